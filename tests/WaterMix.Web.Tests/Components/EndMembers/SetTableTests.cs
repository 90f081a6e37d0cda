using AngleSharp.Dom;
using Bunit;
using WaterMix.Core.Mixing;
using WaterMix.Web.Components.EndMembers;
using WaterMix.Web.State.EndMembers;
using WaterMix.Web.State.Mixing;
using WaterMix.Web.Tests.State.Mixing;

namespace WaterMix.Web.Tests.Components.EndMembers;

public class SetTableTests : BunitContext
{
    private readonly DraftStudies _studies = new(SmallModel.Make());
    private string? _removed;

    [Fact]
    public async Task Change_AValue_IsSavedUnderTheEndMember()
    {
        IRenderedComponent<SetTable> table = await ShowAsync();
        Field(table, "oxygen of A \u00b5mol/kg").Change("290");
        Assert.Equal(290, _studies.Stored.Draft.EndMembers.EndMembers[0].Values["oxygen"]);
    }

    [Fact]
    public async Task Change_AValueToText_SaysSoInTheCellAndSavesNothing()
    {
        IRenderedComponent<SetTable> table = await ShowAsync();
        Field(table, "oxygen of A \u00b5mol/kg").Change("3,1");
        Assert.Equal(280, _studies.Stored.Draft.EndMembers.EndMembers[0].Values["oxygen"]);
        Assert.Equal(4, _studies.Stored.Revision);
        Assert.Contains("decimal mark is a point", table.Find("td [role=alert]").TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Change_AnIdThatIsTaken_SaysSoAndKeepsTheOldOne()
    {
        IRenderedComponent<SetTable> table = await ShowAsync();
        Field(table, "Id of A").Change("b");
        Assert.Equal("A", _studies.Stored.Draft.EndMembers.EndMembers[0].Id);
        Assert.Contains("taken", table.Find("th [role=alert]").TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Render_AMissingValue_IsMarkedAsNeeded()
    {
        await _studies.SaveDraftAsync(_studies.Stored.Id, SetEdits.WithValue(SmallModel.Make(), 1, "oxygen", null), 4);
        IRenderedComponent<SetTable> table = await ShowAsync();
        Assert.Equal("needed", Field(table, "oxygen of B \u00b5mol/kg").GetAttribute("placeholder"));
        Assert.Single(table.FindAll("td.is-missing"));
    }

    [Fact]
    public async Task Remove_AnEndMember_SavesAndTellsThePage()
    {
        IRenderedComponent<SetTable> table = await ShowAsync();
        table.FindAll("button").First(b => b.TextContent.Contains("Remove", StringComparison.Ordinal)).Click();
        Assert.Equal("A", _removed);
        Assert.Equal("B", Assert.Single(_studies.Stored.Draft.EndMembers.EndMembers).Id);
    }

    private static IElement Field(IRenderedComponent<SetTable> table, string label) => table.FindAll("input").Single(i => i.GetAttribute("aria-label") == label);

    private async Task<IRenderedComponent<SetTable>> ShowAsync()
    {
        JSInterop.Mode = JSRuntimeMode.Loose;
        var editor = new DraftEditor(_studies, _studies.Stored.Id);
        await editor.OpenAsync();
        MixingModel model = editor.Model;
        return Render<SetTable>(p => p
            .Add(t => t.Editor, editor)
            .Add(t => t.Set, model.EndMembers)
            .Add(t => t.Columns, SetColumns.Of(model, []))
            .Add(t => t.Needed, ModelEdits.Parents(model))
            .Add(t => t.OnRemoved, id => _removed = id));
    }
}
