using WaterMix.Core;
using WaterMix.Core.Mixing;

namespace WaterMix.Formats.Results;

/// <summary>What became of an input as a whole.</summary>
/// <param name="Rows">Number of samples.</param>
/// <param name="Statuses">Number of samples by status, those that occur.</param>
/// <param name="Findings">What was found while reading and deriving, the same thing folded into one with its count.</param>
/// <param name="SamplesHash">SHA-256 of the samples as read, lower-case hex.</param>
/// <param name="LargestKktViolation">The worst proof of optimality among the solved samples, or NaN where it was not asked for.</param>
public sealed record SolveSummary(
    long Rows,
    IReadOnlyDictionary<SolveStatus, long> Statuses,
    IReadOnlyList<Finding> Findings,
    string SamplesHash,
    double LargestKktViolation)
{
    /// <summary>True where the input is not usable; what was written is then to be thrown away.</summary>
    public bool HasErrors => Findings.Any(f => f.Severity == Severity.Error);
}
