using AngleSharp.Dom;
using Bunit;
using WaterMix.Web.Components.Common;

namespace WaterMix.Web.Tests.Components.Common;

/// <summary>The frame and what stands in it.</summary>
public sealed class FrameTests : BunitContext
{
    [Fact]
    public void PageFrame_AllSlots_AreNamedRegionsInReadingOrder()
    {
        IRenderedComponent<PageFrame> frame = Render<PageFrame>(p => p
            .Add(f => f.Title, "Results")
            .Add(f => f.Figure, "<i>figure</i>")
            .Add(f => f.FigureLabel, "Sections")
            .Add(f => f.Margin, "<i>margin</i>")
            .Add(f => f.Numbers, "<i>numbers</i>"));

        Assert.Equal("Results", Assert.Single(frame.FindAll("h1")).TextContent);
        Assert.Equal(["Sections", "Notes and choices", "Numbers"], frame.FindAll("section").Select(s => s.GetAttribute("aria-label")));
        Assert.Equal(["figure", "margin", "numbers"], frame.FindAll("section i").Select(i => i.TextContent));
    }

    [Fact]
    public void PageFrame_EmptySlots_TakeNoRoom()
    {
        IRenderedComponent<PageFrame> frame = Render<PageFrame>(p => p.Add(f => f.Title, "Results"));

        Assert.Empty(frame.FindAll("section"));
        Assert.Contains("without-margin", frame.Find(".page-frame").ClassName, StringComparison.Ordinal);
    }

    [Fact]
    public void MarginNote_WithASummary_OpensItsControlOnDemand()
    {
        IRenderedComponent<MarginNote> note = Render<MarginNote>(p => p
            .Add(n => n.Heading, "Mass").Add(n => n.Words, "Mass is conserved exactly.").Add(n => n.Summary, "Change").AddChildContent("<input />"));

        Assert.Equal("Mass", note.Find("h2").TextContent);
        IElement details = note.Find("details");
        Assert.False(details.HasAttribute("open"));
        Assert.NotNull(details.QuerySelector("input"));
    }

    [Theory]
    [InlineData(NoticeKind.Note, "status")]
    [InlineData(NoticeKind.Warning, "status")]
    [InlineData(NoticeKind.Error, "alert")]
    public void Notice_OfEachKind_IsHeardAsItWeighs(NoticeKind kind, string role)
    {
        IRenderedComponent<Notice> notice = Render<Notice>(p => p.Add(n => n.Kind, kind).Add(n => n.Text, "Done."));

        Assert.Equal(role, notice.Find(".notice").GetAttribute("role"));
        Assert.Empty(notice.FindAll("button"));
    }

    [Fact]
    public async Task Notice_WithHandlers_OffersUndoAndDismiss()
    {
        var pressed = new List<string>();
        IRenderedComponent<Notice> notice = Render<Notice>(p => p
            .Add(n => n.Text, "Deleted.").Add(n => n.ActionText, "Undo").Add(n => n.OnAction, () => pressed.Add("undo")).Add(n => n.OnDismiss, () => pressed.Add("dismiss")));

        foreach (IElement button in notice.FindAll("button"))
        {
            await button.ClickAsync();
        }

        Assert.Equal(["undo", "dismiss"], pressed);
    }

    [Fact]
    public void WorkBar_Words_LabelTheBar()
    {
        IRenderedComponent<WorkBar> bar = Render<WorkBar>(p => p.Add(b => b.Words, "Solving: 1 of 3 samples").Add(b => b.Fraction, 1.0 / 3));

        IElement progress = bar.Find("progress");
        Assert.Equal("0.333", progress.GetAttribute("value"));
        Assert.Equal("Solving: 1 of 3 samples", bar.Find($"label[for={progress.Id}]").TextContent);
        Assert.Empty(bar.FindAll("button"));
    }

    [Fact]
    public void WorkBar_FractionUnknown_IsIndeterminate() =>
        Assert.False(Render<WorkBar>(p => p.Add(b => b.Words, "Reading")).Find("progress").HasAttribute("value"));

    [Fact]
    public async Task NameForm_EnterAndEscape_SaveAndGiveUp()
    {
        string? saved = null;
        bool gaveUp = false;
        JSInterop.Mode = JSRuntimeMode.Loose;
        IRenderedComponent<NameForm> form = Render<NameForm>(p => p
            .Add(f => f.Label, "Name").Add(f => f.Name, "Old").Add(f => f.Problem, "Too long.").Add(f => f.OnSave, name => saved = name).Add(f => f.OnGiveUp, () => gaveUp = true));
        IElement input = form.Find("input");

        Assert.Equal("Old", input.GetAttribute("value"));
        Assert.Equal("true", input.GetAttribute("aria-invalid"));
        Assert.Equal("Too long.", form.Find($"#{input.GetAttribute("aria-describedby")}").TextContent);
        await input.InputAsync("New");
        await form.Find("form").SubmitAsync();
        await form.Find("form").KeyDownAsync("Escape");
        Assert.Equal("New", saved);
        Assert.True(gaveUp);
    }
}
