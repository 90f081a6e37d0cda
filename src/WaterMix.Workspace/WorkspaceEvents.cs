using Microsoft.Extensions.Logging;

namespace WaterMix.Workspace;

/// <summary>Tells whoever listens that something changed. A listener that fails is logged and harms nobody else.</summary>
internal sealed partial class WorkspaceEvents(ILogger<WorkspaceEvents> log)
{
    /// <summary>A study changed.</summary>
    public event Action<Guid>? StudyChanged;

    /// <summary>A run made progress or ended.</summary>
    public event Action<Guid>? RunProgressed;

    /// <summary>Raises <see cref="StudyChanged"/>.</summary>
    public void Change(Guid study) => Raise(StudyChanged, study);

    /// <summary>Raises <see cref="RunProgressed"/>.</summary>
    public void Progress(Guid run) => Raise(RunProgressed, run);

    private void Raise(Action<Guid>? listeners, Guid id)
    {
        foreach (Action<Guid> listener in Delegate.EnumerateInvocationList(listeners))
        {
            try
            {
                listener(id);
            }
#pragma warning disable CA1031 // Whatever a page's listener throws must not end a job or another page's update.
            catch (Exception fault)
#pragma warning restore CA1031
            {
                ListenerFailed(fault);
            }
        }
    }

    [LoggerMessage(Level = LogLevel.Warning, Message = "A listener to changes failed.")]
    private partial void ListenerFailed(Exception fault);
}
