namespace WaterMix.Web.State.Results;

/// <summary>The summary numbers of a layer over the samples that are shown.</summary>
/// <param name="Layer">The layer's id, or <c>all layers</c>.</param>
/// <param name="Samples">Number of samples.</param>
/// <param name="Answered">Number of those that have fractions; the other numbers are over these.</param>
/// <param name="MeanFractions">Mean fraction of each source, in the set's order; NaN where the layer does not permit it. Over all layers a source counts as 0 where it is not permitted.</param>
/// <param name="LargestMassResidual">The largest |1 - sum of the fractions|; NaN without an answer.</param>
/// <param name="MedianReducedChi2">Median of chi2 / dof over samples with at least one degree of freedom; NaN where there is none.</param>
/// <param name="ShareImprobable">Share of the samples with p &lt; 0.05 among those that have p, 0 to 1; NaN where there is none.</param>
public sealed record LayerSummary(
    string Layer,
    int Samples,
    int Answered,
    IReadOnlyList<double> MeanFractions,
    double LargestMassResidual,
    double MedianReducedChi2,
    double ShareImprobable)
{
    /// <summary>Below this p a sample counts as improbable.</summary>
    public const double Improbable = 0.05;

    /// <summary>The summaries of the layers that have samples, and last, where there are several, of all layers together.</summary>
    /// <param name="results">The results.</param>
    /// <param name="rows">The rows that are shown.</param>
    public static IReadOnlyList<LayerSummary> Of(RunResults results, int[] rows)
    {
        ArgumentNullException.ThrowIfNull(results);
        ArgumentNullException.ThrowIfNull(rows);
        List<LayerSummary> summaries = [];
        foreach ((int index, string layer) in results.LayerIds.Index())
        {
            int[] own = [.. rows.Where(row => results.Layer[row] == index)];
            if (own.Length > 0)
            {
                summaries.Add(One(results, layer, own, missingAsZero: false));
            }
        }

        if (summaries.Count > 1)
        {
            summaries.Add(One(results, "all layers", [.. rows.Where(row => results.Layer[row] >= 0)], missingAsZero: true));
        }

        return summaries;
    }

    private static LayerSummary One(RunResults results, string layer, int[] rows, bool missingAsZero)
    {
        int[] answered = [.. rows.Where(row => !double.IsNaN(results.FractionSum[row]))];
        double[] chi2 = results.Chi2;
        double[] freedom = results.DegreesOfFreedom;
        double[] p = [.. answered.Select(row => results.PValue[row]).Where(double.IsFinite)];
        return new LayerSummary(
            layer,
            rows.Length,
            answered.Length,
            [.. results.Sources.Select(source => Mean(results.Columns.Fractions(source.Id), answered, missingAsZero))],
            answered.Length == 0 ? double.NaN : answered.Max(row => Math.Abs(results.ResidualMass[row])),
            Median([.. answered.Where(row => freedom[row] >= 1 && double.IsFinite(chi2[row])).Select(row => chi2[row] / freedom[row])]),
            p.Length == 0 ? double.NaN : p.Count(value => value < Improbable) / (double)p.Length);
    }

    private static double Mean(double[] column, int[] rows, bool missingAsZero)
    {
        double sum = 0;
        int count = 0;
        foreach (int row in rows)
        {
            bool missing = double.IsNaN(column[row]);
            sum += missing ? 0 : column[row];
            count += missing ? 0 : 1;
        }

        return count == 0 ? double.NaN : sum / (missingAsZero ? rows.Length : count);
    }

    private static double Median(double[] values)
    {
        if (values.Length == 0)
        {
            return double.NaN;
        }

        Array.Sort(values);
        int middle = values.Length / 2;
        return values.Length % 2 == 1 ? values[middle] : (values[middle - 1] + values[middle]) / 2;
    }
}
