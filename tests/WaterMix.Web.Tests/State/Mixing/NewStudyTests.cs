using Microsoft.Extensions.DependencyInjection;
using WaterMix.Core;
using WaterMix.Core.Mixing;
using WaterMix.Formats.Reading;
using WaterMix.Web.State.EndMembers;
using WaterMix.Web.State.Mixing;
using WaterMix.Workspace.Cruises;
using WaterMix.Workspace.Demo;
using WaterMix.Workspace.Runs;
using WaterMix.Workspace.Studies;

namespace WaterMix.Web.Tests.State.Mixing;

// With the real services over a data folder of its own.
public class NewStudyTests
{
    [Fact]
    public async Task EnsureAsync_ANewStudyWithACruise_BeginsWithTheMaskAndRunsOnceItHasSources()
    {
        await using var app = new RunningApp();
        IStudies studies = app.Services.GetRequiredService<IStudies>();
        ICruises cruises = app.Services.GetRequiredService<ICruises>();
        Guid study = await studies.CreateAsync("New");
        Guid upload = Guid.NewGuid();
        await cruises.ReceiveAsync(upload, "halcyon_hy1.csv", InventedOcean.Open("halcyon_hy1.csv"), TestContext.Current.CancellationToken);
        await cruises.KeepAsync(study, upload, "Cruise", new ReadingOptions(), null, TestContext.Current.CancellationToken);

        using var editor = new DraftEditor(studies, study);
        var samples = new StudySamples(cruises);
        await editor.OpenAsync();
        await samples.ReadAsync(editor.Study!);
        await StartingModel.EnsureAsync(editor, samples);
        Assert.Equal(150, WinterMask.Of((await studies.FindAsync(study))!.Draft));
        Assert.Equal(6, editor.Model.Tracers.Count);

        var desk = new MixingDesk(samples);
        desk.Look(editor.Model);
        Assert.False(desk.CanRun);
        await editor.ReplaceAsync("the set", SetEdits.Replace(editor.Model, InventedCruise.Model.EndMembers));
        desk.Look(editor.Model);
        Assert.DoesNotContain(desk.Findings, f => f.Severity == Severity.Error);
        Assert.True(desk.CanRun);

        Run run = await FinishedAsync(app.Services.GetRequiredService<IRuns>(), study);
        Assert.Equal(desk.Census!.Outside, run.Statuses[SolveStatus.OutsideLayers]);
        Assert.Equal(desk.Census.TooFew, run.Statuses.GetValueOrDefault(SolveStatus.TooFewTracers));

        await editor.UndoAsync();
        await editor.UndoAsync();
        await StartingModel.EnsureAsync(editor, samples);
        Assert.True(StartingModel.IsUntouched(editor.Model));
    }

    private static async Task<Run> FinishedAsync(IRuns runs, Guid study)
    {
        Guid id = await runs.StartAsync(study, "Run 1");
        for (int i = 0; i < 400; i++)
        {
            if (await runs.FindAsync(id) is { State: RunState.Finished } run)
            {
                return run;
            }

            await Task.Delay(50, TestContext.Current.CancellationToken);
        }

        throw new TimeoutException("The run did not finish.");
    }
}
