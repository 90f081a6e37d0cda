using CsCheck;
using WaterMix.Core.Seawater;

namespace WaterMix.Core.Tests.Seawater;

/// <summary>Property. Round trips, missing values, edges of the ranges.</summary>
public class SeawaterPropertyTests
{
    private static readonly Gen<(double SA, double T, double P)> Water =
        Gen.Select(Gen.Double[0, 42], Gen.Double[-2, 38], Gen.Double[0, 10_000]);

    [Fact]
    public void Temperatures_ThereAndBack_ReturnTheInput() => Water.Sample(w =>
    {
        double ct = ConservativeTemperature.FromInSitu(w.SA, w.T, w.P);
        return Math.Abs(InSituTemperature.FromConservative(w.SA, ct, w.P) - w.T) < 1e-11;
    });

    [Fact]
    public void PotentialTemperature_BothWaysToTheSurface_Agree() => Water.Sample(w =>
        Math.Abs(PotentialTemperature.FromInSitu(w.SA, w.T, w.P, 0) - PotentialTemperature.FromInSitu(w.SA, w.T, w.P)) < 1e-12);

    [Fact]
    public void Salinities_ThereAndBack_ReturnTheInput() =>
        Gen.Select(Gen.Double[0, 42], Gen.Double[0, 8_000], Gen.Double[-180, 360], Gen.Double[-86, 90]).Sample((sp, p, lon, lat) =>
            Math.Abs(PracticalSalinity.FromAbsolute(AbsoluteSalinity.FromPractical(sp, p, lon, lat), p, lon, lat) - sp) < 1e-13);

    [Fact]
    public void Pressure_ThereAndBack_ReturnsTheInput() =>
        Gen.Select(Gen.Double[0, 11_000], Gen.Double[-90, 90]).Sample((p, lat) =>
            Math.Abs(SeaPressure.FromDepth(Depth.FromPressure(p, lat), lat) - p) < 1e-8);

    [Fact]
    public void Expansion_AgainstDifferences_IsTheDerivativeOfDensity() => Water.Sample(w =>
    {
        const double Step = 1e-3;
        double v = Density.SpecificVolume(w.SA, w.T, w.P);
        double byTemperature = Density.SpecificVolume(w.SA, w.T + Step, w.P) - Density.SpecificVolume(w.SA, w.T - Step, w.P);
        double bySalinity = Density.SpecificVolume(w.SA + Step, w.T, w.P) - Density.SpecificVolume(w.SA - Step, w.T, w.P);
        return Math.Abs(Density.ThermalExpansion(w.SA, w.T, w.P) - (byTemperature / (2 * Step * v))) < 1e-11
            && Math.Abs(Density.HalineContraction(w.SA, w.T, w.P) + (bySalinity / (2 * Step * v))) < 1e-11;
    });

    [Theory]
    [InlineData(-60, 300)]
    [InlineData(-180, 180)]
    [InlineData(-0.5, 359.5)]
    [InlineData(0, 360)]
    [InlineData(-85, 275)]
    public void AbsoluteSalinity_LongitudeEitherWay_IsTheSame(double west, double east) =>
        Assert.Equal(AbsoluteSalinity.FromPractical(35, 500, west, 12), AbsoluteSalinity.FromPractical(35, 500, east, 12), 1e-14);

    [Theory]
    [InlineData(0, -86.5)]
    [InlineData(0, 90.5)]
    [InlineData(361, 0)]
    [InlineData(-181, 0)]
    [InlineData(double.NaN, 0)]
    [InlineData(0, double.NaN)]
    public void AbsoluteSalinity_OutsideTheAtlas_IsMissing(double longitude, double latitude)
    {
        Assert.True(double.IsNaN(AbsoluteSalinity.FromPractical(35, 0, longitude, latitude)));
        Assert.True(double.IsNaN(PracticalSalinity.FromAbsolute(35, 0, longitude, latitude)));
    }

