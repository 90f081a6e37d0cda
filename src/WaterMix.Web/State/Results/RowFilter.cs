using WaterMix.Core.Mixing;

namespace WaterMix.Web.State.Results;

/// <summary>Which samples are shown, in the figure, in the summaries and in the table alike.</summary>
public sealed record RowFilter
{
    /// <summary>Every sample.</summary>
    public static readonly RowFilter None = new();

    /// <summary>Only samples with this status; null for all.</summary>
    public SolveStatus? Status { get; init; }

    /// <summary>Only samples of the layer with this id; null for all.</summary>
    public string? Layer { get; init; }

    /// <summary>Only samples of this cruise, counted from 1 in the study's order; null for all.</summary>
    public int? Cruise { get; init; }

    /// <summary>Ranges that all must hold.</summary>
    public IReadOnlyList<RowCondition> Conditions { get; init; } = [];

    /// <summary>True where every sample passes.</summary>
    public bool IsNone => Status is null && Layer is null && Cruise is null && Conditions.Count == 0;

    /// <summary>True where the other lets the same samples pass.</summary>
    /// <param name="other">Another one, or null.</param>
    public bool Equals(RowFilter? other) =>
        other is not null && Status == other.Status && Layer == other.Layer && Cruise == other.Cruise && Conditions.SequenceEqual(other.Conditions);

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(Status, Layer, Cruise, Conditions.Count);
}
