using Deque.AxeCore.Commons;
using Deque.AxeCore.Playwright;
using Microsoft.Playwright;

namespace WaterMix.Browser.Tests;

// The rules of WCAG 2.2, levels A and AA, as far as axe-core (Deque) can check them.
[Collection(InChromium.Name)]
public sealed class AccessTests(RealBrowser browser)
{
    private static readonly AxeRunOptions Wcag = new()
    {
        RunOnly = new RunOnlyOptions { Type = "tag", Values = ["wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa"] },
    };

    [Theory]
    [InlineData(1280, false)]
    [InlineData(1280, true)]
    [InlineData(390, false)]
    [InlineData(390, true)]
    public async Task EveryPage_InBothThemesAndWidths_BreaksNoRuleAndComplainsNowhere(int width, bool dark)
    {
        await using Window window = await browser.OpenAsync(width, dark);
        var violations = new List<string>(await ViolationsAsync(window.Page, "Studies"));

        await window.OpenInventedCruiseAsync();
        IReadOnlyList<string> pages = await window.Page.GetByRole(AriaRole.Navigation, new() { Name = "Pages of the study" }).GetByRole(AriaRole.Link).AllTextContentsAsync();
        Assert.NotEmpty(pages);
        foreach (string name in pages)
        {
            await window.GoToAsync(name);
            violations.AddRange(await ViolationsAsync(window.Page, name));
        }

        Assert.True(violations.Count == 0, string.Join("\n", violations));
        Assert.Empty(window.Complaints);
    }

    [Theory]
    [InlineData("Fractions")]
    [InlineData("Processes")]
    [InlineData("Residuals")]
    [InlineData("Fit")]
    [InlineData("Profiles at a station")]
    [InlineData("Properties")]
    public async Task EachFigureOfTheResults_WithACardOpen_BreaksNoRule(string figure)
    {
        await using Window window = await browser.OpenAsync();
        await window.OpenInventedCruiseAsync();
        await window.GoToAsync("Results");
        IPage page = window.Page;

        await page.GetByRole(AriaRole.Navigation, new() { Name = "Figures" }).GetByRole(AriaRole.Link, new() { Name = figure, Exact = true }).ClickAsync();
        await Assertions.Expect(page.GetByRole(AriaRole.Link, new() { Name = figure, Exact = true })).ToHaveAttributeAsync("aria-current", "true");
        await page.GetByRole(AriaRole.Button, new() { NameRegex = new("^1, card of") }).ClickAsync();
        await page.GetByRole(AriaRole.Article, new() { NameRegex = new("^Sample: ") }).WaitForAsync();

        IReadOnlyList<string> violations = await ViolationsAsync(page, figure);
        Assert.True(violations.Count == 0, string.Join("\n", violations));
        Assert.Empty(window.Complaints);
    }

    private static async Task<IReadOnlyList<string>> ViolationsAsync(IPage page, string name)
    {
        // The page is alive and has drawn when nothing is asked of the server any more.
        await page.WaitForLoadStateAsync(LoadState.NetworkIdle);
        await Assertions.Expect(page.GetByRole(AriaRole.Contentinfo)).Not.ToBeEmptyAsync();
        AxeResult result = await page.RunAxe(Wcag);
        return [.. result.Violations.Select(v => $"{name}: {v.Id}, {v.Help}: {string.Join("; ", v.Nodes.Select(n => n.Html).Take(3))}")];
    }
}
