using AngleSharp.Dom;
using Bunit;
using WaterMix.Core;
using WaterMix.Formats.Matching;
using WaterMix.Formats.Reading;
using WaterMix.Web.Components.Samples;
using WaterMix.Web.State.Samples;
using WaterMix.Workspace.Cruises;

namespace WaterMix.Web.Tests.Components.Samples;

public sealed class SamplesComponentsTests : BunitContext
{
    public SamplesComponentsTests() => JSInterop.Mode = JSRuntimeMode.Loose;

    [Fact]
    public void MatchTable_AnotherQuantityChosen_IsSaid()
    {
        var form = new MatchForm(Trial(new ColumnMatch("oxigen") { Quantity = "oxigen", By = MatchedBy.OwnName }));
        bool edited = false;
        IRenderedComponent<MatchTable> table = Render<MatchTable>(p => p.Add(t => t.Form, form).Add(t => t.OnEdited, () => edited = true));
        table.Find("select[aria-label='What oxigen is']").Change("oxygen");
        Assert.True(edited);
        ColumnMatch said = Assert.Single(form.Said);
        Assert.Equal(("oxygen", MatchedBy.MatchFile), (said.Quantity, said.By));
        Assert.Contains("corrected by you", table.Markup, StringComparison.Ordinal);
    }

    [Fact]
    public void ReportSheet_MarkupInAFile_StaysText()
    {
        const string evil = "<img src=x onerror=alert(1)>";
        var finding = new Finding(Severity.Warning, "a number", $"'{evil}'", "It counts as missing.") { File = evil, Line = 3, Column = evil, Count = 7 };
        var report = new ImportReport(1, [new ImportedFile(evil, "csv", 1)], [], [], [evil], new Dictionary<int, long>(), [finding]);
        IRenderedComponent<ReportSheet> sheet = Render<ReportSheet>(p => p.Add(s => s.Text, new ReportText(report)));
        Assert.Empty(sheet.FindAll("img"));
        Assert.Contains("7 times, first here", sheet.Find(".place").TextContent, StringComparison.Ordinal);
        Assert.Contains(evil, sheet.Find(".found").TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public void RangeFields_TextInsteadOfANumber_SaysWhatIsExpected()
    {
        ValueRange? wished = null;
        IRenderedComponent<RangeFields> fields = Render<RangeFields>(p => p.Add(f => f.Name, "down").Add(f => f.Label, "Pressure").Add(f => f.OnChanged, r => wished = r));
        fields.Find("#down-from").Change("deep");
        Assert.Null(wished);
        Assert.Contains("Expected a number", fields.Find("[role=alert]").TextContent, StringComparison.Ordinal);
        fields.Find("#down-from").Change("1000");
        Assert.Equal(new ValueRange(1000, null), wished);
        Assert.Empty(fields.FindAll("[role=alert]"));
    }

    [Fact]
    public void CruiseTable_EveryControl_NamesItsCruise()
    {
        var list = new CruiseList(null!);
        list.Show([State.Samples.Tables.CruiseOf("A03"), State.Samples.Tables.CruiseOf("B07")]);
        IRenderedComponent<CruiseTable> table = Render<CruiseTable>(p => p.Add(t => t.List, list).Add(t => t.ReportAddress, id => $"?report={id}"));
        Assert.Equal(2, table.FindAll("tbody tr").Count);
        Assert.All(table.FindAll("tbody tr")[1].QuerySelectorAll("button, a"), control => Assert.Contains("B07", control.TextContent, StringComparison.Ordinal));
    }

    private static ImportTrial Trial(params ColumnMatch[] columns) =>
        new(State.Samples.Tables.NoReport, new ColumnMatchFile(columns), [.. columns.Select(c => c.Column)], null);
}
