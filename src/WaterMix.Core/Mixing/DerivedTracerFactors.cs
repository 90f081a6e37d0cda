using WaterMix.Core.EndMembers;

namespace WaterMix.Core.Mixing;

/// <summary>The factors of the derived tracers.</summary>
public sealed record DerivedTracerFactors
{
    // A sum no larger than this share of its terms is rounding: the terms cancel.
    private const double Cancelled = 1e-12;

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

    /// <summary>
    /// The change of a tracer by a process, from the ratios of its parent quantities. What cancels to within rounding is 0: respiration in
    /// the ratios that PO is defined with does not change PO.
    /// </summary>
    /// <param name="tracer">A tracer's id.</param>
    /// <param name="ratios">Change by quantity id; a quantity without one does not change.</param>
    public double ChangeOf(string tracer, IReadOnlyDictionary<string, double> ratios)
    {
        ArgumentNullException.ThrowIfNull(ratios);
        double[] changes = [.. FormOf(tracer).Terms.Select(term => term.Factor * ratios.GetValueOrDefault(term.Parent))];
        double sum = changes.Sum();
        return Math.Abs(sum) <= Cancelled * changes.Max(Math.Abs) ? 0 : sum;
    }

    /// <summary>Mean and standard deviation of a tracer over end-members; those that lack it do not count. A deviation within rounding is 0.</summary>
    /// <param name="tracer">A tracer's id.</param>
    /// <param name="endMembers">The end-members.</param>
    /// <param name="divisor">What the sum of squares is divided by.</param>
    /// <returns>NaN for both where no end-member has the tracer.</returns>
    public (double Mean, double Sd) SpreadOf(string tracer, IEnumerable<EndMember> endMembers, SdDivisor divisor)
    {
        ArgumentNullException.ThrowIfNull(endMembers);
        EndMember[] having = [.. endMembers.Where(e => FormOf(tracer).Terms.All(term => e.Values.ContainsKey(term.Parent)))];
        if (having.Length == 0)
        {
            return (double.NaN, double.NaN);
        }

        double[] values = [.. having.Select(e => ValueOf(tracer, e.Values))];
        double mean = values.Average();
        double squares = values.Sum(v => (v - mean) * (v - mean));
        double sd = values.Length == 1 ? 0 : Math.Sqrt(squares / (divisor == SdDivisor.N ? values.Length : values.Length - 1));
        double largest = having.Max(e => FormOf(tracer).Terms.Max(term => Math.Abs(term.Factor * e.Values[term.Parent])));
        return (mean, sd <= Cancelled * largest ? 0 : sd);
    }
}
