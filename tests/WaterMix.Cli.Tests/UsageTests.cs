namespace WaterMix.Cli.Tests;

/// <summary>A command line that cannot be meant ends with status 1 and words on the error stream; the standard output is for results.</summary>
public class UsageTests
{
    public static TheoryData<string[], string> WrongLines => new()
    {
        { [], "watermix: nothing was done; 'watermix --help' shows the usage." },
        { ["slove", "s.csv"], "solve" },
        { ["solve"], "watermix: nothing was done; 'watermix solve --help' shows the usage." },
        { ["solve", "s.csv"], "--model" },
        { ["solve", "s.csv", "--model", "m.json", "--draws", "10"], "unknown option '--draws'." },
        { ["solve", "s.csv", "--model", "m.json", "-x"], "unknown option '-x'." },
        { ["solve", "s.csv", "--model", "m.json", "--thread=3"], "unknown option '--thread'. Did you mean \"--threads\"?" },
        { ["convert-set", "--set", "--pair", "conservative", "--out", "n.json"], "unknown option '--set'." },
        { ["convert-set", "s.json", "--pair", "conservative", "--out", ""], "--out: expected the name of the file to write; found an empty name." },
        { ["inspect", "s.csv", "--save-columns", ""], "--save-columns: expected the name of the file to write; found an empty name." },
        { ["convert", "s.csv", "--out", ""], "--out: expected the name of the file to write; found an empty name." },
    };

    [Theory]
    [MemberData(nameof(WrongLines))]
    public void Command_WrongLine_ExplainsOnTheErrorStreamOnly(string[] line, string said)
    {
        CommandRun run = CommandRun.Of(line);

        run.AssertRefused();
        Assert.Contains(said, run.Error, StringComparison.Ordinal);
        Assert.DoesNotContain("(Parameter", run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void Command_Help_GoesToTheStandardOutput()
    {
        CommandRun run = CommandRun.Of("solve", "--help");

        Assert.Equal((0, ""), (run.ExitCode, run.Error));
        Assert.Contains("--model", run.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Solve_FileWhoseNameBeginsLikeAnOption_IsRead()
    {
        using var scratch = new Scratch();
        string model = scratch.Write("m.mixmodel.json", SmallModel.Json);
        scratch.Write("-x.csv", SmallModel.Samples);

        CommandRun run = CommandRun.In(scratch.Path(""), "solve", "-x.csv", "--model", model);

        Assert.True(run.ExitCode == 0, run.Error);
        Assert.Equal("solved", ResultTable.Parse(run.Output).Text(0, "status"));
    }

    [Theory]
    [InlineData("a sample file", "solve", "", "--model", "MODEL")]
    [InlineData("the mixing model", "solve", "SAMPLES", "--model", "")]
    [InlineData("the column match", "solve", "SAMPLES", "--model", "MODEL", "--columns", "")]
    [InlineData("the end-member set", "convert-set", "", "--pair", "conservative", "--out", "OUT")]
    public void Command_EmptyNameOfAnInput_IsAFinding(string what, params string[] line)
    {
        using var scratch = new Scratch();
        var names = new Dictionary<string, string>
        {
            ["MODEL"] = scratch.Write("m.mixmodel.json", SmallModel.Json),
            ["SAMPLES"] = scratch.Write("s.csv", SmallModel.Samples),
            ["OUT"] = scratch.Path("out"),
        };

        CommandRun run = CommandRun.Of([.. line.Select(word => names.GetValueOrDefault(word, word))]);

        run.AssertNotUsable(scratch.Path("out"));
        Assert.Contains($"expected the name of {what}; found an empty name.", run.Error, StringComparison.Ordinal);
    }

    // Any exception that nobody foresaw: here a standard output that throws one.
    [Fact]
    public void Command_FaultOfTheProgram_IsOneSentenceToReport()
    {
        using var scratch = new Scratch();
        string samples = scratch.Write("my samples.csv", SmallModel.Samples);

        CommandRun run = CommandRun.WithVariable("DOTNET_STARTUP_HOOKS", typeof(UsageTests).Assembly.Location, "inspect", samples);

        Assert.Equal((1, ""), (run.ExitCode, run.Output));
        Assert.Equal(
            "watermix: stopped by a fault of the program, and nothing was written; please report this command and this message to whoever maintains the program: "
            + $"watermix inspect \"{samples}\": InvalidOperationException: No writer today. Nor tomorrow.",
            run.Error.TrimEnd());
    }
}
