using WaterMix.Core.EndMembers;

namespace WaterMix.Core.Mixing;

/// <summary>The published row-weighting recipes (<c>TomczakLarge1989</c>): standardise over the end-members, weigh, minimise the sum of squared rows.</summary>
/// <param name="Weights">Weight by tracer id, each > 0.</param>
public sealed record WeightedRows(IReadOnlyDictionary<string, double> Weights) : Fit
{
    /// <summary>What is done to a tracer row before it is weighed.</summary>
    public Standardisation Standardise { get; init; } = Standardisation.MeanAndSd;

    /// <summary>Whether mean and sd are taken over the layer's permitted end-members or over the whole set.</summary>
    public StandardiseOver Over { get; init; } = StandardiseOver.Layer;

    /// <summary>The divisor of the variance.</summary>
    public SdDivisor SdOver { get; init; } = SdDivisor.N;

    /// <summary>Whether a weight multiplies the row or its square.</summary>
    public WeightMeaning WeightsAre { get; init; } = WeightMeaning.RowFactors;

    /// <summary>True where the other holds the same content; dictionaries in any order.</summary>
    /// <param name="other">Another one, or null.</param>
    public bool Equals(WeightedRows? other) =>
        base.Equals(other)
        && Structural.Same(Weights, other!.Weights)
        && Standardise == other.Standardise
        && Over == other.Over
        && SdOver == other.SdOver
        && WeightsAre == other.WeightsAre;

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(base.GetHashCode(), Structural.Hash(Weights), Standardise);
}
