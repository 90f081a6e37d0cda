namespace WaterMix.Core.Mixing;

/// <summary>
/// What a model made of a table of samples, as columns: one entry per sample in input order, NaN (or -1) where there is no number.
/// </summary>
public sealed class MixingResult
{
    /// <summary>A result without numbers yet, to be filled by whoever makes it: the solver, or a reader of stored results.</summary>
    /// <param name="model">The model.</param>
    /// <param name="rows">Number of samples.</param>
    /// <param name="withProof">True to make room for each sample's optimality violation.</param>
    public MixingResult(PreparedModel model, int rows, bool withProof)
    {
        ArgumentNullException.ThrowIfNull(model);
        MixingModel source = model.Model;
        Model = model;
        RowCount = rows;
        Status = new SolveStatus[rows];
        Layer = Filled(rows, -1);
        TracerCount = new int[rows];
        Fractions = Columns(source.EndMembers.EndMembers.Count, rows);
        FractionSum = Empty(rows);
        Amounts = Columns(source.Processes.Count, rows);
        Residuals = Columns(source.Tracers.Count, rows);
        ResidualMass = Empty(rows);
        Misfit = Empty(rows);
        Chi2 = Empty(rows);
        DegreesOfFreedom = Filled(rows, -1);
        PValue = Empty(rows);
        KktViolation = withProof ? Empty(rows) : null;
        Notes = new string?[rows];
    }

    /// <summary>The model that made the result.</summary>
    public PreparedModel Model { get; }

    /// <summary>Number of samples.</summary>
    public int RowCount { get; }

    /// <summary>What became of each sample.</summary>
    public SolveStatus[] Status { get; }

    /// <summary>Index of each sample's layer, -1 where it has none.</summary>
    public int[] Layer { get; }

    /// <summary>Number of usable tracers of each sample in its layer.</summary>
    public int[] TracerCount { get; }

    /// <summary>One column per end-member of the set; NaN where it is not permitted in the sample's layer.</summary>
    public double[][] Fractions { get; }

    /// <summary>Sum of the fractions.</summary>
    public double[] FractionSum { get; }

    /// <summary>One column per process, in the unit of its per-quantity; NaN where it is off.</summary>
    public double[][] Amounts { get; }

    /// <summary>One column per tracer: observed minus fitted, in the tracer's unit; NaN where it is not used.</summary>
    public double[][] Residuals { get; }

    /// <summary>1 - sum of the fractions.</summary>
    public double[] ResidualMass { get; }

    /// <summary>Square root of the minimum of what was minimised, the mass row included.</summary>
    public double[] Misfit { get; }

    /// <summary>Residuals against their covariance (generalised least squares) or the measurement errors (weighted rows, where given).</summary>
    public double[] Chi2 { get; }

    /// <summary>Degrees of freedom on the active set; -1 where the sample has no fit.</summary>
    public int[] DegreesOfFreedom { get; }

    /// <summary>Upper tail of chi-square; NaN below one degree of freedom.</summary>
    public double[] PValue { get; }

    /// <summary>The optimality violation of each sample, relative to the scale of its problem, or null where it was not asked for.</summary>
    public double[]? KktViolation { get; }

    /// <summary>A remark on a sample, or null.</summary>
    public string?[] Notes { get; }

    private static double[][] Columns(int count, int rows) => [.. Enumerable.Range(0, count).Select(_ => Empty(rows))];

    private static double[] Empty(int rows)
    {
        double[] values = new double[rows];
        values.AsSpan().Fill(double.NaN);
        return values;
    }

    private static int[] Filled(int rows, int value)
    {
        int[] values = new int[rows];
        values.AsSpan().Fill(value);
        return values;
    }
}
