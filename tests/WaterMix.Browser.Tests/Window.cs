using Microsoft.Playwright;

namespace WaterMix.Browser.Tests;

/// <summary>A window of the browser, with what its console said.</summary>
public sealed class Window : IAsyncDisposable
{
    private readonly IBrowserContext _context;
    private readonly List<string> _complaints = [];

    /// <summary>A window around a page that was not opened yet.</summary>
    /// <param name="context">Its own cookies and storage.</param>
    /// <param name="page">The page.</param>
    public Window(IBrowserContext context, IPage page)
    {
        ArgumentNullException.ThrowIfNull(page);
        _context = context;
        Page = page;
        page.Console += (_, message) =>
        {
            if (message.Type is "error" or "warning")
            {
                _complaints.Add($"{message.Type} at {page.Url}: {message.Text}");
            }
        };
        page.PageError += (_, error) => _complaints.Add($"fault at {page.Url}: {error}");
    }

    /// <summary>The page.</summary>
    public IPage Page { get; }

    /// <summary>Errors and warnings of the console since the window was opened; a violation of the content security policy is one of them.</summary>
    public IReadOnlyList<string> Complaints => _complaints;

    /// <summary>Opens the study of the invented cruise from the list of studies.</summary>
    public async Task OpenInventedCruiseAsync()
    {
        await Page.GetByRole(AriaRole.Table).GetByRole(AriaRole.Link, new() { NameRegex = new("Halcyon") }).First.ClickAsync();
        await Page.GetByRole(AriaRole.Navigation, new() { Name = "Pages of the study" }).WaitForAsync();
    }

    /// <summary>Goes to a page of the study by its link.</summary>
    /// <param name="name">The link's name.</param>
    public async Task GoToAsync(string name)
    {
        await Page.GetByRole(AriaRole.Navigation, new() { Name = "Pages of the study" }).GetByRole(AriaRole.Link, new() { Name = name, Exact = true }).ClickAsync();
        await Page.GetByRole(AriaRole.Heading, new() { Name = name, Level = 1, Exact = true }).WaitForAsync();
    }

    /// <inheritdoc/>
    public ValueTask DisposeAsync() => _context.DisposeAsync();
}
