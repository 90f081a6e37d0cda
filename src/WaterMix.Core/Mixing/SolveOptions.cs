namespace WaterMix.Core.Mixing;

/// <summary>How a run is carried out; none of it changes a number of the result.</summary>
public sealed record SolveOptions
{
    /// <summary>Most threads at work, at least 1. Default: one per processor.</summary>
    public int Threads { get; init; } = Environment.ProcessorCount;

    /// <summary>True to keep each sample's optimality violation.</summary>
    public bool WithProof { get; init; }

    /// <summary>Ends the work early.</summary>
    public CancellationToken Cancellation { get; init; }
}
