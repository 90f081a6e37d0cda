using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;
using WaterMix.Core.Tests.Mixing.Exact;

namespace WaterMix.Core.Tests.Mixing;

/// <summary>Agreement: the whole path from model to fractions against every support tried in exact rational arithmetic, covariance included.</summary>
public class MixingSolverAgreementTests
{
    [Theory]
    [InlineData(EndMemberSpread.None, 1)]
    [InlineData(EndMemberSpread.Fixed, 2)]
    [InlineData(EndMemberSpread.Iterated, 3)]
    public void Solve_RandomSamples_MinimisesTheContractsChiSquare(EndMemberSpread spread, int seed)
    {
        var random = new Random(seed);
        MixingModel model = Twin.LeastSquares(spread);
        model = model with { EndMembers = WithCorrelations(model.EndMembers) };
        for (int trial = 0; trial < 40; trial++)
        {
            double[] sample = [.. Twin.Exact.Select((v, t) => v + (Twin.SourceSd[t] * 3 * (random.NextDouble() - 0.5)))];

            MixingResult result = Twin.Solve(model, sample);
            double[] x = [.. result.Fractions.Select(f => f[0])];
            double[] shares = spread switch
            {
                EndMemberSpread.None => [0, 0, 0, 0],
                EndMemberSpread.Fixed => [0.25, 0.25, 0.25, 0.25],
                _ => x,
            };
            (double[] exact, double minimum) = ExactSolver.Solve(
                Columns(model), sample, ExactSolver.Inverse(Covariance(model, shares)), 4, exactMass: true, new bool[5]);

            // The iteration stops when no fraction changes by more than 1e-9, so that is how closely S at the final fractions agrees.
            for (int i = 0; i < 4; i++)
            {
                Assert.Equal(exact[i], x[i], spread == EndMemberSpread.Iterated ? 2e-9 : 1e-11);
            }

            Assert.Equal(exact[4], result.Amounts[0][0], spread == EndMemberSpread.Iterated ? 2e-9 : 1e-11);
            Assert.Equal(minimum, result.Chi2[0], 1e-7 * (1 + minimum));
        }
    }

    // The published recipes, with mass conserved exactly and by a row: rows standardised, weighed and summed here in another way.
    [Theory]
    [InlineData(Standardisation.MeanAndSd, StandardiseOver.Layer, SdDivisor.N, WeightMeaning.RowFactors, 0)]
    [InlineData(Standardisation.MeanAndSd, StandardiseOver.Set, SdDivisor.NMinus1, WeightMeaning.Squared, 0)]
    [InlineData(Standardisation.MeanAndSd, StandardiseOver.Set, SdDivisor.N, WeightMeaning.RowFactors, 30)]
    [InlineData(Standardisation.Sd, StandardiseOver.Layer, SdDivisor.NMinus1, WeightMeaning.Squared, 200)]
    [InlineData(Standardisation.None, StandardiseOver.Layer, SdDivisor.N, WeightMeaning.RowFactors, 3)]
    public void Solve_WeightedRows_MinimisesTheRecipesSumOfSquares(
        Standardisation standardise, StandardiseOver over, SdDivisor divisor, WeightMeaning meaning, double massWeight)
    {
        double[] weights = [24, 7, 4, 7, 7, 4.5];
        var fit = new WeightedRows(Twin.ByTracer(weights)) { Standardise = standardise, Over = over, SdOver = divisor, WeightsAre = meaning };
        MixingModel model = Twin.Model(fit, massWeight == 0 ? null : new MassConservation(massWeight)) with
        {
            Layers = [new Layer("three", ["a", "b", "e"], [])],
        };
        double[][] set = [.. model.EndMembers.EndMembers.Select(e => Twin.Tracers.Select(t => e.Values[t]).ToArray())];
        double[][] permitted = [set[0], set[1], set[3]];
        double[][] basis = over == StandardiseOver.Set ? set : permitted;
        double[] mean = [.. Twin.Tracers.Select((_, t) => standardise == Standardisation.MeanAndSd ? basis.Average(v => v[t]) : 0)];
        double[] factor = [.. Twin.Tracers.Select((_, t) =>
        {
            double average = basis.Average(v => v[t]);
            double sd = Math.Sqrt(basis.Sum(v => (v[t] - average) * (v[t] - average)) / (basis.Length - (divisor == SdDivisor.N ? 0 : 1)));
            return (meaning == WeightMeaning.Squared ? Math.Sqrt(weights[t]) : weights[t]) / (standardise == Standardisation.None ? 1 : sd);
        })];
        var random = new Random(4);
        for (int trial = 0; trial < 25; trial++)
        {
            double[] sample = [.. Twin.Exact.Select((v, t) => v + (Twin.SourceSd[t] * 8 * (random.NextDouble() - 0.5)))];
            double[] Row(double[] values) => [.. values.Select((v, t) => factor[t] * (v - mean[t])), .. massWeight == 0 ? [] : new[] { massWeight }];
            double[] process = [.. Twin.Tracers.Select((t, k) => factor[k] * Twin.Respiration.Ratios.GetValueOrDefault(t)), .. massWeight == 0 ? [] : new[] { 0.0 }];
            double[][] columns = [.. permitted.Select(Row), process];

            MixingResult result = Twin.Solve(model, sample);
            (double[] exact, double minimum) = ExactSolver.Solve(
                columns, Row(sample), ExactSolver.Identity(process.Length), 3, exactMass: massWeight == 0, new bool[4]);

            double[] solved = [result.Fractions[0][0], result.Fractions[1][0], result.Fractions[3][0], result.Amounts[0][0]];
            Assert.All(solved.Zip(exact), p => Assert.Equal(p.Second, p.First, 1e-9));
            Assert.Equal(Math.Sqrt(minimum), result.Misfit[0], 1e-9 * (1 + Math.Sqrt(minimum)));
            Assert.True(double.IsNaN(result.Fractions[2][0]));
        }
    }

