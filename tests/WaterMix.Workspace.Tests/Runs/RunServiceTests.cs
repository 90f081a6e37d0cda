using System.Diagnostics;
using System.Security.Cryptography;
using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;
using WaterMix.Core.Samples;
using WaterMix.Workspace.Cruises;
using WaterMix.Workspace.Runs;
using WaterMix.Workspace.Studies;

namespace WaterMix.Workspace.Tests.Runs;

public class RunServiceTests
{
    private static readonly byte[] Bottles = OpenWorkspace.Sample("halcyon_hy1.csv");

    [Fact]
    public async Task Start_TheInventedCruise_EndsWithTheSolversNumbers()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Guid study = await HalcyonStudyAsync(workspace);
        var progress = new System.Collections.Concurrent.ConcurrentQueue<Guid>();
        workspace.Runs.Progressed += progress.Enqueue;

        Guid id = await workspace.Runs.StartAsync(study, " first ");
        Run run = await workspace.EndOfAsync(id);

        Assert.Equal(("first", RunState.Finished, 832L, 832L), (run.Name, run.State, run.Done, run.Total));
        CruiseResult result = Assert.Single(await workspace.Runs.ResultsAsync(id));
        SampleTable samples = await workspace.Cruises.SamplesAsync(result.SamplesHash);
        MixingResult direct = MixingSolver.Solve(PreparedModel.From(Halcyon.Model), samples, new SolveOptions { Threads = 1 }).Result;
        AssertSame(direct, result.Result);
        Assert.Equal(direct.Status.GroupBy(s => s).ToDictionary(g => g.Key, g => g.LongCount()), run.Statuses);
        Assert.All(progress, p => Assert.Equal(id, p));
        Assert.NotEmpty(progress);
        Assert.Same(result.Result, (await workspace.Runs.ResultsAsync(id))[0].Result);
    }

    [Fact]
    public async Task Start_ThenEditTheDraft_LeavesTheRunAsItWas()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Guid study = await HalcyonStudyAsync(workspace);
        Guid first = await workspace.Runs.StartAsync(study, "first");
        await workspace.EndOfAsync(first);

        await workspace.Studies.SaveDraftAsync(study, Halcyon.Simple, 1);
        Guid second = await workspace.Runs.StartAsync(study, "second");
        await workspace.EndOfAsync(second);
        await workspace.Runs.RenameAsync(second, "simple");

        Study found = (await workspace.Studies.FindAsync(study))!;
        Assert.Equal(["simple", "first"], found.Runs.Select(r => r.Name));
        Assert.Equal([Halcyon.Simple, Halcyon.Model], found.Runs.Select(r => r.Model));
        Assert.NotEqual(found.Runs[0].ModelHash, found.Runs[1].ModelHash);
    }

    [Fact]
    public async Task Start_WithoutSamplesOrWithAModelThatHasErrors_SaysWhatToDo()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Guid study = await workspace.Studies.CreateAsync("a");

        InvalidOperationException incomplete = await Assert.ThrowsAsync<InvalidOperationException>(() => workspace.Runs.StartAsync(study, "r"));
        await workspace.Studies.SaveDraftAsync(study, Halcyon.Model, 0);
        InvalidOperationException empty = await Assert.ThrowsAsync<InvalidOperationException>(() => workspace.Runs.StartAsync(study, "r"));
        await workspace.KeepAsync(study, "c", ("a.csv", "latitude,longitude,pressure,oxygen\n1,2,3,200\n"u8.ToArray()));
        InvalidOperationException columns = await Assert.ThrowsAsync<InvalidOperationException>(() => workspace.Runs.StartAsync(study, "r"));

        Assert.StartsWith("The model cannot be solved yet: error: /endMembers/endMembers", incomplete.Message, StringComparison.Ordinal);
        Assert.Equal("There are no samples in this study. Upload a cruise first.", empty.Message);
        Assert.StartsWith("No cruise has a column of nitrate, phosphate, potential_temperature, practical_salinity, silicate", columns.Message, StringComparison.Ordinal);
        Assert.Empty((await workspace.Studies.FindAsync(study))!.Runs);
    }

    [Fact]
    public async Task Start_WithOneTracerWithoutAnyUsableValue_FailsAndNamesIt()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Guid study = await workspace.Studies.CreateAsync("a");
        await workspace.Studies.SaveDraftAsync(study, Halcyon.Model with { Tracers = ["practical_salinity", "oxygen"], Processes = [], Layers = [] }, 0);
        await workspace.KeepAsync(study, "c", ("a.csv", "latitude,longitude,pressure,practical_salinity,oxygen,oxygen_flag\n1,2,3,35,200,4\n"u8.ToArray()));

        Guid id = await workspace.Runs.StartAsync(study, "r");
        Run run = await workspace.EndOfAsync(id);

        Assert.Equal(RunState.Failed, run.State);
        Assert.StartsWith("No sample has a usable value of oxygen,", run.Problem, StringComparison.Ordinal);
        await Assert.ThrowsAsync<InvalidOperationException>(() => workspace.Runs.ResultsAsync(id));
        await Assert.ThrowsAsync<InvalidOperationException>(() => workspace.CsvAsync(id));
    }

    [Fact]
    public async Task Start_WithTheSamplesFileGone_FailsAndTheWorkerGoesOn()
    {
        using var scratch = new Scratch();
        Guid study;
        await using (OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder))
        {
            study = await HalcyonStudyAsync(workspace);
        }

        string file = Directory.GetFiles(scratch.Path("samples")).Single();
        File.Move(file, file + ".away");
        await using OpenWorkspace again = await OpenWorkspace.AtAsync(scratch.Folder);
        await Assert.ThrowsAsync<InvalidDataException>(() => again.Runs.StartAsync(study, "r"));
        File.Move(file + ".away", file);

        Assert.Equal(RunState.Finished, (await again.EndOfAsync(await again.Runs.StartAsync(study, "r"))).State);
    }

    // Few rows to a chunk, so that there is a middle to stop in.
    [Fact]
    public async Task Restart_InTheMiddle_GoesOnAndEndsWithTheSameBytes()
    {
        using var scratch = new Scratch();
        var small = new WorkspaceOptions { ChunkRows = 8 };
        Guid whole;
        Guid interrupted;
        await using (OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder, small))
        {
            Guid study = await HalcyonStudyAsync(workspace);
            whole = await workspace.Runs.StartAsync(study, "whole");
            await workspace.EndOfAsync(whole);
            interrupted = await workspace.Runs.StartAsync(study, "interrupted");
            await ReachedAsync(workspace, interrupted, 20);
        }

        long before;
        await using (OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder, small))
        {
            Run run = (await workspace.Runs.FindAsync(interrupted))!;
            before = run.Done;
            Assert.InRange(before, 20, 831);
            Assert.True(run.State is RunState.Waiting or RunState.Running);
            Assert.Equal(RunState.Finished, (await workspace.EndOfAsync(interrupted)).State);
            Assert.Equal(832, (await workspace.Runs.FindAsync(interrupted))!.Done);
            Assert.Equal(await workspace.CsvAsync(whole), await workspace.CsvAsync(interrupted));
        }

        byte[][] hashes = [.. Directory.GetFiles(scratch.Path("runs"), "*.parquet", SearchOption.AllDirectories).Select(f => SHA256.HashData(File.ReadAllBytes(f)))];
        Assert.Equal(2, hashes.Length);
        Assert.Equal(hashes[0], hashes[1]);
    }

    // The quickest of three, so that whatever else the machine does decides nothing.
    [Fact]
    public async Task Cancel_AtWork_StopsWithinATenthOfASecondAndStaysCancelled()
    {
        using var scratch = new Scratch();
        Guid last = default;
        long quickest = long.MaxValue;
        await using (OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder, new WorkspaceOptions { ChunkRows = 8 }))
        {
            Guid study = await HalcyonStudyAsync(workspace);
            for (int i = 0; i < 3; i++)
            {
                last = await workspace.Runs.StartAsync(study, "r");
                await ReachedAsync(workspace, last, 16);
                var clock = Stopwatch.StartNew();
                await workspace.Runs.CancelAsync(last);
                Assert.Equal(RunState.Cancelled, (await workspace.Runs.FindAsync(last))!.State);
                quickest = Math.Min(quickest, clock.ElapsedMilliseconds);
            }

            long done = (await workspace.Runs.FindAsync(last))!.Done;
            Assert.Equal(RunState.Finished, (await workspace.EndOfAsync(await workspace.Runs.StartAsync(study, "next"))).State);
            Assert.Equal(done, (await workspace.Runs.FindAsync(last))!.Done);
        }

        Assert.Single(Directory.GetFiles(scratch.Path("runs"), "*.parquet", SearchOption.AllDirectories));
        await using OpenWorkspace again = await OpenWorkspace.AtAsync(scratch.Folder);
        await again.Runs.CancelAsync(last);
        Assert.Equal(RunState.Cancelled, (await again.Runs.FindAsync(last))!.State);
        Assert.InRange(quickest, 0, 100);
    }

    [Fact]
    public async Task Cancel_BeforeAnyWork_LeavesNothing()
    {
        using var scratch = new Scratch();
        await using (OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder, new WorkspaceOptions { ChunkRows = 8 }))
        {
            Guid study = await HalcyonStudyAsync(workspace);
            Guid[] runs = [.. await Task.WhenAll(Enumerable.Range(0, 5).Select(i => workspace.Runs.StartAsync(study, "r")))];
            await Task.WhenAll(runs.Select(workspace.Runs.CancelAsync));
            await workspace.EndOfAsync(await workspace.Runs.StartAsync(study, "next"));
            Assert.All((await workspace.Studies.FindAsync(study))!.Runs.Where(r => r.Name == "r"), r => Assert.Equal(RunState.Cancelled, r.State));
        }

        Assert.Single(Directory.GetFiles(scratch.Path("runs"), "*.parquet", SearchOption.AllDirectories));
    }

    [Fact]
    public async Task Start_TwoRunsAtOnce_TakeTurns()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder, new WorkspaceOptions { ChunkRows = 16 });
        Guid study = await HalcyonStudyAsync(workspace);

        Guid first = await workspace.Runs.StartAsync(study, "first");
        Guid second = await workspace.Runs.StartAsync(study, "second");
        await ReachedAsync(workspace, second, 40);

        Assert.InRange((await workspace.Runs.FindAsync(first))!.Done, 40, 831);
        Assert.Equal(RunState.Finished, (await workspace.EndOfAsync(first)).State);
        Assert.Equal(RunState.Finished, (await workspace.EndOfAsync(second)).State);
    }

    [Fact]
    public async Task Duplicate_AStudyWithRuns_ShowsTheSameResults()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Guid study = await HalcyonStudyAsync(workspace);
        Guid run = await workspace.Runs.StartAsync(study, "r");
        await workspace.EndOfAsync(run);

        Study copy = (await workspace.Studies.FindAsync(await workspace.Studies.DuplicateAsync(study, "copy")))!;

        Run copied = Assert.Single(copy.Runs);
        Assert.NotEqual(run, copied.Id);
        Assert.Equal(await workspace.CsvAsync(run), await workspace.CsvAsync(copied.Id));
        Assert.Equal(copy.Cruises[0].Id, (await workspace.Runs.ResultsAsync(copied.Id))[0].Cruise);
    }

    [Fact]
    public async Task Start_ACruisesErrorBesideAFullCovariance_IsRefused()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Guid study = await HalcyonStudyAsync(workspace);
        var fit = (GeneralisedLeastSquares)Halcyon.Model.Fit;
        await workspace.Studies.SaveDraftAsync(study, Halcyon.Model with { Fit = fit with { MeasurementCovariance = new TracerMatrix(["oxygen"], [[1]]) } }, 1);
        Cruise cruise = (await workspace.Studies.FindAsync(study))!.Cruises[0];
        await workspace.Cruises.SetMeasurementSdAsync(cruise.Id, new Dictionary<string, MeasurementError> { ["oxygen"] = new(1) });

        InvalidOperationException refusal = await Assert.ThrowsAsync<InvalidOperationException>(() => workspace.Runs.StartAsync(study, "r"));

        Assert.Equal("The cruise c has a measurement error of its own for oxygen, and the model a full covariance. Take one of the two away.", refusal.Message);
    }

    internal static async Task<Guid> HalcyonStudyAsync(OpenWorkspace workspace)
    {
        Guid study = await workspace.Studies.CreateAsync("a");
        await workspace.Studies.SaveDraftAsync(study, Halcyon.Model, 0);
        await workspace.KeepAsync(study, "c", ("halcyon_hy1.csv", Bottles));
        return study;
    }

    internal static void AssertSame(MixingResult expected, MixingResult actual)
    {
        Assert.Equal(expected.Status, actual.Status);
        Assert.Equal(expected.Layer, actual.Layer);
        Assert.Equal(expected.TracerCount, actual.TracerCount);
        Assert.Equal(expected.DegreesOfFreedom, actual.DegreesOfFreedom);
        Assert.Equal(expected.Notes, actual.Notes);
        Assert.Equal(Numbers(expected), Numbers(actual));
    }

    private static ulong[][] Numbers(MixingResult result) =>
    [
        .. ((double[][])[.. result.Fractions, result.FractionSum, .. result.Amounts, .. result.Residuals, result.ResidualMass, result.Misfit, result.Chi2, result.PValue])
            .Select(column => column.Select(BitConverter.DoubleToUInt64Bits).ToArray()),
    ];

    private static async Task ReachedAsync(OpenWorkspace workspace, Guid run, long samples)
    {
        while ((await workspace.Runs.FindAsync(run))!.Done < samples)
        {
            await Task.Delay(1, TestContext.Current.CancellationToken);
        }
    }
}
