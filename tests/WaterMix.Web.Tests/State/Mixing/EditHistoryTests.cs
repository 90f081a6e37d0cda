using WaterMix.Core.Mixing;
using WaterMix.Web.State.Mixing;

namespace WaterMix.Web.Tests.State.Mixing;

public class EditHistoryTests
{
    [Fact]
    public void Do_ThenUndoAndRedo_GoesBackAndForthOverTheSameModels()
    {
        MixingModel first = SmallModel.Make();
        var history = new EditHistory(first);
        MixingModel second = first with { Name = "Second" };
        MixingModel third = second with { Name = "Third" };
        history.Do(second, "the name");
        history.Do(third, "the name again");

        Assert.Equal("the name again", history.UndoWords);
        Assert.True(history.Undo());
        Assert.Same(second, history.Present);
        Assert.Equal("the name again", history.RedoWords);
        Assert.True(history.Undo());
        Assert.Same(first, history.Present);
        Assert.False(history.Undo());
        Assert.True(history.Redo());
        Assert.True(history.Redo());
        Assert.Same(third, history.Present);
        Assert.False(history.Redo());
    }

    [Fact]
    public void Do_AfterUndo_ForgetsWhatWasUndone()
    {
        var history = new EditHistory(SmallModel.Make());
        history.Do(history.Present with { Name = "Second" }, "the name");
        history.Undo();
        history.Do(history.Present with { Name = "Other" }, "the name");
        Assert.Null(history.RedoWords);
    }

    [Fact]
    public void Do_AModelThatSaysTheSame_IsNoStep()
    {
        var history = new EditHistory(SmallModel.Make());
        Assert.False(history.Do(SmallModel.Make(), "nothing"));
        Assert.Null(history.UndoWords);
    }

    [Fact]
    public void Do_MoreStepsThanAreKept_ForgetsTheOldest()
    {
        var history = new EditHistory(SmallModel.Make());
        for (int i = 0; i <= EditHistory.MostSteps; i++)
        {
            history.Do(history.Present with { Name = $"Name {i}" }, "the name");
        }

        int steps = 0;
        while (history.Undo())
        {
            steps++;
        }

        Assert.Equal(EditHistory.MostSteps, steps);
        Assert.Equal("Name 0", history.Present.Name);
    }
}
