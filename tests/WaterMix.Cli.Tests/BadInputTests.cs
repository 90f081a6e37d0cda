using System.Text;

namespace WaterMix.Cli.Tests;

/// <summary>Whatever is wrong with an input, the command says what was expected, what was found and what to do, writes nothing and returns 2.</summary>
public class BadInputTests
{
    private const string Header = SmallModel.Header;
    private const string Row = SmallModel.Row;
    private const string Model = SmallModel.Json;

    public static TheoryData<string, string, string> Samples => new()
    {
        { "empty", "", "empty" },
        { "header only", Header + "\n", "row" },
        { "wrong delimiter", $"{Header}\n{Row}\n".Replace(',', ';'), "delimiter" },
        { "decimal commas", $"{Header.Replace(',', ';')}\n{Row.Replace(',', ';').Replace('.', ',')}\n", "delimiter" },
        { "decimal commas in quotes", $"{Header}\n1,2000,\"3,5\",\"34,95\",\"270,1\",18,1.2,15\n", "decimal" },
        { "repeated header", $"{Header},oxygen\n{Row},271\n", "oxygen" },
        { "rows of other lengths", $"{Header}\n{Row}\n{Row},99,99\n", "line 3" },
        { "no tracer present", "station,pressure\n1,2000\n", "potential_temperature" },
        { "all values missing", $"{Header}\n1,2000,3.5,34.95,-999,18,1.2,15\n2,2000,3.5,34.95,,18,1.2,15\n", "oxygen" },
        { "all values flagged bad", $"{Header},oxygen_flag\n{Row},4\n", "oxygen" },
        { "exchange cut off", "BOTTLE,20200101AAA\nSTNNBR,CTDPRS,CTDTMP,SALNTY,OXYGEN\n,DBAR,ITS-90,PSS-78,UMOL/KG\n1,2000,3.5,34.95,270\n", "END_DATA" },
        { "unknown unit of a used column", "pressure,potential_temperature,practical_salinity,oxygen [furlongs]\n2000,3.5,34.95,270\n", "furlongs" },
        { "ambiguous column", "pressure,potential_temperature,practical_salinity,O2,Oxygen\n2000,3.5,34.95,270,271\n", "--columns" },
    };

    public static TheoryData<string, string, string, string> Models => new()
    {
        { "unknown key", "\"massConservation\"", "\"massconservation\": 1, \"massConservation\"", "/massconservation" },
        { "unknown key in a set", "\"version\": 1", "\"version\": 1, \"colour\": \"red\"", "/endMembers/colour" },
        { "duplicate ids", "\"id\": \"B\"", "\"id\": \"a\"", "/endMembers/endMembers/1/id" },
        { "tracer that no end-member has", "\"practical_salinity\", \"oxygen\"]", "\"practical_salinity\", \"nitrate\"]", "nitrate" },
        { "zero error", "\"oxygen\": 2 }", "\"oxygen\": 0 }", "/fit/measurementSd/oxygen" },
        { "negative error", "\"oxygen\": 2 }", "\"oxygen\": -2 }", "/fit/measurementSd/oxygen" },
        { "no error", ", \"oxygen\": 2 }", " }", "measurementSd" },
        { "layer naming an absent source", "\"massConservation\"", "\"layers\": [{ \"id\": \"l\", \"endMembers\": [\"A\", \"C\"], \"where\": [] }], \"massConservation\"", "/layers/0/endMembers/1" },
        { "in-situ temperature", "[\"potential_temperature\"", "[\"in_situ_temperature\"", "in_situ_temperature" },
        { "density", "[\"potential_temperature\"", "[\"sigma0\"", "sigma0" },
        { "mixed pairs", "[\"potential_temperature\"", "[\"conservative_temperature\"", "conservative_temperature" },
        { "NaN", "\"oxygen\": 285", "\"oxygen\": NaN", "line" },
        { "infinity", "\"oxygen\": 285", "\"oxygen\": 1e999", "oxygen" },
        { "text for a number", "\"oxygen\": 285", "\"oxygen\": \"285\"", "oxygen" },
        { "cut off", "\"massConservation\": { \"kind\": \"exact\" }\n}", "", "line" },
        { "unknown schema", "watermix/mixing-model/1", "watermix/mixing-model/9", "/schema" },
        { "zero weight of mass", "\"exact\"", "\"weighted\", \"weight\": 0", "weight" },
    };

    [Theory]
    [MemberData(nameof(Samples))]
    public void Solve_UnusableSamples_AreRefused(string what, string text, string named)
    {
        using var scratch = new Scratch();
        string samples = scratch.Write("samples.csv", text);
        string model = scratch.Write("m.mixmodel.json", Model);

        CommandRun run = CommandRun.Of("solve", samples, "--model", model, "--out", scratch.Path("r.csv"));

        run.AssertNotUsable(scratch.Path("r.csv"));
        Assert.True(run.Error.Contains(named, StringComparison.Ordinal), $"{what}: {run.Error}");
    }

