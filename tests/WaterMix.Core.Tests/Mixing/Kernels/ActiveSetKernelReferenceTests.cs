using System.Globalization;
using WaterMix.Core.Mixing.Kernels;
using WaterMix.Testing;

namespace WaterMix.Core.Tests.Mixing.Kernels;

/// <summary>Reference: scipy.optimize.nnls, R nnls and R quadprog on the problems of tests/Reference/mixing.</summary>
public class ActiveSetKernelReferenceTests
{
    private static readonly string Folder = Path.Combine(TestData.Root, "tests", "Reference", "mixing");

    [Theory]
    [InlineData("scipy_nnls.csv", 1e-10)]
    [InlineData("r_nnls.csv", 1e-10)]
    // quadprog forms the normal equations, which costs it some digits.
    [InlineData("r_quadprog.csv", 1e-8)]
    public void Solve_StoredProblems_AgreesWithLibrary(string file, double tolerance)
    {
        Dictionary<string, double[]> problems = Read("problems.csv");
        Dictionary<string, double[]> solutions = Read(file);
        var kernel = new ActiveSetKernel();

        Assert.Equal(150, solutions.Count);
        foreach ((string id, double[] expected) in solutions)
        {
            double[] x = Problem(problems[id]).Solve(kernel, out _);
            for (int j = 0; j < x.Length; j++)
            {
                Assert.Equal(expected[j], x[j], tolerance);
            }
        }
    }

    [Fact]
    public void StoredSolutions_Scipy_ComeOutOfTheScriptAgain() =>
        AssertSlice("scipy_nnls.csv", ExternalTool.Lines(
            ["/usr/bin/python3", "-c", "import scipy.optimize"],
            ["/usr/bin/python3", Path.Combine(Folder, "solve_scipy.py"), Path.Combine(Folder, "problems.csv"), "20"],
            "scipy (Debian package python3-scipy)"));

    [Theory]
    [InlineData("nnls")]
    [InlineData("quadprog")]
    public void StoredSolutions_R_ComeOutOfTheScriptAgain(string package) =>
        AssertSlice($"r_{package}.csv", ExternalTool.Lines(
            ["Rscript", "-e", $"library({package})"],
            ["Rscript", Path.Combine(Folder, "solve_r.R"), package, Path.Combine(Folder, "problems.csv"), "20"],
            $"R's {package} (Debian package r-cran-{package})"));

    private static void AssertSlice(string file, IReadOnlyList<string> lines)
    {
        Dictionary<string, double[]> stored = Read(file);
        string[] fresh = [.. lines.Where(l => !l.StartsWith('#'))];

        Assert.Equal(20, fresh.Length);
        foreach (string line in fresh)
        {
            string[] parts = line.Split(',');
            Assert.Equal(stored[parts[0]], Numbers(parts[1..]), (a, b) => Math.Abs(a - b) < 1e-9);
        }
    }

    private static KernelProblem Problem(double[] numbers)
    {
        // kind (0 bounded, 1 simplex), fractions, rows, A column by column, b.
        int fractions = (int)numbers[1];
        int rows = (int)numbers[2];
        double[][] columns = [.. Enumerable.Range(0, fractions).Select(j => numbers.AsSpan(3 + (j * rows), rows).ToArray())];
        return KernelProblem.From(columns, numbers[(3 + (fractions * rows))..], fractions, exactMass: numbers[0] == 1);
    }

    private static Dictionary<string, double[]> Read(string file) =>
        File.ReadLines(Path.Combine(Folder, file)).Where(l => !l.StartsWith('#')).Select(l => l.Split(','))
            .ToDictionary(p => p[0], p => Numbers(p[1..]));

    private static double[] Numbers(string[] parts) =>
        [.. parts.Select(p => p switch
        {
            "bounded" => 0,
            "simplex" => 1,
            _ => double.Parse(p, CultureInfo.InvariantCulture),
        })];
}
