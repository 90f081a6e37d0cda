using WaterMix.Core.Mixing;

namespace WaterMix.Web.State.Mixing;

/// <summary>What a new study's model begins with: the tracers that its samples have, their usual errors, and the mask of the winter mixed layer.</summary>
public static class StartingModel
{
    private static readonly string[] Usual = ["potential_temperature", "practical_salinity", "oxygen", "nitrate", "phosphate", "silicate"];

    /// <summary>True where nobody has put anything into a model.</summary>
    /// <param name="model">The model.</param>
    public static bool IsUntouched(MixingModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        return model.EndMembers.EndMembers.Count == 0 && model.Tracers.Count == 0 && model.Layers.Count == 0 && model.Processes.Count == 0;
    }

    /// <summary>The model to begin with.</summary>
    /// <param name="model">An untouched model.</param>
    /// <param name="measured">The tracers that the samples have.</param>
    public static MixingModel From(MixingModel model, IReadOnlyList<string> measured)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(measured);
        MixingModel with = Usual.Where(measured.Contains).Aggregate(model, ModelEdits.AddTracer);
        return WinterMask.With(with, WinterMask.UsualDbar);
    }

    /// <summary>Gives a new study that has samples its model to begin with, as a step that can be undone.</summary>
    /// <param name="editor">The editor of the study, opened.</param>
    /// <param name="samples">Its samples, read.</param>
    public static async Task EnsureAsync(DraftEditor editor, StudySamples samples)
    {
        ArgumentNullException.ThrowIfNull(editor);
        ArgumentNullException.ThrowIfNull(samples);
        bool isNew = editor is { Study: { Revision: 0, Cruises.Count: > 0 }, UndoWords: null, RedoWords: null };
        if (isNew && IsUntouched(editor.Model))
        {
            await editor.EditAsync("the model to begin with", model => From(model, samples.Tracers(model)));
        }
    }
}
