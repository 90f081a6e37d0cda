using WaterMix.Core;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Formats.Matching;
using WaterMix.Formats.Reading;

namespace WaterMix.Formats.Tests.Reading;

/// <summary>What counts as missing, what is data, and what one bad cell does.</summary>
public class ValueRuleTests
{
    [Theory]
    [InlineData("-999")]
    [InlineData("-999.0")]
    [InlineData("  -999.0000 ")]
    [InlineData("9.96921e36")]
    [InlineData("9.969209968386869E+36")]
    [InlineData("NaN")]
    [InlineData("nan")]
    [InlineData("")]
    [InlineData("   ")]
    public void ReadCell_TextThatStandsForNothing_IsMissingWithoutAFinding(string cell)
    {
        IReadOnlyList<Finding> findings = ReadingHelp.Findings($"station,oxygen,latitude\n1,{cell},{cell}\n");
        SampleTable table = ReadingHelp.Table($"station,oxygen,latitude\n1,{cell},{cell}\n");

        Assert.Empty(findings);
        Assert.True(double.IsNaN(table.Find(Quantity.Oxygen)!.Values[0]));
        Assert.True(double.IsNaN(table.Find(Quantity.Latitude)!.Values[0]));
    }

    [Theory]
    [InlineData("9", double.NaN)]
    [InlineData("5", double.NaN)]
    [InlineData("2", -9)]
    [InlineData("", -9)]
    public void ReadCell_MinusNine_IsMissingOnlyWhereTheFlagSaysNotSampled(string flag, double expected)
    {
        SampleTable table = ReadingHelp.Table($"station,silicate,silicate_flag\n1,-9.0,{flag}\n");

        Assert.Equal(expected, table.Find(Quantity.Silicate)!.Values[0]);
    }

    [Theory]
    [InlineData("latitude")]
    [InlineData("longitude")]
    [InlineData("in_situ_temperature")]
    [InlineData("potential_temperature")]
    [InlineData("delta_oxygen_18")]
    [InlineData("DELC13 [/MILLE]")]
    public void ReadCell_MinusNineWhereItCanBeAValue_IsKeptWhateverIsDeclared(string column)
    {
        var options = new ReadingOptions { Match = new ColumnMatchFile([]) { Missing = ["-9"] } };
        string id = column.Split(' ')[0];

        SampleTable table = ReadingHelp.Table($"station,{column},{id}_flag\n1,-9.0000,9\n", options);

        Assert.Equal(-9, table.Find(id)!.Values[0]);
    }

    [Fact]
    public void ReadCell_DeclaredFill_IsMissing()
    {
        var options = new ReadingOptions { Match = new ColumnMatchFile([]) { Missing = ["-9", "1e10", "n.d."] } };

        SampleTable table = ReadingHelp.Table("station,oxygen,nitrate,silicate,phosphate\n1,-9.00,10000000000,n.d.,-0.01\n", options);

        Assert.Equal([double.NaN, double.NaN, double.NaN, -0.01], new[] { Quantity.Oxygen, Quantity.Nitrate, Quantity.Silicate, Quantity.Phosphate }.Select(q => table.Find(q)!.Values[0]));
    }

    [Fact]
    public void ReadCell_SmallNegativeNutrient_IsData() =>
        Assert.Equal(-0.01, ReadingHelp.Table("station,nitrate\n1,-0.01\n").Find(Quantity.Nitrate)!.Values[0]);

    [Theory]
    [InlineData("<0.02")]
    [InlineData("n.d.")]
    [InlineData("inf")]
    [InlineData("1e999")]
    [InlineData("3,1", "\"3,1\"")]
    public void ReadCell_OneBadCell_IsMissingWithAFinding(string text, string? cell = null)
    {
        string csv = $"station,nitrate\n1,5.5\n2,{cell ?? text}\n3,{cell ?? text}\n";

        Finding finding = Assert.Single(ReadingHelp.Findings(csv));
        SampleTable table = ReadingHelp.Table(csv);

        Assert.Equal((Severity.Warning, 3L, "nitrate", 2L, $"'{text}'"), (finding.Severity, finding.Line, finding.Column, finding.Count, finding.Found) switch { var f => (f.Severity, f.Line!.Value, f.Column!, f.Count, f.Found) });
        Assert.Equal([5.5, double.NaN, double.NaN], table.Find(Quantity.Nitrate)!.Values.ToArray());
    }

    [Theory]
    [InlineData(190, -170)]
    [InlineData(180, -180)]
    [InlineData(-180, -180)]
    [InlineData(360, 0)]
    [InlineData(359.5, -0.5)]
    [InlineData(-190, 170)]
    [InlineData(12.25, 12.25)]
    public void ReadCell_Longitude_IsBroughtIntoHalfOpenRange(double given, double expected) =>
        Assert.Equal(expected, ReadingHelp.Table(FormattableString.Invariant($"station,longitude\n1,{given}\n")).Find(Quantity.Longitude)!.Values[0]);

    [Fact]
    public void ReadCell_ImpossibleLatitude_IsKeptForTheRowsStatusWithAWarning()
    {
        const string Csv = "station,latitude\n1,91.5\n";

        Finding finding = Assert.Single(ReadingHelp.Findings(Csv));

        Assert.Equal((Severity.Warning, 2L, "91.5"), (finding.Severity, finding.Line!.Value, finding.Found));
        Assert.Equal(91.5, ReadingHelp.Table(Csv).Find(Quantity.Latitude)!.Values[0]);
    }

    [Fact]
    public void ReadCell_TemperatureScaleRowByRow_ConvertsEachRow()
    {
        SampleTable table = ReadingHelp.Table("station,temperature_C,temp_scale\n1,10,IPTS-68\n2,10,ITS-90\n3,10,\n");

        Assert.Equal([10 / 1.00024, 10, 10], table.Find(Quantity.InSituTemperature)!.Values.ToArray());
    }

    [Fact]
    public void ReadCell_ScaleThatIsNone_IsMissingWithAFinding()
    {
        const string Csv = "station,temperature_C,temp_scale\n1,10,Réaumur\n";

        Finding finding = Assert.Single(ReadingHelp.Findings(Csv));

        Assert.Equal((Severity.Warning, "temp_scale", "'Réaumur'"), (finding.Severity, finding.Column!, finding.Found));
        Assert.True(double.IsNaN(ReadingHelp.Table(Csv).Find(Quantity.InSituTemperature)!.Values[0]));
    }

    [Fact]
    public void ReadCell_FlagThatIsNone_MakesTheValueUnusableWithAFinding()
    {
        const string Csv = "station,oxygen,oxygen_flag\n1,200,A\n2,201,2\n3,202,2.0\n";

        Finding finding = Assert.Single(ReadingHelp.Findings(Csv));

        Assert.Equal((2L, "oxygen_flag", "'A'"), (finding.Line!.Value, finding.Column!, finding.Found));
        Assert.Equal([9, 2, 2], ReadingHelp.Table(Csv).Find(Quantity.Oxygen)!.Flags.ToArray());
    }
}
