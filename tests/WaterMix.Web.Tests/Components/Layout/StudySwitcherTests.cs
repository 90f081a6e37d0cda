using AngleSharp.Dom;
using Bunit;
using Microsoft.Extensions.DependencyInjection;
using WaterMix.Web.Components.Layout;
using WaterMix.Web.State;
using WaterMix.Workspace.Studies;

namespace WaterMix.Web.Tests.Components.Layout;

public sealed class StudySwitcherTests : BunitContext
{
    private readonly FakeStudies _studies = new();

    public StudySwitcherTests()
    {
        JSInterop.Mode = JSRuntimeMode.Loose;
        Services.AddSingleton<IStudies>(_studies);
    }

    [Fact]
    public async Task Menu_Opened_OffersTheOtherStudies()
    {
        Guid here = _studies.Add("Halcyon");
        _studies.Add("Lantern");
        IRenderedComponent<StudySwitcher> switcher = RenderAt(here);
        IElement button = switcher.Find("button");

        Assert.Contains("Halcyon", button.TextContent, StringComparison.Ordinal);
        Assert.Equal("false", button.GetAttribute("aria-expanded"));
        await button.ClickAsync();
        Assert.Equal("true", switcher.Find("button").GetAttribute("aria-expanded"));
        Assert.Equal(["Lantern", "All studies"], switcher.FindAll("li a").Select(a => a.TextContent));
    }

    [Fact]
    public async Task Menu_Escape_Closes()
    {
        IRenderedComponent<StudySwitcher> switcher = RenderAt(_studies.Add("Halcyon"));
        await switcher.Find("button").ClickAsync();
        await switcher.Find(".study-switcher").KeyDownAsync("Escape");

        Assert.Empty(switcher.FindAll("li"));
    }

    [Fact]
    public async Task Name_ChangedElsewhere_IsShown()
    {
        Guid here = _studies.Add("Halcyon");
        IRenderedComponent<StudySwitcher> switcher = RenderAt(here);
        await _studies.RenameAsync(here, "Halcyon, winter");

        switcher.WaitForAssertion(() => Assert.Contains("Halcyon, winter", switcher.Find("button").TextContent, StringComparison.Ordinal));
    }

    private IRenderedComponent<StudySwitcher> RenderAt(Guid study) => Render<StudySwitcher>(p => p.Add(s => s.Place, new StudyPlace(study, "results")));
}
