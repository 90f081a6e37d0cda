using AngleSharp.Dom;
using Bunit;
using Bunit.TestDoubles;
using Microsoft.AspNetCore.Components;
using Microsoft.Extensions.DependencyInjection;
using WaterMix.Web.Components.Pages;
using WaterMix.Web.State.Results;
using WaterMix.Web.Tests.State.Results;
using WaterMix.Workspace.Cruises;
using WaterMix.Workspace.Runs;
using WaterMix.Workspace.Studies;

namespace WaterMix.Web.Tests.Components.Pages;

public sealed class ResultsPageTests : BunitContext
{
    private static readonly Run Second = TwoLayers.Run(RunState.Running, new Guid("5f3c1f0e-0000-4000-8000-000000000002"), "Second run") with { Done = 2 };

    [Fact]
    public void Page_NoRun_LeadsToMixing()
    {
        IRenderedComponent<ResultsPage> page = Open(new OneStudy());

        Assert.Equal("No run yet", page.WaitForElement("h2").TextContent);
        Assert.Equal($"studies/{OneStudy.Id}/mixing", page.Find("a.primary").GetAttribute("href"));
    }

    [Fact]
    public void Page_FinishedRun_ShowsTableSummariesModelAndFiles()
    {
        IRenderedComponent<ResultsPage> page = Open(new OneStudy(TwoLayers.Run()));

        page.WaitForElement("#samples-heading");
        Assert.Equal(8, page.FindAll("table")[^1].QuerySelectorAll("tbody tr").Length);
        Assert.Contains("3f2a9c0d11223344", page.Markup, StringComparison.Ordinal);
        Assert.Equal(
            [$"api/runs/{TwoLayers.RunId}/results.csv", $"api/runs/{TwoLayers.RunId}/model.json", $"api/runs/{TwoLayers.RunId}/endmembers.json"],
            page.FindAll(".files a").Select(a => a.GetAttribute("href")));
        Assert.Contains("1 usable tracers for 1 unknowns", page.Markup, StringComparison.Ordinal);
    }

    [Fact]
    public void Page_RowChosen_ShowsTheCardAndKeepsItInTheAddressUntilItIsClosed()
    {
        IRenderedComponent<ResultsPage> page = Open(new OneStudy(TwoLayers.Run()));

        page.WaitForElement("tbody tr .row-head button").Click();

        IElement card = page.WaitForElement(".sample-card");
        Assert.Contains("Station S2, sample 1, 100 dbar", card.TextContent, StringComparison.Ordinal);
        Assert.EndsWith("?sample=1", Address, StringComparison.Ordinal);
        page.Find(".results-page").KeyDown("Escape");
        page.WaitForState(() => page.FindAll(".sample-card").Count == 0);
        Assert.EndsWith("/results", Address, StringComparison.Ordinal);
    }

    [Fact]
    public void Page_HeadChosenTwice_SortsTheLargestFirst()
    {
        IRenderedComponent<ResultsPage> page = Open(new OneStudy(TwoLayers.Run()));

        Head(page).Click();
        page.WaitForAssertion(() => Assert.Equal("ascending", Head(page).ParentElement!.GetAttribute("aria-sort")));
        Head(page).Click();

        page.WaitForAssertion(() => Assert.Equal("descending", Head(page).ParentElement!.GetAttribute("aria-sort")));
        Assert.EndsWith("?sort=-pressure", Address, StringComparison.Ordinal);
        Assert.StartsWith("8", page.FindAll("table")[^1].QuerySelector("tbody tr .row-head")!.TextContent.Trim(), StringComparison.Ordinal);

        static IElement Head(IRenderedComponent<ResultsPage> page) => page.WaitForElement("#samples-heading").Closest("section")!.QuerySelectorAll("thead button").Single(b => b.TextContent.Contains("Pressure", StringComparison.Ordinal));
    }

    [Fact]
    public void Page_StatusChosen_ShowsOnlyItsSamples()
    {
        IRenderedComponent<ResultsPage> page = Open(new OneStudy(TwoLayers.Run()));

        page.WaitForElements(".statuses button").Single(b => b.TextContent.Contains("too few tracers", StringComparison.Ordinal)).Click();

        page.WaitForAssertion(() => Assert.Contains("1 of 8 samples is shown: too few tracers.", page.Markup, StringComparison.Ordinal));
        Assert.EndsWith("?status=too-few-tracers", Address, StringComparison.Ordinal);
    }

    [Fact]
    public void Page_RunAtWork_ShowsProgressAndCancels()
    {
        var workspace = new OneStudy(Second, TwoLayers.Run());
        IRenderedComponent<ResultsPage> page = Open(workspace);

        Assert.Contains("“Second run”: 2 of 8 samples apportioned", page.WaitForElement(".work-bar").TextContent, StringComparison.Ordinal);
        page.Find(".work-bar button").Click();

        Assert.Equal([Second.Id], workspace.Cancelled);
    }

    [Fact]
    public void Page_AddressNamesAFigure_ShowsItWithItsChoices()
    {
        IRenderedComponent<ResultsPage> page = Open(new OneStudy(TwoLayers.Run()), new ResultsView { Figure = ResultsFigure.Residuals });

        Assert.Equal("Residuals", page.WaitForElement(".figure-choice a[aria-current]").TextContent);
        Assert.NotEmpty(page.FindAll("svg.histogram rect"));
    }

    [Fact]
    public void Page_RunOfAnotherStudyInTheAddress_AsksForAChoice()
    {
        IRenderedComponent<ResultsPage> page = Open(new OneStudy(TwoLayers.Run()), new ResultsView { Run = Guid.NewGuid() });

        Assert.Contains("The address names a run that this study does not have.", page.WaitForElement(".notice").TextContent, StringComparison.Ordinal);
        page.Find("#run").Change(TwoLayers.RunId.ToString());
        page.WaitForElement("#samples-heading");
    }

    [Fact]
    public void Page_Rename_GivesTheRunItsNewName()
    {
        IRenderedComponent<ResultsPage> page = Open(new OneStudy(TwoLayers.Run()));

        page.WaitForElements("button").Single(b => b.TextContent.StartsWith("Rename", StringComparison.Ordinal)).Click();
        page.WaitForElement(".name-form input").Input("Without opal");
        page.Find(".name-form").Submit();

        page.WaitForAssertion(() => Assert.Contains("“Without opal”, run of", page.Markup, StringComparison.Ordinal));
    }

    private string Address => Services.GetRequiredService<NavigationManager>().Uri;

    private IRenderedComponent<ResultsPage> Open(OneStudy workspace, ResultsView? view = null)
    {
        JSInterop.Mode = JSRuntimeMode.Loose;
        Services.AddSingleton<IStudies>(workspace).AddSingleton<ICruises>(workspace).AddSingleton<IRuns>(workspace).AddSingleton(TimeProvider.System);
        SetRendererInfo(new RendererInfo("Server", isInteractive: true));
        Services.GetRequiredService<BunitNavigationManager>().NavigateTo(ResultsAddress.Of(OneStudy.Id, view ?? new ResultsView()));
        return Render<ResultsPage>(p => p.Add(x => x.Id, OneStudy.Id));
    }
}
