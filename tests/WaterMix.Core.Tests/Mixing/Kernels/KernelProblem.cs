using WaterMix.Core.Mixing.Kernels;

namespace WaterMix.Core.Tests.Mixing.Kernels;

/// <summary>A whitened system with one right-hand side, for tests.</summary>
internal sealed class KernelProblem
{
    private KernelProblem(double[][] columns, double[] b, int fractions, bool exactMass, bool[] isFree)
    {
        Columns = columns;
        B = b;
        IsFree = isFree;
        System.Reshape(b.Length, fractions, columns.Length - fractions, exactMass);
        isFree.CopyTo(System.IsFree, 0);
        CopyColumns();
    }

    public MixingSystem System { get; } = new();

    public double[][] Columns { get; }

    public double[] B { get; }

    public bool[] IsFree { get; }

    public double[] Start
    {
        get
        {
            double[] start = new double[Columns.Length];
            int[] usable = [.. Enumerable.Range(0, System.Fractions).Where(j => System.IsIndependent[j])];
            foreach (int j in usable)
            {
                start[j] = 1.0 / usable.Length;
            }

            return start;
        }
    }

    public static KernelProblem From(double[][] columns, double[] b, int fractions, bool exactMass) =>
        new(columns, b, fractions, exactMass, new bool[columns.Length]);

    public static KernelProblem Random(Random random, int fractions, int rows, int amounts, bool exactMass)
    {
        int unknowns = fractions + amounts;
        double[][] columns = [.. Enumerable.Range(0, unknowns).Select(_ => Numbers(random, rows))];
        bool[] isFree = [.. Enumerable.Range(0, unknowns).Select(j => j >= fractions && random.Next(3) == 0)];
        return new KernelProblem(columns, Numbers(random, rows), fractions, exactMass, isFree);
    }

    /// <summary>The same tracer rows, with mass conserved by a row in place of exactly.</summary>
    public KernelProblem WithMassRow(double weight)
    {
        double[][] columns = [.. Columns.Select((c, j) => c.Append(j < System.Fractions ? weight : 0).ToArray())];
        return new KernelProblem(columns, [.. B, weight], System.Fractions, exactMass: false, IsFree);
    }

    public double[] Solve(ActiveSetKernel kernel, out KernelOutcome outcome)
    {
        double[] x = Start;
        var outcomes = new KernelOutcome[1];
        kernel.Solve(System, B, x, outcomes);
        outcome = outcomes[0];
        return x;
    }

    public double Misfit(double[] x) =>
        Enumerable.Range(0, B.Length).Sum(i => Math.Pow(B[i] - x.Select((v, j) => v * Columns[j][i]).Sum(), 2));

    public double[] SetExactMixture(Random random, int zeros)
    {
        double[] truth = [.. Columns.Select((_, j) => j < zeros ? 0 : random.NextDouble() + 0.05)];
        double sum = truth.Take(System.Fractions).Sum();
        for (int j = 0; j < System.Fractions; j++)
        {
            truth[j] /= sum;
        }

        for (int i = 0; i < B.Length; i++)
        {
            B[i] = truth.Select((v, j) => v * Columns[j][i]).Sum();
        }

        return truth;
    }

    /// <summary>Scales, duplicates, near-duplicates, zeros, collinear columns and exact ties.</summary>
    public void MakeHard(Random random)
    {
        int rows = B.Length;
        int unknowns = Columns.Length;
        double scale = Math.Pow(10, random.Next(-12, 13));
        int kind = random.Next(7);
        int from = random.Next(unknowns);
        int to = random.Next(unknowns);
        for (int i = 0; i < rows; i++)
        {
            Columns[to][i] = kind switch
            {
                1 => Columns[from][i],
                2 => Columns[from][i] * (1 + (1e-9 * random.NextDouble())),
                3 => 0,
                4 => (0.5 * Columns[from][i]) + (0.5 * Columns[0][i]),
                5 => Columns[from][i] + (1e-6 * random.NextDouble()),
                _ => Columns[to][i],
            };
            B[i] = kind == 6 ? Columns[from][i] : B[i];
        }

        for (int i = 0; i < rows; i++)
        {
            B[i] *= scale;
            foreach (double[] column in Columns)
            {
                column[i] *= scale;
            }
        }

        if (!System.ExactMass)
        {
            SetMassRow(scale * Math.Pow(10, random.Next(-1, 3)));
        }

        CopyColumns();
    }

    private void SetMassRow(double weight)
    {
        B[^1] = weight;
        for (int j = 0; j < Columns.Length; j++)
        {
            Columns[j][^1] = j < System.Fractions ? weight : 0;
        }
    }

    private static double[] Numbers(Random random, int count) =>
        [.. Enumerable.Range(0, count).Select(_ => Math.Round((random.NextDouble() * 4) - 2, 3))];

    private void CopyColumns()
    {
        for (int j = 0; j < Columns.Length; j++)
        {
            Columns[j].CopyTo(System.Column(j));
        }
    }
}
