using WaterMix.Workspace.Cruises;
using WaterMix.Workspace.Storage;

namespace WaterMix.Workspace.Tests.Storage;

public class HousekeepingTests
{
    private static readonly byte[] Bottles = OpenWorkspace.Sample("halcyon_hy1.csv");

    [Fact]
    public async Task Clear_LongAfterADeletion_RemovesTheStudyAndItsFiles()
    {
        using var scratch = new Scratch();
        var clock = new SetClock();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder, clock: clock);
        Guid study = await RunsOf(workspace);
        Guid kept = await workspace.Studies.CreateAsync("kept");
        Cruise cruise = await workspace.KeepAsync(kept, "c", ("cast.csv", OpenWorkspace.Sample("casts/halcyon_00035_00001_ct1.csv")));
        await workspace.Studies.DeleteAsync(study);
        int files = Files(scratch);

        clock.Now += TimeSpan.FromDays(29);
        await workspace.Get<Housekeeping>().ClearAsync();
        Assert.Equal(files, Files(scratch));

        clock.Now += TimeSpan.FromDays(2);
        await workspace.Get<Housekeeping>().ClearAsync();

        Assert.Equal(2, Files(scratch));
        await Assert.ThrowsAsync<ArgumentException>(() => workspace.Studies.RestoreAsync(study));
        Assert.Equal(cruise.SampleCount, (await workspace.Cruises.SamplesAsync(cruise.SamplesHash)).RowCount);
        Assert.False((await workspace.Cruises.TryAsync(cruise.Upload, new Formats.Reading.ReadingOptions(), TestContext.Current.CancellationToken)).HasErrors);
    }

    [Fact]
    public async Task Clear_UploadsThatNoCruiseWasReadFrom_GoAfterAWhile()
    {
        using var scratch = new Scratch();
        var clock = new SetClock();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder, clock: clock);
        Guid upload = await workspace.UploadAsync(("a.csv", Bottles));

        await workspace.Get<Housekeeping>().ClearAsync();
        Assert.Equal(1, Files(scratch));
        clock.Now += TimeSpan.FromDays(3);
        await workspace.Get<Housekeeping>().ClearAsync();

        Assert.Equal(0, Files(scratch));
        await Assert.ThrowsAsync<ArgumentException>(() => workspace.Cruises.TryAsync(upload, new Formats.Reading.ReadingOptions(), TestContext.Current.CancellationToken));
    }

    [Fact]
    public async Task Clear_ARemovedCruiseWhoseSamplesARunUsed_KeepsThoseSamples()
    {
        using var scratch = new Scratch();
        var clock = new SetClock();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder, clock: clock);
        Guid study = await RunsOf(workspace);
        Guid run = (await workspace.Studies.FindAsync(study))!.Runs[0].Id;
        await workspace.Cruises.RemoveAsync((await workspace.Studies.FindAsync(study))!.Cruises[0].Id);

        clock.Now += TimeSpan.FromDays(40);
        await workspace.Get<Housekeeping>().ClearAsync();

        Assert.NotEmpty(await workspace.CsvAsync(run));
    }

    private static async Task<Guid> RunsOf(OpenWorkspace workspace)
    {
        Guid study = await workspace.Studies.CreateAsync("a");
        await workspace.Studies.SaveDraftAsync(study, Halcyon.Model, 0);
        await workspace.KeepAsync(study, "c", ("halcyon_hy1.csv", Bottles));
        await workspace.EndOfAsync(await workspace.Runs.StartAsync(study, "r"));
        return study;
    }

    private static int Files(Scratch scratch) => ((string[])["samples", "runs", "uploads"])
        .Sum(folder => Directory.GetFiles(scratch.Path(folder), "*", SearchOption.AllDirectories).Length);

    private sealed class SetClock : TimeProvider
    {
        public DateTimeOffset Now { get; set; } = DateTimeOffset.UtcNow;

        public override DateTimeOffset GetUtcNow() => Now;
    }
}
