using System.Net;

namespace WaterMix.Web.Tests.Hosting;

public sealed class HostAndOriginTests(RunningApp app)
{
    // Loopback: 127.0.0.0/8 and ::1 (RFC 6890), localhost and names under it (RFC 6761, section 6.3).
    [Theory]
    [InlineData("localhost")]
    [InlineData("LOCALHOST:5080")]
    [InlineData("localhost.:1")]
    [InlineData("watermix.localhost")]
    [InlineData("127.0.0.1:9")]
    [InlineData("127.8.9.10")]
    [InlineData("[::1]:5080")]
    public async Task Host_LoopbackNameAndAnyPort_Accepted(string host)
    {
        using HttpResponseMessage answer = await GetAsync(host, origin: null);

        Assert.Equal(HttpStatusCode.OK, answer.StatusCode);
    }

    [Theory]
    [InlineData("evil.example")]
    [InlineData("localhost.evil.example")]
    [InlineData("notlocalhost")]
    [InlineData("127.0.0.1.evil.example")]
    [InlineData("192.168.0.7")]
    [InlineData("0.0.0.0")]
    [InlineData("[::2]")]
    public async Task Host_AnyOther_RefusedWithASentence(string host)
    {
        using HttpResponseMessage answer = await GetAsync(host, origin: null);

        Assert.Equal(HttpStatusCode.BadRequest, answer.StatusCode);
        Assert.Contains("this machine's own names", await answer.Content.ReadAsStringAsync(TestContext.Current.CancellationToken), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("http://localhost:5080", HttpStatusCode.OK)]
    [InlineData("http://127.0.0.1:3000", HttpStatusCode.OK)]
    [InlineData("http://[::1]", HttpStatusCode.OK)]
    [InlineData("https://evil.example", HttpStatusCode.Forbidden)]
    [InlineData("http://localhost.evil.example", HttpStatusCode.Forbidden)]
    [InlineData("null", HttpStatusCode.Forbidden)]
    [InlineData("file://localhost", HttpStatusCode.Forbidden)]
    public async Task Origin_OfAPageElsewhere_Refused(string origin, HttpStatusCode expected)
    {
        using HttpResponseMessage answer = await GetAsync("localhost", origin);

        Assert.Equal(expected, answer.StatusCode);
    }

    [Fact]
    public async Task Host_NamedInTheSetting_Accepted()
    {
        using RunningApp named = new RunningApp().WithSetting("WATERMIX_HOSTS", "lab.example; other.example");
        using HttpRequestMessage request = new(HttpMethod.Get, "/health") { Headers = { Host = "lab.example" } };
        using HttpClient client = named.CreateClient();
        using HttpResponseMessage answer = await client.SendAsync(request, TestContext.Current.CancellationToken);

        Assert.Equal(HttpStatusCode.OK, answer.StatusCode);
    }

    private async Task<HttpResponseMessage> GetAsync(string host, string? origin)
    {
        using HttpRequestMessage request = new(HttpMethod.Get, "/health");
        request.Headers.Host = host;
        if (origin is not null)
        {
            request.Headers.TryAddWithoutValidation("Origin", origin);
        }

        using HttpClient client = app.CreateClient();
        return await client.SendAsync(request, TestContext.Current.CancellationToken);
    }
}
