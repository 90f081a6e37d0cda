using System.Text.RegularExpressions;

namespace WaterMix.Web.Tests.Hosting;

public sealed partial class SecurityHeadersTests(RunningApp app)
{
    [Theory]
    [InlineData("/", "localhost")]
    [InlineData("/styles/tokens.css", "localhost")]
    [InlineData("/_framework/blazor.web.js", "localhost")]
    [InlineData("/health", "localhost")]
    [InlineData("/api/studies", "localhost")]
    [InlineData("/api/nothing", "localhost")]
    [InlineData("/nothing", "localhost")]
    [InlineData("/error", "localhost")]
    [InlineData("/openapi/v1.json", "localhost")]
    [InlineData("/", "evil.example")]
    public async Task Headers_OnEveryKindOfAnswer_CarryThePolicy(string path, string host)
    {
        using HttpRequestMessage request = new(HttpMethod.Get, path) { Headers = { Host = host } };
        using HttpClient client = app.CreateClient();
        using HttpResponseMessage answer = await client.SendAsync(request, TestContext.Current.CancellationToken);

        string policy = Assert.Single(answer.Headers.GetValues("Content-Security-Policy"));
        Dictionary<string, string> directives = policy.Split(';', StringSplitOptions.TrimEntries)
            .Select(d => d.Split(' ', 2)).ToDictionary(d => d[0], d => d[1]);
        Assert.Equal("'none'", directives["default-src"]);
        Assert.Equal("'self'", directives["script-src"]);
        Assert.Equal("'self'", directives["style-src-elem"]);
        Assert.Equal("'self'", directives["connect-src"]);
        Assert.Equal("'none'", directives["frame-ancestors"]);
        Assert.DoesNotContain("http", policy, StringComparison.OrdinalIgnoreCase);
        Assert.DoesNotContain("unsafe-eval", policy, StringComparison.Ordinal);
        Assert.Equal("nosniff", Assert.Single(answer.Headers.GetValues("X-Content-Type-Options")));
        Assert.Equal("DENY", Assert.Single(answer.Headers.GetValues("X-Frame-Options")));
        Assert.Equal("same-origin", Assert.Single(answer.Headers.GetValues("Referrer-Policy")));
    }

    // What the policy would refuse must not be in the page in the first place.
    [Theory]
    [InlineData("/")]
    [InlineData("/nothing")]
    [InlineData("/error")]
    public async Task Page_AsServed_HoldsNothingInlineAndNothingFromElsewhere(string path)
    {
        using HttpClient client = app.CreateClient();
        using HttpResponseMessage answer = await client.GetAsync(path, TestContext.Current.CancellationToken);
        string page = await answer.Content.ReadAsStringAsync(TestContext.Current.CancellationToken);

        Assert.Contains("<h1", page, StringComparison.Ordinal);
        Assert.DoesNotMatch(InlineScript(), page);
        Assert.DoesNotContain("<style", page, StringComparison.OrdinalIgnoreCase);
        Assert.DoesNotMatch(InlineHandler(), page);
        Assert.All(Addresses().Matches(page), m => Assert.StartsWith("http://localhost/", m.Groups[1].Value, StringComparison.Ordinal));
    }

    [GeneratedRegex("<script(?![^>]*\\bsrc=)", RegexOptions.IgnoreCase)]
    private static partial Regex InlineScript();

    [GeneratedRegex("\\son[a-z]+=", RegexOptions.IgnoreCase)]
    private static partial Regex InlineHandler();

    [GeneratedRegex("(?:src|href)=\"((?:https?:)?//[^\"]*)\"", RegexOptions.IgnoreCase)]
    private static partial Regex Addresses();
}
