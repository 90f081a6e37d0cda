using WaterMix.Core.Quantities;

namespace WaterMix.Web.State.Results;

/// <summary>How the residuals of a tracer in a layer are spread.</summary>
/// <param name="Tracer">The tracer.</param>
/// <param name="Layer">The layer's id.</param>
/// <param name="Count">Number of residuals.</param>
/// <param name="Mean">Their mean, in the tracer's unit; NaN without any.</param>
/// <param name="Sd">Their standard deviation (n - 1); NaN below two.</param>
/// <param name="Half">The counts reach from minus this to plus this, in the tracer's unit; the same for every layer of the tracer.</param>
/// <param name="Counts">Number of residuals in each of <see cref="Bins"/> equal steps; those farther out count in the outermost.</param>
public sealed record ResidualSummary(Quantity Tracer, string Layer, int Count, double Mean, double Sd, double Half, IReadOnlyList<int> Counts)
{
    /// <summary>Number of steps; odd, so that one is centred on zero.</summary>
    public const int Bins = 25;

    /// <summary>The summaries, tracer by tracer and within it layer by layer; layers without a residual are left out.</summary>
    /// <param name="results">The results.</param>
    /// <param name="rows">The rows that are shown.</param>
    public static IReadOnlyList<ResidualSummary> Of(RunResults results, int[] rows)
    {
        ArgumentNullException.ThrowIfNull(results);
        ArgumentNullException.ThrowIfNull(rows);
        List<ResidualSummary> summaries = [];
        foreach (string tracer in results.Model.Tracers)
        {
            double[] residuals = results.Columns.Residuals(tracer);
            double half = HalfWidth([.. rows.Select(row => Math.Abs(residuals[row])).Where(double.IsFinite)]);
            foreach ((int index, string layer) in results.LayerIds.Index())
            {
                double[] own = [.. rows.Where(row => results.Layer[row] == index).Select(row => residuals[row]).Where(double.IsFinite)];
                if (own.Length > 0)
                {
                    summaries.Add(One(results.QuantityOf(tracer), layer, own, half));
                }
            }
        }

        return summaries;
    }

    private static ResidualSummary One(Quantity tracer, string layer, double[] values, double half)
    {
        double mean = values.Average();
        double sd = values.Length < 2 ? double.NaN : Math.Sqrt(values.Sum(v => (v - mean) * (v - mean)) / (values.Length - 1));
        int[] counts = new int[Bins];
        foreach (double value in values)
        {
            int bin = half > 0 ? (int)Math.Floor((value + half) / (2 * half) * Bins) : Bins / 2;
            counts[Math.Clamp(bin, 0, Bins - 1)]++;
        }

        return new ResidualSummary(tracer, layer, values.Length, mean, sd, half, counts);
    }

    // The size that 99 of 100 residuals stay below, so that one stray sample does not press the rest into one step.
    private static double HalfWidth(double[] sizes)
    {
        if (sizes.Length == 0)
        {
            return 0;
        }

        Array.Sort(sizes);
        return sizes[Math.Min(sizes.Length - 1, (int)(0.99 * sizes.Length))];
    }
}
