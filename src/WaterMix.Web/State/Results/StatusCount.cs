using WaterMix.Core.Mixing;

namespace WaterMix.Web.State.Results;

/// <summary>How many samples of a run have a status, and why.</summary>
/// <param name="Status">The status.</param>
/// <param name="Count">Number of samples.</param>
/// <param name="Reasons">The solver's remarks on them with how many have each, the most frequent first; at most <see cref="MostReasons"/>.</param>
public sealed record StatusCount(SolveStatus Status, int Count, IReadOnlyList<(string Reason, int Count)> Reasons)
{
    /// <summary>As many reasons are listed.</summary>
    public const int MostReasons = 6;

    /// <summary>The statuses that occur, the most frequent first.</summary>
    /// <param name="results">The results.</param>
    public static IReadOnlyList<StatusCount> Of(RunResults results)
    {
        ArgumentNullException.ThrowIfNull(results);
        return
        [
            .. Enumerable.Range(0, results.RowCount)
                .GroupBy(row => results.Status[row])
                .Select(group => new StatusCount(group.Key, group.Count(), ReasonsOf(results, group)))
                .OrderByDescending(s => s.Count),
        ];
    }

    private static IReadOnlyList<(string Reason, int Count)> ReasonsOf(RunResults results, IEnumerable<int> rows) =>
    [
        .. rows.Select(results.NoteOf)
            .OfType<string>()
            .GroupBy(note => note, StringComparer.Ordinal)
            .Select(group => (group.Key, group.Count()))
            .OrderByDescending(reason => reason.Item2)
            .Take(MostReasons),
    ];
}
