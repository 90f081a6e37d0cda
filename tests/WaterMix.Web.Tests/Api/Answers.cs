using System.Net.Http.Json;
using System.Runtime.InteropServices;
using System.Text.Json;

namespace WaterMix.Web.Tests.Api;

/// <summary>What the API answers, for checks.</summary>
internal static class Answers
{
    /// <summary>The JSON at an address.</summary>
    public static async Task<JsonElement> JsonAsync(this HttpClient client, string address) =>
        await client.GetFromJsonAsync<JsonElement>(address, TestContext.Current.CancellationToken);

    /// <summary>The body of an answer as JSON.</summary>
    public static async Task<JsonElement> JsonAsync(this HttpResponseMessage answer) =>
        await answer.Content.ReadFromJsonAsync<JsonElement>(TestContext.Current.CancellationToken);

    /// <summary>A problem's sentence, after checking that it is one (RFC 9457).</summary>
    public static async Task<string> ProblemAsync(this HttpResponseMessage answer)
    {
        Assert.Equal("application/problem+json", answer.Content.Headers.ContentType?.MediaType);
        JsonElement problem = await answer.JsonAsync();
        Assert.Equal((int)answer.StatusCode, problem.GetProperty("status").GetInt32());
        string detail = problem.GetProperty("detail").GetString()!;
        Assert.EndsWith(".", detail, StringComparison.Ordinal);
        return detail;
    }

    /// <summary>The columns in a binary answer, each with one value per row.</summary>
    public static async Task<float[][]> ColumnsAsync(this HttpResponseMessage answer)
    {
        answer.EnsureSuccessStatusCode();
        int rows = int.Parse(Assert.Single(answer.Headers.GetValues("X-WaterMix-Rows")), System.Globalization.CultureInfo.InvariantCulture);
        float[] all = MemoryMarshal.Cast<byte, float>(await answer.Content.ReadAsByteArrayAsync(TestContext.Current.CancellationToken)).ToArray();
        return [.. all.Chunk(rows)];
    }

    /// <summary>A form of files: field, name, bytes.</summary>
    public static MultipartFormDataContent Form(params (string Field, string Name, byte[] Bytes)[] files)
    {
        var form = new MultipartFormDataContent();
        foreach ((string field, string name, byte[] bytes) in files)
        {
            form.Add(new ByteArrayContent(bytes), field, name);
        }

        return form;
    }
}
