using System.IO.Compression;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Formats.Matching;
using WaterMix.Formats.Reading;
using WaterMix.Testing;

namespace WaterMix.Formats.Tests.Reading;

public class OpenDataTests
{
    [Theory]
    [InlineData("bottle/a03_hy1.csv")]
    [InlineData("bottle/a03_1993_uniform.csv")]
    [InlineData("bottle/btl_csv.csv")]
    [InlineData("bottle/i06s_33RR20080204_mini_hy1.csv")]
    [InlineData("ctd/18HU20130507_00235_00001_ct1.csv")]
    [InlineData("ctd/a03_3_00001_ct1.csv")]
    [InlineData("ctd/p10_00026_00001_ct1.csv")]
    public void ReadBlocks_OpenFile_RoundTripsThroughTidyCsv(string file)
    {
        using OpenedSamples opened = SampleReader.Open([TestData.File(file)], new ReadingOptions());
        SampleTable table = Assert.Single(opened.ReadBlocks(TestContext.Current.CancellationToken)).Table;
        Assert.False(opened.HasErrors, string.Join("\n", opened.Findings));

        byte[] tidy = ReadingHelp.Write(table);
        using OpenedSamples again = SampleReader.Open([ReadingHelp.File("a.csv", tidy)], new ReadingOptions());
        SampleTable back = Assert.Single(again.ReadBlocks(TestContext.Current.CancellationToken)).Table;

        Assert.False(again.HasErrors, string.Join("\n", again.Findings));
        ReadingHelp.AssertSame(table, back);
    }

    // Counts from the data's own description: 2,841 samples, 124 stations, 8.5W to 73.7W, 2 to 5,562 dbar; row 159 (station 12) is flagged 4.
    [Fact]
    public void ReadBlocks_A03Bottles_AreAsDescribed()
    {
        SampleTable table = Read("bottle/a03_hy1.csv");

        Assert.Equal(2_841, table.RowCount);
        IdentityColumn station = table.Identity.Single(i => i.Id == "station");
        Assert.Equal(124, Enumerable.Range(0, table.RowCount).Select(i => station[i]).Distinct().Count());
        Assert.Equal("1993-09-23T22:22:00Z", table.Identity.Single(i => i.Id == "time")[0]);
        double[] longitude = table.Find(Quantity.Longitude)!.Values.ToArray();
        Assert.Equal((-73.7, -8.5), (Math.Round(longitude.Min(), 1), Math.Round(longitude.Max(), 1)));
        double[] pressure = table.Find(Quantity.Pressure)!.Values.ToArray();
        Assert.Equal((2, 5_562), (Math.Round(pressure.Min()), Math.Round(pressure.Max())));
        Assert.Equal("12", station[158]);
        Assert.Equal(4, table.Find(Quantity.Phosphate)!.FlagAt(158));

        // The first line of the file has 16.5035 on IPTS-68.
        Assert.Equal(16.5035 / 1.00024, table.Find(Quantity.InSituTemperature)!.Values[0]);
        Assert.Equal("NO2+NO3", table.Find(Quantity.Nitrate)!.Source);
        Assert.Equal(202, table.Find(Quantity.BottomDepth)!.Values[0]);
        Assert.Null(table.Find(Quantity.Depth));
    }

    [Fact]
    public void ReadBlocks_SameSamplesInOurOwnHeader_GiveTheSameNumbers()
    {
        SampleTable exchange = Read("bottle/a03_hy1.csv");
        SampleTable plain = Read("bottle/a03_1993_uniform.csv");

        Assert.Equal(exchange.Columns.Select(c => c.Id), plain.Columns.Select(c => c.Id));
        ReadingHelp.AssertSame(exchange, plain);
    }

    [Fact]
    public void ReadBlocks_PlainFileByItsSavedGuess_GivesTheSameNumbers()
    {
        string path = TestData.File("bottle/a03_1993_uniform.csv");
        using OpenedSamples guessed = SampleReader.Open([path], new ReadingOptions());
        ColumnMatchFile saved = ColumnMatchFile.Read(guessed.Match.Write(), "match.json").Value!;

        using OpenedSamples matched = SampleReader.Open([path], new ReadingOptions { Match = saved });

        ReadingHelp.AssertSame(
            Assert.Single(guessed.ReadBlocks(TestContext.Current.CancellationToken)).Table,
            Assert.Single(matched.ReadBlocks(TestContext.Current.CancellationToken)).Table);
    }

