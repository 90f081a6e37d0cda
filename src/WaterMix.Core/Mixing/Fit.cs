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
}
