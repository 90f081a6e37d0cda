using System.Text.Json;
using WaterMix.Testing;

namespace WaterMix.Cli.Tests;

public class InspectCommandTests
{
    private static readonly string Cruise = Path.Combine(TestData.Root, "sample-data", "halcyon_hy1.csv");

    [Fact]
    public void Inspect_Text_NamesFormatColumnsUnitsAndFlags()
    {
        CommandRun run = CommandRun.Of("inspect", Cruise);

        Assert.Equal(0, run.ExitCode);
        Assert.Contains("832 samples from 1 file", run.Output, StringComparison.Ordinal);
        Assert.Contains("halcyon_hy1.csv: exchange-bottle, 832 rows", run.Output, StringComparison.Ordinal);
        Assert.Matches("practical_salinity +\\[1\\] from SALNTY, CTDSAL .*from the bottle, .*from the CTD", run.Output);
    }

    [Fact]
    public void Inspect_Json_HoldsTheReport()
    {
        CommandRun run = CommandRun.Of("inspect", Cruise, "--json");
        using JsonDocument report = JsonDocument.Parse(run.Output);
        JsonElement root = report.RootElement;

        Assert.Equal(832, root.GetProperty("rows").GetInt64());
        Assert.Equal("exchange-bottle", root.GetProperty("files")[0].GetProperty("format").GetString());
        JsonElement oxygen = root.GetProperty("columns").EnumerateArray().Single(c => c.GetProperty("id").GetString() == "oxygen");
        Assert.Equal("umol/kg", oxygen.GetProperty("unit").GetString());
        Assert.True(oxygen.GetProperty("flags").GetProperty("2").GetInt64() > 700);
        Assert.Contains(root.GetProperty("findings").EnumerateArray(), f => f.GetProperty("severity").GetString() == "warning");
    }

    [Fact]
    public void Inspect_SavedColumns_AreReadBackAndChangeNothing()
    {
        using var scratch = new Scratch();
        string match = scratch.Path("match.json");

        CommandRun guessed = CommandRun.Of("inspect", Cruise, "--save-columns", match);
        CommandRun reused = CommandRun.Of("convert", Cruise, "--columns", match, "--out", scratch.Path("reused.csv"));
        CommandRun direct = CommandRun.Of("convert", Cruise, "--out", scratch.Path("direct.csv"));

        Assert.Equal(0, guessed.ExitCode + reused.ExitCode + direct.ExitCode);
        Assert.Equal(File.ReadAllBytes(scratch.Path("direct.csv")), File.ReadAllBytes(scratch.Path("reused.csv")));
    }

    [Fact]
    public void Inspect_UnusableFile_PrintsTheReportAndReturnsTwo()
    {
        using var scratch = new Scratch();

        CommandRun run = CommandRun.Of("inspect", scratch.Write("empty.csv", ""));

        Assert.Equal(2, run.ExitCode);
        Assert.Contains("error: empty.csv", run.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Inspect_UnknownKeyInTheColumnMatch_IsRefusedWithItsPath()
    {
        using var scratch = new Scratch();
        string match = scratch.Write("match.json", "{ \"schema\": \"watermix/column-match/1\", \"columns\": [ { \"column\": \"x\", \"quantite\": \"oxygen\" } ] }");

        CommandRun run = CommandRun.Of("inspect", Cruise, "--columns", match);

        Assert.Equal(2, run.ExitCode);
        Assert.Contains("/columns/0/quantite", run.Error, StringComparison.Ordinal);
    }
}
