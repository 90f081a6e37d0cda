using Microsoft.Playwright;

namespace WaterMix.Browser.Tests;

[Collection(InChromium.Name)]
public sealed class OpeningTests(RealBrowser browser)
{
    [Fact]
    public async Task App_OpenedForTheFirstTime_HasTheInventedCruiseSolvedAndItsSectionDrawn()
    {
        await using Window window = await browser.OpenAsync();
        await window.OpenInventedCruiseAsync();
        await window.GoToAsync("Results");

        ILocator figure = window.Page.GetByRole(AriaRole.Region, new() { Name = "Figure of the results" });
        await figure.WaitForAsync();
        await Assertions.Expect(figure.GetByRole(AriaRole.Group, new() { NameRegex = new("one panel each") }).GetByRole(AriaRole.Button)).Not.ToHaveCountAsync(0);
        await Assertions.Expect(window.Page.GetByRole(AriaRole.Contentinfo)).ToContainTextAsync("solved");
        Assert.True(await ColouredPixels.WaitForAsync(figure, atLeast: 2000), "The section has no coloured dots.");
        Assert.Empty(window.Complaints);
    }

    [Fact]
    public async Task Results_SampleChosenInTheTable_ShowsItsCardAlsoAfterAReloadAndNotAfterTheBackButton()
    {
        await using Window window = await browser.OpenAsync();
        await window.OpenInventedCruiseAsync();
        await window.GoToAsync("Results");

        await window.Page.GetByRole(AriaRole.Button, new() { NameRegex = new("^30, card of") }).ClickAsync();
        ILocator card = window.Page.GetByRole(AriaRole.Article, new() { NameRegex = new("^Sample: Station") });
        await card.WaitForAsync();
        string? name = await card.GetByRole(AriaRole.Heading, new() { Level = 2 }).TextContentAsync();
        await window.Page.ReloadAsync();
        await Assertions.Expect(card.GetByRole(AriaRole.Heading, new() { Level = 2 })).ToHaveTextAsync(name!);
        await window.Page.GoBackAsync();
        await Assertions.Expect(card).ToHaveCountAsync(0);
    }

    [Fact]
    public async Task Results_KeyboardOnly_SortsTheTableStepsThroughTheSectionAndClosesTheCard()
    {
        await using Window window = await browser.OpenAsync();
        await window.OpenInventedCruiseAsync();
        await window.GoToAsync("Results");
        IPage page = window.Page;

        ILocator pressure = page.GetByRole(AriaRole.Columnheader, new() { NameRegex = new("^Pressure") });
        await pressure.GetByRole(AriaRole.Button).FocusAsync();
        await page.Keyboard.PressAsync("Enter");
        await Assertions.Expect(pressure).ToHaveAttributeAsync("aria-sort", "ascending");

        ILocator plot = page.GetByRole(AriaRole.Region, new() { Name = "Figure of the results" }).GetByRole(AriaRole.Application).First;
        Assert.True(await ColouredPixels.WaitForAsync(plot, atLeast: 500), "The section has no coloured dots.");
        await plot.FocusAsync();
        await page.Keyboard.PressAsync("ArrowRight");
        await Assertions.Expect(plot).ToContainTextAsync("Station"); // what a screen reader says of the point
        await page.Keyboard.PressAsync("Enter");
        ILocator card = page.GetByRole(AriaRole.Article, new() { NameRegex = new("^Sample: Station") });
        await card.WaitForAsync();
        await page.Keyboard.PressAsync("Escape");
        await Assertions.Expect(card).ToHaveCountAsync(0);
    }
}
