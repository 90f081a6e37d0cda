using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;
using WaterMix.Workspace.Runs;

namespace WaterMix.Workspace.Tests.Runs;

public class LiveSolverTests
{
    [Fact]
    public async Task Solve_ADraftThatIsNotSaved_GivesTheSolversNumbers()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder, new WorkspaceOptions { ChunkRows = 100 });
        Guid study = await RunServiceTests.HalcyonStudyAsync(workspace);
        LiveSolver live = workspace.Get<LiveSolver>();

        LiveResult result = await live.SolveAsync(study, Guid.NewGuid(), Halcyon.Simple, TestContext.Current.CancellationToken);

        Assert.Empty(result.Errors);
        CruiseResult cruise = Assert.Single(result.Cruises);
        MixingResult direct = MixingSolver.Solve(
            PreparedModel.From(Halcyon.Simple), await workspace.Cruises.SamplesAsync(cruise.SamplesHash), new SolveOptions { Threads = 1 }).Result;
        RunServiceTests.AssertSame(direct, cruise.Result);
        Assert.Empty((await workspace.Studies.FindAsync(study))!.Runs);
        Assert.Empty(Directory.GetDirectories(scratch.Path("runs")));
    }

    [Fact]
    public async Task Solve_AModelWithErrors_GivesTheErrors()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Guid study = await RunServiceTests.HalcyonStudyAsync(workspace);

        LiveResult result = await workspace.Get<LiveSolver>().SolveAsync(
            study, Guid.NewGuid(), Halcyon.Model with { EndMembers = new EndMemberSet("none", 1, []) }, TestContext.Current.CancellationToken);

        Assert.NotEmpty(result.Errors);
        Assert.Empty(result.Cruises);
    }

    [Fact]
    public async Task Solve_ManyRequestsOfOneTab_OnlyTheLatestIsSureToCount()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder, new WorkspaceOptions { ChunkRows = 16 });
        Guid study = await RunServiceTests.HalcyonStudyAsync(workspace);
        LiveSolver live = workspace.Get<LiveSolver>();
        Guid tab = Guid.NewGuid();
        Guid otherTab = Guid.NewGuid();

        Task<LiveResult> other = live.SolveAsync(study, otherTab, Halcyon.Model, TestContext.Current.CancellationToken);
        Task<LiveResult>[] requests = [.. Enumerable.Range(0, 20).Select(_ => live.SolveAsync(study, tab, Halcyon.Model, TestContext.Current.CancellationToken))];

        Assert.Single((await requests[^1]).Cruises);
        Assert.Single((await other).Cruises);
        int overtaken = 0;
        foreach (Task<LiveResult> request in requests[..^1])
        {
            try
            {
                await request;
            }
            catch (OperationCanceledException)
            {
                overtaken++;
            }
        }

        Assert.InRange(overtaken, 15, 19);
    }

    [Fact]
    public async Task Solve_WhileARunIsAtWork_GoesFirst()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder, new WorkspaceOptions { ChunkRows = 8 });
        Guid study = await RunServiceTests.HalcyonStudyAsync(workspace);
        Guid run = await workspace.Runs.StartAsync(study, "r");

        LiveResult result = await workspace.Get<LiveSolver>().SolveAsync(study, Guid.NewGuid(), Halcyon.Model, TestContext.Current.CancellationToken);

        Assert.Single(result.Cruises);
        Assert.InRange((await workspace.Runs.FindAsync(run))!.Done, 0, 831);
    }
}