    // The three casts: a trailing comma in a header; the misspelt ITS-68; ITS-90 although the bottle file of the cruise is IPTS-68.
    [Theory]
    [InlineData("ctd/a03_3_00001_ct1.csv", 93, "3", 16.5319, false)]
    [InlineData("ctd/18HU20130507_00235_00001_ct1.csv", 1_097, "235", 9.8494, true)]
    [InlineData("ctd/p10_00026_00001_ct1.csv", 2_247, "26", 29.3158, false)]
    public void ReadBlocks_CtdCast_HasItsHeaderInEveryRow(string file, int rows, string station, double firstTemperature, bool is1968)
    {
        SampleTable table = Read(file);

        Assert.Equal(rows, table.RowCount);
        Assert.All(Enumerable.Range(0, rows), i => Assert.Equal(station, table.Identity.Single(c => c.Id == "station")[i]));
        Assert.Equal(is1968 ? firstTemperature / 1.00024 : firstTemperature, table.Find(Quantity.InSituTemperature)!.Values[0]);
        Assert.Equal(ValueOrigin.Ctd, table.Find(Quantity.PracticalSalinity)!.OriginAt(0));
        Assert.False(double.IsNaN(table.Find(Quantity.Latitude)!.Values[rows - 1]));
    }

    [Fact]
    public void ReadBlocks_ZipOfTheCasts_ReadsThemAll()
    {
        string path = Path.Combine(Directory.CreateTempSubdirectory("watermix-casts").FullName, "casts.zip");
        using (ZipArchive archive = ZipFile.Open(path, ZipArchiveMode.Create))
        {
            foreach (string cast in (string[])["p10_00026_00001_ct1.csv", "a03_3_00001_ct1.csv", "18HU20130507_00235_00001_ct1.csv"])
            {
                archive.CreateEntryFromFile(TestData.File("ctd/" + cast), "casts/" + cast);
            }
        }

        using OpenedSamples opened = SampleReader.Open([path], new ReadingOptions());
        List<SampleBlock> blocks = [.. opened.ReadBlocks(TestContext.Current.CancellationToken)];

        Assert.False(opened.HasErrors, string.Join("\n", opened.Findings));
        Assert.Equal([1, 1_098, 1_191], blocks.Select(b => b.FirstRow));
        Assert.Equal(1_097 + 93 + 2_247, opened.Report.Rows);
        Directory.Delete(Path.GetDirectoryName(path)!, recursive: true);
    }

    [Fact]
    public void ReadBlocks_I06sBottles_KeepPositionsOfBottlesAndNegativeNutrients()
    {
        SampleTable table = Read("bottle/i06s_33RR20080204_mini_hy1.csv");

        Assert.Equal((-33.2152, -33.2382), (table.Find(Quantity.Latitude)!.Values[0], table.Find("BTL_LAT")!.Values[0]));
        Assert.Equal(-0.01, table.Find(Quantity.Nitrate)!.Values[0]);
        Assert.True(double.IsNaN(table.Find(Quantity.DeltaOxygen18)!.Values[0]));
        Assert.Equal("PERCNT", table.Find("DELHE3")!.Quantity.Unit);
    }

    [Fact]
    public void ReadBlocks_P02Bottles_UnitsWithinNamesAreUnderstood()
    {
        SampleTable table = Read("bottle/btl_csv.csv");

        Assert.Equal("CTDSAL [PSS-78]", table.Find("practical_salinity_ctd")!.Source);
        Assert.True(table.Find("practical_salinity_ctd")!.HasFlags);
        Assert.Equal(16.8878, table.Find(Quantity.PotentialTemperature)!.Values[0]);
        Assert.Equal(144, table.Find(Quantity.BottomDepth)!.Values[0]);
    }

    private static SampleTable Read(string file)
    {
        using OpenedSamples opened = SampleReader.Open([TestData.File(file)], new ReadingOptions());
        SampleTable table = Assert.Single(opened.ReadBlocks(TestContext.Current.CancellationToken)).Table;
        Assert.False(opened.HasErrors, string.Join("\n", opened.Findings));
        return table;
    }
}
