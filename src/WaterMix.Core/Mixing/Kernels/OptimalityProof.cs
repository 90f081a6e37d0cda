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
    /// r is the largest fraction. Without exact mass its own gradient, that of the sum, is judged by the length of a_r, so that a heavy mass row hides no tracer. 0 is a perfect proof.
    /// </returns>
    public double Violation(MixingSystem system, ReadOnlySpan<double> b, ReadOnlySpan<double> x)
    {
        ArgumentNullException.ThrowIfNull(system);
        if (_residual.Length < system.Rows)
        {
            _residual = new double[system.Rows];
            _difference = new double[system.Rows];
        }

        (int reference, double sum, double worst) = BoundsAndSum(system, x);
        double scale = Vectors.Norm(Relative(system, b, reference));
        Span<double> residual = _residual.AsSpan(0, system.Rows);
        _difference.AsSpan(0, system.Rows).CopyTo(residual);
        for (int j = 0; j < x.Length; j++)
        {
            if (j != reference)
            {
                ReadOnlySpan<double> column = ColumnOf(system, j, reference);
                Vectors.AddScaled(-x[j], column, residual);
                scale = Math.Max(scale, Math.Max(1, Math.Abs(x[j])) * Vectors.Norm(column));
            }
        }

        if (!system.ExactMass && reference >= 0)
        {
            ReadOnlySpan<double> column = system.Column(reference);
            Vectors.AddScaled(1 - sum, column, residual);
            double length = Vectors.Norm(column);
            worst = Math.Max(worst, Share(Math.Abs(Vectors.Dot(column, residual)), length * Math.Max(scale, length)));
        }

        for (int j = 0; j < x.Length; j++)
        {
            if (system.IsIndependent[j] && j != reference)
            {
                ReadOnlySpan<double> column = ColumnOf(system, j, reference);
                double gradient = Vectors.Dot(column, residual);
                bool atBound = !system.IsFree[j] && x[j] == 0;
                worst = Math.Max(worst, Share(atBound ? gradient : Math.Abs(gradient), Vectors.Norm(column) * scale));
            }
        }

        return worst;
    }

    private static double Share(double part, double whole) => whole > 0 ? part / whole : 0;

    // The largest fraction (-1 where the sum may depart from one and all are zero), the sum, and the worst of bounds and sum.
    private static (int Reference, double Sum, double Worst) BoundsAndSum(MixingSystem system, ReadOnlySpan<double> x)
    {
        int reference = 0;
        double sum = 0;
        double worst = 0;
        for (int j = 0; j < x.Length; j++)
        {
            worst = system.IsFree[j] ? worst : Math.Max(worst, -x[j]);
            if (j < system.Fractions)
            {
                sum += x[j];
                reference = x[j] > x[reference] ? j : reference;
            }
        }

        worst = system.ExactMass ? Math.Max(worst, Math.Abs(sum - 1)) : worst;
        return (system.ExactMass || x[reference] > 0 ? reference : -1, sum, worst);
    }

    private ReadOnlySpan<double> ColumnOf(MixingSystem system, int column, int reference) =>
        column < system.Fractions ? Relative(system, system.Column(column), reference) : system.Column(column);

    private ReadOnlySpan<double> Relative(MixingSystem system, ReadOnlySpan<double> values, int reference)
    {
        Span<double> difference = _difference.AsSpan(0, system.Rows);
        values.CopyTo(difference);
        if (reference >= 0)
        {
            Vectors.AddScaled(-1, system.Column(reference), difference);
        }

        return difference;
    }
}
