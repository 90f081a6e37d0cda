using WaterMix.Web.State.EndMembers;
using WaterMix.Web.State.Mixing;

namespace WaterMix.Web.Tests.State.Mixing;

public class DraftEditorTests
{
    private readonly DraftStudies _studies = new(SmallModel.Make());

    [Fact]
    public async Task EditAsync_AnEdit_IsSavedAtOnceWithTheNextRevision()
    {
        using DraftEditor editor = await OpenAsync();
        await editor.EditAsync("the name", m => m with { Name = "Other" });
        Assert.Equal("Other", _studies.Stored.Draft.Name);
        Assert.Equal(5, _studies.Stored.Revision);
        Assert.False(editor.ChangedElsewhere);
    }

    [Fact]
    public async Task UndoAsync_AfterAnEdit_SavesTheModelOfBefore()
    {
        using DraftEditor editor = await OpenAsync();
        await editor.EditAsync("the name", m => m with { Name = "Other" });
        await editor.UndoAsync();
        Assert.Equal("Small", _studies.Stored.Draft.Name);
        await editor.RedoAsync();
        Assert.Equal("Other", _studies.Stored.Draft.Name);
    }

    [Fact]
    public async Task Changed_AnotherTabSaves_ShowsItsModelAndUndoLeadsBack()
    {
        using DraftEditor editor = await OpenAsync();
        await editor.EditAsync("the name", m => m with { Name = "Mine" });
        await _studies.SaveDraftAsync(_studies.Stored.Id, _studies.Stored.Draft with { Name = "Theirs" }, _studies.Stored.Revision);
        await UntilAsync(() => editor.ChangedElsewhere);
        Assert.Equal("Theirs", editor.Model.Name);

        await editor.UndoAsync();
        Assert.Equal("Mine", _studies.Stored.Draft.Name);
        await editor.UndoAsync();
        Assert.Equal("Small", _studies.Stored.Draft.Name);
    }

    [Fact]
    public async Task Changed_TwoEditorsOfOneStudy_EndWithTheSameModel()
    {
        using DraftEditor one = await OpenAsync();
        using DraftEditor other = await OpenAsync();
        await one.EditAsync("the name", m => m with { Name = "One" });
        await other.EditAsync("adding a layer", ModelEdits.AddLayer);
        await UntilAsync(() => one.Model == other.Model);
        Assert.Equal(_studies.Stored.Draft, one.Model);
    }

    [Fact]
    public async Task EditAsync_SavingFails_KeepsTheEditAndSaysSo()
    {
        using DraftEditor editor = await OpenAsync();
        _studies.Fault = new IOException("The disk is full.");
        await editor.EditAsync("the name", m => m with { Name = "Other" });
        Assert.Contains("The disk is full", editor.Problem, StringComparison.Ordinal);
        Assert.Equal("Other", editor.Model.Name);

        _studies.Fault = null;
        await editor.SaveAsync();
        Assert.Null(editor.Problem);
        Assert.Equal("Other", _studies.Stored.Draft.Name);
    }

    [Fact]
    public async Task EditAsync_OfASetThatARunUsed_TakesTheNextVersionOnceAndUndoTheOldOne()
    {
        _studies.Run(_studies.Stored.Draft);
        using DraftEditor editor = await OpenAsync();
        await editor.EditAsync("oxygen of A", m => SetEdits.WithValue(m, 0, "oxygen", 281));
        Assert.Equal(2, editor.Model.EndMembers.Version);
        await editor.EditAsync("oxygen of A", m => SetEdits.WithValue(m, 0, "oxygen", 282));
        Assert.Equal(2, editor.Model.EndMembers.Version);
        await editor.UndoAsync();
        await editor.UndoAsync();
        Assert.Equal(1, editor.Model.EndMembers.Version);
    }

    [Fact]
    public async Task EditAsync_AfterTheSetWentOutAsAFile_TakesTheNextVersion()
    {
        using DraftEditor editor = await OpenAsync();
        await editor.EditAsync("oxygen of A", m => SetEdits.WithValue(m, 0, "oxygen", 281));
        Assert.Equal(1, editor.Model.EndMembers.Version);
        editor.Publish();
        await editor.EditAsync("oxygen of A", m => SetEdits.WithValue(m, 0, "oxygen", 282));
        Assert.Equal(2, editor.Model.EndMembers.Version);
    }

    private async Task<DraftEditor> OpenAsync()
    {
        var editor = new DraftEditor(_studies, _studies.Stored.Id);
        await editor.OpenAsync();
        return editor;
    }

    // What another tab saved is read beside the tab's own work, not within it.
    private static async Task UntilAsync(Func<bool> condition)
    {
        for (int i = 0; i < 200 && !condition(); i++)
        {
            await Task.Delay(25, TestContext.Current.CancellationToken);
        }

        Assert.True(condition());
    }
}
