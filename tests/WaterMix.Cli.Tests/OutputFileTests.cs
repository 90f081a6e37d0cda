using System.Text;

namespace WaterMix.Cli.Tests;

/// <summary>An output appears whole or not at all, and never in place of what was read.</summary>
public sealed class OutputFileTests : IDisposable
{
    private readonly Scratch _scratch = new();
    private readonly string _model;
    private readonly string _samples;
    private readonly string _match;

    public OutputFileTests()
    {
        _model = _scratch.Write("model.csv", SmallModel.Json);
        _samples = _scratch.Write("samples.csv", SmallModel.Samples);
        _match = _scratch.Write("match.csv", "{ \"schema\": \"watermix/column-match/1\", \"columns\": [] }");
        Directory.CreateDirectory(_scratch.Path("folder"));
        Directory.CreateSymbolicLink(_scratch.Path("linked"), _scratch.Path(""));
    }

    public void Dispose() => _scratch.Dispose();

    [Theory]
    [InlineData("samples.csv")]
    [InlineData("model.csv")]
    [InlineData("match.csv")]
    [InlineData("folder/../samples.csv")]
    [InlineData("linked/samples.csv")]
    public void Solve_OutputThatIsAnInput_IsRefusedAndTheInputKept(string output)
    {
        string path = _scratch.Path(output);
        byte[] before = File.ReadAllBytes(path);

        CommandRun run = CommandRun.Of("solve", _samples, "--model", _model, "--columns", _match, "--out", path);

        run.AssertRefused();
        Assert.Contains($"found '{path}', which is the input '", run.Error, StringComparison.Ordinal);
        Assert.Contains("Give the output another name.", run.Error, StringComparison.Ordinal);
        Assert.Equal(before, File.ReadAllBytes(path));
    }

    [Fact]
    public void OtherCommands_OutputThatIsAnInput_AreRefused()
    {
        CommandRun.Of("convert", _samples, "--out", _samples).AssertRefused();
        CommandRun.Of("inspect", _samples, "--columns", _match, "--save-columns", _match).AssertRefused();
        CommandRun.Of("convert-set", _model, "--pair", "conservative", "--out", _model).AssertRefused();

        Assert.Equal((SmallModel.Samples, SmallModel.Json), (File.ReadAllText(_samples), File.ReadAllText(_model)));
    }

    [Fact]
    public void Solve_OutputThatIsAFolder_IsRefused()
    {
        Directory.CreateDirectory(_scratch.Path("r.csv"));

        CommandRun run = CommandRun.Of("solve", _samples, "--model", _model, "--out", _scratch.Path("r.csv"));

        run.AssertRefused();
        Assert.Contains("which is a folder", run.Error, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("solve", "SAMPLES", "--model", "MODEL", "--out", "no/such/r.csv")]
    [InlineData("convert", "SAMPLES", "--out", "no/such/r.csv")]
    [InlineData("inspect", "SAMPLES", "--save-columns", "no/such/r.csv")]
    public void Command_FolderThatDoesNotExist_NamesTheOutputAsGiven(params string[] line)
    {
        CommandRun run = CommandRun.In(_scratch.Path(""), [.. line.Select(word => word switch { "SAMPLES" => _samples, "MODEL" => _model, _ => word })]);

        Assert.Equal((1, ""), (run.ExitCode, run.Output));
        Assert.Contains("'no/such/r.csv'", run.Error, StringComparison.Ordinal);
        Assert.Contains("Nothing was written", run.Error, StringComparison.Ordinal);
        Assert.DoesNotContain(".unfinished", run.Error, StringComparison.Ordinal);
        Assert.DoesNotContain("   at ", run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void Solve_Interrupted_LeavesNoUnfinishedFile()
    {
        Assert.SkipUnless(OperatingSystem.IsLinux(), "The signal is sent as on Linux.");
        var text = new StringBuilder(SmallModel.Header + "\n");
        for (int i = 0; i < 1_000_000; i++)
        {
            text.Append(SmallModel.Row).Append('\n');
        }

        File.WriteAllText(_samples, text.ToString());
        string result = _scratch.Path("r.csv");

        CommandRun run = CommandRun.Interrupted(
            () => Directory.GetFiles(_scratch.Path(""), "*.unfinished").Length > 0, "solve", _samples, "--model", _model, "--threads", "1", "--out", result);

        Assert.Equal((1, "watermix: interrupted; nothing was written."), (run.ExitCode, run.Error.TrimEnd().Split('\n')[^1]));
        Assert.False(File.Exists(result));
        Assert.Empty(Directory.GetFiles(_scratch.Path(""), "*.unfinished"));
    }

    // A pipe into which nobody writes: the reading of it cannot be called off, but the command ends all the same.
    [Fact]
    public void Solve_InterruptedWhileWaitingForAPipe_Ends()
    {
        Assert.SkipUnless(OperatingSystem.IsLinux(), "The signal is sent as on Linux.");
        DateTime start = DateTime.UtcNow;

        CommandRun run = CommandRun.Interrupted(() => DateTime.UtcNow - start > TimeSpan.FromSeconds(3), "solve", "/dev/stdin", "--model", _model);

        Assert.Equal((1, "", "watermix: interrupted; nothing was written."), (run.ExitCode, run.Output, run.Error.TrimEnd()));
    }
}
