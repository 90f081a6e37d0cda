using System.Text;
using WaterMix.Core;
using WaterMix.Formats.Matching;
using WaterMix.Formats.Reading;

namespace WaterMix.Formats.Tests.Reading;

/// <summary>Files that cannot be taken: each gives an error that says where, what was expected, what was found and what to do.</summary>
public class BadInputTests
{
    private const string Exchange = "BOTTLE,20000101TEST\n# é\nSTNNBR,CTDPRS,OXYGEN\n,DBAR,UMOL/KG\n";

    [Theory]
    [InlineData("")]
    [InlineData("\n\n  \n")]
    public void Open_EmptyFile_IsAnError(string text) => Assert.Equal("an empty file", ReadingHelp.Error(ReadingHelp.Findings(text)).Found);

    [Theory]
    [InlineData(new byte[] { 0x43, 0x44, 0x46, 1, 0, 0 }, "a NetCDF file")]
    [InlineData(new byte[] { 0x89, 0x48, 0x44, 0x46, 0x0D, 0x0A }, "an HDF5 or NetCDF-4 file")]
    [InlineData(new byte[] { 0x73, 0x2C, 0x00, 0x0A }, "a binary file (it holds NUL bytes)")]
    [InlineData(new byte[] { 0xFF, 0xFE, 0x61, 0x00 }, "UTF-16 text")]
    public void Open_BinaryFile_IsAnError(byte[] bytes, string found) => Assert.Equal(found, ReadingHelp.Error(ReadingHelp.Findings(bytes)).Found);

    [Theory]
    [InlineData("station,oxygen\n")]
    [InlineData("BOTTLE,20000101TEST\nSTNNBR,OXYGEN\n,UMOL/KG\nEND_DATA\n")]
    public void ReadBlocks_HeaderOnly_IsAnError(string text) => Assert.Equal("rows of data", ReadingHelp.Error(ReadingHelp.Findings(text)).Expected);

    [Theory]
    [InlineData("hello world\nthis is no table\n")]
    [InlineData("1,2,3\n4,5,6\n")]
    [InlineData("{ \"a\": 1 }\n")]
    public void Open_NoKnownColumnName_IsAnError(string text) =>
        Assert.True(ReadingHelp.Error(ReadingHelp.Findings(text)) is { Line: 1 } error && error.Expected.StartsWith("column names of samples", StringComparison.Ordinal));

    [Fact]
    public void ReadBlocks_ExchangeWithoutEndData_IsAnError()
    {
        Finding error = ReadingHelp.Error(ReadingHelp.Findings(Exchange + "1,10,200\n"));

        Assert.Contains("END_DATA", error.Expected, StringComparison.Ordinal);
    }

    [Fact]
    public void ReadBlocks_ExchangeCutOffWithinARow_SaysSoAndCountsTheRow()
    {
        IReadOnlyList<Finding> findings = ReadingHelp.Findings(Exchange + "1,10,200\n1,20");

        Assert.Equal(2, findings.Count(f => f.Severity == Severity.Error));
    }

    [Theory]
    [InlineData("BOTTLE,20000101TEST\n")]
    [InlineData("BOTTLE,20000101TEST\nSTNNBR,CTDPRS\n")]
    [InlineData("CTD,20000101TEST\nNUMBER_HEADERS = 3\nSTNNBR = 1\n")]
    public void Open_ExchangeCutOffInTheHeader_IsAnError(string text) =>
        Assert.Equal("the end of the file in the header", ReadingHelp.Error(ReadingHelp.Findings(text)).Found);

    [Theory]
    [InlineData("station;oxygen;nitrate\n1;200;3,1\n", "';' as the delimiter")]
    [InlineData("station\toxygen\tnitrate\n1\t200\t3.1\n", "tab as the delimiter")]
    [InlineData("station|oxygen|nitrate\n1|200|3.1\n", "'|' as the delimiter")]
    public void Open_OtherDelimiter_IsAnErrorWithTheRemedy(string text, string found)
    {
        Finding error = ReadingHelp.Error(ReadingHelp.Findings(text));

        Assert.Equal((1L, found), (error.Line!.Value, error.Found));
        Assert.Contains("--columns", error.Remedy, StringComparison.Ordinal);
    }

    [Fact]
    public void ReadBlocks_DecimalCommasThroughout_IsAnErrorWithTheRemedy()
    {
        IReadOnlyList<Finding> findings = ReadingHelp.Findings("station,oxygen,nitrate\n1,200,\"3,1\"\n2,201,\"3,2\"\n");

        Finding error = ReadingHelp.Error(findings);
        Assert.Equal(("nitrate", 2L, 2L), (error.Column!, error.Line!.Value, error.Count));
        Assert.Contains("decimalMark", error.Remedy, StringComparison.Ordinal);
    }

    [Fact]
    public void ReadBlocks_DecimalCommasInAColumnThatIsNotNeeded_IsAWarning()
    {
        IReadOnlyList<Finding> findings = ReadingHelp.Findings(
            "station,oxygen,nitrate\n1,200,\"3,1\"\n", new ReadingOptions { NeededQuantities = new HashSet<string> { "oxygen" } });

        Assert.DoesNotContain(findings, f => f.Severity == Severity.Error);
    }

