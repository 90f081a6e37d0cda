using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;

namespace WaterMix.Web.State.Figures;

/// <summary>
/// The standard deviation that a tracer's residual is to be compared with: the square root of the diagonal of S, that is the error of
/// the measurement and, in generalised least squares, the spread within the sources at the sample's own fractions.
/// </summary>
public static class ResidualScale
{
    /// <summary>One standard deviation of a residual.</summary>
    /// <param name="model">The model of the run.</param>
    /// <param name="tracer">A tracer of the model.</param>
    /// <param name="observed">The sample's usable values by parent quantity.</param>
    /// <param name="fractions">The sample's fractions in the set's order; NaN where not permitted.</param>
    /// <returns>In the tracer's unit; NaN where the model gives no error for it.</returns>
    public static double Of(MixingModel model, string tracer, IReadOnlyDictionary<string, double> observed, IReadOnlyList<double> fractions)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(observed);
        ArgumentNullException.ThrowIfNull(fractions);
        IReadOnlyList<(string Parent, double Factor)> terms = model.Fit.Factors.FormOf(tracer).Terms;
        double variance = MeasurementVariance(model.Fit, terms, observed);
        EndMemberSpread spread = (model.Fit as GeneralisedLeastSquares)?.Spread ?? EndMemberSpread.None;
        int permitted = fractions.Count(f => !double.IsNaN(f));
        for (int i = 0; i < fractions.Count && spread != EndMemberSpread.None; i++)
        {
            if (!double.IsNaN(fractions[i]))
            {
                double share = spread == EndMemberSpread.Fixed ? 1.0 / permitted : fractions[i];
                variance += share * share * SpreadVariance(model.EndMembers.EndMembers[i], terms);
            }
        }

        return variance > 0 ? Math.Sqrt(variance) : double.NaN;
    }

    private static double MeasurementVariance(Fit fit, IReadOnlyList<(string Parent, double Factor)> terms, IReadOnlyDictionary<string, double> observed)
    {
        TracerMatrix? given = (fit as GeneralisedLeastSquares)?.MeasurementCovariance;
        double variance = 0;
        foreach ((string a, double factorA) in terms)
        {
            if (given is null || !given.Tracers.Contains(a))
            {
                variance += fit.MeasurementSd.TryGetValue(a, out MeasurementError? error)
                    ? factorA * factorA * ((error.Absolute * error.Absolute) + Square(error.Relative * observed.GetValueOrDefault(a, double.NaN)))
                    : double.NaN;
                continue;
            }

            foreach ((string b, double factorB) in terms.Where(t => given.Tracers.Contains(t.Parent)))
            {
                variance += factorA * factorB * Entry(given, a, b);
            }
        }

        return variance;
    }

    private static double SpreadVariance(EndMember member, IReadOnlyList<(string Parent, double Factor)> terms)
    {
        double variance = 0;
        foreach ((string a, double factorA) in terms)
        {
            foreach ((string b, double factorB) in terms)
            {
                double correlation = a == b ? 1 : Entry(member.Correlations, a, b);
                variance += factorA * factorB * correlation * member.Sd.GetValueOrDefault(a) * member.Sd.GetValueOrDefault(b);
            }
        }

        return variance;
    }

    private static double Entry(TracerMatrix? matrix, string a, string b)
    {
        int row = matrix?.Tracers.ToList().IndexOf(a) ?? -1;
        int column = matrix?.Tracers.ToList().IndexOf(b) ?? -1;
        return row < 0 || column < 0 ? 0 : matrix!.Matrix[row][column];
    }

    private static double Square(double value) => value * value;
}
