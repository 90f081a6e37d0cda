using System.Net;
using System.Text;
using System.Text.Json;
using WaterMix.Core.Mixing;
using WaterMix.Formats.MixingModels;
using WaterMix.Formats.Reading;
using WaterMix.Formats.Results;
using WaterMix.Workspace.Demo;

namespace WaterMix.Web.Tests.Api;

public sealed class SolveEndpointTests(RunningApp app, SmallUploadsApp small)
{
    private static readonly (string, string, byte[]) Samples = ("samples", "halcyon_hy1.csv", InventedOcean.Read("halcyon_hy1.csv"));
    private static readonly (string, string, byte[]) Model = ("model", "halcyon.mixmodel.json", InventedOcean.Read("halcyon.mixmodel.json"));
    private static readonly (string, string, byte[]) Set = ("endMembers", "halcyon.endmembers.json", InventedOcean.Read("halcyon.endmembers.json"));

    // Agreement: what the library writes for the same files, which is what the command line writes.
    [Fact]
    public async Task Solve_CruiseModelAndSet_AnswersTheCommandLinesBytes()
    {
        using HttpResponseMessage answer = await PostAsync("/api/solve", Samples, Model, Set);

        Assert.Equal(HttpStatusCode.OK, answer.StatusCode);
        Assert.Equal("text/csv", answer.Content.Headers.ContentType?.MediaType);
        Assert.Equal(Expected(), await answer.Content.ReadAsStringAsync(TestContext.Current.CancellationToken));
        Assert.Empty(Directory.EnumerateFileSystemEntries(Path.Combine(app.DataFolder, "scratch")));
    }

    [Fact]
    public async Task Solve_SetMissing_NamesItAsAFinding()
    {
        using HttpResponseMessage answer = await PostAsync("/api/solve", Samples, Model);

        Assert.Equal(HttpStatusCode.UnprocessableEntity, answer.StatusCode);
        JsonElement finding = Assert.Single((await answer.JsonAsync()).GetProperty("findings").EnumerateArray());
        Assert.Equal("/endMembers/file", finding.GetProperty("path").GetString());
        Assert.Contains("halcyon.endmembers.json", finding.GetProperty("found").GetString(), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Solve_SeveralFaults_ListsThemAll()
    {
        using HttpResponseMessage answer = await PostAsync(
            "/api/solve?acceptFlags=2,x&laboratoryTemperature=99", ("samples", "a.csv", "nothing\n1\n"u8.ToArray()), ("model", "m.json", "{}"u8.ToArray()));

        Assert.Equal(HttpStatusCode.UnprocessableEntity, answer.StatusCode);
        JsonElement[] findings = [.. (await answer.JsonAsync()).GetProperty("findings").EnumerateArray()];
        Assert.Contains(findings, f => f.GetProperty("file").GetString() == "a.csv");
        Assert.Contains(findings, f => f.GetProperty("file").GetString() == "m.json");
        Assert.Contains(findings, f => f.GetProperty("expected").GetString()!.StartsWith("acceptFlags", StringComparison.Ordinal));
        Assert.Contains(findings, f => f.GetProperty("expected").GetString()!.StartsWith("laboratoryTemperature", StringComparison.Ordinal));
    }

    [Fact]
    public async Task Solve_CutOffFile_AnswersNoHalfResult()
    {
        byte[] cut = Encoding.UTF8.GetBytes(Encoding.UTF8.GetString(Samples.Item3).Replace("END_DATA", "", StringComparison.Ordinal));

        using HttpResponseMessage answer = await PostAsync("/api/solve", ("samples", "halcyon_hy1.csv", cut), Model, Set);

        Assert.Equal(HttpStatusCode.UnprocessableEntity, answer.StatusCode);
        Assert.Contains("END_DATA", await answer.ProblemAsync(), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Solve_UnknownField_RefusedWithTheFieldsThereAre()
    {
        using HttpResponseMessage answer = await PostAsync("/api/solve", ("sample", "a.csv", [1]));

        Assert.Equal(HttpStatusCode.BadRequest, answer.StatusCode);
        Assert.Contains("samples, model, endMembers, columns", await answer.ProblemAsync(), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Solve_NoForm_RefusedWithASentence()
    {
        using HttpClient client = app.CreateClient();
        using var content = new StringContent("x");
        using HttpResponseMessage answer = await client.PostAsync("/api/solve", content, TestContext.Current.CancellationToken);

        Assert.Equal(HttpStatusCode.UnsupportedMediaType, answer.StatusCode);
        Assert.Contains("multipart", await answer.ProblemAsync(), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Solve_LargerThanTheLimit_RefusedWithTheLimit()
    {
        using HttpClient client = small.App.CreateClient();
        using MultipartFormDataContent form = Answers.Form(("samples", "a.csv", new byte[2 << 20]));
        using HttpResponseMessage answer = await client.PostAsync("/api/solve", form, TestContext.Current.CancellationToken);

        Assert.Equal(HttpStatusCode.RequestEntityTooLarge, answer.StatusCode);
        Assert.Contains("1 MB", await answer.ProblemAsync(), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Inspect_Cruise_AnswersTheReport()
    {
        using HttpResponseMessage answer = await PostAsync("/api/inspect", Samples);

        Assert.Equal(HttpStatusCode.OK, answer.StatusCode);
        JsonElement report = await answer.JsonAsync();
        Assert.Equal(832, report.GetProperty("rows").GetInt64()); // sample-data/README.md
        Assert.Equal("exchange-bottle", report.GetProperty("files")[0].GetProperty("format").GetString());
    }

    private async Task<HttpResponseMessage> PostAsync(string address, params (string, string, byte[])[] files)
    {
        using HttpClient client = app.CreateClient();
        using MultipartFormDataContent form = Answers.Form(files);
        return await client.PostAsync(address, form, TestContext.Current.CancellationToken);
    }

    private static string Expected()
    {
        PreparedModel model = PreparedModel.From(MixingModelFile.Read(Model.Item3, "m", _ => (Set.Item3, "s")).Value!);
        using OpenedSamples samples = SampleReader.Open(
            [new InputFile("halcyon_hy1.csv", () => new MemoryStream(Samples.Item3))], new ReadingOptions { NeededQuantities = model.InputIds });
        using var csv = new MemoryStream();
        StreamedSolve.Run(samples, model, new SolveOptions(), csv, null);
        return Encoding.UTF8.GetString(csv.ToArray());
    }
}
