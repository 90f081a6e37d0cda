using WaterMix.Core.EndMembers;

namespace WaterMix.Core.Mixing;

/// <summary>How residuals are weighed: <see cref="GeneralisedLeastSquares"/> or <see cref="WeightedRows"/>.</summary>
public abstract record Fit
{
    private protected Fit()
    {
    }

    /// <summary>Measurement error by quantity id (a parent quantity for a derived tracer). May be empty for weighted rows.</summary>
    public IReadOnlyDictionary<string, MeasurementError> MeasurementSd { get; init; } = new Dictionary<string, MeasurementError>();

    /// <summary>The factors of the derived tracers (NO, PO, N*, PO4*).</summary>
    public DerivedTracerFactors Factors { get; init; } = new();

    /// <summary>True where the other holds the same content; dictionaries in any order.</summary>
    /// <param name="other">Another one, or null.</param>
    public virtual bool Equals(Fit? other) =>
        other is not null
        && EqualityContract == other.EqualityContract
        && Structural.Same(MeasurementSd, other.MeasurementSd)
        && Factors == other.Factors;

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(EqualityContract, Structural.Hash(MeasurementSd), Factors);
}
