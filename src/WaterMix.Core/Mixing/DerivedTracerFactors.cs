namespace WaterMix.Core.Mixing;

/// <summary>The factors of the derived tracers.</summary>
public sealed record DerivedTracerFactors
{
    /// <summary>NO = O2 + this * NO3. Default 170/16, <c>AndersonSarmiento1994</c>.</summary>
    public double NoOxygenPerNitrate { get; init; } = 170.0 / 16.0;

    /// <summary>PO = O2 + this * PO4. Default 170, <c>AndersonSarmiento1994</c>.</summary>
    public double PoOxygenPerPhosphate { get; init; } = 170;

    /// <summary>N* = NO3 - this * PO4 + offset. Default 16.</summary>
    public double NStarNitratePerPhosphate { get; init; } = 16;

    /// <summary>The offset of N*, umol/kg. Default 2.9, <c>GruberSarmiento1997</c>.</summary>
    public double NStarOffset { get; init; } = 2.9;

    /// <summary>PO4* = PO4 + O2 / this + offset. Default 175, <c>Broecker1998</c>.</summary>
    public double Po4StarOxygenPerPhosphate { get; init; } = 175;

    /// <summary>The offset of PO4*, umol/kg. Default -1.95, <c>Broecker1998</c>.</summary>
    public double Po4StarOffset { get; init; } = -1.95;

    /// <summary>
    /// A tracer as a linear form of measured quantities: <c>oxygen + 170 phosphate</c> for <c>po</c>. A tracer that is measured itself is
    /// one term with factor 1. Values of end-members and samples take the offset; covariances and ratios do not.
    /// </summary>
    /// <param name="tracer">A tracer's id.</param>
    /// <returns>The terms, each parent quantity once, and the additive constant in the tracer's unit.</returns>
    public (IReadOnlyList<(string Parent, double Factor)> Terms, double Offset) FormOf(string tracer) => tracer switch
    {
        "no" => ([("oxygen", 1), ("nitrate", NoOxygenPerNitrate)], 0),
        "po" => ([("oxygen", 1), ("phosphate", PoOxygenPerPhosphate)], 0),
        "n_star" => ([("nitrate", 1), ("phosphate", -NStarNitratePerPhosphate)], NStarOffset),
        "po4_star" => ([("phosphate", 1), ("oxygen", 1 / Po4StarOxygenPerPhosphate)], Po4StarOffset),
        _ => ([(tracer, 1)], 0),
    };

    /// <summary>The value of a tracer from values of its parent quantities; NaN where a parent has none.</summary>
    /// <param name="tracer">A tracer's id.</param>
    /// <param name="values">Values by quantity id.</param>
    public double ValueOf(string tracer, IReadOnlyDictionary<string, double> values)
    {
        ArgumentNullException.ThrowIfNull(values);
        (IReadOnlyList<(string Parent, double Factor)> terms, double offset) = FormOf(tracer);
        return terms.Sum(term => term.Factor * values.GetValueOrDefault(term.Parent, double.NaN)) + offset;
    }
}
