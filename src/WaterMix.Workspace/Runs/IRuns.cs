using WaterMix.Core.Mixing;

namespace WaterMix.Workspace.Runs;

/// <summary>Runs: a model applied to the samples of a study. Kept, named, never overwritten.</summary>
public interface IRuns
{
    /// <summary>Raised with a run's id when it made progress or ended.</summary>
    event Action<Guid>? Progressed;

    /// <summary>Starts a run of the study's draft over all its cruises, in the background; it survives a restart.</summary>
    /// <param name="study">The study.</param>
    /// <param name="name">The run's name.</param>
    /// <returns>The run's id.</returns>
    /// <exception cref="InvalidOperationException">The draft has errors or there are no samples; the message says what to do.</exception>
    Task<Guid> StartAsync(Guid study, string name);

    /// <summary>Cancels a run that waits or runs; it stays in the list as cancelled.</summary>
    Task CancelAsync(Guid run);

    /// <summary>One run, or null.</summary>
    Task<Run?> FindAsync(Guid run);

    /// <summary>The result of a finished run, one per cruise in the study's order, from a shared cache.</summary>
    Task<IReadOnlyList<CruiseResult>> ResultsAsync(Guid run);

    /// <summary>Renames a run.</summary>
    Task RenameAsync(Guid run, string name);

    /// <summary>Writes the results as CSV by the contract: what the command line would write for the run's model and samples.</summary>
    Task WriteCsvAsync(Guid run, Stream output, CancellationToken cancellation);
}

/// <summary>How far a run is.</summary>
public enum RunState
{
    /// <summary>In the queue.</summary>
    Waiting,

    /// <summary>At work.</summary>
    Running,

    /// <summary>Done.</summary>
    Finished,

    /// <summary>Cancelled by a person.</summary>
    Cancelled,

    /// <summary>Ended by a fault; <see cref="Run.Problem"/> says which.</summary>
    Failed,
}

/// <summary>A run and how far it is.</summary>
/// <param name="Id">The run.</param>
/// <param name="Name">Its name.</param>
/// <param name="Started">When it was started, UTC.</param>
/// <param name="State">How far it is.</param>
/// <param name="Done">Samples solved so far.</param>
/// <param name="Total">Samples in all.</param>
/// <param name="Model">The model as it was, its set inline.</param>
/// <param name="ModelHash">SHA-256 of the model.</param>
/// <param name="Statuses">Number of samples by status; empty until finished.</param>
/// <param name="Problem">What went wrong and what to do, or null.</param>
public sealed record Run(
    Guid Id,
    string Name,
    DateTimeOffset Started,
    RunState State,
    long Done,
    long Total,
    MixingModel Model,
    string ModelHash,
    IReadOnlyDictionary<SolveStatus, long> Statuses,
    string? Problem);

/// <summary>The results of one cruise in a run.</summary>
/// <param name="Cruise">The cruise's id.</param>
/// <param name="CruiseName">Its name.</param>
/// <param name="SamplesHash">Its samples.</param>
/// <param name="Result">One entry per sample, in the order of the samples.</param>
public sealed record CruiseResult(Guid Cruise, string CruiseName, string SamplesHash, MixingResult Result);
