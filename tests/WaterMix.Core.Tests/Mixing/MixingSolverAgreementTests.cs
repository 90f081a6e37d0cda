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
