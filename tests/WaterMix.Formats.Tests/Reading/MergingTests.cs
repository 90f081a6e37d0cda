using WaterMix.Core;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Formats.Reading;

namespace WaterMix.Formats.Tests.Reading;

/// <summary>Bottle and CTD values of one quantity, the three tables of flags, and bottles that did not trip.</summary>
public class MergingTests
{
    // Bottle value, its flag, CTD value, its flag; then the merged value, flag and origin.
    public static TheoryData<string, string, string, string, double, byte, ValueOrigin> Choices => new()
    {
        { "35.1", "2", "35.2", "2", 35.1, 2, ValueOrigin.Bottle },
        { "35.1", "6", "35.2", "2", 35.1, 6, ValueOrigin.Bottle },
        { "35.1", "3", "35.2", "2", 35.2, 2, ValueOrigin.Ctd },
        { "35.1", "3", "35.2", "6", 35.2, 6, ValueOrigin.Ctd },
        { "35.1", "3", "35.2", "7", 35.2, 7, ValueOrigin.Ctd },
        { "35.1", "7", "35.2", "2", 35.2, 2, ValueOrigin.Ctd }, // 7 is good for a CTD value only
        { "-999", "9", "35.2", "2", 35.2, 2, ValueOrigin.Ctd },
        { "35.1", "3", "35.2", "3", 35.1, 3, ValueOrigin.Bottle },
        { "-999", "9", "35.2", "3", 35.2, 3, ValueOrigin.Ctd },
        { "-999", "5", "-999", "9", double.NaN, 5, ValueOrigin.None },
        { "35.1", "", "35.2", "2", 35.1, 0, ValueOrigin.Bottle },
    };

    [Theory]
    [MemberData(nameof(Choices))]
    public void Merge_BottleFirst_TakesTheAcceptableOne(string bottle, string bottleFlag, string ctd, string ctdFlag, double value, byte flag, ValueOrigin origin)
    {
        SampleTable table = ReadingHelp.Table(
            $"BOTTLE,20000101TEST\nSTNNBR,CTDSAL,CTDSAL_FLAG_W,SALNTY,SALNTY_FLAG_W\n,PSS-78,,PSS-78,\n1,{ctd},{ctdFlag},{bottle},{bottleFlag}\nEND_DATA\n");
        SampleColumn merged = table.Find(Quantity.PracticalSalinity)!;

        Assert.True(merged.IsMerged);
        Assert.Equal((value, flag, origin), (merged.Values[0], merged.FlagAt(0), merged.OriginAt(0)));
        Assert.Equal(bottle == "-999" ? double.NaN : 35.1, table.Find("practical_salinity_bottle")!.Values[0]);
        Assert.Equal(ctd == "-999" ? double.NaN : 35.2, table.Find("practical_salinity_ctd")!.Values[0]);
    }

    [Fact]
    public void Merge_CtdPreferred_TakesTheCtdFirst()
    {
        const string Csv = "station,salinity,salinity_flag,salinity_ctd,salinity_ctd_flag\n1,35.1,2,35.2,2\n2,35.1,2,35.2,4\n3,35.1,4,35.2,4\n";

        SampleColumn merged = ReadingHelp.Table(Csv, new ReadingOptions { Prefer = ValueOrigin.Ctd }).Find(Quantity.PracticalSalinity)!;

        Assert.Equal([35.2, 35.1, 35.2], merged.Values.ToArray());
    }

    [Fact]
    public void Merge_OtherAcceptedFlags_ChangeTheChoice()
    {
        const string Csv = "station,salinity,salinity_flag,salinity_ctd,salinity_ctd_flag\n1,35.1,3,35.2,2\n";

        SampleColumn merged = ReadingHelp.Table(Csv, new ReadingOptions { AcceptedFlags = new AcceptedFlags([2, 3, 6], [2]) }).Find(Quantity.PracticalSalinity)!;

        Assert.Equal(35.1, merged.Values[0]);
    }

