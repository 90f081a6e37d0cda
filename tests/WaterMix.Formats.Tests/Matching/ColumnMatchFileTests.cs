using System.Text;
using WaterMix.Core;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Formats.Json;
using WaterMix.Formats.Matching;
using WaterMix.Formats.Reading;
using WaterMix.Formats.Tests.Reading;

namespace WaterMix.Formats.Tests.Matching;

public class ColumnMatchFileTests
{
    private const string Full = """
        { "schema": "watermix/column-match/1", "delimiter": ";", "decimalMark": ",", "missing": ["-9", "n.d."],
          "columns": [
            { "column": "Stat", "identity": "station" },
            { "column": "T", "quantity": "in_situ_temperature", "unitColumn": "Skala" },
            { "column": "S1", "quantity": "practical_salinity", "flag": "q1" },
            { "column": "S2", "quantity": "practical_salinity", "flag": "q2", "origin": "ctd" },
            { "column": "Ba", "quantity": "barium", "unit": "nmol/kg" },
            { "column": "Bemerkung", "ignore": true } ] }
        """;

    [Fact]
    public void Read_EveryKey_IsUsedByTheReader()
    {
        var options = new ReadingOptions { Match = Read(Full).Value };
        Assert.NotNull(options.Match);

        SampleTable table = ReadingHelp.Table("Stat;T;Skala;S1;q1;S2;q2;Ba;Bemerkung\n7a;10,5;IPTS-68;35,1;3;35,2;2;45,5;na ja\n8;10,5;ITS-90;-9;2;n.d.;9;-9;\n", options);

        Assert.Equal("7a", table.Identity[0][0]);
        Assert.Equal([10.5 / 1.00024, 10.5], table.Find(Quantity.InSituTemperature)!.Values.ToArray());
        Assert.Equal([35.2, double.NaN], table.Find(Quantity.PracticalSalinity)!.Values.ToArray());
        Assert.Equal((45.5, "nmol/kg"), (table.Find("barium")!.Values[0], table.Find("barium")!.Quantity.Unit));
        Assert.Null(table.Find("Bemerkung"));
    }

    [Fact]
    public void Write_ThenRead_GivesTheSame()
    {
        ColumnMatchFile match = Read(Full).Value!;

        ColumnMatchFile back = ColumnMatchFile.Read(match.Write(), "again.json").Value!;

        Assert.Equal(match.Columns, back.Columns);
        Assert.Equal((match.Delimiter, match.DecimalMark), (back.Delimiter, back.DecimalMark));
        Assert.Equal(match.Missing, back.Missing);
    }

    [Theory]
    [InlineData("""{ "columns": [] }""", "/schema")]
    [InlineData("""{ "schema": "watermix/column-match/2", "columns": [] }""", "/schema")]
    [InlineData("""{ "schema": "watermix/column-match/1" }""", "/columns")]
    [InlineData("""{ "schema": "watermix/column-match/1", "columns": [], "delimeter": ";" }""", "/delimeter")]
    [InlineData("""{ "schema": "watermix/column-match/1", "columns": [], "delimiter": "x" }""", "/delimiter")]
    [InlineData("""{ "schema": "watermix/column-match/1", "columns": [], "decimalMark": "," }""", "/decimalMark")]
    [InlineData("""{ "schema": "watermix/column-match/1", "columns": [ { "column": "a" } ] }""", "/columns/0")]
    [InlineData("""{ "schema": "watermix/column-match/1", "columns": [ { "quantity": "oxygen" } ] }""", "/columns/0/column")]
    [InlineData("""{ "schema": "watermix/column-match/1", "columns": [ { "column": "a", "quantity": "oxygen", "ignore": true } ] }""", "/columns/0")]
    [InlineData("""{ "schema": "watermix/column-match/1", "columns": [ { "column": "a", "identity": "stations" } ] }""", "/columns/0/identity")]
    [InlineData("""{ "schema": "watermix/column-match/1", "columns": [ { "column": "a", "identity": "station", "flag": "b" } ] }""", "/columns/0/flag")]
    [InlineData("""{ "schema": "watermix/column-match/1", "columns": [ { "column": "a", "quantity": "oxygen", "origin": "CTD" } ] }""", "/columns/0/origin")]
    [InlineData("""{ "schema": "watermix/column-match/1", "columns": [ { "column": "a", "quantity": "oxygen", "units": "mL/L" } ] }""", "/columns/0/units")]
    [InlineData("""{ "schema": "watermix/column-match/1", "columns": [ { "column": "a", "ignore": true }, { "column": "a", "ignore": true } ] }""", "/columns/1")]
    public void Read_Fault_IsAnErrorWithItsPath(string json, string path)
    {
        Reading<ColumnMatchFile> reading = Read(json);

        Assert.Null(reading.Value);
        Assert.Contains(reading.Findings, f => f.Severity == Severity.Error && f.Path == path);
    }

