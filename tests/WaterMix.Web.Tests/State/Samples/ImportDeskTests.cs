using System.Text;
using WaterMix.Core.Mixing;
using WaterMix.Core.Samples;
using WaterMix.Testing;
using WaterMix.Web.State.Samples;
using WaterMix.Workspace.Cruises;

namespace WaterMix.Web.Tests.State.Samples;

public sealed class ImportDeskTests
{
    private const string Commas = "station;latitude;longitude;pressure;temperature;salinity;oxigen\n1;50,5;-30;100;4,5;34,9;6,1\n1;50,5;-30;200;4,1;34,91;6,0\n";

    [Fact]
    public async Task Begin_InventedCruise_ReportsWhatStandsInTheFile()
    {
        await using TestWorkspace workspace = await TestWorkspace.OpenAsync();
        using var desk = new ImportDesk(workspace.Cruises);
        await desk.BeginAsync(await workspace.UploadAsync("halcyon_hy1.csv", TestWorkspace.Halcyon), null);
        Assert.True(desk.CanKeep);
        Assert.Equal("HB01, ZZHB20240206", desk.Name);

        // Counted in the text itself: lines between the units and END_DATA.
        string[] lines = Encoding.UTF8.GetString(TestWorkspace.Halcyon).Split('\n');
        int rows = Array.FindIndex(lines, l => l.StartsWith("END_DATA", StringComparison.Ordinal)) - Array.FindIndex(lines, l => l.StartsWith(',')) - 1;
        Assert.StartsWith(FormattableString.Invariant($"{rows} samples were read from 1 file"), desk.Report!.Summary, StringComparison.Ordinal);
        Assert.Contains(desk.Report.Sources, s => s.StartsWith("Practical Salinity:", StringComparison.Ordinal) && s.Contains("both columns are kept", StringComparison.Ordinal));
        Assert.Equal("WHP-Exchange bottle file", desk.Report.Files.Single().Format);
        Assert.Equal(8, desk.FirstRows!.Rows.Count);
    }

    [Fact]
    public async Task ReadAgain_WithMarksAndMatchCorrected_MakesTheFileUsable()
    {
        await using TestWorkspace workspace = await TestWorkspace.OpenAsync();
        using var desk = new ImportDesk(workspace.Cruises);
        await desk.BeginAsync(await workspace.UploadAsync("comma.csv", Encoding.UTF8.GetBytes(Commas)), null);
        Assert.False(desk.CanKeep);
        Assert.NotEmpty(desk.Report!.Errors);
        Assert.All(desk.Report.Errors, e => Assert.DoesNotContain("--", e.Remedy, StringComparison.Ordinal));

        desk.Reading.Delimiter = ';';
        desk.Reading.DecimalMark = ',';
        Assert.True(desk.HasChanges);
        await desk.ReadAgainAsync();
        Assert.True(desk.CanKeep);
        MatchRow oxygen = desk.Match!.Rows.Single(r => r.Column == "oxigen");
        Assert.Equal(MatchRow.OwnName, oxygen.Meaning);
        Assert.Equal("Names not known, kept as further tracers: oxigen.", desk.Report!.Unknown);

        oxygen.Meaning = "oxygen";
        oxygen.Unit = "mL/L";
        Assert.False(desk.CanKeep);
        Assert.NotNull(desk.WhyNot);
        await desk.ReadAgainAsync();
        Assert.True(desk.CanKeep);
        Assert.Contains(desk.Report!.Conversions, c => c.StartsWith("Oxygen:", StringComparison.Ordinal) && c.Contains("44.6596", StringComparison.Ordinal));

        // What nobody touched is still guessed, and the report says so.
        Assert.Equal("as you said", desk.Report.Columns.Single(c => c.Name == "Oxygen").Matched);
        Assert.Equal("by its id", desk.Report.Columns.Single(c => c.Name == "Latitude").Matched);
    }

    [Fact]
    public async Task SavedMatch_ReadBack_SaysTheSame()
    {
        await using TestWorkspace workspace = await TestWorkspace.OpenAsync();
        using var desk = new ImportDesk(workspace.Cruises);
        Guid upload = await workspace.UploadAsync("comma.csv", Encoding.UTF8.GetBytes(Commas));
        await desk.BeginAsync(upload, null);
        desk.Reading.Delimiter = ';';
        desk.Reading.DecimalMark = ',';
        await desk.ReadAgainAsync();
        desk.Match!.Rows.Single(r => r.Column == "oxigen").Meaning = "oxygen";
        byte[] saved = desk.SavedMatch();

        await desk.BeginAsync(upload, null);
        await desk.UseMatchAsync(saved, "columns.match.json");
        Assert.True(desk.CanKeep);
        Assert.Equal(';', desk.Reading.Delimiter);
        Assert.Equal("oxygen", desk.Match!.Rows.Single(r => r.Column == "oxigen").Meaning);
        Assert.Equal(saved, desk.SavedMatch());
    }

    [Fact]
    public async Task UseMatch_NotAMatchFile_SaysWhatIsWrong()
    {
        await using TestWorkspace workspace = await TestWorkspace.OpenAsync();
        using var desk = new ImportDesk(workspace.Cruises);
        await desk.BeginAsync(await workspace.UploadAsync("halcyon_hy1.csv", TestWorkspace.Halcyon), null);
        await desk.UseMatchAsync("{ \"schema\": \"other\" }"u8.ToArray(), "wrong.json");
        Assert.StartsWith("wrong.json:", Assert.Single(desk.Problems), StringComparison.Ordinal);
        Assert.NotNull(desk.Report);
    }

