namespace WaterMix.Core.Mixing;

/// <summary>
/// How the tracers of a fit follow from the quantities that are measured (their parents): t = T u + c. A plain tracer is its own parent;
/// NO, PO, N* and PO4* are linear in two. Covariances follow as T S T', ratios as T r without the constant.
/// </summary>
public sealed class TracerTransform
{
    private TracerTransform(IReadOnlyList<string> tracers, IReadOnlyList<string> parents, double[][] rows, double[] constants)
    {
        Tracers = tracers;
        Parents = parents;
        Rows = rows;
        Constants = constants;
        IsIdentity = parents.Count == tracers.Count && parents.SequenceEqual(tracers);
    }

    /// <summary>The tracers, one per row of T.</summary>
    public IReadOnlyList<string> Tracers { get; }

    /// <summary>The measured quantities, one per column of T.</summary>
    public IReadOnlyList<string> Parents { get; }

    /// <summary>T, row by row.</summary>
    public double[][] Rows { get; }

    /// <summary>c, one per tracer.</summary>
    public double[] Constants { get; }

    /// <summary>True where every tracer is its own parent.</summary>
    public bool IsIdentity { get; }

    /// <summary>The transform for these tracers.</summary>
    /// <param name="tracers">Tracer ids, each once.</param>
    /// <param name="factors">The factors of the derived ones.</param>
    public static TracerTransform For(IReadOnlyList<string> tracers, DerivedTracerFactors factors)
    {
        ArgumentNullException.ThrowIfNull(tracers);
        ArgumentNullException.ThrowIfNull(factors);
        var terms = tracers.Select(factors.FormOf).ToArray();
        var parents = terms.SelectMany(t => t.Terms).Select(p => p.Parent).Distinct().ToList();
        double[][] rows = [.. terms.Select(t =>
        {
            double[] row = new double[parents.Count];
            foreach ((string parent, double factor) in t.Terms)
            {
                row[parents.IndexOf(parent)] = factor;
            }

            return row;
        })];
        return new TracerTransform(tracers, parents, rows, [.. terms.Select(t => t.Offset)]);
    }

    /// <summary>T u + c, NaN where a parent of the tracer is NaN.</summary>
    /// <param name="tracer">Index of the tracer.</param>
    /// <param name="parents">One value per parent.</param>
    public double Value(int tracer, ReadOnlySpan<double> parents)
    {
        double sum = Constants[tracer];
        double[] row = Rows[tracer];
        for (int k = 0; k < row.Length; k++)
        {
            if (row[k] != 0)
            {
                sum = Math.FusedMultiplyAdd(row[k], parents[k], sum);
            }
        }

        return sum;
    }
}
