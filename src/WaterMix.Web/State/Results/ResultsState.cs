using WaterMix.Core.Samples;
using WaterMix.Workspace.Cruises;
using WaterMix.Workspace.Runs;
using WaterMix.Workspace.Studies;

namespace WaterMix.Web.State.Results;

/// <summary>What the Results page of a study remembers. Reading and computing happen away from the caller's thread; of several requests the latest wins.</summary>
/// <param name="studies">The studies.</param>
/// <param name="cruises">The samples.</param>
/// <param name="runs">The runs.</param>
public sealed class ResultsState(IStudies studies, ICruises cruises, IRuns runs)
{
    private Task _before = Task.CompletedTask;
    private ResultsMaker? _maker;
    private int _latest;

    /// <summary>The study, or null before it is read and where there is none.</summary>
    public Study? Study { get; private set; }

    /// <summary>True once the study was looked for.</summary>
    public bool IsRead { get; private set; }

    /// <summary>The run that the view names, or the newest finished one, or the newest; null where there is none.</summary>
    public Run? Run { get; private set; }

    /// <summary>What is shown; null where the run is not finished, and before it was read for the first time.</summary>
    public ResultsShown? Shown { get; private set; }

    /// <summary>Why the run's results cannot be shown and what to do, or null.</summary>
    public string? Problem { get; private set; }

    /// <summary>The runs of the study, the newest first.</summary>
    public IReadOnlyList<Run> Runs => Study?.Runs ?? [];

    /// <summary>The runs that wait or work.</summary>
    public IEnumerable<Run> AtWork => Runs.Where(r => r.State is RunState.Waiting or RunState.Running);

    /// <summary>Reads the study again and shows a view of it.</summary>
    /// <param name="study">The study.</param>
    /// <param name="view">The view.</param>
    public async Task ReadAsync(Guid study, ResultsView view)
    {
        Study = await studies.FindAsync(study);
        IsRead = true;
        await ShowAsync(view);
    }

    /// <summary>Takes the progress of a run of this study in.</summary>
    /// <param name="run">The run's id.</param>
    /// <param name="view">The view.</param>
    /// <returns>True where something of this page changed.</returns>
    public async Task<bool> TakeProgressAsync(Guid run, ResultsView view)
    {
        if (Study is null || Runs.All(r => r.Id != run) || await runs.FindAsync(run) is not { } now)
        {
            return false;
        }

        Study = Study with { Runs = [.. Runs.Select(r => r.Id == run ? now : r)] };
        await ShowAsync(view);
        return true;
    }

    /// <summary>Shows a view of the study as it was read.</summary>
    /// <param name="view">The view.</param>
    public async Task ShowAsync(ResultsView view)
    {
        ArgumentNullException.ThrowIfNull(view);
        int own = ++_latest;
        Run = Chosen(view);
        if (Run is not { State: RunState.Finished } run)
        {
            (Shown, Problem) = (null, null);
            return;
        }

        // One after the other, in the order of the calls.
        Task before = _before;
        var done = new TaskCompletionSource();
        _before = done.Task;
        await before;
        try
        {
            if (own != _latest)
            {
                return;
            }

            ResultsShown shown = await Task.Run(() => MakeAsync(run, view));
            if (own == _latest)
            {
                (Shown, Problem) = (shown, null);
            }
        }
        catch (Exception fault) when (fault is IOException or InvalidOperationException)
        {
            (Shown, Problem) = (null, $"The results of “{run.Name}” could not be read: {fault.Message} Choose another run, or run the model again.");
        }
        finally
        {
            done.SetResult();
        }
    }

    /// <summary>Renames the run that is shown.</summary>
    /// <param name="name">Its new name.</param>
    /// <returns>Why the name was not taken and what to do, or null.</returns>
    public async Task<string?> RenameAsync(string name)
    {
        ArgumentNullException.ThrowIfNull(name);
        if (Run is null)
        {
            return null;
        }

        if (name.Trim().Length is 0 or > 200)
        {
            return name.Trim().Length == 0 ? "A run needs a name. Type what is special about it." : "The name is longer than 200 characters. Shorten it.";
        }

        await runs.RenameAsync(Run.Id, name.Trim());
        return null;
    }

    private Run? Chosen(ResultsView view) =>
        view.Run is { } named
            ? Runs.FirstOrDefault(r => r.Id == named)
            : Runs.FirstOrDefault(r => r.State == RunState.Finished) ?? (Runs.Count > 0 ? Runs[0] : null);

    private async Task<ResultsShown> MakeAsync(Run run, ResultsView view)
    {
        if (_maker?.Results.Run.Id != run.Id)
        {
            IReadOnlyList<CruiseResult> results = await runs.ResultsAsync(run.Id);
            SampleTable[] samples = await Task.WhenAll(results.Select(r => cruises.SamplesAsync(r.SamplesHash)));
            _maker = new ResultsMaker(new RunResults(run, results, samples));
        }

        return _maker.Make(view);
    }
}
