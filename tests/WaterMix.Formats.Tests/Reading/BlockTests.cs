using System.Globalization;
using System.Text;
using System.Text.Json;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Formats.Matching;
using WaterMix.Formats.Reading;

namespace WaterMix.Formats.Tests.Reading;

public class BlockTests
{
    [Theory]
    [InlineData(1)]
    [InlineData(1_024)]
    [InlineData(1_025)]
    [InlineData(65_536)]
    [InlineData(65_537)]
    [InlineData(140_000)]
    public void ReadBlocks_LongFile_ComesInBlocksWithRunningRows(int rows)
    {
        var text = new StringBuilder("station,sample,oxygen\n");
        for (int i = 0; i < rows; i++)
        {
            text.Append(CultureInfo.InvariantCulture, $"s{i / 24},{i},{i}.5\n");
        }

        long row = 0;
        using OpenedSamples opened = SampleReader.Open([ReadingHelp.File("a.csv", text.ToString())], new ReadingOptions());
        foreach (SampleBlock block in opened.ReadBlocks(TestContext.Current.CancellationToken))
        {
            Assert.Equal((row + 1, row + 1), (block.FirstRow, block.FirstFileRow));
            Assert.InRange(block.Table.RowCount, 1, SampleBlock.MostRows);
            SampleColumn oxygen = block.Table.Find(Quantity.Oxygen)!;
            for (int i = 0; i < block.Table.RowCount; i++, row++)
            {
                Assert.Equal(row + 0.5, oxygen.Values[i]);
                Assert.Equal(string.Create(CultureInfo.InvariantCulture, $"s{row / 24}"), block.Table.Identity[0][i]);
                Assert.Equal(row.ToString(CultureInfo.InvariantCulture), block.Table.Identity[1][i]);
            }
        }

        Assert.Equal(rows, row);
    }

    [Fact]
    public void ReadBlocks_Twice_GivesTheSameAndCountsOnce()
    {
        using OpenedSamples opened = SampleReader.Open([ReadingHelp.File("a.csv", "station,oxygen\n1,n.d.\n2,201\n")], new ReadingOptions());

        SampleTable first = ReadingHelp.ReadAll(opened).Blocks[0].Table;
        (List<SampleBlock> second, ImportReport report, _) = ReadingHelp.ReadAll(opened);

        ReadingHelp.AssertSame(first, second[0].Table);
        Assert.Equal((2L, 1L), (report.Rows, Assert.Single(report.Findings).Count));
    }

    [Fact]
    public void ReadBlocks_FilesWithDifferentColumns_HaveTheUnion()
    {
        InputFile a = ReadingHelp.File("a.csv", "station,oxygen,oxygen_flag\n1,200,2\n");
        InputFile b = ReadingHelp.File("b.csv", "cast,nitrate,barium\n1,20,45\n");

        (List<SampleBlock> blocks, _, OpenedSamples opened) = ReadingHelp.ReadAll(SampleReader.Open([a, b], new ReadingOptions()));

        Assert.Equal(["oxygen", "nitrate", "barium"], opened.Schema.Columns.Select(c => c.Id));
        Assert.Equal(["station", "cast"], blocks[1].Table.Identity.Select(i => i.Id));
        Assert.Equal(("", "1"), (blocks[1].Table.Identity[0][0], blocks[1].Table.Identity[1][0]));
        Assert.True(double.IsNaN(blocks[1].Table.Find("oxygen")!.Values[0]));
        Assert.Equal(0, blocks[1].Table.Find("oxygen")!.FlagAt(0));
        Assert.Equal([200, double.NaN, double.NaN], blocks[0].Table.Columns.Select(c => c.Values[0]));
    }

    [Fact]
    public void Open_FurtherTracerInTwoUnits_IsAnError()
    {
        InputFile a = ReadingHelp.File("a.csv", "station,barium [nmol/kg]\n1,45\n");
        InputFile b = ReadingHelp.File("b.csv", "station,barium [umol/kg]\n1,0.045\n");

        using OpenedSamples opened = SampleReader.Open([a, b], new ReadingOptions());

        Assert.Equal("umol/kg", ReadingHelp.Error(opened.Findings).Found);
    }

