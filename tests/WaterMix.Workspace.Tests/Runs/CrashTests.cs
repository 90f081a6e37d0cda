using System.Diagnostics;
using WaterMix.Workspace.Runs;
using WaterMix.Workspace.Studies;

namespace WaterMix.Workspace.Tests.Runs;

/// <summary>A process that is killed in the middle of a run: this test assembly plays the app in a process of its own.</summary>
public class CrashTests
{
    private const string FolderVariable = "WATERMIX_CRASH_FOLDER";

    [Fact]
    public async Task Killed_InTheMiddleOfARun_GoesOnAndEndsWithTheSameBytes()
    {
        using var scratch = new Scratch();
        var start = new ProcessStartInfo("dotnet", [typeof(CrashTests).Assembly.Location, "-method", $"*.{nameof(CrashTests)}.{nameof(Run_InChunksOfFourRows_Finishes)}"])
        {
            RedirectStandardOutput = true,
        };
        start.Environment[FolderVariable] = scratch.Folder;
        using (var victim = Process.Start(start)!)
        {
            _ = victim.StandardOutput.ReadToEndAsync(TestContext.Current.CancellationToken);
            while (ChunksDone(scratch) < 10)
            {
                Assert.False(victim.HasExited, "The process ended by itself.");
                await Task.Delay(5, TestContext.Current.CancellationToken);
            }

            victim.Kill(entireProcessTree: true);
            await victim.WaitForExitAsync(TestContext.Current.CancellationToken);
        }

        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Study study = (await workspace.Studies.FindAsync((await workspace.Studies.ListAsync()).Single().Id))!;
        Run interrupted = study.Runs.Single();
        Assert.True(interrupted.State is RunState.Waiting or RunState.Running);
        Assert.InRange(interrupted.Done, 1, interrupted.Total - 1);
        Assert.Equal(RunState.Finished, (await workspace.EndOfAsync(interrupted.Id)).State);
        Assert.Equal(interrupted.Total, (await workspace.Runs.FindAsync(interrupted.Id))!.Done);

        Guid whole = await workspace.Runs.StartAsync(study.Id, "whole");
        await workspace.EndOfAsync(whole);
        Assert.Equal(await workspace.CsvAsync(whole), await workspace.CsvAsync(interrupted.Id));
    }

    /// <summary>The test above starts this one in a process of its own, with a folder to work in, and kills it.</summary>
    [Fact]
    public async Task Run_InChunksOfFourRows_Finishes()
    {
        using var scratch = new Scratch();
        string folder = Environment.GetEnvironmentVariable(FolderVariable) ?? scratch.Folder;
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(folder, new WorkspaceOptions { ChunkRows = 4 });
        Guid study = await RunServiceTests.HalcyonStudyAsync(workspace);

        Run run = await workspace.EndOfAsync(await workspace.Runs.StartAsync(study, "interrupted"));

        Assert.Equal((RunState.Finished, run.Total), (run.State, run.Done));
    }

    private static int ChunksDone(Scratch scratch) => Directory.Exists(scratch.Path("runs"))
        ? Directory.GetFiles(scratch.Path("runs"), "*.parquet", SearchOption.AllDirectories).Length
        : 0;
}
