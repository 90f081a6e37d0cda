using System.Text;
using WaterMix.Core.Mixing;
using WaterMix.Core.Samples;
using WaterMix.Testing;
using WaterMix.Workspace.Cruises;
using WaterMix.Workspace.Runs;

namespace WaterMix.Workspace.Tests.Runs;

/// <summary>Agreement: the app's CSV is the command line's, byte for byte.</summary>
public class RunCsvTests
{
    private static readonly string[] Casts = ["halcyon_00004_00001_ct1.csv", "halcyon_00012_00001_ct1.csv", "halcyon_00035_00001_ct1.csv"];

    [Theory]
    [InlineData(16_384)]
    [InlineData(100)]
    [InlineData(31)]
    public async Task WriteCsv_OneCruise_IsWhatTheCommandLineWrites(int chunkRows)
    {
        (string, byte[]) file = ("halcyon_hy1.csv", OpenWorkspace.Sample("halcyon_hy1.csv"));

        Assert.Equal(Text(CommandLineCsv.Of(Halcyon.Model, file)), Text(await SolvedAsync(Halcyon.Model, chunkRows, [file])));
    }

    [Fact]
    public async Task WriteCsv_ACruiseOfSeveralFiles_NamesTheFileOfEachRow()
    {
        (string, byte[])[] files = [.. Casts.Select(c => (c, OpenWorkspace.Sample("casts/" + c)))];
        MixingModel model = TwoTracers();

        Assert.Equal(Text(CommandLineCsv.Of(model, files)), Text(await SolvedAsync(model, 37, files)));
    }

    // The names stand in ordinal order, as the command line reads them; the second cruise lacks identity columns that the first has.
    [Fact]
    public async Task WriteCsv_SeveralCruises_RunOnAsFilesDo()
    {
        (string, byte[]) first = ("halcyon_00004_00001_ct1.csv", OpenWorkspace.Sample("casts/halcyon_00004_00001_ct1.csv"));
        (string, byte[]) second = ("tidy.csv", "latitude,longitude,pressure,in_situ_temperature,practical_salinity,oxygen\n-30,-120,10,20,35,220\n-30,-120,3000,1.5,34.7,\n95,-120,3000,1.5,34.7,180\n"u8.ToArray());
        MixingModel model = TwoTracers();

        Assert.Equal(Text(CommandLineCsv.Of(model, first, second)), Text(await SolvedAsync(model, 16_384, [first], [second])));
    }

    [Theory]
    [InlineData(ValueOrigin.Ctd)]
    [InlineData(ValueOrigin.Bottle)]
    public async Task WriteCsv_AModelThatPrefersTheOtherInstrument_ReadsTheUploadSo(ValueOrigin prefer)
    {
        (string, byte[]) file = ("halcyon_hy1.csv", OpenWorkspace.Sample("halcyon_hy1.csv"));
        MixingModel model = Halcyon.Model with { Prefer = prefer };

        Assert.Equal(Text(CommandLineCsv.Of(model, file)), Text(await SolvedAsync(model, 16_384, [file])));
        Assert.NotEqual(Text(CommandLineCsv.Of(Halcyon.Model with { Prefer = ValueOrigin.Bottle }, file)), Text(CommandLineCsv.Of(Halcyon.Model with { Prefer = ValueOrigin.Ctd }, file)));
    }

    [Fact]
    public async Task WriteCsv_TheOpenSection_IsWhatTheCommandLineWrites()
    {
        (string, byte[]) file = ("a03_hy1.csv", await File.ReadAllBytesAsync(TestData.File("bottle/a03_hy1.csv"), TestContext.Current.CancellationToken));

        Assert.Equal(Text(CommandLineCsv.Of(Halcyon.Model, file)), Text(await SolvedAsync(Halcyon.Model, 1000, [file])));
    }

    [Fact]
    public async Task WriteCsv_AnErrorOfTheCruisesOwn_ReplacesTheModelsForItsRows()
    {
        (string, byte[]) file = ("halcyon_hy1.csv", OpenWorkspace.Sample("halcyon_hy1.csv"));
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Guid study = await workspace.Studies.CreateAsync("a");
        await workspace.Studies.SaveDraftAsync(study, Halcyon.Model, 0);
        Cruise cruise = await workspace.KeepAsync(study, "own", file);
        var own = new Dictionary<string, MeasurementError> { ["oxygen"] = new(5, 0.1) };
        await workspace.Cruises.SetMeasurementSdAsync(cruise.Id, own);

        Guid run = await workspace.Runs.StartAsync(study, "r");
        await workspace.EndOfAsync(run);

        var errors = new Dictionary<string, MeasurementError>(Halcyon.Model.Fit.MeasurementSd) { ["oxygen"] = new(5, 0.1) };
        MixingModel changed = Halcyon.Model with { Fit = Halcyon.Model.Fit with { MeasurementSd = errors } };
        Assert.Equal(Text(CommandLineCsv.Of(changed, file)), Text(await workspace.CsvAsync(run)));
        Assert.NotEqual(Text(CommandLineCsv.Of(Halcyon.Model, file)), Text(await workspace.CsvAsync(run)));
    }

    [Fact]
    public async Task WriteCsv_NeverWritesSynchronously()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Guid study = await workspace.Studies.CreateAsync("a");
        await workspace.Studies.SaveDraftAsync(study, Halcyon.Model, 0);
        await workspace.KeepAsync(study, "own", ("halcyon_hy1.csv", OpenWorkspace.Sample("halcyon_hy1.csv")));
        Guid run = await workspace.Runs.StartAsync(study, "r");
        await workspace.EndOfAsync(run);
        using var strict = new AsynchronousOnly();

        await workspace.Runs.WriteCsvAsync(run, strict, TestContext.Current.CancellationToken);

        Assert.Equal(await workspace.CsvAsync(run), strict.ToArray());
    }

    private static MixingModel TwoTracers() => Halcyon.Model with
    {
        Tracers = ["potential_temperature", "practical_salinity"],
        Processes = [],
        Layers = [new Layer("deep", ["NDW", "SBW"], [new Condition("pressure", 150, null)])],
    };

    private static async Task<byte[]> SolvedAsync(MixingModel model, int chunkRows, params (string Name, byte[] Bytes)[][] cruises)
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder, new WorkspaceOptions { ChunkRows = chunkRows });
        Guid study = await workspace.Studies.CreateAsync("a");
        await workspace.Studies.SaveDraftAsync(study, model, 0);
        foreach ((string Name, byte[] Bytes)[] files in cruises)
        {
            await workspace.KeepAsync(study, files[0].Name, files);
        }

        Guid run = await workspace.Runs.StartAsync(study, "r");
        Run ended = await workspace.EndOfAsync(run);
        Assert.True(ended.State == RunState.Finished, ended.Problem);
        return await workspace.CsvAsync(run);
    }

    private static string Text(byte[] csv) => Encoding.UTF8.GetString(csv);

    /// <summary>As a web server's response: synchronous writing is refused.</summary>
    private sealed class AsynchronousOnly : MemoryStream
    {
        public override void Write(byte[] buffer, int offset, int count) => throw new InvalidOperationException("written synchronously");

        public override void Write(ReadOnlySpan<byte> buffer) => throw new InvalidOperationException("written synchronously");

        public override ValueTask WriteAsync(ReadOnlyMemory<byte> buffer, CancellationToken cancellationToken = default)
        {
            base.Write(buffer.ToArray(), 0, buffer.Length);
            return ValueTask.CompletedTask;
        }
    }
}
