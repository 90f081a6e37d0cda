using WaterMix.Core;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Core.Seawater;
using WaterMix.Formats.Reading;

namespace WaterMix.Formats.Tests.Reading;

/// <summary>Amounts per litre become amounts per kilogram, late, over the block.</summary>
public class PerKilogramTests
{
    private const string Header = "station,latitude,longitude,pressure,in_situ_temperature,salinity,salinity_flag,salinity_ctd,oxygen [mL/L],PO4 [umol/L],NO3 [umol/kg]\n";

    [Fact]
    public void Build_AmountsPerLitre_AreMultipliedByTheFactorOfTheirKind()
    {
        var fake = new FakePerKilogram();
        OpenedSamples opened = SampleReader.Open(
            [ReadingHelp.File("a.csv", Header + "1,30,-40,100,10,35.1,2,35.2,5,2,20\n")], new ReadingOptions { LaboratoryTemperature = 23 }, fake, new FindingList(), null);

        SampleTable table = Assert.Single(ReadingHelp.ReadAll(opened).Blocks).Table;

        Assert.Equal(5 * 44.6596 * 0.5, table.Find(Quantity.Oxygen)!.Values[0]);
        Assert.Equal(2 * 0.25, table.Find(Quantity.Phosphate)!.Values[0]);
        Assert.Equal(20, table.Find(Quantity.Nitrate)!.Values[0]);
        Assert.Equal(23, fake.Temperature);
        Assert.Equal(35.1, fake.Salinity);
        Assert.Contains("44.6596", table.Find(Quantity.Oxygen)!.Conversion, StringComparison.Ordinal);
    }

    // Agreement with the functions of the core on the same numbers, which have their own reference tests.
    [Fact]
    public void Build_RealDensities_AgreeWithTheSeawaterFunctions()
    {
        SampleTable table = ReadingHelp.Table(Header + "1,30,-40,100,10,35.1,2,35.2,5,2,20\n");

        double sa = AbsoluteSalinity.FromPractical(35.1, 100, -40, 30);
        double sigma0 = Density.PotentialAnomaly(sa, ConservativeTemperature.FromInSitu(sa, 10, 100), 0);
        Assert.Equal(ConcentrationUnits.OxygenPerKilogram(5 * 44.6596, sigma0), table.Find(Quantity.Oxygen)!.Values[0], 1e-12);
        Assert.Equal(ConcentrationUnits.NutrientPerKilogram(2, 35.1, 20), table.Find(Quantity.Phosphate)!.Values[0], 1e-14);
    }

    [Fact]
    public void Build_UnacceptedBottleSalinity_TakesTheMergedOne()
    {
        double accepted = ReadingHelp.Table(Header + "1,30,-40,100,10,35.1,2,35.1,5,2,20\n").Find(Quantity.Phosphate)!.Values[0];

        Assert.Equal(accepted, ReadingHelp.Table(Header + "1,30,-40,100,10,3.51,4,35.1,5,2,20\n").Find(Quantity.Phosphate)!.Values[0]);
    }

    [Fact]
    public void Build_NoPosition_UsesReferenceSalinityWithinOnePartInTenThousand()
    {
        double oxygen = ReadingHelp.Table(Header + "1,30,-40,100,10,35.1,2,35.2,5,2,20\n").Find(Quantity.Oxygen)!.Values[0];
        double without = ReadingHelp.Table(Header + "1,,,100,10,35.1,2,35.2,5,2,20\n").Find(Quantity.Oxygen)!.Values[0];

        Assert.Equal(oxygen, without, oxygen * 1e-4);
    }

    [Fact]
    public void Build_NoSalinity_IsMissingWithAFinding()
    {
        IReadOnlyList<Finding> findings = ReadingHelp.Findings(Header + "1,30,-40,100,10,,,,5,2,20\n2,30,-40,100,10,35,2,,5,2,20\n");
        SampleTable table = ReadingHelp.Table(Header + "1,30,-40,100,10,,,,5,2,20\n2,30,-40,100,10,35,2,,5,2,20\n");

        Assert.True(double.IsNaN(table.Find(Quantity.Oxygen)!.Values[0]));
        Assert.False(double.IsNaN(table.Find(Quantity.Oxygen)!.Values[1]));
        Assert.Equal(20, table.Find(Quantity.Nitrate)!.Values[0]);
        Assert.Equal(2, findings.Count(f => f.Severity == Severity.Warning && f.Count == 1 && f.Column is "oxygen [mL/L]" or "PO4 [umol/L]"));
    }

    private sealed class FakePerKilogram : IPerKilogram
    {
        public double Temperature { get; private set; }

        public double Salinity { get; private set; }

        public double[] AtPotentialDensity(SampleTable samples, AcceptedFlags accepted) => [.. Enumerable.Repeat(0.5, samples.RowCount)];

        public double[] InLaboratory(SampleTable samples, AcceptedFlags accepted, double temperature)
        {
            Temperature = temperature;
            Salinity = samples.Find(Quantity.PracticalSalinity)!.UsableAt(0, accepted);
            return [.. Enumerable.Repeat(0.25, samples.RowCount)];
        }
    }
}