    [Fact]
    public void ReadBlocks_Cancelled_Stops()
    {
        using var source = new CancellationTokenSource();
        using OpenedSamples opened = SampleReader.Open([ReadingHelp.File("a.csv", "station,oxygen\n1,2\n")], new ReadingOptions());
        source.Cancel();

        Assert.Throws<OperationCanceledException>(() => opened.ReadBlocks(source.Token).ToList());
    }

    [Theory]
    [InlineData("station,oxygen\r\n1,200\r\n2,201\r\n")]
    [InlineData("\uFEFFstation,oxygen\n1,200\n2,201\n")]
    [InlineData("\uFEFFBOTTLE,20000101TEST\r\nSTNNBR,OXYGEN\r\n,UMOL/KG\r\n1,200\r\n2,201\r\nEND_DATA\r\n")]
    [InlineData("# a comment, with \"quotes\n\n  station , oxygen \n1, 200 \n# another\n 2 ,201,,\n\n")]
    [InlineData("station,oxygen,\n1,200,\n2,201,\n")]
    [InlineData("\"station\",\"oxygen\"\n\"1\",\"200\"\n\"2\",201\n")]
    [InlineData("station,latitude,oxygen\n,degrees_north,umol/kg\n1,,200\n2,,201")]
    public void ReadBlocks_WaysToWriteTheSameTable_AreOne(string text)
    {
        SampleTable table = ReadingHelp.Table(text);

        Assert.Equal([200, 201], table.Find(Quantity.Oxygen)!.Values.ToArray());
        Assert.Equal(["1", "2"], [table.Identity[0][0], table.Identity[0][1]]);
    }

    [Fact]
    public void ReadBlocks_StationNamesAsText_KeepLettersAndZeros()
    {
        SampleTable table = ReadingHelp.Table("station,oxygen\n007b,1\n\"St. 5, north\",1\nÅ,1\n");

        Assert.Equal(["007b", "St. 5, north", "Å"], [table.Identity[0][0], table.Identity[0][1], table.Identity[0][2]]);
    }

    [Fact]
    public void Report_Column_SaysWhereItCameFromAndWhatWasMadeOfIt()
    {
        using OpenedSamples opened = SampleReader.Open(
            [ReadingHelp.File("a.csv", "station,T [IPTS-68],temp [IPTS-68],oxygen,oxygen_flag\n1,3,10,200,2\n2,3,-999,201,4\n")], new ReadingOptions());
        (_, ImportReport report, _) = ReadingHelp.ReadAll(opened);

        ImportedColumn temperature = report.Columns.Single(c => c.Id == "in_situ_temperature");
        ImportedColumn oxygen = report.Columns.Single(c => c.Id == "oxygen");
        Assert.Equal(("temp [IPTS-68]", "name", "T90 = T68 / 1.00024", 1L, 1L), (temperature.Source, temperature.MatchedBy, temperature.Conversion, temperature.Values, temperature.Missing));
        Assert.Equal((2L, 1L, 1L), (oxygen.Values, oxygen.Usable, oxygen.Flags[4]));
        Assert.Contains("in_situ_temperature [degC] from temp [IPTS-68] (name): 1 values, 1 missing; T90 = T68 / 1.00024", report.ToText(), StringComparison.Ordinal);
        Assert.Equal(MatchedBy.Name, opened.Match.Columns[2].By);
    }

    [Fact]
    public void Report_ColumnsThatWereNotRead_AreNamed()
    {
        using OpenedSamples opened = SampleReader.Open(
            [ReadingHelp.File("a.csv", "EXPOCODE,STNNBR,SAMPNO,BTLNBR,OXYGEN,nitrate_kind\nX,1,1,a3,200,NO2+NO3\n")], new ReadingOptions());

        Assert.Equal(["BTLNBR", "nitrate_kind"], ReadingHelp.ReadAll(opened).Report.LeftOut);
    }

    [Fact]
    public void Report_AsJson_HasItsParts()
    {
        using OpenedSamples opened = SampleReader.Open([ReadingHelp.File("a.csv", "station,oxygen,oxygen_flag\n1,200,2\n")], new ReadingOptions());

        using JsonDocument json = JsonDocument.Parse(JsonSerializer.Serialize(ReadingHelp.ReadAll(opened).Report, JsonSerializerOptions.Web));

        Assert.Equal("csv", json.RootElement.GetProperty("files")[0].GetProperty("format").GetString());
        Assert.Equal(1, json.RootElement.GetProperty("columns")[0].GetProperty("flags").GetProperty("2").GetInt64());
    }
}
