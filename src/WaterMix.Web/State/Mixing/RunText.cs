using System.Globalization;
using WaterMix.Core.Mixing;
using WaterMix.Workspace.Runs;
using WaterMix.Workspace.Studies;

namespace WaterMix.Web.State.Mixing;

/// <summary>Runs in words.</summary>
public static class RunText
{
    /// <summary>A name that no run of the study has: <c>Run 3</c>.</summary>
    /// <param name="study">The study.</param>
    public static string ProposedName(Study study)
    {
        ArgumentNullException.ThrowIfNull(study);
        var names = study.Runs.Select(r => r.Name).ToHashSet(StringComparer.OrdinalIgnoreCase);
        return Enumerable.Range(study.Runs.Count + 1, study.Runs.Count + 1).Select(n => string.Create(CultureInfo.InvariantCulture, $"Run {n}")).First(name => !names.Contains(name));
    }

    /// <summary>How far a run is, for a bar.</summary>
    /// <param name="run">A run that waits or runs.</param>
    public static string Progress(Run run)
    {
        ArgumentNullException.ThrowIfNull(run);
        return run.State == RunState.Waiting
            ? $"\u201c{run.Name}\u201d waits for its turn"
            : $"\u201c{run.Name}\u201d: {PlainText.Count(run.Done)} of {PlainText.Count(run.Total, "sample")} solved";
    }

    /// <summary>How far, 0 to 1; null where it is not known.</summary>
    /// <param name="run">The run.</param>
    public static double? Fraction(Run run)
    {
        ArgumentNullException.ThrowIfNull(run);
        return run.State == RunState.Waiting || run.Total == 0 ? null : (double)run.Done / run.Total;
    }

    /// <summary>What came out, in a sentence.</summary>
    /// <param name="run">A finished run.</param>
    public static string Finished(Run run)
    {
        ArgumentNullException.ThrowIfNull(run);
        return $"\u201c{run.Name}\u201d is done: {Solved(run)}.";
    }

    /// <summary>The state of a run, for a list.</summary>
    /// <param name="run">The run.</param>
    public static string State(Run run)
    {
        ArgumentNullException.ThrowIfNull(run);
        return run.State switch
        {
            RunState.Waiting => "Waits",
            RunState.Running => $"{PlainText.Count(run.Done)} of {PlainText.Count(run.Total)} solved",
            RunState.Finished => Solved(run),
            RunState.Cancelled => "Cancelled",
            _ => run.Problem ?? "Failed",
        };
    }

    private static string Solved(Run run) =>
        $"{PlainText.Count(run.Statuses.GetValueOrDefault(SolveStatus.Solved))} of {PlainText.Count(run.Total, "sample")} solved";
}
