namespace WaterMix.Core.Mixing.Kernels;

/// <summary>How far an answer is from meeting the Karush-Kuhn-Tucker conditions, which hold exactly at the minimum of a convex problem and nowhere else.</summary>
/// <remarks>Not thread-safe: it owns its work arrays. It shares no step with the kernels: everything is recomputed from the whitened rows.</remarks>
public sealed class OptimalityProof
{
    private double[] _residual = [];
    private double[] _difference = [];

    /// <summary>The largest violation, relative to the scale of the problem.</summary>
    /// <param name="system">The whitened system.</param>
    /// <param name="b">Length rows: the right-hand side.</param>
    /// <param name="x">Length unknowns: the answer.</param>
    /// <returns>
    /// The largest of: a bound passed, |sum(x) - 1| with exact mass, and for each independent unknown the part of its gradient that should be zero
    /// (or not positive at a bound), divided by |a_j - a_r| times the longest of b - a_r and all max(1, |x_k|) (a_k - a_r): the terms that the residual is summed from.
    /// r is the largest fraction (nothing is subtracted without exact mass). 0 is a perfect proof.
    /// </returns>
    public double Violation(MixingSystem system, ReadOnlySpan<double> b, ReadOnlySpan<double> x)
    {
        ArgumentNullException.ThrowIfNull(system);
        if (_residual.Length < system.Rows)
        {
            _residual = new double[system.Rows];
            _difference = new double[system.Rows];
        }

        int reference = 0;
        double sum = 0;
        double worst = 0;
        Span<double> residual = _residual.AsSpan(0, system.Rows);
        b.CopyTo(residual);
        for (int j = 0; j < x.Length; j++)
        {
            Vectors.AddScaled(-x[j], system.Column(j), residual);
            worst = system.IsFree[j] ? worst : Math.Max(worst, -x[j]);
            if (j < system.Fractions)
            {
                sum += x[j];
                reference = x[j] > x[reference] ? j : reference;
            }
        }

        worst = system.ExactMass ? Math.Max(worst, Math.Abs(sum - 1)) : worst;
        double scale = Vectors.Norm(Relative(system, b, reference));
        for (int j = 0; j < x.Length; j++)
        {
            scale = Math.Max(scale, Math.Max(1, Math.Abs(x[j])) * Vectors.Norm(ColumnOf(system, j, reference)));
        }

        for (int j = 0; j < x.Length; j++)
        {
            if (!system.IsIndependent[j] || (system.ExactMass && j == reference))
            {
                continue;
            }

            ReadOnlySpan<double> column = ColumnOf(system, j, reference);
            double gradient = Vectors.Dot(column, residual);
            double unit = Vectors.Norm(column) * scale;
            bool atBound = !system.IsFree[j] && x[j] == 0;
            double violation = atBound ? Math.Max(0, gradient) : Math.Abs(gradient);
            worst = Math.Max(worst, unit > 0 ? violation / unit : 0);
        }

        return worst;
    }

    private ReadOnlySpan<double> ColumnOf(MixingSystem system, int column, int reference) =>
        column < system.Fractions ? Relative(system, system.Column(column), reference) : system.Column(column);

    private ReadOnlySpan<double> Relative(MixingSystem system, ReadOnlySpan<double> values, int reference)
    {
        Span<double> difference = _difference.AsSpan(0, system.Rows);
        values.CopyTo(difference);
        if (system.ExactMass)
        {
            Vectors.AddScaled(-1, system.Column(reference), difference);
        }

        return difference;
    }
}
