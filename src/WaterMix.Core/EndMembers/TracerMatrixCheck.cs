using System.Globalization;
using MathNet.Numerics.LinearAlgebra;

namespace WaterMix.Core.EndMembers;

/// <summary>Whether a matrix over named tracers can be a correlation or a covariance.</summary>
internal static class TracerMatrixCheck
{
    // Matrices come from files with rounded decimals; rounding errors of the last binary digits are no fault.
    private const double Tolerance = 1e-9;

    /// <summary>Findings on a correlation matrix: square, symmetric, unit diagonal, entries in [-1, 1], positive semi-definite.</summary>
    public static void Correlation(TracerMatrix matrix, string at, CheckFindings findings)
    {
        if (!HasShape(matrix, at, findings))
        {
            return;
        }

        bool sound = true;
        for (int i = 0; i < matrix.Tracers.Count; i++)
        {
            for (int j = i; j < matrix.Tracers.Count; j++)
            {
                double r = matrix.Matrix[i][j];
                if (i == j && !(Math.Abs(r - 1) <= Tolerance))
                {
                    findings.Error(Cell(at, i, j), "1 on the diagonal of a correlation matrix", Text(r), "Give correlations, not covariances.");
                    sound = false;
                }
                else if (!(Math.Abs(r) <= 1 + Tolerance))
                {
                    findings.Error(Cell(at, i, j), "a correlation from -1 to 1", Text(r), "Give correlations, not covariances.");
                    sound = false;
                }
            }
        }

        sound &= IsSymmetric(matrix, at, findings);
        if (sound && SmallestEigenvalue(matrix) is var smallest && !(smallest >= -Tolerance))
        {
            findings.Error(
                JsonPointer.Append(at, "matrix"),
                "correlations that can hold together (positive semi-definite)",
                $"a matrix with the eigenvalue {Text(smallest)}",
                "Check the signs, and give correlations that were computed from one set of samples, with enough digits.");
        }
    }

    /// <summary>Findings on a covariance matrix: square, symmetric, positive definite.</summary>
    public static void Covariance(TracerMatrix matrix, string at, CheckFindings findings)
    {
        if (!HasShape(matrix, at, findings))
        {
            return;
        }

        bool sound = IsSymmetric(matrix, at, findings);
        for (int i = 0; i < matrix.Tracers.Count; i++)
        {
            double variance = matrix.Matrix[i][i];
            if (!(variance > 0 && double.IsFinite(variance)))
            {
                findings.Error(Cell(at, i, i), "a variance above 0", Text(variance), "Give the square of the measurement's standard deviation.");
                sound = false;
            }
        }

        if (sound && SmallestEigenvalue(matrix) is var smallest && !(smallest > 1e-12))
        {
            findings.Error(
                JsonPointer.Append(at, "matrix"),
                "a positive definite covariance",
                $"a matrix whose correlations have the eigenvalue {Text(smallest)}",
                "Check signs and units; no tracer's error may follow completely from the others'.");
        }
    }

    private static bool HasShape(TracerMatrix matrix, string at, CheckFindings findings)
    {
        int n = matrix.Tracers.Count;
        var seen = new HashSet<string>(StringComparer.Ordinal);
        bool sound = true;
        for (int i = 0; i < n; i++)
        {
            if (!seen.Add(matrix.Tracers[i]))
            {
                findings.Error(JsonPointer.Append(JsonPointer.Append(at, "tracers"), i), "each tracer once", $"\"{matrix.Tracers[i]}\" a second time", "Take one out, with its row and column.");
                sound = false;
            }
        }

        if (matrix.Matrix.Count != n || matrix.Matrix.Any(row => row.Count != n))
        {
            string lengths = string.Join(", ", matrix.Matrix.Select(row => Text(row.Count)));
            findings.Error(
                JsonPointer.Append(at, "matrix"),
                $"{Text(n)} rows of {Text(n)} numbers, as many as there are tracers",
                matrix.Matrix.Count == 0 ? "no rows" : $"rows of length {lengths}",
                "Give one row and one column for each tracer.");
            return false;
        }

        return sound;
    }

    private static bool IsSymmetric(TracerMatrix matrix, string at, CheckFindings findings)
    {
        bool sound = true;
        for (int i = 0; i < matrix.Tracers.Count; i++)
        {
            for (int j = 0; j < i; j++)
            {
                double below = matrix.Matrix[i][j];
                double above = matrix.Matrix[j][i];
                double scale = Math.Max(Math.Abs(below), Math.Abs(above));
                if (!(Math.Abs(below - above) <= Tolerance * scale) || !double.IsFinite(scale))
                {
                    findings.Error(
                        Cell(at, i, j),
                        $"the same number as for {matrix.Tracers[j]} and {matrix.Tracers[i]}, {Text(above)}",
                        Text(below),
                        "Make the matrix symmetric.");
                    sound = false;
                }
            }
        }

        return sound;
    }

    // Of the matrix scaled to a unit diagonal, so that units do not matter.
    private static double SmallestEigenvalue(TracerMatrix matrix)
    {
        int n = matrix.Tracers.Count;
        if (n == 0)
        {
            return 1;
        }

        Matrix<double> scaled = Matrix<double>.Build.Dense(n, n, (i, j) =>
            0.5 * (matrix.Matrix[i][j] + matrix.Matrix[j][i]) / (Math.Sqrt(matrix.Matrix[i][i]) * Math.Sqrt(matrix.Matrix[j][j])));
        return scaled.ForAll(double.IsFinite) ? scaled.Evd(Symmetricity.Symmetric).EigenValues.Min(e => e.Real) : double.NaN;
    }

    private static string Cell(string at, int row, int column) =>
        JsonPointer.Append(JsonPointer.Append(JsonPointer.Append(at, "matrix"), row), column);

    private static string Text(double value) => value.ToString("R", CultureInfo.InvariantCulture);
}
