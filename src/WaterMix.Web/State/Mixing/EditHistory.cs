using WaterMix.Core.Mixing;

namespace WaterMix.Web.State.Mixing;

/// <summary>The model as it is, and the steps that led to it and away from it: undo and redo.</summary>
/// <param name="present">The model to begin with.</param>
public sealed class EditHistory(MixingModel present)
{
    /// <summary>Steps that can be taken back; the oldest go first when there are more.</summary>
    public const int MostSteps = 200;

    private readonly List<EditStep> _done = [];
    private readonly List<EditStep> _undone = [];

    /// <summary>The model as it is.</summary>
    public MixingModel Present { get; private set; } = present;

    /// <summary>What undo takes back, such as <c>oxygen of NDW</c>; null where there is nothing.</summary>
    public string? UndoWords => _done.LastOrDefault()?.Words;

    /// <summary>What redo does again; null where there is nothing.</summary>
    public string? RedoWords => _undone.LastOrDefault()?.Words;

    /// <summary>Makes another model the present one. A model that says the same is no step.</summary>
    /// <param name="model">The model.</param>
    /// <param name="words">What was changed, such as <c>oxygen of NDW</c>.</param>
    /// <returns>True where the model changed.</returns>
    public bool Do(MixingModel model, string words)
    {
        ArgumentNullException.ThrowIfNull(model);
        if (model == Present)
        {
            return false;
        }

        _done.Add(new EditStep(Present, words));
        if (_done.Count > MostSteps)
        {
            _done.RemoveAt(0);
        }

        _undone.Clear();
        Present = model;
        return true;
    }

    /// <summary>Takes the last step back.</summary>
    /// <returns>False where there is none.</returns>
    public bool Undo() => Move(_done, _undone);

    /// <summary>Does the step again that was taken back last.</summary>
    /// <returns>False where there is none.</returns>
    public bool Redo() => Move(_undone, _done);

    private bool Move(List<EditStep> from, List<EditStep> to)
    {
        if (from.Count == 0)
        {
            return false;
        }

        EditStep step = from[^1];
        from.RemoveAt(from.Count - 1);
        to.Add(new EditStep(Present, step.Words));
        Present = step.Model;
        return true;
    }

    /// <summary>A model on the other side of a step.</summary>
    private sealed record EditStep(MixingModel Model, string Words);
}
