using AngleSharp.Dom;
using Bunit;
using Microsoft.AspNetCore.Components;
using Microsoft.Extensions.DependencyInjection;
using WaterMix.Web.Components.Pages;
using WaterMix.Workspace.Studies;

namespace WaterMix.Web.Tests.Components.Pages;

public sealed class StudiesPageTests : BunitContext
{
    private readonly FakeStudies _studies = new();

    public StudiesPageTests()
    {
        JSInterop.Mode = JSRuntimeMode.Loose;
        Services.AddSingleton<IStudies>(_studies);
        Services.AddSingleton<TimeProvider>(new UtcClock());
    }

    [Fact]
    public void Page_NoStudy_SaysHowToBegin()
    {
        IRenderedComponent<StudiesPage> page = Render<StudiesPage>();

        Assert.Equal("No study yet", page.Find("h2").TextContent);
        Assert.NotNull(Button(page, "Create the first study"));
        Assert.Empty(page.FindAll("table"));
    }

    [Fact]
    public void Page_Studies_AreRowsWithNamedButtons()
    {
        _studies.Add("Halcyon", 832, 1);
        _studies.Add("<script>alert(1)</script>", 5, 2);
        IRenderedComponent<StudiesPage> page = Render<StudiesPage>();

        Assert.Equal(["Halcyon", "<script>alert(1)</script>"], page.FindAll("tbody th a").Select(a => a.TextContent));
        Assert.Empty(page.FindAll("script"));
        Assert.Equal(["Rename Halcyon", "Duplicate Halcyon", "Delete Halcyon"], page.FindAll("tbody tr:first-child button").Select(b => b.GetAttribute("aria-label")));
        Assert.All(page.FindAll("thead th"), th => Assert.Equal("col", th.GetAttribute("scope")));
    }

    [Fact]
    public async Task Create_ByKeyboard_GoesToTheStudy()
    {
        IRenderedComponent<StudiesPage> page = Render<StudiesPage>();
        await Button(page, "Create the first study").ClickAsync();
        await page.Find("form").SubmitAsync();
        Assert.Contains("needs a name", page.Find("[role=alert]").TextContent, StringComparison.Ordinal);

        await page.Find("form input").InputAsync("Lantern Ridge");
        await page.Find("form").SubmitAsync();

        Assert.Equal("Lantern Ridge", (await _studies.ListAsync())[0].Name);
        Assert.Empty(page.FindAll("form"));
    }

    [Fact]
    public async Task Rename_InPlace_ChangesTheName()
    {
        _studies.Add("Old name");
        IRenderedComponent<StudiesPage> page = Render<StudiesPage>();
        await Button(page, "Rename Old name").ClickAsync();
        await page.Find("form input").InputAsync("New name");
        await page.Find("form").SubmitAsync();

        Assert.Equal("New name", page.Find("tbody th a").TextContent);
    }

    [Fact]
    public async Task Delete_ThenUndo_BringsTheRowBack()
    {
        _studies.Add("Halcyon");
        IRenderedComponent<StudiesPage> page = Render<StudiesPage>();
        await Button(page, "Delete Halcyon").ClickAsync();

        Assert.Empty(page.FindAll("tbody tr"));
        Assert.Contains("“Halcyon” was deleted.", page.Find("[role=status]").TextContent, StringComparison.Ordinal);

        await Button(page, "Undo").ClickAsync();
        Assert.Equal("Halcyon", page.Find("tbody th a").TextContent);
        Assert.DoesNotContain("was deleted", page.Markup, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Delete_Dismissed_TakesTheMessageAway()
    {
        _studies.Add("Halcyon");
        IRenderedComponent<StudiesPage> page = Render<StudiesPage>();
        await Button(page, "Delete Halcyon").ClickAsync();
        await Button(page, "Dismiss").ClickAsync();

        Assert.DoesNotContain("was deleted", page.Markup, StringComparison.Ordinal);
    }

    [Fact]
    public void Search_InTheAddress_NarrowsTheList()
    {
        _studies.Add("Halcyon");
        _studies.Add("Lantern");
        Services.GetRequiredService<NavigationManager>().NavigateTo("/?search=lan");
        IRenderedComponent<StudiesPage> page = Render<StudiesPage>();

        Assert.Equal("Lantern", page.Find("tbody th a").TextContent);
        Assert.Equal("lan", page.Find("input[type=search]").GetAttribute("value"));
    }

    [Fact]
    public async Task Search_Typed_IsKeptInTheAddress()
    {
        _studies.Add("Halcyon");
        IRenderedComponent<StudiesPage> page = Render<StudiesPage>();
        await page.Find("input[type=search]").InputAsync("zzz");

        Assert.EndsWith("?search=zzz", Services.GetRequiredService<NavigationManager>().Uri, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Studies_ChangedElsewhere_AppearByThemselves()
    {
        IRenderedComponent<StudiesPage> page = Render<StudiesPage>();
        await _studies.CreateAsync("From another tab");

        page.WaitForAssertion(() => Assert.Equal("From another tab", page.Find("tbody th a").TextContent));
    }

    private static IElement Button(IRenderedComponent<StudiesPage> page, string text) => page.FindAll("button").Single(b => (b.GetAttribute("aria-label") ?? b.TextContent) == text);
}
