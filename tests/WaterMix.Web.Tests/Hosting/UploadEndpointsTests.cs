using System.Net;
using System.Net.Http.Headers;
using System.Net.Http.Json;
using System.Text.Json;
using Microsoft.AspNetCore.Antiforgery;
using Microsoft.AspNetCore.Http;
using Microsoft.AspNetCore.Http.HttpResults;
using Microsoft.Extensions.DependencyInjection;
using WaterMix.Formats.Reading;
using WaterMix.Web.Hosting;
using WaterMix.Workspace;
using WaterMix.Workspace.Cruises;

namespace WaterMix.Web.Tests.Hosting;

public sealed class UploadEndpointsTests(SmallUploadsApp small)
{
    private readonly RunningApp _app = small.App;

    [Fact]
    public async Task Receive_TwoFilesWithAToken_CanBeReadAsOneUpload()
    {
        var upload = Guid.NewGuid();
        using HttpClient client = _app.CreateClient();
        using MultipartFormDataContent form = Form(("a.csv", "station,latitude,pressure,oxygen\n1,10,5,200\n"), ("b.csv", "station,latitude,pressure,oxygen\n2,11,5,210\n"));

        using HttpResponseMessage answer = await PostAsync(client, upload, form, withToken: true);

        Assert.Equal(HttpStatusCode.NoContent, answer.StatusCode);
        ImportTrial trial = await _app.Services.GetRequiredService<ICruises>().TryAsync(upload, new ReadingOptions(), TestContext.Current.CancellationToken);
        Assert.Equal(2, trial.Report.Rows);
        Assert.Equal(["a.csv", "b.csv"], trial.Report.Files.Select(f => f.Name));
    }

    [Fact]
    public async Task Receive_WithoutAToken_RefusedAndNothingKept()
    {
        var upload = Guid.NewGuid();
        using HttpClient client = _app.CreateClient();
        using MultipartFormDataContent form = Form(("a.csv", "station\n1\n"));

        using HttpResponseMessage answer = await PostAsync(client, upload, form, withToken: false);

        Assert.Equal(HttpStatusCode.BadRequest, answer.StatusCode);
        Assert.Contains("Load the page again", await DetailAsync(answer), StringComparison.Ordinal);
        await Assert.ThrowsAsync<ArgumentException>(() =>
            _app.Services.GetRequiredService<ICruises>().TryAsync(upload, new ReadingOptions(), TestContext.Current.CancellationToken));
    }

    // A token looked for in the form would be found only after the body was read.
    [Fact]
    public async Task Receive_WithoutAToken_LeavesTheBodyAlone()
    {
        var context = new DefaultHttpContext { RequestServices = _app.Services };
        context.Request.Method = HttpMethods.Post;
        context.Request.ContentType = "multipart/form-data; boundary=x";
        context.Request.Body = new UnreadableStream();

        Results<NoContent, ProblemHttpResult> answer = await UploadEndpoints.ReceiveAsync(
            Guid.NewGuid(),
            context,
            _app.Services.GetRequiredService<IAntiforgery>(),
            _app.Services.GetRequiredService<ICruises>(),
            _app.Services.GetRequiredService<WorkspaceOptions>());

        Assert.Equal(StatusCodes.Status400BadRequest, Assert.IsType<ProblemHttpResult>(answer.Result).StatusCode);
    }

    [Fact]
    public async Task Receive_LargerThanTheLimit_RefusedWithTheLimit()
    {
        using HttpClient client = _app.CreateClient();
        using MultipartFormDataContent form = Form(("big.csv", new string('1', 3 << 20)));

        using HttpResponseMessage answer = await PostAsync(client, Guid.NewGuid(), form, withToken: true);

        Assert.Equal(HttpStatusCode.RequestEntityTooLarge, answer.StatusCode);
        Assert.Contains("larger than 1 MB", await DetailAsync(answer), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Receive_NoFile_RefusedWithASentence()
    {
        using HttpClient client = _app.CreateClient();
        using var form = new MultipartFormDataContent { { new StringContent("x"), "field" } };

        using HttpResponseMessage answer = await PostAsync(client, Guid.NewGuid(), form, withToken: true);

        Assert.Equal(HttpStatusCode.BadRequest, answer.StatusCode);
        Assert.Contains("holds no file", await DetailAsync(answer), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Receive_NameWithAPath_KeepsItsLastPartOnly()
    {
        var upload = Guid.NewGuid();
        using HttpClient client = _app.CreateClient();
        using MultipartFormDataContent form = Form(("../../outside/evil.csv", "station,latitude,pressure,oxygen\n1,10,5,200\n"));

        using HttpResponseMessage answer = await PostAsync(client, upload, form, withToken: true);

        Assert.Equal(HttpStatusCode.NoContent, answer.StatusCode);
        ImportTrial trial = await _app.Services.GetRequiredService<ICruises>().TryAsync(upload, new ReadingOptions(), TestContext.Current.CancellationToken);
        Assert.Equal("evil.csv", Assert.Single(trial.Report.Files).Name);
        Assert.Empty(Directory.EnumerateFiles(Path.GetDirectoryName(_app.DataFolder)!, "evil.csv"));
    }

    private static MultipartFormDataContent Form(params (string Name, string Text)[] files)
    {
        var form = new MultipartFormDataContent();
        foreach ((string name, string text) in files)
        {
            var part = new StringContent(text);
            part.Headers.ContentDisposition = new ContentDispositionHeaderValue("form-data") { Name = "\"file\"", FileName = $"\"{name}\"" };
            form.Add(part);
        }

        return form;
    }

    private static async Task<HttpResponseMessage> PostAsync(HttpClient client, Guid upload, HttpContent form, bool withToken)
    {
        using HttpRequestMessage request = new(HttpMethod.Post, $"/uploads/{upload}") { Content = form };
        if (withToken)
        {
            JsonElement token = await client.GetFromJsonAsync<JsonElement>("/uploads/token", TestContext.Current.CancellationToken);
            request.Headers.Add(token.GetProperty("header").GetString()!, token.GetProperty("value").GetString());
        }

        return await client.SendAsync(request, TestContext.Current.CancellationToken);
    }

    private static async Task<string?> DetailAsync(HttpResponseMessage answer) =>
        (await answer.Content.ReadFromJsonAsync<JsonElement>(TestContext.Current.CancellationToken)).GetProperty("detail").GetString();

    private sealed class UnreadableStream : MemoryStream
    {
        public override int Read(byte[] buffer, int offset, int count) => throw new InvalidOperationException("The body was read.");

        public override ValueTask<int> ReadAsync(Memory<byte> buffer, CancellationToken cancellationToken = default) => throw new InvalidOperationException("The body was read.");
    }
}
