using WaterMix.Testing;

namespace WaterMix.Cli.Tests;

public class ConvertCommandTests
{
    private static readonly string Data = Path.Combine(TestData.Root, "sample-data");

    private static readonly string Cruise = Path.Combine(Data, "halcyon_hy1.csv");

    [Fact]
    public void Convert_ThenSolve_GivesTheSameResults()
    {
        using var scratch = new Scratch();
        string model = Path.Combine(Data, "halcyon.mixmodel.json");

        CommandRun convert = CommandRun.Of("convert", Cruise, "--out", scratch.Path("tidy.csv"));
        CommandRun again = CommandRun.Of("convert", scratch.Path("tidy.csv"), "--out", scratch.Path("again.csv"));
        CommandRun original = CommandRun.Of("solve", Cruise, "--model", model);
        CommandRun tidy = CommandRun.Of("solve", scratch.Path("tidy.csv"), "--model", model);

        Assert.Equal(0, convert.ExitCode + again.ExitCode + original.ExitCode + tidy.ExitCode);
        Assert.Equal(File.ReadAllText(scratch.Path("tidy.csv")), File.ReadAllText(scratch.Path("again.csv")));
        Assert.Equal(original.Output, tidy.Output);
    }

    // The tidy table keeps both originals, so the preference and the accepted flags act on it as on the file it came from.
    [Fact]
    public void Convert_ThenSolvePreferringTheCtd_GivesTheSameResults()
    {
        using var scratch = new Scratch();
        string text = File.ReadAllText(Path.Combine(Data, "halcyon.mixmodel.json"));
        File.Copy(Path.Combine(Data, "halcyon.endmembers.json"), scratch.Path("halcyon.endmembers.json"));
        string model = scratch.Write("ctd.mixmodel.json", text.Insert(text.IndexOf('{', StringComparison.Ordinal) + 1, " \"samples\": { \"prefer\": \"ctd\" },"));
        CommandRun.Of("convert", Cruise, "--out", scratch.Path("tidy.csv"));

        CommandRun bottle = CommandRun.Of("solve", scratch.Path("tidy.csv"), "--model", Path.Combine(Data, "halcyon.mixmodel.json"));
        CommandRun original = CommandRun.Of("solve", Cruise, "--model", model);
        CommandRun tidy = CommandRun.Of("solve", scratch.Path("tidy.csv"), "--model", model);

        Assert.Equal(0, original.ExitCode + tidy.ExitCode);
        Assert.Equal(original.Output, tidy.Output);
        Assert.NotEqual(bottle.Output, tidy.Output);
    }

    [Fact]
    public void Convert_WithDerived_AddsColumns()
    {
        using var scratch = new Scratch();

        CommandRun run = CommandRun.Of("convert", Cruise, "--out", scratch.Path("tidy.csv"), "--derive", "potential_temperature,sigma2");
        string header = File.ReadLines(scratch.Path("tidy.csv")).First();

        Assert.Equal(0, run.ExitCode);
        Assert.Contains("potential_temperature,potential_temperature_flag", header, StringComparison.Ordinal);
        Assert.Contains("sigma2", header, StringComparison.Ordinal);
    }

    [Fact]
    public void Convert_UnknownDerived_NamesWhatCanBe()
    {
        using var scratch = new Scratch();

        CommandRun run = CommandRun.Of("convert", Cruise, "--out", scratch.Path("tidy.csv"), "--derive", "gold");

        Assert.Equal(1, run.ExitCode);
        Assert.Contains("found 'gold'", run.Error, StringComparison.Ordinal);
        Assert.Contains("sigma0", run.Error, StringComparison.Ordinal);
    }

    // Agreement: TEOS-10 to and fro.
    [Fact]
    public void ConvertSet_ThereAndBack_ReturnsTheValues()
    {
        using var scratch = new Scratch();
        string set = Path.Combine(Data, "halcyon.endmembers.json");

        CommandRun there = CommandRun.Of("convert-set", set, "--pair", "conservative", "--out", scratch.Path("c.json"));
        CommandRun back = CommandRun.Of("convert-set", scratch.Path("c.json"), "--pair", "potential", "--out", scratch.Path("p.json"));

        Assert.Equal(0, there.ExitCode + back.ExitCode);
        Assert.Contains("conservative_temperature", File.ReadAllText(scratch.Path("c.json")), StringComparison.Ordinal);
        Assert.Contains("absolute_salinity", File.ReadAllText(scratch.Path("c.json")), StringComparison.Ordinal);
        Assert.DoesNotContain("conservative", File.ReadAllText(scratch.Path("p.json")), StringComparison.Ordinal);
    }

    [Fact]
    public void ConvertSet_WithoutPosition_IsRefused()
    {
        using var scratch = new Scratch();
        string set = scratch.Write("s.json", """
            { "schema": "watermix/end-member-set/1", "name": "s", "version": 1, "endMembers": [
              { "id": "A", "name": "", "values": { "potential_temperature": 3, "practical_salinity": 34.9 }, "provenance": { "kind": "manual" } } ] }
            """);

        CommandRun run = CommandRun.Of("convert-set", set, "--pair", "conservative", "--out", scratch.Path("c.json"));

        run.AssertNotUsable(scratch.Path("c.json"));
        Assert.Contains("/endMembers/0/position", run.Error, StringComparison.Ordinal);
    }
}