    [Fact]
    public async Task Keep_WithoutAName_KeepsNothing()
    {
        await using TestWorkspace workspace = await TestWorkspace.OpenAsync();
        Guid study = await workspace.Studies.CreateAsync("A");
        using var desk = new ImportDesk(workspace.Cruises);
        await desk.BeginAsync(await workspace.UploadAsync("halcyon_hy1.csv", TestWorkspace.Halcyon), null);
        desk.Name = " ";
        Assert.Null(await desk.KeepAsync(study));
        Assert.StartsWith("A cruise needs a name.", Assert.Single(desk.Problems), StringComparison.Ordinal);
        Assert.Empty((await workspace.Studies.FindAsync(study))!.Cruises);
    }

    [Fact]
    public async Task Keep_ReadAgain_TakesThePlaceAndTheErrorsOfTheOther()
    {
        await using TestWorkspace workspace = await TestWorkspace.OpenAsync();
        Guid study = await workspace.Studies.CreateAsync("A");
        Cruise first = await workspace.KeepHalcyonAsync(study, "first");
        await workspace.Cruises.SetMeasurementSdAsync(first.Id, new Dictionary<string, MeasurementError> { ["oxygen"] = new(2) });
        first = (await workspace.Studies.FindAsync(study))!.Cruises.Single();
        using var desk = new ImportDesk(workspace.Cruises);
        await desk.BeginAsync(first.Upload, first);
        Assert.Equal("first", desk.Name);
        desk.Reading.Prefer = ValueOrigin.Ctd;
        await desk.ReadAgainAsync();
        Cruise? kept = await desk.KeepAsync(study);
        Cruise now = Assert.Single((await workspace.Studies.FindAsync(study))!.Cruises);
        Assert.Equal(kept!.Id, now.Id);
        Assert.Equal(2, now.MeasurementSd!["oxygen"].Absolute);
        Assert.Equal(ValueOrigin.Ctd, now.Reading.Prefer);
        Assert.NotEqual(first.SamplesHash, now.SamplesHash);
    }

    [Fact]
    public async Task Begin_UnknownUpload_IsASentence()
    {
        await using TestWorkspace workspace = await TestWorkspace.OpenAsync();
        using var desk = new ImportDesk(workspace.Cruises);
        await desk.BeginAsync(Guid.NewGuid(), null);
        Assert.Contains("Nothing in the study changed.", Assert.Single(desk.Problems), StringComparison.Ordinal);
        Assert.Null(desk.Work);
    }

    [Fact]
    public async Task Cancel_WhileReading_LeavesTheStudyAsItWas()
    {
        var slow = new SlowCruises();
        using var desk = new ImportDesk(slow);
        Task reading = desk.BeginAsync(Guid.NewGuid(), null);
        Assert.Equal("Reading the files", desk.Work);
        desk.Cancel();
        await reading;
        Assert.Null(desk.Work);
        Assert.StartsWith("You stopped it.", Assert.Single(desk.Problems), StringComparison.Ordinal);
    }

    // Open data: the A03 section in WHP-Exchange; CTDTMP is on IPTS-68 and nitrate is given with nitrite.
    [Fact]
    public async Task Begin_OpenBottleFile_ReportsConversionAndCounts()
    {
        string path = TestData.File("bottle/a03_hy1.csv");
        await using TestWorkspace workspace = await TestWorkspace.OpenAsync();
        using var desk = new ImportDesk(workspace.Cruises);
        await desk.BeginAsync(await workspace.UploadAsync("a03_hy1.csv", await File.ReadAllBytesAsync(path, TestContext.Current.CancellationToken)), null);
        Assert.Contains("In-situ temperature: T90 = T68 / 1.00024", desk.Report!.Conversions);
        string[] cells = [.. File.ReadLines(path).Where(l => l.Contains("RUCT40_1", StringComparison.Ordinal))];
        Assert.Equal(PlainCount(cells.Length), desk.Report.Files.Single().Rows);
        Assert.Equal(PlainCount(cells.Count(l => l.Split(',')[6].Trim() == "3")), System.Text.RegularExpressions.Regex.Match(desk.Report.BottleFlags, "(\\d+) with flag 3").Groups[1].Value);
    }

    private static string PlainCount(int count) => WaterMix.Web.State.PlainText.Count(count);

    private sealed class SlowCruises : ICruises
    {
        public Task ReceiveAsync(Guid upload, string fileName, Stream content, CancellationToken cancellation) => throw new NotSupportedException();

        public async Task<ImportTrial> TryAsync(Guid upload, Formats.Reading.ReadingOptions options, CancellationToken cancellation)
        {
            await Task.Delay(Timeout.Infinite, cancellation);
            throw new NotSupportedException();
        }

        public Task<(ImportTrial Trial, Cruise? Cruise)> KeepAsync(Guid study, Guid upload, string cruiseName, Formats.Reading.ReadingOptions options, IProgress<long>? progress, CancellationToken cancellation) => throw new NotSupportedException();

        public Task<SampleTable> SamplesAsync(string samplesHash) => throw new NotSupportedException();

        public Task RenameAsync(Guid cruise, string name) => throw new NotSupportedException();

        public Task RemoveAsync(Guid cruise) => throw new NotSupportedException();

        public Task RestoreAsync(Guid cruise) => throw new NotSupportedException();

        public Task SetMeasurementSdAsync(Guid cruise, IReadOnlyDictionary<string, MeasurementError>? measurementSd) => throw new NotSupportedException();

        public Task<IReadOnlyList<DuplicateSamples>> DuplicatesAsync(Guid study) => throw new NotSupportedException();
    }
}
