using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;
using WaterMix.Web.State.EndMembers;
using WaterMix.Workspace.Studies;

namespace WaterMix.Web.State.Mixing;

/// <summary>
/// The model of a study while a person edits it: every edit is a step that can be undone, and is saved at once. What another tab saves
/// becomes a step too, so that undo leads back to what stood here.
/// </summary>
public sealed class DraftEditor : IDisposable
{
    private readonly IStudies _studies;
    private readonly SemaphoreSlim _one = new(1, 1);
    private readonly List<EndMemberSet> _published = [];
    private EditHistory? _history;
    private long _revision;

    /// <summary>An editor; <see cref="OpenAsync"/> reads the study.</summary>
    /// <param name="studies">The studies.</param>
    /// <param name="id">The study.</param>
    public DraftEditor(IStudies studies, Guid id)
    {
        ArgumentNullException.ThrowIfNull(studies);
        _studies = studies;
        Id = id;
        _studies.Changed += ReadAgain;
    }

    /// <summary>Raised after anything here changed; on any thread.</summary>
    public event Action? Changed;

    /// <summary>The study's id.</summary>
    public Guid Id { get; }

    /// <summary>The study as last read; null before <see cref="OpenAsync"/>, or where there is none.</summary>
    public Study? Study { get; private set; }

    /// <summary>True once the study was looked for.</summary>
    public bool IsOpen { get; private set; }

    /// <summary>The model as it is.</summary>
    /// <exception cref="InvalidOperationException">The study was not read.</exception>
    public MixingModel Model => _history?.Present ?? throw new InvalidOperationException("The study was not read; call OpenAsync first.");

    /// <summary>What undo takes back; null where there is nothing.</summary>
    public string? UndoWords => _history?.UndoWords;

    /// <summary>What redo does again; null where there is nothing.</summary>
    public string? RedoWords => _history?.RedoWords;

    /// <summary>True where another tab changed the model since the message was last dismissed.</summary>
    public bool ChangedElsewhere { get; private set; }

    /// <summary>Why the last edit was not saved and what to do; null where all is saved.</summary>
    public string? Problem { get; private set; }

    /// <summary>Reads the study, the first time only.</summary>
    public async Task OpenAsync()
    {
        await _one.WaitAsync();
        try
        {
            if (!IsOpen)
            {
                await ReadAsync();
                IsOpen = true;
            }
        }
        finally
        {
            _one.Release();
        }
    }

    /// <summary>Changes the model and saves it. A set that a run or a file holds keeps its version; the changed one takes the next.</summary>
    /// <param name="words">What is changed, as undo names it.</param>
    /// <param name="edit">From the model as it is to the changed one.</param>
    public Task EditAsync(string words, Func<MixingModel, MixingModel> edit)
    {
        ArgumentNullException.ThrowIfNull(edit);
        MixingModel edited = edit(Model);
        return DoAsync(words, SetVersions.Counted(Model, edited, Published));
    }

    /// <summary>Takes a model from elsewhere, such as a file, with the version that its set has.</summary>
    /// <param name="words">What is changed, as undo names it.</param>
    /// <param name="model">The model.</param>
    public Task ReplaceAsync(string words, MixingModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        _published.Add(model.EndMembers);
        return DoAsync(words, model);
    }

    /// <summary>Says that the set as it is went out as a file: the next change of it takes the next version.</summary>
    public void Publish() => _published.Add(Model.EndMembers);

    /// <summary>Takes the last step back, and saves.</summary>
    public Task UndoAsync() => _history?.Undo() == true ? SaveAsync() : Task.CompletedTask;

    /// <summary>Does the step again that was taken back last, and saves.</summary>
    public Task RedoAsync() => _history?.Redo() == true ? SaveAsync() : Task.CompletedTask;

    /// <summary>Saves the model as it is.</summary>
    public async Task SaveAsync()
    {
        Changed?.Invoke();
        await _one.WaitAsync();
        try
        {
            long? saved = await _studies.SaveDraftAsync(Id, Model, _revision);
            Problem = null;
            if (saved is { } revision)
            {
                _revision = revision;
            }
            else
            {
                await ReadAsync();
            }
        }
        catch (Exception fault) when (fault is not OperationCanceledException)
        {
            Problem = $"The last change is not saved: {fault.Message.TrimEnd('.')}. It is still on this page; try again.";
        }
        finally
        {
            _one.Release();
        }

        Changed?.Invoke();
    }

    /// <summary>Takes the message about another tab away.</summary>
    public void Dismiss() => ChangedElsewhere = false;

    /// <inheritdoc/>
    public void Dispose()
    {
        _studies.Changed -= ReadAgain;
        _one.Dispose();
    }

    private IEnumerable<EndMemberSet> Published => (Study?.Runs.Select(r => r.Model.EndMembers) ?? []).Concat(_published);

    private Task DoAsync(string words, MixingModel model) => _history!.Do(model, words) ? SaveAsync() : Task.CompletedTask;

    private void ReadAgain(Guid study)
    {
        if (study == Id && IsOpen)
        {
            _ = ReadAgainAsync();
        }
    }

    private async Task ReadAgainAsync()
    {
        try
        {
            await _one.WaitAsync();
        }
        catch (ObjectDisposedException)
        {
            return; // The tab was closed meanwhile.
        }

        try
        {
            await ReadAsync();
        }
        finally
        {
            _one.Release();
        }

        Changed?.Invoke();
    }

    private async Task ReadAsync()
    {
        Study = await _studies.FindAsync(Id);
        if (Study is null)
        {
            return;
        }

        if (_history is null)
        {
            _history = new EditHistory(Study.Draft);
        }
        else if (Study.Revision != _revision && _history.Do(Study.Draft, "the change made in another tab"))
        {
            ChangedElsewhere = true;
        }

        _revision = Study.Revision;
    }
}
