using WaterMix.Web.State.Results;
using WaterMix.Workspace.Runs;

namespace WaterMix.Web.Tests.State.Results;

public class ResultsStateTests
{
    private static readonly Run Old = TwoLayers.Run();
    private static readonly Run Newer = TwoLayers.Run(RunState.Running, new Guid("5f3c1f0e-0000-4000-8000-000000000002"), "Second run") with { Done = 2 };

    [Fact]
    public async Task ReadAsync_NewestRunIsAtWork_ShowsTheNewestFinishedOne()
    {
        var workspace = new OneStudy(Newer, Old);
        ResultsState state = Of(workspace);

        await state.ReadAsync(OneStudy.Id, new ResultsView());

        Assert.Equal("First run", state.Run!.Name);
        Assert.NotNull(state.Shown);
        Assert.Equal(["Second run"], state.AtWork.Select(r => r.Name));
    }

    [Fact]
    public async Task ReadAsync_RunThatIsNotThere_ShowsNoneRatherThanAnother()
    {
        ResultsState state = Of(new OneStudy(Old));

        await state.ReadAsync(OneStudy.Id, new ResultsView { Run = Guid.NewGuid() });

        Assert.Null(state.Run);
        Assert.Null(state.Shown);
    }

    [Fact]
    public async Task TakeProgressAsync_RunFinishes_ShowsItsResults()
    {
        var workspace = new OneStudy(Newer);
        ResultsState state = Of(workspace);
        await state.ReadAsync(OneStudy.Id, new ResultsView());
        Assert.Null(state.Shown);

        workspace.Advance(Newer with { State = RunState.Finished, Done = 8 });
        bool changed = await state.TakeProgressAsync(Newer.Id, new ResultsView());

        Assert.True(changed);
        Assert.Equal(8, state.Shown!.RowCount);
        Assert.Empty(state.AtWork);
    }

    [Fact]
    public async Task TakeProgressAsync_RunOfAnotherStudy_ChangesNothing()
    {
        ResultsState state = Of(new OneStudy(Old));
        await state.ReadAsync(OneStudy.Id, new ResultsView());

        Assert.False(await state.TakeProgressAsync(Guid.NewGuid(), new ResultsView()));
    }

    [Fact]
    public async Task ShowAsync_SeveralViewsWhileOneIsMade_EndsWithTheLastAndReadsOnce()
    {
        var gate = new TaskCompletionSource();
        var workspace = new OneStudy(Old) { Gate = gate.Task };
        ResultsState state = Of(workspace);

        Task first = state.ReadAsync(OneStudy.Id, new ResultsView());
        Task second = state.ShowAsync(new ResultsView { Sample = 1 });
        Task third = state.ShowAsync(new ResultsView { Sample = 2 });
        gate.SetResult();
        await Task.WhenAll(first, second, third);

        Assert.Equal(2, state.Shown!.View.Sample);
        Assert.Equal(1, workspace.Readings);
    }

    [Fact]
    public async Task ShowAsync_ResultsCannotBeRead_SaysSoAndWhatToDo()
    {
        ResultsState state = Of(new OneStudy(Old) { Fault = new IOException("The file is gone.") });

        await state.ReadAsync(OneStudy.Id, new ResultsView());

        Assert.Null(state.Shown);
        Assert.Equal("The results of “First run” could not be read: The file is gone. Choose another run, or run the model again.", state.Problem);
    }

    [Theory]
    [InlineData("  ", "A run needs a name. Type what is special about it.")]
    [InlineData("Without opal", null)]
    public async Task RenameAsync_Name_IsTakenUnlessEmpty(string name, string? problem)
    {
        var workspace = new OneStudy(Old);
        ResultsState state = Of(workspace);
        await state.ReadAsync(OneStudy.Id, new ResultsView());

        Assert.Equal(problem, await state.RenameAsync(name));
        Assert.Equal(problem is null ? name : "First run", workspace.Runs[0].Name);
    }

    private static ResultsState Of(OneStudy workspace) => new(workspace, workspace, workspace);
}
