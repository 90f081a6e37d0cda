using WaterMix.Core.Quantities;
using WaterMix.Core.Seawater;
using WaterMix.Formats.Matching;

namespace WaterMix.Formats.Tests.Matching;

public class UnitsTests
{
    [Theory]
    [InlineData("oxygen", "UMOL/KG")]
    [InlineData("oxygen", "µmol kg-1")]
    [InlineData("oxygen", "µmol kg^-1")]
    [InlineData("oxygen", "micromol/kg")]
    [InlineData("oxygen", "micromoles per kg")]
    [InlineData("nitrate", "umol_kg")]
    [InlineData("cfc11", "PMOL/KG")]
    [InlineData("sulfur_hexafluoride", "FMOL/KG")]
    [InlineData("delta_oxygen_18", "/MILLE")]
    [InlineData("delta_oxygen_18", "‰")]
    [InlineData("delta_oxygen_18", "per mil")]
    [InlineData("practical_salinity", "PSS-78")]
    [InlineData("practical_salinity", "psu")]
    [InlineData("in_situ_temperature", "ITS-90")]
    [InlineData("in_situ_temperature", "DEG C")]
    [InlineData("in_situ_temperature", "DEGC")]
    [InlineData("in_situ_temperature", "°C (ITS-90)")]
    [InlineData("pressure", "DBAR")]
    [InlineData("bottom_depth", "METERS")]
    [InlineData("latitude", "degrees_north")]
    [InlineData("neutral_density", "kg m-3")]
    [InlineData("oxygen", "")]
    public void Find_SpellingOfTheCanonicalUnit_KeepsTheNumber(string id, string unit) =>
        Assert.Equal(UnitConversion.Identity, Units.Find(Quantity.Find(id)!, unit));

    [Theory]
    [InlineData("oxygen", "furlongs")]
    [InlineData("oxygen", "percent")]
    [InlineData("phosphate", "mg/L")] // of phosphorus or of phosphate? It does not say.
    [InlineData("nitrate", "mL/L")]
    [InlineData("in_situ_temperature", "degF")]
    [InlineData("in_situ_temperature", "IPTS-48")]
    [InlineData("conservative_temperature", "IPTS-68")]
    [InlineData("practical_salinity", "g/kg")]
    [InlineData("pressure", "m")]
    public void Find_UnitOfSomethingElse_IsNotUnderstood(string id, string unit) =>
        Assert.Null(Units.Find(Quantity.Find(id)!, unit));

    [Theory]
    [InlineData("IPTS-68")]
    [InlineData("ITS-68")]
    [InlineData("ipts68")]
    [InlineData("deg C (IPTS-68)")]
    public void Find_ScaleOf1968_AgreesWithTheSeawaterFunctionToTheBit(string unit)
    {
        UnitConversion conversion = Units.Find(Quantity.InSituTemperature, unit)!.Value;

        foreach (double t68 in (double[])[-1.9, 0, 4.2682, 16.5035, 29.3333])
        {
            Assert.Equal(TemperatureScale.FromIpts68(t68), conversion.Apply(t68));
        }
    }

    // 1 mL/L of O2 is 44.6596 umol/L, 1 mg/L is 1000/31.9988 = 31.2512 umol/L, 1 ug-at/L is half a umol/L of O2: from memory,
    // to the digits that molar mass 31.9988 g/mol and molar volume 22.3916 L/mol give.
    [Theory]
    [InlineData("mL/L", 1000 / 22.3916, 0.0001)]
    [InlineData("ml l-1", 1000 / 22.3916, 0.0001)]
    [InlineData("mg/L", 1000 / 31.9988, 0.0001)]
    [InlineData("ug-at/L", 0.5, 0)]
    public void Find_OxygenPerLitre_MatchesMolarMassAndVolume(string unit, double micromolesPerLitre, double tolerance)
    {
        UnitConversion conversion = Units.Find(Quantity.Oxygen, unit)!.Value;

        Assert.Equal(VolumeBasis.PotentialDensity, conversion.Basis);
        Assert.Equal(micromolesPerLitre, conversion.Apply(1), tolerance);
    }

    [Theory]
    [InlineData("nitrate", "umol/L", 1, VolumeBasis.LaboratoryDensity)]
    [InlineData("nitrate", "µM", 1, VolumeBasis.LaboratoryDensity)]
    [InlineData("nitrate", "mmol/m3", 1, VolumeBasis.LaboratoryDensity)]
    [InlineData("nitrate", "ug-at/L", 1, VolumeBasis.LaboratoryDensity)]
    [InlineData("nitrate", "nmol/L", 0.001, VolumeBasis.LaboratoryDensity)]
    [InlineData("nitrate", "nmol/kg", 0.001, VolumeBasis.None)]
    [InlineData("nitrate", "mmol/kg", 1000, VolumeBasis.None)]
    [InlineData("oxygen", "UMOL/L", 1, VolumeBasis.PotentialDensity)]
    [InlineData("cfc12", "fmol/kg", 0.001, VolumeBasis.None)]
    [InlineData("sulfur_hexafluoride", "pmol/kg", 1000, VolumeBasis.None)]
    public void Find_OtherMultipleOfAMole_Scales(string id, string unit, double factor, VolumeBasis basis)
    {
        UnitConversion conversion = Units.Find(Quantity.Find(id)!, unit)!.Value;

        Assert.Equal(basis, conversion.Basis);
        Assert.Equal(factor, conversion.Apply(1));
    }

    [Fact]
    public void Find_Kelvin_SubtractsTheIcePoint() =>
        Assert.Equal(10, Units.Find(Quantity.InSituTemperature, "K")!.Value.Apply(283.15), 1e-12);

    [Fact]
    public void Find_DegreesWest_ChangesTheSign() =>
        Assert.Equal(-30.5, Units.Find(Quantity.Longitude, "degrees_west")!.Value.Apply(30.5));
}
