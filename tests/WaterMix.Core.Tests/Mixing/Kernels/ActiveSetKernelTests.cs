using WaterMix.Core.Mixing.Kernels;
using WaterMix.Core.Tests.Mixing.Exact;

namespace WaterMix.Core.Tests.Mixing.Kernels;

public class ActiveSetKernelTests
{
    // Agreement: every support tried in exact rational arithmetic (ExactSolver), which shares no code with the kernel.
    [Theory]
    [InlineData(4, 6, 1, true, 1)]
    [InlineData(3, 5, 0, true, 2)]
    [InlineData(5, 8, 1, true, 3)]
    [InlineData(4, 4, 1, true, 4)]
    [InlineData(4, 6, 1, false, 5)]
    [InlineData(5, 7, 2, false, 6)]
    public void Solve_RandomProblems_AgreesWithExactEnumeration(int fractions, int rows, int amounts, bool exactMass, int seed)
    {
        var random = new Random(seed);
        var kernel = new ActiveSetKernel();
        var proof = new OptimalityProof();
        int atBound = 0;
        for (int trial = 0; trial < 60; trial++)
        {
            KernelProblem problem = KernelProblem.Random(random, fractions, rows, amounts, exactMass);

            double[] x = problem.Solve(kernel, out KernelOutcome outcome);
            (double[] exact, double minimum) = ExactSolver.Solve(
                problem.Columns, problem.B, ExactSolver.Identity(rows), fractions, exactMass, problem.IsFree);

            Assert.Equal(KernelOutcome.Optimal, outcome);
            Assert.True(proof.Violation(problem.System, problem.B, x) < 1e-13);
            for (int j = 0; j < x.Length; j++)
            {
                Assert.Equal(exact[j], x[j], 1e-10);
            }

            Assert.Equal(minimum, problem.Misfit(x), 1e-11 * (1 + minimum));
            atBound += x.Any(v => v == 0) ? 1 : 0;
        }

        Assert.InRange(atBound, 5, 60);
    }

    // Property: exact synthetic mixtures come back.
    [Fact]
    public void Solve_ExactMixture_ReturnsTheFractions()
    {
        var random = new Random(11);
        var kernel = new ActiveSetKernel();
        for (int trial = 0; trial < 500; trial++)
        {
            KernelProblem problem = KernelProblem.Random(random, 4, 7, 1, exactMass: true);
            double[] truth = problem.SetExactMixture(random, zeros: trial % 3);

            double[] x = problem.Solve(kernel, out _);

            for (int j = 0; j < x.Length; j++)
            {
                Assert.Equal(truth[j], x[j], 1e-10);
            }
        }
    }

    // Property: the proof, the sum and the bounds hold for problems of every kind, degenerate ones included.
    [Fact]
    public void Solve_HardProblems_ProvesEveryAnswer()
    {
        var random = new Random(12);
        var kernel = new ActiveSetKernel();
        var independent = new IndependentColumns();
        var proof = new OptimalityProof();
        for (int trial = 0; trial < 20_000; trial++)
        {
            int fractions = random.Next(1, 9);
            int amounts = random.Next(0, 3);
            bool exactMass = random.Next(2) == 0;
            int rows = Math.Max(1, fractions - 1 + amounts + random.Next(0, 4)) + (exactMass ? 0 : 1);
            KernelProblem problem = KernelProblem.Random(random, fractions, rows, amounts, exactMass);
            problem.MakeHard(random);
            independent.Mark(problem.System, exactMass ? rows : rows - 1);

            double[] x = problem.Solve(kernel, out KernelOutcome outcome);

            Assert.Equal(KernelOutcome.Optimal, outcome);
            double violation = proof.Violation(problem.System, problem.B, x);
            Assert.True(violation < 1e-9, $"trial {trial}: violation {violation}");
            Assert.All(x.Where((_, j) => !problem.IsFree[j]), v => Assert.True(v >= 0));
            if (exactMass)
            {
                Assert.Equal(1, x.Take(fractions).Sum(), 1e-12);
            }
        }
    }

    // A mass row, however heavy, must not drown the tracers: the answer tends to that of exact mass conservation and keeps its proof.
    [Theory]
    [InlineData(1e2)]
    [InlineData(1e6)]
    [InlineData(1e9)]
    [InlineData(1e12)]
    [InlineData(1e14)]
    public void Solve_HeavyMassRow_TendsToExactMass(double weight)
    {
        var random = new Random(15);
        var kernel = new ActiveSetKernel();
        var proof = new OptimalityProof();
        for (int trial = 0; trial < 200; trial++)
        {
            KernelProblem exact = KernelProblem.Random(random, 4, 6, 1, exactMass: true);
            KernelProblem heavy = exact.WithMassRow(weight);

            double[] x = heavy.Solve(kernel, out KernelOutcome outcome);
            double[] limit = exact.Solve(kernel, out _);

            Assert.Equal(KernelOutcome.Optimal, outcome);
            Assert.True(proof.Violation(heavy.System, heavy.B, x) < 1e-12);
            if (weight >= 1e6)
            {
                Assert.All(x.Zip(limit), p => Assert.Equal(p.Second, p.First, 1e-7));
            }
        }
    }

    // Agreement: the same heavy rows in exact rational arithmetic.
    [Theory]
    [InlineData(1e3)]
    [InlineData(1e7)]
    [InlineData(1e11)]
    public void Solve_HeavyMassRow_AgreesWithExactEnumeration(double weight)
    {
        var random = new Random(16);
        var kernel = new ActiveSetKernel();
        for (int trial = 0; trial < 20; trial++)
        {
            KernelProblem problem = KernelProblem.Random(random, 4, 6, 1, exactMass: true).WithMassRow(weight);

            double[] x = problem.Solve(kernel, out _);
            (double[] exact, _) = ExactSolver.Solve(problem.Columns, problem.B, ExactSolver.Identity(7), 4, exactMass: false, problem.IsFree);

            Assert.All(x.Zip(exact), p => Assert.Equal(p.Second, p.First, 1e-10));
        }
    }

    [Fact]
    public void Solve_SeveralSamples_EachAsIfAlone()
    {
        var random = new Random(13);
        KernelProblem problem = KernelProblem.Random(random, 4, 6, 1, exactMass: true);
        var kernel = new ActiveSetKernel();
        double[] together = [.. Enumerable.Range(0, 3 * 6).Select(_ => random.NextDouble())];
        double[] solutions = [.. Enumerable.Repeat(problem.Start, 3).SelectMany(s => s)];

        kernel.Solve(problem.System, together, solutions, new KernelOutcome[3]);

        for (int s = 0; s < 3; s++)
        {
            double[] alone = [.. problem.Start];
            kernel.Solve(problem.System, together.AsSpan(s * 6, 6), alone, new KernelOutcome[1]);
            Assert.Equal(alone, solutions.AsSpan(s * 5, 5));
        }
    }

    [Fact]
    public void Solve_LengthsThatDoNotMatch_NamesTheNumbers()
    {
        KernelProblem problem = KernelProblem.Random(new Random(14), 3, 4, 0, exactMass: true);

        ArgumentException error = Assert.Throws<ArgumentException>(
            () => new ActiveSetKernel().Solve(problem.System, new double[5], new double[3], new KernelOutcome[1]));

        Assert.Contains("need 4 and 3 numbers, but there are 5 and 3", error.Message, StringComparison.Ordinal);
    }
}