    // With mass as a row of generalised least squares, w is one over the standard deviation of the mass row.
    [Theory]
    [InlineData(2)]
    [InlineData(500)]
    [InlineData(1e6)]
    public void Solve_LeastSquaresWithMassRow_MinimisesChiSquareWithIt(double weight)
    {
        var random = new Random(6);
        MixingModel model = Twin.LeastSquares(EndMemberSpread.None) with { Mass = new MassConservation(weight) };
        double[][] columns = [.. Columns(model).Select((c, j) => c.Append(j < 4 ? 1.0 : 0).ToArray())];
        Rational[] inverse = [.. Twin.MeasurementSd.Select(sd => Rational.One / (Rational.From(sd) * Rational.From(sd))), Rational.From(weight) * Rational.From(weight)];
        for (int trial = 0; trial < 25; trial++)
        {
            double[] sample = [.. Twin.Exact.Select((v, t) => v + (Twin.MeasurementSd[t] * 4 * (random.NextDouble() - 0.5)))];

            MixingResult result = Twin.Solve(model, sample);
            (double[] exact, double minimum) = ExactSolver.Solve(columns, [.. sample, 1], ExactSolver.Diagonal(inverse), 4, exactMass: false, new bool[5]);

            double[] solved = [.. result.Fractions.Select(f => f[0]), result.Amounts[0][0]];
            Assert.All(solved.Zip(exact), p => Assert.Equal(p.Second, p.First, 1e-9));
            Assert.Equal(minimum, result.Chi2[0], 1e-6 * (1 + minimum));
        }
    }

    private static EndMemberSet WithCorrelations(EndMemberSet set)
    {
        var correlations = new TracerMatrix(["nitrate", "phosphate"], [[1, 0.8], [0.8, 1]]);
        return set with { EndMembers = [.. set.EndMembers.Select((e, i) => i == 0 ? e with { Correlations = correlations } : e)] };
    }

    private static double[][] Columns(MixingModel model) =>
    [
        .. model.EndMembers.EndMembers.Select(e => Twin.Tracers.Select(t => e.Values[t]).ToArray()),
        [.. Twin.Tracers.Select(t => Twin.Respiration.Ratios.GetValueOrDefault(t))],
    ];

    private static Rational[][] Covariance(MixingModel model, double[] shares)
    {
        Rational[] measurement = [.. Twin.MeasurementSd.Select(sd => Rational.From(sd) * Rational.From(sd))];
        Rational[][] s = ExactSolver.Diagonal(measurement);
        for (int i = 0; i < shares.Length; i++)
        {
            EndMember member = model.EndMembers.EndMembers[i];
            Rational share = Rational.From(shares[i]) * Rational.From(shares[i]);
            for (int a = 0; a < 6; a++)
            {
                for (int b = 0; b < 6; b++)
                {
                    double correlation = a == b ? 1 : member.Correlations is not null && a + b == 7 && Math.Abs(a - b) == 1 ? 0.8 : 0;
                    s[a][b] += share * Rational.From(correlation) * Rational.From(Twin.SourceSd[a]) * Rational.From(Twin.SourceSd[b]);
                }
            }
        }

        return s;
    }
}