    [Theory]
    [InlineData(20, 58)]
    [InlineData(-30, 40)]
    public void AnyMissingInput_GivesMissing(double longitude, double latitude)
    {
        double nan = double.NaN;
        double[] results =
        [
            AbsoluteSalinity.FromPractical(nan, 0, longitude, latitude), AbsoluteSalinity.FromPractical(35, nan, longitude, latitude),
            PracticalSalinity.FromAbsolute(nan, 0, longitude, latitude), PracticalSalinity.FromAbsolute(35, nan, longitude, latitude),
            ConservativeTemperature.FromInSitu(nan, 5, 0), ConservativeTemperature.FromInSitu(35, nan, 0), ConservativeTemperature.FromInSitu(35, 5, nan),
            PotentialTemperature.FromInSitu(nan, 5, 0), PotentialTemperature.FromInSitu(35, nan, 0), PotentialTemperature.FromInSitu(35, 5, nan),
            PotentialTemperature.FromInSitu(35, 5, 0, nan), PotentialTemperature.FromConservative(nan, 5), PotentialTemperature.FromConservative(35, nan),
            InSituTemperature.FromConservative(35, 5, nan), Density.FromConservative(nan, 5, 0), Density.FromConservative(35, nan, 0),
            Density.FromConservative(35, 5, nan), Density.ThermalExpansion(nan, 5, 0), Density.HalineContraction(35, 5, nan),
            Depth.FromPressure(nan, 0), Depth.FromPressure(0, nan), SeaPressure.FromDepth(nan, 0), SeaPressure.FromDepth(10, nan), Gravity.At(nan, 0),
            OxygenSolubility.FromPractical(nan, 5), OxygenSolubility.FromPractical(35, nan),
            Eos80.Density(nan, 5, 0), Eos80.PotentialTemperature(35, nan, 0, 0), Eos80.PotentialAnomaly(35, 5, nan, 0), Eos80.Depth(100, nan),
        ];
        Assert.All(results, r => Assert.True(double.IsNaN(r)));
    }

    [Fact]
    public void Surface_ChangesNoTemperatureAndHasNoDepth()
    {
        Assert.Equal(12.5, PotentialTemperature.FromInSitu(35, 12.5, 0), 1e-14);
        Assert.Equal(0, Depth.FromPressure(0, 45));
        Assert.Equal(0, SeaPressure.FromDepth(0, 45), 1e-14);
    }

    // Outside the stated ranges: a latitude past the pole, heights above 5 m, salinity below 0.
    [Fact]
    public void OutsideTheRange_IsMissing()
    {
        Assert.True(double.IsNaN(Depth.FromPressure(100, 90.1)));
        Assert.True(double.IsNaN(SeaPressure.FromDepth(-5.1, 0)));
        Assert.False(double.IsNaN(SeaPressure.FromDepth(-5, 0)));
        Assert.True(double.IsNaN(ConservativeTemperature.FromInSitu(-0.01, 5, 0)));
    }

    // Low salinities go through the same straight lines; at 0 nothing is left but the Baltic's river salt, 0.087 g/kg.
    [Fact]
    public void AbsoluteSalinity_FreshWater_IsOnTheSameLine()
    {
        Assert.Equal(0, AbsoluteSalinity.FromPractical(0, 0, -30, 40));
        Assert.Equal(0.087, AbsoluteSalinity.FromPractical(0, 0, 20, 58));
    }

    [Fact]
    public void Squared_TwoLevelsAtOnePressure_IsMissingThereOnly()
    {
        double[] n2 = new double[2];
        double[] middle = new double[2];
        BuoyancyFrequency.Squared([35, 35.1, 35.2], [10, 9, 8], [100, 100, 200], 30, n2, middle);
        Assert.True(double.IsNaN(n2[0]));
        Assert.True(n2[1] > 0);
        Assert.Equal([100, 150], middle);
    }

    [Fact]
    public void Squared_ProfileUpsideDown_GivesTheSameStability()
    {
        double[] down = new double[1];
        double[] up = new double[1];
        double[] middle = new double[1];
        BuoyancyFrequency.Squared([35, 35.1], [10, 9], [100, 200], 30, down, middle);
        BuoyancyFrequency.Squared([35.1, 35], [9, 10], [200, 100], 30, up, middle);
        Assert.Equal(down[0], up[0], 1e-20);
    }

    [Fact]
    public void Squared_LengthsThatDoNotFit_AreNamed()
    {
        ArgumentException error = Assert.Throws<ArgumentException>(() => BuoyancyFrequency.Squared([35, 35], [10], [0, 10], 0, new double[1], new double[1]));
        Assert.Contains("2, 1, 2, 1 and 1", error.Message, StringComparison.Ordinal);
    }
}