    [Fact]
    public void Solve_UnusableBytes_AreRefused()
    {
        using var scratch = new Scratch();
        string model = scratch.Write("m.mixmodel.json", Model);
        byte[] binary = new byte[5000];
        new Random(1).NextBytes(binary);
        string[] files =
        [
            scratch.Write("binary.csv", binary),
            scratch.Write("utf8.csv", [.. Encoding.UTF8.GetBytes(Header + "\n"), .. Encoding.Latin1.GetBytes("Übersee,2000,3.5,34.95,270,18,1.2,15\n")]),
            scratch.Write("long.csv", $"{Header}\n{new string('1', 12_000_000)}\n"),
            scratch.Write("notazip.zip", binary),
            scratch.Path("absent.csv"),
        ];

        foreach (string file in files)
        {
            CommandRun run = CommandRun.Of("solve", file, "--model", model, "--out", scratch.Path("r.csv"));
            run.AssertNotUsable(scratch.Path("r.csv"));
            Assert.Contains(Path.GetFileName(file), run.Error, StringComparison.Ordinal);
        }
    }

    [Theory]
    [MemberData(nameof(Models))]
    public void Solve_UnusableModel_IsRefused(string what, string from, string to, string named)
    {
        using var scratch = new Scratch();
        Assert.Contains(from, Model, StringComparison.Ordinal);
        string samples = scratch.Write("samples.csv", $"{Header}\n{Row}\n");
        string model = scratch.Write("m.mixmodel.json", Model.Replace(from, to, StringComparison.Ordinal));

        CommandRun run = CommandRun.Of("solve", samples, "--model", model, "--out", scratch.Path("r.csv"));

        run.AssertNotUsable(scratch.Path("r.csv"));
        Assert.True(run.Error.Contains(named, StringComparison.Ordinal), $"{what}: {run.Error}");
    }

    [Theory]
    [InlineData("\"weights\": { \"potential_temperature\": 1, \"practical_salinity\": 1 }", "oxygen")]
    [InlineData("\"weights\": { \"potential_temperature\": 1, \"practical_salinity\": 1, \"oxygen\": 0 }", "/fit/weights/oxygen")]
    [InlineData("\"weights\": { \"potential_temperature\": 1, \"practical_salinity\": 1, \"oxygen\": -3 }", "/fit/weights/oxygen")]
    public void Solve_UnusableWeights_AreRefused(string weights, string named)
    {
        using var scratch = new Scratch();
        int start = Model.IndexOf("\"fit\"", StringComparison.Ordinal);
        int end = Model.IndexOf("\"massConservation\"", StringComparison.Ordinal);
        string model = scratch.Write("m.mixmodel.json", $"{Model[..start]}\"fit\": {{ \"kind\": \"weighted-rows\", {weights} }},{Model[end..]}");
        string samples = scratch.Write("samples.csv", $"{Header}\n{Row}\n");

        CommandRun run = CommandRun.Of("solve", samples, "--model", model, "--out", scratch.Path("r.csv"));

        run.AssertNotUsable(scratch.Path("r.csv"));
        Assert.Contains(named, run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void Solve_SeveralThingsWrong_NamesThemAll()
    {
        using var scratch = new Scratch();
        string samples = scratch.Write("samples.csv", "station,pressure\n");
        string model = scratch.Write("m.mixmodel.json", Model
            .Replace("\"version\": 1", "\"version\": 1, \"colour\": \"red\"", StringComparison.Ordinal)
            .Replace("\"oxygen\": 2 }", "\"oxygen\": 0 }", StringComparison.Ordinal));

        CommandRun run = CommandRun.Of("solve", samples, "--model", model, "--out", scratch.Path("r.csv"));

        run.AssertNotUsable(scratch.Path("r.csv"));
        Assert.Contains("/endMembers/colour", run.Error, StringComparison.Ordinal);
        Assert.Contains("/fit/measurementSd/oxygen", run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void Solve_RefusedInput_LeavesAnEarlierResultAlone()
    {
        using var scratch = new Scratch();
        string model = scratch.Write("m.mixmodel.json", Model);
        string samples = scratch.Write("samples.csv", "");
        string result = scratch.Write("r.csv", "kept");

        Assert.Equal(2, CommandRun.Of("solve", samples, "--model", model, "--out", result).ExitCode);

        Assert.Equal("kept", File.ReadAllText(result));
    }

    [Fact]
    public void Solve_OneBadCell_IsAMissingValueAndAFinding()
    {
        using var scratch = new Scratch();
        string model = scratch.Write("m.mixmodel.json", Model);
        string samples = scratch.Write("samples.csv", $"{Header}\n{Row}\n2,2000,3.5,34.95,n.d.,18,1.2,15\n3,2000,3.5,34.95,<0.02,18,1.2,15\n");

        CommandRun run = CommandRun.Of("solve", samples, "--model", model);
        ResultTable table = ResultTable.Parse(run.Output);

        Assert.Equal(0, run.ExitCode);
        Assert.Equal(["3", "2", "2"], Enumerable.Range(0, 3).Select(row => table.Text(row, "tracers")));
        Assert.Contains("n.d.", run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void Solve_IdenticalEndMembers_IsAFindingAndNotUnique()
    {
        using var scratch = new Scratch();
        string model = scratch.Write("m.mixmodel.json", Model.Replace(
            "\"potential_temperature\": -0.4, \"practical_salinity\": 34.66, \"oxygen\": 240, \"silicate\": 121",
            "\"potential_temperature\": 3, \"practical_salinity\": 34.9, \"oxygen\": 285, \"silicate\": 10",
            StringComparison.Ordinal));
        string samples = scratch.Write("samples.csv", $"{Header}\n{Row}\n");

        CommandRun run = CommandRun.Of("solve", samples, "--model", model);

        Assert.Equal(0, run.ExitCode);
        Assert.Equal("not-unique", ResultTable.Parse(run.Output).Text(0, "status"));
        Assert.Contains("warning: ", run.Error, StringComparison.Ordinal);
    }
}
