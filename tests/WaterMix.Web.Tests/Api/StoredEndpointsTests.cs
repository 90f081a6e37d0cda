using System.Globalization;
using System.Net;
using System.Text.Json;
using Microsoft.Extensions.DependencyInjection;
using WaterMix.Core.Samples;
using WaterMix.Core.Seawater;
using WaterMix.Formats.EndMemberSets;
using WaterMix.Formats.MixingModels;
using WaterMix.Workspace.Cruises;
using WaterMix.Workspace.Runs;

namespace WaterMix.Web.Tests.Api;

/// <summary>Studies, runs and columns of the study that a new data folder begins with.</summary>
public sealed class StoredEndpointsTests(RunningApp app)
{
    [Fact]
    public async Task Studies_NewFolder_ListTheInventedCruise()
    {
        using HttpClient client = app.CreateClient();
        JsonElement study = Assert.Single((await client.JsonAsync("/api/studies?search=halcyon")).EnumerateArray());

        Assert.Equal(832, study.GetProperty("sampleCount").GetInt64());
        Assert.Equal(0, (await client.JsonAsync("/api/studies?search=nothing")).GetArrayLength());
    }

    [Fact]
    public async Task Study_ThatIsNotThere_IsAProblem()
    {
        using HttpClient client = app.CreateClient();
        foreach (string address in (string[])["/api/studies/{0}", "/api/studies/{0}/endmembers.json", "/api/runs/{0}", "/api/runs/{0}/results.csv", "/api/runs/{0}/columns?ids=misfit"])
        {
            using HttpResponseMessage answer = await client.GetAsync(string.Format(CultureInfo.InvariantCulture, address, Guid.NewGuid()), TestContext.Current.CancellationToken);

            Assert.Equal(HttpStatusCode.NotFound, answer.StatusCode);
            Assert.StartsWith("There is no", await answer.ProblemAsync(), StringComparison.Ordinal);
        }
    }

    [Fact]
    public async Task StudyFiles_OfTheDraft_ReadBack()
    {
        using HttpClient client = app.CreateClient();
        string id = await StudyAsync(client);
        byte[] set = await client.GetByteArrayAsync($"/api/studies/{id}/endmembers.json", TestContext.Current.CancellationToken);
        byte[] model = await client.GetByteArrayAsync($"/api/studies/{id}/model.json", TestContext.Current.CancellationToken);

        Assert.Equal(5, EndMemberSetFile.Read(set, "set").Value!.EndMembers.Count); // sample-data/README.md: five source waters
        Assert.NotNull(MixingModelFile.Read(model, "model", _ => throw new InvalidOperationException("The set is inline.")).Value);
    }

    [Fact]
    public async Task Run_Finished_GivesResultsModelAndColumns()
    {
        using HttpClient client = app.CreateClient();
        Guid run = await FinishedRunAsync(client);
        CruiseResult result = Assert.Single(await app.Services.GetRequiredService<IRuns>().ResultsAsync(run));

        string csv = await client.GetStringAsync($"/api/runs/{run}/results.csv", TestContext.Current.CancellationToken);
        byte[] model = await client.GetByteArrayAsync($"/api/runs/{run}/model.json", TestContext.Current.CancellationToken);
        using HttpResponseMessage answer = await client.GetAsync($"/api/runs/{run}/columns?ids=fraction_NDW,misfit,status,layer,residual_oxygen,amount_respiration", TestContext.Current.CancellationToken);
        float[][] columns = await answer.ColumnsAsync();

        Assert.Equal(833, csv.Split('\n', StringSplitOptions.RemoveEmptyEntries).Length);
        Assert.Equal(result.Result.Model.Model.Name, MixingModelFile.Read(model, "model", _ => throw new InvalidOperationException("The set is inline.")).Value!.Name);
        int ndw = result.Result.Model.Model.EndMembers.EndMembers.ToList().FindIndex(e => e.Id == "NDW");
        Assert.Equal(result.Result.Fractions[ndw].Select(v => (float)v), columns[0]);
        Assert.Equal(result.Result.Misfit.Select(v => (float)v), columns[1]);
        Assert.Equal(result.Result.Status.Select(s => (float)(int)s), columns[2]);
        Assert.Equal(result.Result.Layer.Select(l => (float)l), columns[3]);
        Assert.Equal(6, columns.Length);
        Assert.Contains(columns[5], v => v > 0);
    }

    [Fact]
    public async Task Run_Cancelled_HasNoResultsAndSaysSo()
    {
        using HttpClient client = app.CreateClient();
        IRuns runs = app.Services.GetRequiredService<IRuns>();
        Guid run = await runs.StartAsync(Guid.Parse(await StudyAsync(client)), "Cancelled");
        await runs.CancelAsync(run);
        Assert.SkipWhen((await runs.FindAsync(run))!.State == RunState.Finished, "The run was done before it could be cancelled.");

        using HttpResponseMessage answer = await client.GetAsync($"/api/runs/{run}/results.csv", TestContext.Current.CancellationToken);

        Assert.Equal(HttpStatusCode.Conflict, answer.StatusCode);
        Assert.Contains("no results", await answer.ProblemAsync(), StringComparison.Ordinal);
    }