    [Fact]
    public void ReadBlocks_DelimiterAndDecimalMarkDeclared_Reads()
    {
        var options = new ReadingOptions { Match = new ColumnMatchFile([]) { Delimiter = ';', DecimalMark = ',' } };

        Assert.Equal([3.1, -0.02], ReadingHelp.Table("station;nitrate\n1;3,1\n2;-0,02\n", options).Find("nitrate")!.Values.ToArray());
    }

    [Fact]
    public void Open_RepeatedHeaderName_IsAnErrorThatNamesBothColumns()
    {
        Finding error = ReadingHelp.Error(ReadingHelp.Findings("station,oxygen,nitrate,oxygen\n1,2,3,4\n"));

        Assert.Equal((1L, "'oxygen' as column 2 and column 4"), (error.Line!.Value, error.Found));
    }

    [Fact]
    public void ReadBlocks_WrongColumnCount_IsAnErrorThatSaysHowMany()
    {
        Finding error = ReadingHelp.Error(ReadingHelp.Findings("station,oxygen,nitrate\n1,2,3\n1,2\n1,2,3,4\n1,2,3\n"));

        Assert.Equal((3L, 2L, "3 columns, as in the header", "2"), (error.Line!.Value, error.Count, error.Expected, error.Found));
    }

    [Fact]
    public void ReadBlocks_OverlongLine_IsAnErrorInBoundedMemory()
    {
        byte[] text = Encoding.UTF8.GetBytes("station,oxygen\n1,2\n" + new string('7', 12_000_000) + "\n2,3\n");
        long before = GC.GetAllocatedBytesForCurrentThread();

        Finding error = ReadingHelp.Error(ReadingHelp.Findings(text));

        Assert.Equal(3L, error.Line);
        Assert.True(GC.GetAllocatedBytesForCurrentThread() - before < 12_000_000, "the whole line was held");
    }

    [Fact]
    public void ReadBlocks_BytesThatAreNotUtf8InARow_IsAnErrorWithLineAndColumn()
    {
        byte[] text = [.. "station,section,oxygen\n1,A,2\n2,"u8, 0xE9, .. ",3\n"u8];

        Finding error = ReadingHelp.Error(ReadingHelp.Findings(text));

        Assert.Equal((3L, "section", "bytes that are not UTF-8"), (error.Line!.Value, error.Column!, error.Found));
    }

    [Fact]
    public void ReadBlocks_NulByteInARow_IsAnError()
    {
        byte[] head = Encoding.UTF8.GetBytes("station,oxygen\n" + string.Concat(Enumerable.Repeat("1,200.25\n", 9_000)));

        Finding error = ReadingHelp.Error(ReadingHelp.Findings([.. head, .. "\x00"u8, .. ",3\n"u8]));

        Assert.Equal((9_002L, "a NUL byte"), (error.Line!.Value, error.Found));
    }

    [Fact]
    public void ReadBlocks_BytesThatAreNotUtf8InAComment_AreTolerated()
    {
        byte[] text = [.. "BOTTLE,20000101TEST\n# "u8, 0xE9, .. " \"\nSTNNBR,OXYGEN\n,UMOL/KG\n1,200\nEND_DATA\n"u8];

        Assert.Empty(ReadingHelp.Findings(text));
    }

    [Fact]
    public void Open_UnknownUnitOfANeededQuantity_IsAnError()
    {
        const string Csv = "station,oxygen [furlongs],nitrate\n1,2,3\n";

        Finding warning = Assert.Single(ReadingHelp.Findings(Csv));
        Finding error = ReadingHelp.Error(ReadingHelp.Findings(Csv, new ReadingOptions { NeededQuantities = new HashSet<string> { "oxygen" } }));

        Assert.Equal((Severity.Warning, "'furlongs'"), (warning.Severity, warning.Found));
        Assert.Equal(("oxygen [furlongs]", "'furlongs'"), (error.Column!, error.Found));
    }

    [Fact]
    public void Open_TwoColumnsForANeededQuantity_IsAnErrorWithTheRemedy()
    {
        const string Csv = "station,O2 [umol/kg],dissolved oxygen [mL/L]\n1,200,4.5\n";

        Finding warning = Assert.Single(ReadingHelp.Findings(Csv));
        Finding error = ReadingHelp.Error(ReadingHelp.Findings(Csv, new ReadingOptions { NeededQuantities = new HashSet<string> { "oxygen" } }));

        Assert.Equal(Severity.Warning, warning.Severity);
        Assert.Equal("'O2 [umol/kg]' and 'dissolved oxygen [mL/L]'", error.Found);
        Assert.Contains("match file", error.Remedy, StringComparison.Ordinal);
    }

    [Fact]
    public void Open_SeveralFaults_ListsThemAll()
    {
        IReadOnlyList<Finding> findings = ReadingHelp.Findings("station,oxygen,nitrate,oxygen\n1,2,3\n1,\"2,5\",3,4\n1,n.d.,3,4\n");

        Assert.True(findings.Count >= 3, string.Join("\n", findings));
    }

    [Fact]
    public void Open_FileThatIsNotThere_IsAnError()
    {
        using OpenedSamples opened = SampleReader.Open(["nowhere/at_all.csv"], new ReadingOptions());

        Assert.True(opened.HasErrors);
        Assert.Empty(opened.ReadBlocks(TestContext.Current.CancellationToken));
    }
}
