namespace WaterMix.Core.Tests.Mixing.Exact;

/// <summary>
/// The least-squares problem solved by trying every support, in exact arithmetic. It shares no code and no idea with the solver:
/// normal equations with a multiplier for the mass condition, elimination on fractions of integers, and the smallest exact misfit among the supports whose answer is feasible.
/// </summary>
internal static class ExactSolver
{
    /// <summary>Minimises (b - A z)' W (b - A z).</summary>
    /// <param name="columns">One array of m rows per unknown.</param>
    /// <param name="b">Length m.</param>
    /// <param name="weights">W, m x m.</param>
    /// <param name="fractions">How many of the first unknowns are fractions.</param>
    /// <param name="exactMass">Whether those sum to one.</param>
    /// <param name="isFree">Per unknown: no bound at zero.</param>
    /// <returns>The best feasible answer, and its misfit squared.</returns>
    public static (double[] X, double Minimum) Solve(
        double[][] columns, double[] b, Rational[][] weights, int fractions, bool exactMass, bool[] isFree)
    {
        int unknowns = columns.Length;
        Rational[][] a = [.. columns.Select(c => c.Select(Rational.From).ToArray())];
        Rational[] right = [.. b.Select(Rational.From)];
        Rational[][] weighted = [.. a.Select(c => Multiply(weights, c))];
        Rational[]? best = null;
        Rational minimum = Rational.Zero;
        for (int support = 0; support < 1 << unknowns; support++)
        {
            int[] members = [.. Enumerable.Range(0, unknowns).Where(j => (support >> j & 1) == 1)];
            if (Enumerable.Range(0, unknowns).Any(j => isFree[j] && (support >> j & 1) == 0))
            {
                continue;
            }

            Rational[]? x = OnSupport(a, weighted, right, members, fractions, exactMass, unknowns);
            if (x is null || Enumerable.Range(0, unknowns).Any(j => !isFree[j] && x[j].Sign < 0))
            {
                continue;
            }

            Rational misfit = Misfit(a, right, weights, x);
            if (best is null || misfit.CompareTo(minimum) < 0)
            {
                best = x;
                minimum = misfit;
            }
        }

        return ([.. best!.Select(v => v.ToDouble())], minimum.ToDouble());
    }

    /// <summary>The identity of size m.</summary>
    public static Rational[][] Identity(int size) => Diagonal([.. Enumerable.Repeat(Rational.One, size)]);

    /// <summary>A diagonal matrix.</summary>
    public static Rational[][] Diagonal(Rational[] entries) =>
        [.. entries.Select((entry, i) => entries.Select((_, j) => i == j ? entry : Rational.Zero).ToArray())];

    /// <summary>The inverse of a regular matrix.</summary>
    public static Rational[][] Inverse(Rational[][] matrix)
    {
        Rational[][] columns = [.. Identity(matrix.Length).Select(unit => Eliminate([.. matrix.Select(r => r.ToArray())], [.. unit])!)];
        return [.. Enumerable.Range(0, matrix.Length).Select(i => columns.Select(c => c[i]).ToArray())];
    }

    private static Rational[]? OnSupport(
        Rational[][] a, Rational[][] weighted, Rational[] b, int[] members, int fractions, bool exactMass, int unknowns)
    {
        int size = members.Length + (exactMass ? 1 : 0);
        if (exactMass && !members.Any(j => j < fractions))
        {
            return null;
        }

        var matrix = new Rational[size][];
        var right = new Rational[size];
        for (int i = 0; i < members.Length; i++)
        {
            matrix[i] = new Rational[size];
            for (int j = 0; j < members.Length; j++)
            {
                matrix[i][j] = Dot(weighted[members[i]], a[members[j]]);
            }

            if (exactMass)
            {
                matrix[i][size - 1] = members[i] < fractions ? Rational.One : Rational.Zero;
            }

            right[i] = Dot(weighted[members[i]], b);
        }

        if (exactMass)
        {
            matrix[size - 1] = [.. members.Select(j => j < fractions ? Rational.One : Rational.Zero), Rational.Zero];
            right[size - 1] = Rational.One;
        }

        Rational[]? answer = Eliminate(matrix, right);
        if (answer is null)
        {
            return null;
        }

        var x = new Rational[unknowns];
        for (int i = 0; i < members.Length; i++)
        {
            x[members[i]] = answer[i];
        }

        return x;
    }

    // Gauss-Jordan; null where the matrix is singular.
    private static Rational[]? Eliminate(Rational[][] matrix, Rational[] right)
    {
        int size = right.Length;
        for (int k = 0; k < size; k++)
        {
            int pivot = Enumerable.Range(k, size - k).FirstOrDefault(i => matrix[i][k].Sign != 0, -1);
            if (pivot < 0)
            {
                return null;
            }

            (matrix[k], matrix[pivot]) = (matrix[pivot], matrix[k]);
            (right[k], right[pivot]) = (right[pivot], right[k]);
            for (int i = 0; i < size; i++)
            {
                if (i == k || matrix[i][k].Sign == 0)
                {
                    continue;
                }

                Rational factor = matrix[i][k] / matrix[k][k];
                for (int j = k; j < size; j++)
                {
                    matrix[i][j] -= factor * matrix[k][j];
                }

                right[i] -= factor * right[k];
            }
        }

        return [.. right.Select((value, k) => value / matrix[k][k])];
    }

    private static Rational Misfit(Rational[][] a, Rational[] b, Rational[][] weights, Rational[] x)
    {
        Rational[] rest = [.. b];
        for (int j = 0; j < x.Length; j++)
        {
            for (int i = 0; i < rest.Length; i++)
            {
                rest[i] -= a[j][i] * x[j];
            }
        }

        return Dot(rest, Multiply(weights, rest));
    }

    private static Rational[] Multiply(Rational[][] matrix, Rational[] v) => [.. matrix.Select(row => Dot(row, v))];

    private static Rational Dot(Rational[] a, Rational[] b)
    {
        Rational sum = Rational.Zero;
        for (int i = 0; i < a.Length; i++)
        {
            sum += a[i] * b[i];
        }

        return sum;
    }
}