    [Fact]
    public void Open_ColumnThatNoFileHas_IsAnError()
    {
        var options = new ReadingOptions { Match = new ColumnMatchFile([new ColumnMatch("O2 sensor") { Quantity = "oxygen" }]) };

        Finding error = ReadingHelp.Error(ReadingHelp.Findings("station,oxygen\n1,2\n", options));

        Assert.Equal("O2 sensor", error.Column);
    }

    [Fact]
    public void Open_FlagColumnThatIsNotThere_IsAnError()
    {
        var options = new ReadingOptions { Match = new ColumnMatchFile([new ColumnMatch("O2") { Quantity = "oxygen", Flag = "O2_q" }]) };

        Assert.Contains("'O2_q'", ReadingHelp.Error(ReadingHelp.Findings("station,O2\n1,2\n", options)).Expected, StringComparison.Ordinal);
    }

    [Fact]
    public void Open_UnitThatIsNotUnderstood_IsAnError()
    {
        var options = new ReadingOptions { Match = new ColumnMatchFile([new ColumnMatch("O2") { Quantity = "oxygen", Unit = "furlong" }]) };

        Assert.Equal("'furlong'", ReadingHelp.Error(ReadingHelp.Findings("station,O2\n1,2\n", options)).Found);
    }

    [Fact]
    public void Open_MatchOfOneRival_SettlesTheAmbiguity()
    {
        var options = new ReadingOptions
        {
            NeededQuantities = new HashSet<string> { "oxygen" },
            Match = new ColumnMatchFile([new ColumnMatch("O2 sensor [umol/kg]") { Quantity = "oxygen" }]),
        };

        SampleTable table = ReadingHelp.Table("station,O2 [umol/kg],O2 sensor [umol/kg]\n1,200,201\n", options);

        Assert.Equal(201, table.Find(Quantity.Oxygen)!.Values[0]);
        Assert.Equal(200, table.Columns.Single(c => c.Id != "oxygen").Values[0]);
    }

    [Fact]
    public void Match_GuessSavedAndUsedAgain_ReadsTheSameTable()
    {
        const string Csv = "Station No.,date,time,lat,lon,Depth_m,temperature_C,temp_scale,sal,sal_flag,O2 [mL/L],bottle_flag\n1,20080205,2207,-33.2,28.1,10,20.5,IPTS-68,35.2,2,4.9,2\n";
        using OpenedSamples opened = SampleReader.Open([ReadingHelp.File("a.csv", Csv)], new ReadingOptions());

        ColumnMatchFile saved = ColumnMatchFile.Read(opened.Match.Write(), "match.json").Value!;

        ReadingHelp.AssertSame(ReadingHelp.Table(Csv), ReadingHelp.Table(Csv, new ReadingOptions { Match = saved }));
    }

    private static Reading<ColumnMatchFile> Read(string json) => ColumnMatchFile.Read(Encoding.UTF8.GetBytes(json), "match.json");
}
