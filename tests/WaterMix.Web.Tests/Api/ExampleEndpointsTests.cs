using System.Net;
using System.Text.Json;
using WaterMix.Formats.Reading;

namespace WaterMix.Web.Tests.Api;

public sealed class ExampleEndpointsTests(RunningApp app)
{
    [Theory]
    [InlineData("exchange-bottle")]
    [InlineData("exchange-ctd")]
    [InlineData("csv")]
    public async Task Example_OfEachFormat_ReadsWithoutAnError(string name)
    {
        using HttpClient client = app.CreateClient();
        byte[] file = await client.GetByteArrayAsync($"/api/examples/{name}", TestContext.Current.CancellationToken);

        using OpenedSamples samples = SampleReader.Open([new InputFile("example.csv", () => new MemoryStream(file))], new ReadingOptions());
        long rows = samples.ReadBlocks(TestContext.Current.CancellationToken).Sum(b => (long)b.Table.RowCount);

        Assert.False(samples.HasErrors, string.Join("\n", samples.Findings));
        Assert.Equal(name, Assert.Single(samples.Report.Files).Format);
        Assert.InRange(rows, 10, 100);
    }

    [Fact]
    public async Task Example_OfAnUnknownFormat_NamesThoseThereAre()
    {
        using HttpClient client = app.CreateClient();
        using HttpResponseMessage answer = await client.GetAsync("/api/examples/xlsx", TestContext.Current.CancellationToken);

        Assert.Equal(HttpStatusCode.NotFound, answer.StatusCode);
        Assert.Contains("exchange-bottle, exchange-ctd and csv", await answer.ProblemAsync(), StringComparison.Ordinal);
    }

    [Fact]
    public async Task OpenApi_Description_ListsEveryEndpoint()
    {
        using HttpClient client = app.CreateClient();
        JsonElement description = await client.JsonAsync("/openapi/v1.json");

        Assert.StartsWith("3.", description.GetProperty("openapi").GetString(), StringComparison.Ordinal);
        string[] paths = [.. description.GetProperty("paths").EnumerateObject().Select(p => p.Name)];
        Assert.Equal(
            [
                "/api/examples/{format}", "/api/inspect", "/api/runs/{id}", "/api/runs/{id}/columns", "/api/runs/{id}/endmembers.json", "/api/runs/{id}/model.json", "/api/runs/{id}/results.csv",
                "/api/samples/{hash}/columns", "/api/solve", "/api/studies", "/api/studies/{id}", "/api/studies/{id}/endmembers.json", "/api/studies/{id}/model.json",
            ],
            paths.Order(StringComparer.Ordinal));
    }
}
