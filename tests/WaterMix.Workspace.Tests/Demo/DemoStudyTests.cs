using System.Text;
using Microsoft.Extensions.DependencyInjection;
using WaterMix.Workspace.Demo;
using WaterMix.Workspace.Runs;
using WaterMix.Workspace.Studies;

namespace WaterMix.Workspace.Tests.Demo;

public class DemoStudyTests
{
    [Fact]
    public async Task Ensure_ANewFolder_HasAFinishedRun()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);

        Guid? id = await DemoStudy.EnsureAsync(workspace.Get<IServiceProvider>(), TestContext.Current.CancellationToken);

        Study study = (await workspace.Studies.FindAsync(id!.Value))!;
        Run run = await workspace.EndOfAsync(study.Runs.Single().Id);
        Assert.Equal((RunState.Finished, 832L), (run.State, run.Done));
        Assert.Equal(Halcyon.Model, study.Draft);
        Assert.Equal(
            CommandText(),
            Encoding.UTF8.GetString(await workspace.CsvAsync(run.Id)));
    }

    [Fact]
    public async Task Ensure_AFolderThatHadAStudy_AddsNothing()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        await workspace.Studies.DeleteAsync(await workspace.Studies.CreateAsync("a"));

        Assert.Null(await DemoStudy.EnsureAsync(workspace.Get<IServiceProvider>(), TestContext.Current.CancellationToken));
        Assert.Empty(await workspace.Studies.ListAsync());
    }

    [Fact]
    public async Task Ensure_BeforeTheAppHasStarted_LeavesTheRunForLater()
    {
        using var scratch = new Scratch();
        await using (ServiceProvider services = new ServiceCollection().AddLogging().AddWaterMixWorkspace(scratch.Folder).BuildServiceProvider())
        {
            Assert.NotNull(await DemoStudy.EnsureAsync(services, TestContext.Current.CancellationToken));
        }

        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Study study = (await workspace.Studies.FindAsync((await workspace.Studies.ListAsync()).Single().Id))!;
        Assert.Equal(RunState.Finished, (await workspace.EndOfAsync(study.Runs.Single().Id)).State);
    }

    [Fact]
    public void InventedOcean_CarriesTheFilesOfSampleData()
    {
        Assert.Contains("casts/halcyon_00004_00001_ct1.csv", InventedOcean.Names);
        Assert.All(InventedOcean.Names, name => Assert.Equal(OpenWorkspace.Sample(name), InventedOcean.Read(name)));
        Assert.Throws<ArgumentException>(() => InventedOcean.Open("../secret"));
    }

    private static string CommandText() => Encoding.UTF8.GetString(Runs.CommandLineCsv.Of(Halcyon.Model, ("halcyon_hy1.csv", OpenWorkspace.Sample("halcyon_hy1.csv"))));
}