    [Fact]
    public async Task SampleColumns_MeasuredDerivedAndFlags_AreTheTables()
    {
        using HttpClient client = app.CreateClient();
        (string hash, SampleTable samples) = await SamplesAsync(client);
        using HttpResponseMessage answer = await client.GetAsync($"/api/samples/{hash}/columns?ids=oxygen,sigma2,oxygen_flag", TestContext.Current.CancellationToken);
        float[][] columns = await answer.ColumnsAsync();

        Assert.Equal(samples.Find("oxygen")!.Values.ToArray().Select(v => (float)v), columns[0]);
        Assert.Equal(SampleDerivation.Derive(samples, ["sigma2"]).Table.Find("sigma2")!.Values.ToArray().Select(v => (float)v), columns[1]);
        Assert.Equal(Enumerable.Range(0, samples.RowCount).Select(row => (float)samples.Find("oxygen")!.FlagAt(row)), columns[2]);
        Assert.Contains("immutable", answer.Headers.CacheControl?.ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public async Task SampleColumns_WithFlags_LackValuesWithOtherFlags()
    {
        using HttpClient client = app.CreateClient();
        (string hash, SampleTable samples) = await SamplesAsync(client);
        using HttpResponseMessage answer = await client.GetAsync($"/api/samples/{hash}/columns?ids=phosphate&acceptFlags=2", TestContext.Current.CancellationToken);
        float[] phosphate = (await answer.ColumnsAsync())[0];

        SampleColumn column = samples.Find("phosphate")!;
        Assert.Contains(Enumerable.Range(0, samples.RowCount), row => column.FlagAt(row) is 3 or 6 && !double.IsNaN(column.Values[row]));
        Assert.All(Enumerable.Range(0, samples.RowCount), row => Assert.Equal(column.FlagAt(row) == 2 ? (float)column.Values[row] : float.NaN, phosphate[row]));
    }

    [Theory]
    [InlineData("ids=oxigen", HttpStatusCode.BadRequest, "oxigen")]
    [InlineData("ids=", HttpStatusCode.BadRequest, "1 to 64")]
    [InlineData("ids=oxygen&acceptFlags=good", HttpStatusCode.BadRequest, "good")]
    [InlineData("", HttpStatusCode.BadRequest, "parameter")]
    public async Task SampleColumns_BadQuery_IsAProblem(string query, HttpStatusCode expected, string words)
    {
        using HttpClient client = app.CreateClient();
        (string hash, _) = await SamplesAsync(client);
        using HttpResponseMessage answer = await client.GetAsync($"/api/samples/{hash}/columns?{query}", TestContext.Current.CancellationToken);

        Assert.Equal(expected, answer.StatusCode);
        Assert.Contains(words, await answer.ProblemAsync(), StringComparison.Ordinal);
        Assert.DoesNotContain("immutable", answer.Headers.CacheControl?.ToString() ?? "", StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("abc")]
    [InlineData("..%2f..%2fwatermix.db")]
    [InlineData("0000000000000000000000000000000000000000000000000000000000000000")]
    public async Task SampleColumns_UnknownHash_IsAProblem(string hash)
    {
        using HttpClient client = app.CreateClient();
        using HttpResponseMessage answer = await client.GetAsync($"/api/samples/{hash}/columns?ids=oxygen", TestContext.Current.CancellationToken);

        Assert.Equal(HttpStatusCode.NotFound, answer.StatusCode);
        await answer.ProblemAsync();
    }

    private static async Task<string> StudyAsync(HttpClient client) =>
        (await client.JsonAsync("/api/studies?search=halcyon"))[0].GetProperty("id").GetString()!;

    private static async Task<Guid> FinishedRunAsync(HttpClient client)
    {
        string id = await StudyAsync(client);
        for (int attempt = 0; attempt < 600; attempt++)
        {
            JsonElement[] runs = [.. (await client.JsonAsync($"/api/studies/{id}")).GetProperty("runs").EnumerateArray()];
            if (runs.FirstOrDefault(r => r.GetProperty("state").GetString() == "finished") is { ValueKind: JsonValueKind.Object } run)
            {
                Assert.Equal(832, run.GetProperty("statuses").EnumerateObject().Sum(s => s.Value.GetInt64()));
                return run.GetProperty("id").GetGuid();
            }

            await Task.Delay(100, TestContext.Current.CancellationToken);
        }

        throw new TimeoutException("The run did not finish within a minute.");
    }

    private async Task<(string Hash, SampleTable Samples)> SamplesAsync(HttpClient client)
    {
        JsonElement study = await client.JsonAsync($"/api/studies/{await StudyAsync(client)}");
        string hash = study.GetProperty("cruises")[0].GetProperty("samplesHash").GetString()!;
        return (hash, await app.Services.GetRequiredService<ICruises>().SamplesAsync(hash));
    }
}