    [Fact]
    public void Build_BottleThatDidNotTrip_VoidsItsWaterNotTheCtd()
    {
        const string Csv = "BOTTLE,20000101TEST\nSTNNBR,BTLNBR_FLAG_W,CTDPRS,CTDTMP,CTDSAL,CTDSAL_FLAG_W,SALNTY,SALNTY_FLAG_W,PHSPHT,PHSPHT_FLAG_W,NITRAT,BTL_LAT\n"
            + ",,DBAR,ITS-90,PSS-78,,PSS-78,,UMOL/KG,,UMOL/KG,\n1,4,100,10.5,35.2,2,35.9,2,1.5,2,20.5,-33.5\n1,2,200,9.5,35.1,2,35.1,2,1.6,2,21.5,-33.5\n1,4,300,8.5,35.0,2,-999,9,-999,9,-999,-33.5\nEND_DATA\n";

        SampleTable table = ReadingHelp.Table(Csv);

        SampleColumn phosphate = table.Find(Quantity.Phosphate)!;
        Assert.Equal([double.NaN, 1.6, double.NaN], phosphate.Values.ToArray());
        Assert.Equal([4, 2, 9], phosphate.Flags.ToArray());
        Assert.Equal([double.NaN, 21.5, double.NaN], table.Find(Quantity.Nitrate)!.Values.ToArray());
        Assert.Equal([4, 0, 0], table.Find(Quantity.Nitrate)!.Flags.ToArray());
        SampleColumn salinity = table.Find(Quantity.PracticalSalinity)!;
        Assert.Equal([35.2, 35.1, 35.0], salinity.Values.ToArray());
        Assert.Equal([ValueOrigin.Ctd, ValueOrigin.Bottle, ValueOrigin.Ctd], [salinity.OriginAt(0), salinity.OriginAt(1), salinity.OriginAt(2)]);
        Assert.Equal([10.5, 9.5, 8.5], table.Find(Quantity.InSituTemperature)!.Values.ToArray());
        Assert.Equal([100, 200, 300], table.Find(Quantity.Pressure)!.Values.ToArray());
        Assert.Equal([-33.5, -33.5, -33.5], table.Find("BTL_LAT")!.Values.ToArray());
        Assert.Equal(35.9, table.Find("practical_salinity_bottle")!.Values[0]);
        Assert.Equal([4, 2, 4], table.BottleFlags.ToArray());
    }

    [Fact]
    public void Report_BottlesThatLeakedOrDidNotTrip_CountsThem()
    {
        OpenedSamples opened = SampleReader.Open([ReadingHelp.File("a.csv", "station,bottle_flag,oxygen\n1,4,200\n2,3,201\n3,3,202\n4,2,203\n")], new ReadingOptions());
        (_, ImportReport report, _) = ReadingHelp.ReadAll(opened);

        Assert.Equal((2L, Severity.Warning), report.Findings.Where(f => f.Found.Contains("leaking", StringComparison.Ordinal)).Select(f => (f.Count, f.Severity)).Single());
        Assert.Equal(1L, report.Findings.Single(f => f.Found.Contains("flag 4", StringComparison.Ordinal)).Count);
        Assert.Equal((1L, 3L), (report.Columns[0].Voided, report.Columns[0].Values));
        Assert.Equal(2L, report.BottleFlags[3]);
    }

    [Fact]
    public void Build_CtdCastAndBottleFileTogether_HaveTheSameColumns()
    {
        InputFile bottle = ReadingHelp.File("a_hy1.csv", "BOTTLE,20000101TEST\nSTNNBR,CTDPRS,SALNTY,SALNTY_FLAG_W\n,DBAR,PSS-78,\n1,10,35.1,2\nEND_DATA\n");
        InputFile ctd = ReadingHelp.File("b_ct1.csv", "CTD,20000101TEST\nNUMBER_HEADERS = 2\nSTNNBR = 1\nCTDPRS,CTDSAL,CTDSAL_FLAG_W\nDBAR,PSS-78,\n12,35.2,2\nEND_DATA\n");

        (List<SampleBlock> blocks, _, OpenedSamples opened) = ReadingHelp.ReadAll(SampleReader.Open([bottle, ctd], new ReadingOptions()));

        Assert.Equal(["pressure", "practical_salinity", "practical_salinity_bottle", "practical_salinity_ctd"], opened.Schema.Columns.Select(c => c.Id));
        Assert.All(blocks, b => Assert.Equal(opened.Schema.Columns.Select(c => (c.Id, c.HasFlags, c.IsMerged)), b.Table.Columns.Select(c => (c.Id, c.HasFlags, c.IsMerged))));
        Assert.Equal([35.1, 35.2], blocks.Select(b => b.Table.Find(Quantity.PracticalSalinity)!.Values[0]));
    }
}
