using WaterMix.Core.Mixing;

namespace WaterMix.Core.Tests.Mixing;

public class ChiSquareTests
{
    // Reference: the usual table of upper percentage points of chi-square (3 decimals printed), AbramowitzStegun1964 table 26.8; values from memory.
    // The tolerance is half of the last printed digit times the density at the point, at most 0.5.
    [Theory]
    [InlineData(3.841, 1, 0.05)]
    [InlineData(5.991, 2, 0.05)]
    [InlineData(7.815, 3, 0.05)]
    [InlineData(9.488, 4, 0.05)]
    [InlineData(18.307, 10, 0.05)]
    [InlineData(6.635, 1, 0.01)]
    [InlineData(23.209, 10, 0.01)]
    [InlineData(0.0039321, 1, 0.95)]
    public void UpperTail_TablePoints_GivesTheProbability(double value, int degreesOfFreedom, double probability) =>
        Assert.Equal(probability, ChiSquare.UpperTail(value, degreesOfFreedom), 0.0005 * 0.5);

    // Agreement: MathNet.Numerics, an independent implementation.
    [Fact]
    public void UpperTail_Grid_AgreesWithMathNet()
    {
        for (int dof = 1; dof <= 40; dof++)
        {
            for (double value = 0.001; value < 400; value *= 1.37)
            {
                double expected = MathNet.Numerics.SpecialFunctions.GammaUpperRegularized(dof / 2.0, value / 2);
                Assert.Equal(expected, ChiSquare.UpperTail(value, dof), 1e-12);
                Assert.True(expected < 1e-250 || Math.Abs((ChiSquare.UpperTail(value, dof) / expected) - 1) < 1e-8, $"{value} {dof}");
            }
        }
    }

    [Fact]
    public void UpperTail_Extremes_StayProbabilities()
    {
        Assert.Equal(1, ChiSquare.UpperTail(0, 3));
        Assert.Equal(0, ChiSquare.UpperTail(double.PositiveInfinity, 3));
        Assert.Equal(0, ChiSquare.UpperTail(1e6, 3));
        Assert.True(double.IsNaN(ChiSquare.UpperTail(double.NaN, 3)));
        Assert.Throws<ArgumentOutOfRangeException>(() => ChiSquare.UpperTail(1, 0));
    }
}
