using System.IO.Compression;
using System.Text;
using WaterMix.Core;
using WaterMix.Formats.Reading;

namespace WaterMix.Formats.Tests.Reading;

public sealed class InputFilesTests : IDisposable
{
    private readonly string _folder = Directory.CreateTempSubdirectory("watermix-zip").FullName;

    public void Dispose() => Directory.Delete(_folder, recursive: true);

    [Fact]
    public void Open_SeveralFiles_ReadsThemInOrdinalNameOrder()
    {
        string[] paths = ["b.csv", "B.csv", "a10.csv", "a9.csv"];
        foreach (string name in paths)
        {
            File.WriteAllText(Path.Combine(_folder, name), $"station,oxygen\n{name},200\n{name},201\n");
        }

        using OpenedSamples opened = SampleReader.Open([.. paths.Select(p => Path.Combine(_folder, p))], new ReadingOptions());
        (List<SampleBlock> blocks, _, _) = ReadingHelp.ReadAll(opened);

        Assert.True(opened.NamesFiles);
        Assert.Equal(["B.csv", "a10.csv", "a9.csv", "b.csv"], blocks.Select(b => b.File));
        Assert.Equal([1, 3, 5, 7], blocks.Select(b => b.FirstRow));
        Assert.All(blocks, b => Assert.Equal(1, b.FirstFileRow));
    }

    [Fact]
    public void Open_ZipOfCasts_ReadsEntriesByNameAndLabelsThemWithTheirPaths()
    {
        string path = Zip(("deep/b.csv", Cast("2")), ("../../a.csv", Cast("1")), ("read.me", "hello"), ("deep/", ""));

        using OpenedSamples opened = SampleReader.Open([path], new ReadingOptions());
        (List<SampleBlock> blocks, ImportReport report, _) = ReadingHelp.ReadAll(opened);

        Assert.False(opened.HasErrors, string.Join("\n", opened.Findings));
        Assert.Equal(["casts.zip/a.csv", "casts.zip/deep/b.csv"], blocks.Select(b => b.File));
        Assert.Equal(["1", "2"], blocks.Select(b => b.Table.Identity[0][0]));
        Assert.Equal(1, report.Findings.Single(f => f.Severity == Severity.Note).Count);
    }

    [Fact]
    public void Open_EntryThatUnpacksManyTimesOver_IsRefusedUnread()
    {
        string path = Zip(("bomb.csv", "station,oxygen\n" + new string('0', 40 << 20)));

        using OpenedSamples opened = SampleReader.Open([path], new ReadingOptions());

        Assert.StartsWith("entries packed at most", ReadingHelp.Error(opened.Findings).Expected, StringComparison.Ordinal);
        Assert.Empty(opened.ReadBlocks(TestContext.Current.CancellationToken));
    }

    [Fact]
    public void Read_MoreBytesThanDeclared_IsRefused()
    {
        using var stream = new BoundedStream(new MemoryStream(new byte[100]), 60);

        Assert.Throws<InvalidDataException>(() => stream.CopyTo(Stream.Null));
    }

    [Fact]
    public void Open_ZipWithoutSampleFiles_IsAnError()
    {
        using OpenedSamples opened = SampleReader.Open([Zip(("read.me", "hello"))], new ReadingOptions());

        Assert.Contains("none among", ReadingHelp.Error(opened.Findings).Found, StringComparison.Ordinal);
    }

    [Fact]
    public void Open_ZipThatIsCutOff_IsAnError()
    {
        string path = Zip(("a.csv", Cast("1")));
        byte[] whole = File.ReadAllBytes(path);
        File.WriteAllBytes(path, whole[..(whole.Length / 2)]);

        using OpenedSamples opened = SampleReader.Open([path], new ReadingOptions());

        Assert.Equal("a whole zip file", ReadingHelp.Error(opened.Findings).Expected);
    }

    [Fact]
    public void Open_ZipOfOneEntry_NamesItsFile()
    {
        using OpenedSamples opened = SampleReader.Open([Zip(("a.csv", Cast("1")))], new ReadingOptions());

        Assert.True(opened.NamesFiles);
    }

    [Fact]
    public void Open_SecondEntryOfOneName_IsAWarning()
    {
        using OpenedSamples opened = SampleReader.Open([Zip(("a.csv", Cast("1")), ("a.csv", Cast("2")))], new ReadingOptions());

        Finding finding = Assert.Single(opened.Findings);
        Assert.Equal((Severity.Warning, "casts.zip/a.csv"), (finding.Severity, finding.File));
        Assert.Equal(2, ReadingHelp.ReadAll(opened).Blocks.Count);
    }

    [Fact]
    public void Open_FileThatDoesNotExist_IsASentenceWithOneFullStop()
    {
        using OpenedSamples opened = SampleReader.Open([Path.Combine(_folder, "absent.csv")], new ReadingOptions());

        Assert.EndsWith("absent.csv'. Check the path and the permissions.", ReadingHelp.Error(opened.Findings).ToString(), StringComparison.Ordinal);
    }

    private static string Cast(string station) =>
        $"CTD,20000101TEST\n# a comment\nNUMBER_HEADERS = 2\nSTNNBR = {station}\nCTDPRS,CTDOXY,CTDOXY_FLAG_W,\nDBAR,UMOL/KG,,\n     1.0,  200.5,2\n     2.0, -999.0,9\nEND_DATA\n";

    private string Zip(params (string Name, string Text)[] entries)
    {
        string path = Path.Combine(_folder, "casts.zip");
        using ZipArchive archive = ZipFile.Open(path, ZipArchiveMode.Create);
        foreach ((string name, string text) in entries)
        {
            using Stream stream = archive.CreateEntry(name).Open();
            stream.Write(Encoding.UTF8.GetBytes(text));
        }

        return path;
    }
}
