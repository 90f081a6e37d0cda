using System.Globalization;
using WaterMix.Core;
using WaterMix.Core.Mixing;
using WaterMix.Formats.Json;
using WaterMix.Formats.Reading;
using WaterMix.Formats.Results;
using WaterMix.Formats.Tests.Reading;

namespace WaterMix.Formats.Tests.Results;

public class StreamedSolveTests
{
    private const string Row = "7,30,-40,2000,1.3,34.78,255";
    private const string Good = SmallModel.Header + "\n" + Row + "\n";

    [Fact]
    public void Run_Samples_SumsUpWhatBecameOfThem()
    {
        PreparedModel model = SmallModel.Prepare();
        string text = $"{Good}8,30,-40,2000,,,\n9,95,-40,2000,1.3,34.78,255\n";

        (string csv, SolveSummary summary) = SmallModel.Solve(model, new SolveOptions { WithProof = true }, ReadingHelp.File("a.csv", text));

        Assert.Equal(3, summary.Rows);
        Assert.Equal(3, summary.Statuses.Values.Sum());
        Assert.Equal(1, summary.Statuses[SolveStatus.TooFewTracers]);
        Assert.InRange(summary.LargestKktViolation, 0, 1e-9);
        Assert.False(summary.HasErrors);
        Assert.Equal(5, csv.Split('\n').Length);
        using var hash = new SampleHash();
        hash.Add(ReadingHelp.Table(text));
        Assert.Equal(hash.Finish(), summary.SamplesHash);
    }

    // The same seven rows over and over, for more than one block: each time they come out as the first time, only `row` runs on.
    [Fact]
    public void Run_MoreRowsThanABlock_SolvesEachAsInAShortFile()
    {
        string[] rows = [.. Enumerable.Range(0, 7).Select(i => FormattableString.Invariant($"{i},30,-40,{2000 + i},{i * 0.4},34.78,{250 + i}"))];
        int count = SampleBlock.MostRows + 10;
        string text = SmallModel.Header + "\n" + string.Concat(Enumerable.Range(0, count).Select(i => rows[i % 7] + "\n"));
        PreparedModel model = SmallModel.Prepare();

        string[] first = SmallModel.Solve(model, $"{SmallModel.Header}\n{string.Join('\n', rows)}\n").Csv.Split('\n');
        string[] lines = SmallModel.Solve(model, text).Csv.Split('\n');

        Assert.Equal(count + 2, lines.Length);
        Assert.Equal(first[0], lines[0]);
        for (int i = 0; i < count; i++)
        {
            string expected = (i + 1).ToString(CultureInfo.InvariantCulture) + first[(i % 7) + 1][1..];
            Assert.Equal(expected, lines[i + 1]);
        }
    }

    // The contract: the set of columns depends only on model, options and headers.
    [Theory]
    [InlineData(Row)]
    [InlineData(",,,,1.3,34.78,255")]
    [InlineData("7,30,-40,10,1.3,34.78,255")]
    [InlineData("7,95,-40,2000,1.3,34.78,255")]
    [InlineData("7,30,-40,2000,1.3,34.78,255\n8,30,-40,2000,,34.78,255")]
    public void Run_AnyValues_HasTheSameColumns(string rows)
    {
        PreparedModel model = SmallModel.Prepare("""[{ "id": "deep", "endMembers": ["A", "B"], "where": [{ "quantity": "pressure", "atLeast": 1000 }] }]""");
        string expected = SmallModel.Solve(model, Good).Csv.Split('\n')[0];

        string[] lines = SmallModel.Solve(model, $"{SmallModel.Header}\n{rows}\n").Csv.Split('\n');

        Assert.Equal(expected, lines[0]);
    }

    [Fact]
    public void Run_SeveralInputs_NamesTheFileOfEachRow()
    {
        InputFile[] files = [ReadingHelp.File("a.csv", Good), ReadingHelp.File("b.csv", Good + Row + "\n")];

        string[] lines = SmallModel.Solve(SmallModel.Prepare(), new SolveOptions(), files).Csv.Split('\n');

        Assert.StartsWith("file,file_row,row,station,", lines[0], StringComparison.Ordinal);
        Assert.Equal(["a.csv,1,1,7", "b.csv,1,2,7", "b.csv,2,3,7"], lines[1..4].Select(line => line[..line.IndexOf(",30,", StringComparison.Ordinal)]));
    }

