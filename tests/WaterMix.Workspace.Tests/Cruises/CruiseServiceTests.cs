using System.Diagnostics;
using System.Globalization;
using System.IO.Compression;
using System.Text;
using WaterMix.Core.Mixing;
using WaterMix.Core.Samples;
using WaterMix.Formats.Json;
using WaterMix.Formats.Reading;
using WaterMix.Workspace.Cruises;

namespace WaterMix.Workspace.Tests.Cruises;

public class CruiseServiceTests
{
    private static readonly byte[] Bottles = OpenWorkspace.Sample("halcyon_hy1.csv");

    [Fact]
    public async Task Keep_TheInventedCruise_HoldsWhatTheReaderReads()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Guid study = await workspace.Studies.CreateAsync("a");

        Cruise cruise = await workspace.KeepAsync(study, "Halcyon", ("halcyon_hy1.csv", Bottles));
        SampleTable kept = await workspace.Cruises.SamplesAsync(cruise.SamplesHash);

        using OpenedSamples opened = SampleReader.Open([new InputFile("halcyon_hy1.csv", () => new MemoryStream(Bottles))], new ReadingOptions());
        SampleTable direct = opened.ReadBlocks(TestContext.Current.CancellationToken).Single().Table;
        Assert.Equal(832, cruise.SampleCount);
        Assert.Equal(ContentHash.OfSamples(direct), cruise.SamplesHash);
        Assert.Equal(cruise.SamplesHash, ContentHash.OfSamples(kept));
        Assert.Equal(opened.Report.ToText(), cruise.Report.ToText());
        Assert.Same(kept, await workspace.Cruises.SamplesAsync(cruise.SamplesHash));
    }

    [Fact]
    public async Task Try_AnUpload_ShowsTheBeginningAndKeepsNothing()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Guid upload = await workspace.UploadAsync(("halcyon_hy1.csv", Bottles));

        ImportTrial trial = await workspace.Cruises.TryAsync(upload, new ReadingOptions(), TestContext.Current.CancellationToken);

        Assert.False(trial.HasErrors);
        Assert.Equal(832, trial.Report.Rows);
        Assert.Equal(50, trial.FirstRows!.RowCount);
        Assert.Contains("SALNTY", trial.Headers);
        Assert.Empty(Directory.GetFiles(scratch.Path("samples")));
    }

    [Fact]
    public async Task Keep_AfterACorrectedMatch_ReadsTheSameUploadAgain()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Guid study = await workspace.Studies.CreateAsync("a");
        Guid upload = await workspace.UploadAsync(("a.csv", "latitude,longitude,pressure,stuff\n1,2,3,200\n"u8.ToArray()));
        ImportTrial first = await workspace.Cruises.TryAsync(upload, new ReadingOptions(), TestContext.Current.CancellationToken);
        Assert.Null(first.FirstRows!.Find("oxygen"));

        ReadingOptions corrected = new()
        {
            Match = first.Match with { Columns = [.. first.Match.Columns.Select(c => c.Column == "stuff" ? c with { Quantity = "oxygen", Unit = "umol/kg" } : c)] },
        };
        (ImportTrial trial, Cruise? cruise) = await workspace.Cruises.KeepAsync(study, upload, "c", corrected, null, TestContext.Current.CancellationToken);

        Assert.False(trial.HasErrors);
        Assert.Equal(200, (await workspace.Cruises.SamplesAsync(cruise!.SamplesHash)).Find("oxygen")!.Values[0]);
    }

    [Theory]
    [InlineData("")]
    [InlineData("latitude,longitude,pressure,oxygen\n")]
    [InlineData("PK\u0003\u0004 no zip after all")]
    [InlineData("\u0000\u0001\u0002\u0003")]
    [InlineData("<html><body>not found</body></html>\n")]
    public async Task Keep_AnUnusableFile_SaysWhyAndKeepsNothing(string text)
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Guid study = await workspace.Studies.CreateAsync("a");
        Guid upload = await workspace.UploadAsync(("a.csv", Encoding.UTF8.GetBytes(text)));

        (ImportTrial trial, Cruise? cruise) = await workspace.Cruises.KeepAsync(study, upload, "c", new ReadingOptions(), null, TestContext.Current.CancellationToken);

        Assert.Null(cruise);
        Assert.True(trial.HasErrors);
        Assert.True((await workspace.Cruises.TryAsync(upload, new ReadingOptions(), TestContext.Current.CancellationToken)).HasErrors);
        Assert.Empty((await workspace.Studies.FindAsync(study))!.Cruises);
        Assert.Empty(Directory.GetFiles(scratch.Path("samples")));
    }

    [Fact]
    public async Task Keep_ManyFilesAndAZip_RemembersTheFileOfEachRow()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Guid study = await workspace.Studies.CreateAsync("a");
        var zip = new MemoryStream();
        using (var archive = new ZipArchive(zip, ZipArchiveMode.Create, leaveOpen: true))
        {
            foreach (string name in (string[])["halcyon_00012_00001_ct1.csv", "halcyon_00004_00001_ct1.csv"])
            {
                using Stream entry = archive.CreateEntry("../deep/" + name).Open();
                entry.Write(OpenWorkspace.Sample("casts/" + name));
            }
        }

        Cruise cruise = await workspace.KeepAsync(study, "c", ("z.zip", zip.ToArray()), ("halcyon_00022_00001_ct1.csv", OpenWorkspace.Sample("casts/halcyon_00022_00001_ct1.csv")));
        KeptSamples kept = await workspace.Get<SampleStore>().FindAsync(cruise.SamplesHash);

        Assert.True(kept.NamesFiles);
        Assert.Equal(["halcyon_00022_00001_ct1.csv", "z.zip/deep/halcyon_00004_00001_ct1.csv", "z.zip/deep/halcyon_00012_00001_ct1.csv"], kept.Files.Select(f => f.File));
        Assert.Equal(cruise.SampleCount, kept.Files.Sum(f => f.Count));
    }

    [Fact]
    public async Task Keep_SameValuesUnderOtherNames_KeepsBothApart()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Guid study = await workspace.Studies.CreateAsync("a");

        Cruise a = await workspace.KeepAsync(study, "a", ("a.csv", "station,latitude,longitude,pressure\nA,1,2,3\n"u8.ToArray()));
        Cruise b = await workspace.KeepAsync(study, "b", ("a.csv", "station,latitude,longitude,pressure\nB,1,2,3\n"u8.ToArray()));
        Cruise again = await workspace.KeepAsync(study, "c", ("a.csv", "station,latitude,longitude,pressure\nB,1,2,3\n"u8.ToArray()));

        Assert.StartsWith(a.SamplesHash + "-", b.SamplesHash, StringComparison.Ordinal);
        Assert.Equal("B", (await workspace.Cruises.SamplesAsync(b.SamplesHash)).Identity[0][0]);
        Assert.Equal("A", (await workspace.Cruises.SamplesAsync(a.SamplesHash)).Identity[0][0]);
        Assert.Equal(b.SamplesHash, again.SamplesHash);
    }

    [Theory]
    [InlineData("../../etc/passwd", "passwd")]
    [InlineData("C:\\data\\a\u202Efdp.csv", "afdp.csv")]
    [InlineData("a\u0000b\n.csv", "ab.csv")]
    [InlineData("<b>x</b>.csv", "b>.csv")]
    [InlineData("=cmd|' /C calc'!A0.csv", "C calc'!A0.csv")]
    public async Task Receive_NamesThatMeanHarm_BecomeHarmless(string given, string kept)
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Guid upload = await workspace.UploadAsync((given, Bottles));

        ImportTrial trial = await workspace.Cruises.TryAsync(upload, new ReadingOptions(), TestContext.Current.CancellationToken);

        Assert.Equal(kept, Assert.Single(trial.Report.Files).Name);
        Assert.Equal(["00001"], Directory.GetFiles(scratch.Path("uploads"), "*", SearchOption.AllDirectories).Select(Path.GetFileName));
    }

    [Theory]
    [InlineData(130)]
    [InlineData(131)]
    public void Harmless_ALongName_IsCutBetweenCharacters(int characters)
    {
        string name = UploadName.Harmless(string.Concat(Enumerable.Repeat("\U0001F41F", characters)) + "a.csv");

        Assert.InRange(name.Length, 100, 120);
        Assert.EndsWith("a.csv", name, StringComparison.Ordinal);
        Assert.DoesNotContain('\uFFFD', Encoding.UTF8.GetString(Encoding.UTF8.GetBytes(name)));
    }

    [Theory]
    [InlineData("")]
    [InlineData("a/..")]
    [InlineData("x\\")]
    public async Task Receive_WithoutAName_IsRefused(string given)
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);

        await Assert.ThrowsAsync<ArgumentException>(() => workspace.UploadAsync((given, Bottles)));
    }

    [Fact]
    public async Task Receive_BeyondTheLimits_IsRefusedAndNothingStays()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder, new WorkspaceOptions { MostUploadBytes = 1000, MostUploadFiles = 3 });
        Guid upload = await workspace.UploadAsync(("a.csv", new byte[600]), ("a.csv", new byte[100]));

        ArgumentException bytes = await Assert.ThrowsAsync<ArgumentException>(() => workspace.Cruises.ReceiveAsync(upload, "b.csv", new MemoryStream(new byte[301]), TestContext.Current.CancellationToken));
        await workspace.Cruises.ReceiveAsync(upload, "b.csv", new MemoryStream(new byte[300]), TestContext.Current.CancellationToken);
        ArgumentException files = await Assert.ThrowsAsync<ArgumentException>(() => workspace.Cruises.ReceiveAsync(upload, "c.csv", new MemoryStream(), TestContext.Current.CancellationToken));

        Assert.Equal("Expected at most 1000 bytes in one upload; with b.csv there are more. Upload fewer files at a time, or as several cruises.", bytes.Message);
        Assert.StartsWith("Expected at most 3 files in one upload", files.Message, StringComparison.Ordinal);
        Assert.Equal(3, Directory.GetFiles(scratch.Path("uploads"), "*", SearchOption.AllDirectories).Length);
    }

    [Fact]
    public async Task Receive_Cancelled_LeavesNoHalfFile()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        using var cancellation = new CancellationTokenSource();

        await Assert.ThrowsAnyAsync<OperationCanceledException>(() => workspace.Cruises.ReceiveAsync(
            Guid.NewGuid(), "a.csv", new EndlessStream(after: 1 << 20, cancellation), cancellation.Token));

        Assert.Empty(Directory.GetFiles(scratch.Path("uploads"), "*", SearchOption.AllDirectories));
    }

    [Fact]
    public async Task Receive_ManyAtOnce_NumbersEachOnce()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Guid upload = Guid.NewGuid();

        await Task.WhenAll(Enumerable.Range(0, 30).Select(i => workspace.Cruises.ReceiveAsync(
            upload, "cast.csv", new MemoryStream(OpenWorkspace.Sample("casts/halcyon_00035_00001_ct1.csv")), TestContext.Current.CancellationToken)));
        ImportTrial trial = await workspace.Cruises.TryAsync(upload, new ReadingOptions(), TestContext.Current.CancellationToken);

        Assert.Equal(30, trial.Report.Files.Select(f => f.Name).Distinct().Count());
        Assert.Contains("cast (30).csv", trial.Report.Files.Select(f => f.Name));
    }

    [Fact]
    public async Task Samples_UnderAKeyThatIsNone_IsRefused()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);

        await Assert.ThrowsAsync<ArgumentException>(() => workspace.Cruises.SamplesAsync("../watermix"));
    }

    [Fact]
    public async Task RemoveRestoreRenameAndErrors_AreKept()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Guid study = await workspace.Studies.CreateAsync("a");
        Cruise cruise = await workspace.KeepAsync(study, "c", ("halcyon_hy1.csv", Bottles));
        var errors = new Dictionary<string, MeasurementError> { ["oxygen"] = new(0.5, 0.01) };

        await workspace.Cruises.RemoveAsync(cruise.Id);
        Assert.Empty((await workspace.Studies.FindAsync(study))!.Cruises);
        await workspace.Cruises.RestoreAsync(cruise.Id);
        await workspace.Cruises.RenameAsync(cruise.Id, "d");
        await workspace.Cruises.SetMeasurementSdAsync(cruise.Id, errors);

        Cruise kept = Assert.Single((await workspace.Studies.FindAsync(study))!.Cruises);
        Assert.Equal("d", kept.Name);
        Assert.Equal(errors, kept.MeasurementSd);
        await Assert.ThrowsAsync<ArgumentException>(() => workspace.Cruises.SetMeasurementSdAsync(cruise.Id, new Dictionary<string, MeasurementError> { ["oxygen"] = new(0) }));
        await Assert.ThrowsAsync<ArgumentException>(() => workspace.Cruises.RenameAsync(Guid.NewGuid(), "d"));
    }

    [Fact]
    public async Task Duplicates_TheSameCruiseTwiceAndAPart_AreCounted()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Guid study = await workspace.Studies.CreateAsync("a");
        const string Header = "latitude,longitude,pressure,in_situ_temperature,practical_salinity\n";
        Cruise first = await workspace.KeepAsync(study, "a", ("a.csv", Encoding.UTF8.GetBytes(Header + "1,2,10,3,35\n1,2,20,3,35\n1,2,20,3,35\n1,2,,3,35\n1,2,30,,\n")));
        Cruise second = await workspace.KeepAsync(study, "b", ("b.csv", Encoding.UTF8.GetBytes(Header + "1.0000001,2,10,3,35\n1.002,2,20,3,35\n1,2,,3,35\n1,2,30,,\n")));

        IReadOnlyList<DuplicateSamples> duplicates = await workspace.Cruises.DuplicatesAsync(study);

        Assert.Equal([new DuplicateSamples(first.Id, first.Id, 1), new DuplicateSamples(first.Id, second.Id, 1)], duplicates);
    }

    [Fact]
    public async Task Samples_TwoHundredThousand_LoadInUnderASecond()
    {
        using var scratch = new Scratch();
        var text = new StringBuilder("expocode,station,cast,sample,latitude,longitude,pressure,in_situ_temperature,practical_salinity,oxygen,oxygen_flag,nitrate,nitrate_flag,phosphate,phosphate_flag,silicate,silicate_flag\n");
        for (int i = 0; i < 200_000; i++)
        {
            text.Append(CultureInfo.InvariantCulture, $"HALCYON,{i / 24},1,{i % 24},{-40 + (i % 1000 * 0.01)},-120,{i % 24 * 200},{2 + (i % 77 * 0.1)},{34 + (i % 91 * 0.01)},{200 + (i % 53)},2,{20 + (i % 13)},2,{1 + (i % 7 * 0.1)},2,{30 + (i % 101)},2\n");
        }

        Cruise cruise;
        await using (OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder))
        {
            cruise = await workspace.KeepAsync(await workspace.Studies.CreateAsync("a"), "c", ("a.csv", Encoding.UTF8.GetBytes(text.ToString())));
        }

        await using OpenWorkspace again = await OpenWorkspace.AtAsync(scratch.Folder);
        var clock = Stopwatch.StartNew();
        SampleTable samples = await again.Cruises.SamplesAsync(cruise.SamplesHash);

        TestContext.Current.TestOutputHelper!.WriteLine($"{clock.ElapsedMilliseconds} ms");
        Assert.Equal(200_000, samples.RowCount);
        Assert.InRange(clock.ElapsedMilliseconds, 0, 1000);
    }

    /// <summary>Gives bytes for ever and cancels on the way.</summary>
    private sealed class EndlessStream(long after, CancellationTokenSource cancellation) : MemoryStream
    {
        private long _given;

        public override async ValueTask<int> ReadAsync(Memory<byte> buffer, CancellationToken cancellationToken = default)
        {
            _given += buffer.Length;
            if (_given > after)
            {
                await cancellation.CancelAsync();
            }

            cancellationToken.ThrowIfCancellationRequested();
            return buffer.Length;
        }
    }
}
