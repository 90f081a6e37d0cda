using WaterMix.Core.Seawater;

namespace WaterMix.Core.Tests.Seawater;

/// <summary>
/// Reference. Check values of <c>Unesco44</c>. Its temperatures are IPTS-68, so they are converted on the way in and back on the way out.
/// "From memory" says that the value was recalled and reproduced by computation, not read on the page.
/// </summary>
public class Eos80ReferenceTests
{
    // From memory, five decimals given: half of the last is 0.000005.
    [Theory]
    [InlineData(0, 5, 0, 999.96675)]
    [InlineData(35, 5, 0, 1027.67547)]
    [InlineData(35, 25, 0, 1023.34306)]
    [InlineData(35, 5, 10_000, 1069.48914)]
    [InlineData(35, 25, 10_000, 1062.53817)]
    public void Density_RememberedCheckValue(double s, double t68, double p, double expected) =>
        Assert.Equal(expected, Eos80.Density(s, TemperatureScale.FromIpts68(t68), p), 0.000005);

    // From memory, algorithm 3 of the report: rho(40, 40, 10,000 dbar).
    [Fact]
    public void Density_RememberedCheckValueAt40Degrees() =>
        Assert.Equal(1059.8204, Eos80.Density(40, TemperatureScale.FromIpts68(40), 10_000), 0.00005);

    // From memory, algorithm 7: theta(40, 40, 10,000 dbar to 0).
    [Fact]
    public void PotentialTemperature_RememberedCheckValue() =>
        Assert.Equal(
            36.89073,
            TemperatureScale.ToIpts68(Eos80.PotentialTemperature(40, TemperatureScale.FromIpts68(40), 10_000, 0)),
            0.000005);

    // Unesco44, algorithm 4, printed check value; read in a source that quotes it. Three decimals printed: half of the last is 0.0005.
    [Fact]
    public void Depth_PrintedCheckValue() => Assert.Equal(9712.653, Eos80.Depth(10_000, 30), 0.0005);

    // From memory, algorithm 1.
    [Theory]
    [InlineData(1.888091, 40, 10_000, 40.0000, 0.00005)]
    [InlineData(1.2, 20, 2_000, 37.245628, 0.0000005)]
    [InlineData(0.65, 5, 1_500, 27.995347, 0.0000005)]
    [InlineData(1, 15, 0, 35, 0.0000005)]
    public void PracticalSalinity_RememberedCheckValue(double ratio, double t68, double p, double expected, double halfDigit) =>
        Assert.Equal(expected, PracticalSalinityScale.FromConductivityRatio(ratio, TemperatureScale.FromIpts68(t68), p), halfDigit);

    // PSS-78 is defined from 2 to 42.
    [Theory]
    [InlineData(0.02)]
    [InlineData(1.6)]
    [InlineData(-1)]
    [InlineData(double.NaN)]
    public void PracticalSalinity_OutsideTheScale_IsMissing(double ratio) =>
        Assert.True(double.IsNaN(PracticalSalinityScale.FromConductivityRatio(ratio, 15, 0)));

    // Methods of the two standards compared on deep water: TEOS-10 is higher below 2,000 dbar by 0.007 to 0.018 in sigma2 (computed on
    // two real sections). The water here: 30N in both oceans, typical values, from memory.
    [Theory]
    [InlineData(34.90, 2.40, 4000, -60, 0.005, 0.012)]
    [InlineData(34.68, 1.50, 4000, -160, 0.010, 0.022)]
    public void PotentialAnomaly_DeepWater_IsLowerThanTeos10(double sp, double t, double p, double longitude, double least, double most)
    {
        double sa = AbsoluteSalinity.FromPractical(sp, p, longitude, 30);
        double teos10 = Density.PotentialAnomaly(sa, ConservativeTemperature.FromInSitu(sa, t, p), 2000);
        Assert.InRange(teos10 - Eos80.PotentialAnomaly(sp, t, p, 2000), least, most);
    }

    // The lapse rate integrated in one step against the entropy of TEOS-10: Fofonoff and Bryden claim 0.1 mK, from memory; the two
    // standards differ by a few mK at depth.
    [Fact]
    public void PotentialTemperature_DeepWater_IsNearTeos10()
    {
        double sa = ReferenceSalinity.FromPractical(34.9);
        Assert.Equal(PotentialTemperature.FromInSitu(sa, 2.4, 5000), Eos80.PotentialTemperature(34.9, 2.4, 5000, 0), 0.003);
    }

    [Fact]
    public void PotentialAnomaly_AtTheReferencePressure_IsTheDensityThere() =>
        Assert.Equal(Eos80.Density(35, 3, 2000) - 1000, Eos80.PotentialAnomaly(35, 3, 2000, 2000), 1e-11);
}
