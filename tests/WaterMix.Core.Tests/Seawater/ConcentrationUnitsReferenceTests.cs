using WaterMix.Core.Mixing;
using WaterMix.Core.Seawater;

namespace WaterMix.Core.Tests.Seawater;

/// <summary>Reference. Factors between units of concentration, and the formulas of derived tracers.</summary>
public class ConcentrationUnitsReferenceTests
{
    // Molar volume of oxygen as a real gas at 0 degC and one atmosphere, 22.3916 L/mol, from memory; four decimals of the factor.
    [Fact]
    public void OxygenMicromolesPerMillilitre_FollowsFromTheMolarVolume() =>
        Assert.Equal(1000 / 22.3916, ConcentrationUnits.OxygenMicromolesPerMillilitre, 0.00005);

    // Molar mass of O2, 31.9988 g/mol, from memory.
    [Fact]
    public void OxygenMicromolesPerMilligram_FollowsFromTheMolarMass() =>
        Assert.Equal(1000 / 31.9988, ConcentrationUnits.OxygenMicromolesPerMilligram, 0.00005);

    // umol/kg = umol/L * 1000 / (1000 + sigma), read in a source; the figure by hand.
    [Fact]
    public void OxygenPerKilogram_DividesByDensityInKilogramsPerLitre() =>
        Assert.Equal(250 * 1000 / 1027.0, ConcentrationUnits.OxygenPerKilogram(250, 27), 1e-12);

    // EOS-80 density at S 35, 25 degC (IPTS-68), 0 dbar: 1023.34306, from memory; the two standards differ there by under 0.01 kg/m3.
    [Fact]
    public void NutrientPerKilogram_UsesDensityAtTheLaboratorysTemperature() =>
        Assert.Equal(30 / 1.02334306, ConcentrationUnits.NutrientPerKilogram(30, 35, TemperatureScale.FromIpts68(25)), 30 * 1e-5);

    // Computed elsewhere: 5 in place of 20 degC is an error of 0.28 %.
    [Fact]
    public void NutrientPerKilogram_FiveDegreesInPlaceOfTwenty_IsLowerByAQuarterOfAPercent() =>
        Assert.Equal(
            0.0028,
            (ConcentrationUnits.NutrientPerKilogram(30, 35) / ConcentrationUnits.NutrientPerKilogram(30, 35, 5)) - 1,
            0.00005);

    // By hand from the formulas of the papers, with the default factors.
    [Fact]
    public void DerivedTracers_DefaultFactors()
    {
        var factors = new DerivedTracerFactors();
        Assert.Equal(200 + (10.625 * 20), DerivedTracers.No(200, 20, factors), 1e-12);
        Assert.Equal(200 + (170 * 1.4), DerivedTracers.Po(200, 1.4, factors), 1e-12);
        Assert.Equal(20 - (16 * 1.4) + 2.9, DerivedTracers.NStar(20, 1.4, factors), 1e-12);
        Assert.Equal(1.4 + (200 / 175.0) - 1.95, DerivedTracers.Po4Star(1.4, 200, factors), 1e-12);
    }

    // AOU is solubility less oxygen: 0 in water at equilibrium.
    [Fact]
    public void ApparentOxygenUtilisation_AtEquilibrium_IsZero() =>
        Assert.Equal(0, DerivedTracers.ApparentOxygenUtilisation(OxygenSolubility.FromPractical(35, 10), 35, 10));
}
