using WaterMix.Core;

namespace WaterMix.Formats.Reading;

/// <summary>Findings as they come, with repeated ones folded into the first.</summary>
internal sealed class FindingList
{
    private readonly List<Finding> _findings = [];
    private readonly Dictionary<(string Kind, string? Column), int> _folded = [];

    /// <summary>What was found so far, in the order of the first places.</summary>
    public IReadOnlyList<Finding> All => _findings;

    /// <summary>True where the input is not usable.</summary>
    public bool HasErrors => _findings.Any(f => f.Severity == Severity.Error);

    /// <summary>Adds one finding.</summary>
    public void Add(Finding finding) => _findings.Add(finding);

    /// <summary>Counts a finding of this kind in this column; the first one gives place and words.</summary>
    /// <param name="kind">What is the same about them.</param>
    /// <param name="column">The column they share, or null.</param>
    /// <param name="first">Makes the finding where it is the first.</param>
    /// <param name="count">How many are counted at once.</param>
    public void Fold(string kind, string? column, Func<Finding> first, long count = 1)
    {
        if (_folded.TryGetValue((kind, column), out int index))
        {
            _findings[index] = _findings[index] with { Count = _findings[index].Count + count };
            return;
        }

        _folded.Add((kind, column), _findings.Count);
        _findings.Add(first() with { Count = count });
    }

    /// <summary>How often this kind was found in this column.</summary>
    public long CountOf(string kind, string? column) => _folded.TryGetValue((kind, column), out int index) ? _findings[index].Count : 0;

    /// <summary>Replaces the first finding of this kind in this column.</summary>
    public void Replace(string kind, string? column, Func<Finding, Finding> change)
    {
        int index = _folded[(kind, column)];
        _findings[index] = change(_findings[index]);
    }
}
