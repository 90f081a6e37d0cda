using WaterMix.Core.Seawater;

namespace WaterMix.Core.Tests.Seawater;

/// <summary>Reference. Printed TEOS-10 check values, each to half of its last printed digit or the double's own precision.</summary>
public class Teos10ReferenceTests
{
    // Example values of the documentation of the TEOS-10 toolbox (SA 34.7118 and 34.7324 g/kg), read there.
    [Theory]
    [InlineData(34.7118, 28.7856, 10, 28.809919826700281)]
    [InlineData(34.7324, 4.4036, 1000, 4.323575748610455)]
    public void ConservativeTemperature_DocumentationExample(double sa, double t, double p, double expected) =>
        Assert.Equal(expected, ConservativeTemperature.FromInSitu(sa, t, p), 1e-12);

    // Same source.
    [Theory]
    [InlineData(34.7118, 28.7856, 10, 28.783196819670632)]
    [InlineData(34.7324, 4.4036, 1000, 4.324510571845719)]
    public void PotentialTemperature_DocumentationExample(double sa, double t, double p, double expected) =>
        Assert.Equal(expected, PotentialTemperature.FromInSitu(sa, t, p), 1e-12);

    // Computed once with the reference library, 3.6.16; an older atlas gave 34.71177834.
    [Fact]
    public void AbsoluteSalinity_DocumentationExample_WithTheCurrentAtlas() =>
        Assert.Equal(34.7117937385076, AbsoluteSalinity.FromPractical(34.5487, 10, 188, 4), 1e-13);

    // Documentation of the TEOS-10 toolbox, 75-term polynomial, read there.
    [Theory]
    [InlineData(34.7118, 28.8099, 0, 21.797900819337656)]
    [InlineData(34.7324, 4.3236, 0, 27.409748977090885)]
    [InlineData(34.7118, 28.8099, 1000, 25.955618850310202)]
    [InlineData(34.7324, 4.3236, 1000, 32.002453224572037)]
    public void PotentialAnomaly_DocumentationExample(double sa, double ct, double reference, double expected) =>
        Assert.Equal(expected, Density.PotentialAnomaly(sa, ct, reference), 1e-11);

    // Computed once with the reference library, 75-term polynomial.
    [Fact]
    public void Depth_At1000DbarAnd4North() => Assert.Equal(992.0919060719987, Depth.FromPressure(1000, 4), 1e-10);

    // Documentation of the TEOS-10 toolbox, read there and reproduced. Without T68 = 1.00024 T90 in the fit the second would be higher
    // by 0.06: that trap is why it stands here. The first pair of inputs is as printed there.
    [Theory]
    [InlineData(34.7118, 28.8099, 194.6825431692940)]
    [InlineData(34.8472, 10.2262, 273.5652832698713)]
    [InlineData(34.7324, 4.3236, 312.9598716631408)]
    public void OxygenSolubility_DocumentationExample(double sp, double pt, double expected) =>
        Assert.Equal(expected, OxygenSolubility.FromPractical(sp, pt), 1e-10);

    // Computed: at S 35 and 10 degC the fit gives 274.596 with T68 and 274.610 without.
    [Fact]
    public void OxygenSolubility_Salinity35At10Degrees_UsesIpts68() =>
        Assert.Equal(274.596, OxygenSolubility.FromPractical(35, 10), 0.0005);

    // Common practice, no source: cold water holds more oxygen at every salinity, fresh water more than salt.
    [Fact]
    public void OxygenSolubility_ColderOrFresher_HoldsMore()
    {
        for (double s = 0; s <= 40; s += 5)
        {
            for (double t = -1; t < 35; t++)
            {
                Assert.True(OxygenSolubility.FromPractical(s, t) > OxygenSolubility.FromPractical(s, t + 1));
                Assert.True(OxygenSolubility.FromPractical(s, t) > OxygenSolubility.FromPractical(s + 1, t));
            }
        }
    }

    // The same fit with the exponential and logarithm of the system's library: 1e-15 of the value is a few units of the last place.
    [Fact]
    public void OxygenSolubility_OwnExponentialAndLogarithm_AgreeWithTheSystems()
    {
        for (double s = 0; s <= 42; s += 1.7)
        {
            for (double t90 = -2; t90 <= 40; t90 += 0.37)
            {
                double t = 1.00024 * t90;
                double y = Math.Log((298.15 - t) / (273.15 + t));
                double a = 5.80871 + (y * (3.20291 + (y * (4.17887 + (y * (5.10006 + (y * (-0.0986643 + (y * 3.80369)))))))));
                double b = -7.01577e-3 + (y * (-7.70028e-3 + (y * (-1.13864e-2 + (y * -9.51519e-3)))));
                double expected = Math.Exp(a + (s * b) + (s * s * -2.75915e-7));
                Assert.Equal(expected, OxygenSolubility.FromPractical(s, t90), 4e-15 * expected);
            }
        }
    }

    // The formula of gravity at the surface with the system's sine.
    [Fact]
    public void Gravity_OwnSine_AgreesWithTheSystems()
    {
        for (double latitude = -90; latitude <= 90; latitude += 0.25)
        {
            double sine = Math.Sin(latitude * Math.PI / 180);
            double expected = 9.780327 * (1 + (5.2792e-3 * sine * sine) + (2.32e-5 * sine * sine * sine * sine));
            Assert.Equal(expected, Gravity.At(0, latitude), 4e-15);
        }
    }
}
