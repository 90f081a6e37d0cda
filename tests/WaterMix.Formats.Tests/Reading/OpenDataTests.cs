using WaterMix.Core.Samples;
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
        TestContext.Current.SendDiagnosticMessage(opened.Report.ToText());
        Assert.False(opened.HasErrors, string.Join("\n", opened.Findings));

        byte[] tidy = ReadingHelp.Write(table);
        using OpenedSamples again = SampleReader.Open([ReadingHelp.File("a.csv", tidy)], new ReadingOptions());
        SampleTable back = Assert.Single(again.ReadBlocks(TestContext.Current.CancellationToken)).Table;

        Assert.False(again.HasErrors, string.Join("\n", again.Findings));
        ReadingHelp.AssertSame(table, back);
    }
}
