using WaterMix.Workspace.Studies;

namespace WaterMix.Web.State.Mixing;

/// <summary>The editors of one browser tab, one per study, so that undo holds when a person goes from page to page.</summary>
/// <param name="studies">The studies.</param>
public sealed class DraftEditors(IStudies studies) : IDisposable
{
    private readonly Dictionary<Guid, DraftEditor> _editors = [];

    /// <summary>The editor of a study.</summary>
    /// <param name="study">The study.</param>
    public DraftEditor Of(Guid study)
    {
        if (!_editors.TryGetValue(study, out DraftEditor? editor))
        {
            editor = new DraftEditor(studies, study);
            _editors.Add(study, editor);
        }

        return editor;
    }

    /// <inheritdoc/>
    public void Dispose()
    {
        foreach (DraftEditor editor in _editors.Values)
        {
            editor.Dispose();
        }
    }
}