    [Fact]
    public void Run_FileCutOff_IsAnErrorFoundAtTheEnd()
    {
        string text = "BOTTLE,20000101TEST\nSTNNBR,CTDPRS,THETA,SALNTY,OXYGEN\n,DBAR,ITS-90,PSS-78,UMOL/KG\n7,2000,1.3,34.78,255\n";
        using OpenedSamples samples = SampleReader.Open([ReadingHelp.File("a_hy1.csv", text)], new ReadingOptions());
        Assert.False(samples.HasErrors);

        SolveSummary summary = StreamedSolve.Run(samples, SmallModel.Prepare(), new SolveOptions(), Stream.Null, null);

        Assert.True(summary.HasErrors);
        Assert.Contains("END_DATA", ReadingHelp.Error(summary.Findings).Expected, StringComparison.Ordinal);
        Assert.Equal(1, summary.Rows);
    }

    [Fact]
    public void Run_NoUsableValueOfATracer_IsAnErrorFoundAtTheEnd()
    {
        SolveSummary summary = SmallModel.Solve(SmallModel.Prepare(), $"{SmallModel.Header},oxygen_flag\n{Row},4\n{Row},3\n").Summary;

        Finding error = ReadingHelp.Error(summary.Findings);
        Assert.StartsWith("at least one usable value of oxygen", error.Expected, StringComparison.Ordinal);
    }

    [Fact]
    public void MissingTracers_NoColumn_NamesEachOne()
    {
        using OpenedSamples samples = SampleReader.Open([ReadingHelp.File("a.csv", "station,pressure,practical_salinity\n7,2000,34.78\n")], new ReadingOptions());

        IReadOnlyList<Finding> missing = StreamedSolve.MissingTracers(samples, SmallModel.Prepare());

        Assert.Equal(
            ["a column of potential_temperature, which the model fits", "a column of oxygen, which the model fits"],
            missing.Select(f => f.Expected));
        Assert.All(missing, f => Assert.Equal(Severity.Error, f.Severity));
    }

    [Theory]
    [InlineData("neutral_density", "teos10")]
    [InlineData("nitrate", "teos10")]
    [InlineData("depth", "teos10")]
    [InlineData("sigma2", "teos10")]
    [InlineData("sigma2", "eos80")]
    public void Run_ConditionOnWhatNoInputHas_IsAWarningThatNamesItsUse(string quantity, string scale)
    {
        string where = $$"""[{ "quantity": "{{quantity}}", "atLeast": 1{{(scale == "eos80" ? ", \"scale\": \"eos80\"" : "")}} }]""";
        string layers = $$"""[{ "id": "deep", "endMembers": ["A", "B"], "where": {{where}} }, { "id": "rest", "endMembers": ["A", "B"] }]""";
        string text = scale == "eos80" ? "station,oxygen,absolute_salinity,potential_temperature\n7,255,34.9,1.3\n" : "station,potential_temperature,practical_salinity,oxygen\n7,1.3,34.78,255\n";

        SolveSummary both = SmallModel.Solve(SmallModel.Prepare(layers, where), text).Summary;
        SolveSummary process = SmallModel.Solve(SmallModel.Prepare(where: where), text).Summary;

        Finding finding = Assert.Single(both.Findings, f => f.Expected.Contains("conditions", StringComparison.Ordinal));
        Assert.Equal((Severity.Warning, $"a column of {quantity}, which the conditions of layer deep, process respiration test"), (finding.Severity, finding.Expected));
        Assert.Equal($"a column of {quantity}, which the conditions of process respiration test", Assert.Single(process.Findings, f => f.Expected.Contains("conditions", StringComparison.Ordinal)).Expected);
    }

    [Theory]
    [InlineData("pressure", "")]
    [InlineData("depth", "")]
    [InlineData("sigma2", "")]
    [InlineData("sigma2", ", \"scale\": \"eos80\"")]
    public void Run_ConditionOnWhatCanBeDerived_SaysNothing(string quantity, string scale)
    {
        string where = $$"""[{ "quantity": "{{quantity}}", "atLeast": 1{{scale}} }]""";

        SolveSummary summary = SmallModel.Solve(SmallModel.Prepare(where: where), Good).Summary;

        Assert.DoesNotContain(summary.Findings, f => f.Expected.Contains("conditions", StringComparison.Ordinal));
    }

    [Fact]
    public void Run_Cancelled_Ends()
    {
        using OpenedSamples samples = SampleReader.Open([ReadingHelp.File("a.csv", Good)], new ReadingOptions());
        using var source = new CancellationTokenSource();
        source.Cancel();

        Assert.ThrowsAny<OperationCanceledException>(() => StreamedSolve.Run(samples, SmallModel.Prepare(), new SolveOptions { Cancellation = source.Token }, Stream.Null, null));
    }
}
