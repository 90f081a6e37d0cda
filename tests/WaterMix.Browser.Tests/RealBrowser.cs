using Microsoft.Playwright;

namespace WaterMix.Browser.Tests;

/// <summary>One Chromium and one app for all tests of the collection. Where there is no Chromium, each test skips.</summary>
public sealed class RealBrowser : IAsyncLifetime
{
    private static readonly string[] Places = ["/usr/bin/chromium", "/usr/bin/chromium-browser", "/usr/bin/google-chrome"];

    private IPlaywright? _playwright;
    private IBrowser? _browser;
    private RunningApp? _app;

    /// <inheritdoc/>
    public async ValueTask InitializeAsync()
    {
        if (Chromium() is not { } chromium)
        {
            return;
        }

        Task<RunningApp> starting = RunningApp.StartAsync();
        _playwright = await Playwright.CreateAsync();
        _browser = await _playwright.Chromium.LaunchAsync(new BrowserTypeLaunchOptions
        {
            ExecutablePath = chromium,
            Args = ["--no-sandbox", "--disable-gpu", "--disable-quic", "--no-first-run", "--disable-background-networking", "--disable-component-update", "--disable-sync"],
        });
        _app = await starting;
    }

    /// <inheritdoc/>
    public async ValueTask DisposeAsync()
    {
        if (_browser is not null)
        {
            await _browser.DisposeAsync();
        }

        _playwright?.Dispose();
        if (_app is not null)
        {
            await _app.DisposeAsync();
        }
    }

    /// <summary>A new window at the app's first page; skips the running test where there is no Chromium.</summary>
    /// <param name="width">Width of the window, CSS px.</param>
    /// <param name="dark">True for a person who prefers dark pages.</param>
    public async Task<Window> OpenAsync(int width = 1280, bool dark = false)
    {
        Assert.SkipUnless(_browser is not null, "There is no Chromium here. Install the package chromium, or name one in WATERMIX_CHROMIUM.");
        IBrowserContext context = await _browser!.NewContextAsync(new BrowserNewContextOptions
        {
            BaseURL = _app!.Address,
            ViewportSize = new ViewportSize { Width = width, Height = width < 600 ? 844 : 900 },
            ColorScheme = dark ? ColorScheme.Dark : ColorScheme.Light,
            ReducedMotion = ReducedMotion.Reduce,
        });
        context.SetDefaultTimeout(30_000);
        IPage page = await context.NewPageAsync();
        var window = new Window(context, page);
        await page.GotoAsync("");
        return window;
    }

    private static string? Chromium() =>
        Environment.GetEnvironmentVariable("WATERMIX_CHROMIUM") is { Length: > 0 } named ? named : Places.FirstOrDefault(File.Exists);
}

/// <summary>The tests that share the browser and the app; they run one after the other.</summary>
[CollectionDefinition(Name)]
public sealed class InChromium : ICollectionFixture<RealBrowser>
{
    /// <summary>The collection's name.</summary>
    public const string Name = "In Chromium";
}
