using WaterMix.Core.Mixing;

namespace WaterMix.Core.Tests.Mixing;

/// <summary>
/// Reference: twins whose values were computed by two readers with throw-away programs of their own, before this solver existed (no published source).
/// The tolerance is half of the last digit given.
/// </summary>
public class TwinTests
{
    // The published weight recipe: source variance between the sources over the variance within them (all sources alike here).
    private static readonly double[] RecipeWeights = [.. Twin.Tracers.Select((_, t) =>
    {
        double[] values = [.. Twin.Set.EndMembers.Select(e => e.Values[Twin.Tracers[t]])];
        double mean = values.Average();
        return values.Average(v => (v - mean) * (v - mean)) / (Twin.SourceSd[t] * Twin.SourceSd[t]);
    })];

    public static TheoryData<string> Modes => ["none", "fixed", "iterated", "rows", "squared", "rows-soft", "squared-soft", "uncentred", "raw"];

    [Theory]
    [MemberData(nameof(Modes))]
    public void Solve_ExactMixture_RecoversItInEveryMode(string mode)
    {
        MixingResult result = Twin.Solve(ModelOf(mode), Twin.Exact);

        Assert.Equal(SolveStatus.Solved, result.Status[0]);
        AssertSolution(result, Twin.Fractions, Twin.Amount, 1e-9);
        Assert.True(result.KktViolation![0] < 1e-9);
        Assert.Equal(1, result.FractionSum[0], 1e-12);
        Assert.Equal(6, result.TracerCount[0]);
        Assert.Equal(2, result.DegreesOfFreedom[0]);
    }

    [Fact]
    public void Solve_Disturbed_PublishedWeightsOnRows() =>
        AssertSolution(Twin.Solve(ModelOf("rows-soft"), Twin.Disturbed), [0.337247, 0.379954, 0.172305, 0.110494], 0.147558, 6e-7);

    [Fact]
    public void Solve_Disturbed_PublishedWeightsOnRowsUncentred() =>
        AssertSolution(Twin.Solve(ModelOf("uncentred"), Twin.Disturbed), [0.321088, 0.394221, 0.171734, 0.112500], 0.158883, 6e-7);

    [Fact]
    public void Solve_Disturbed_RootsOfWeightsEqualLeastSquaresWithSourceSpread()
    {
        MixingResult weighted = Twin.Solve(ModelOf("squared"), Twin.Disturbed);
        MixingResult leastSquares = Twin.Solve(Twin.LeastSquares(EndMemberSpread.None, Twin.SourceSd), Twin.Disturbed);

        AssertSolution(weighted, [0.328693, 0.394615, 0.168149, 0.108544], 0.164092, 6e-7);
        AssertSolution(weighted, [.. leastSquares.Fractions.Select(f => f[0])], leastSquares.Amounts[0][0], 1e-9);
    }

    [Fact]
    public void Solve_Disturbed_IteratedSpread()
    {
        MixingResult result = Twin.Solve(ModelOf("iterated"), Twin.Disturbed);

        AssertSolution(result, [0.329385, 0.394279, 0.167831, 0.108505], 0.163656, 6e-7);
        Assert.Equal(3.0795, result.Chi2[0], 6e-5);
        Assert.Equal(Math.Sqrt(result.Chi2[0]), result.Misfit[0], 1e-14);
    }

    [Fact]
    public void Solve_Disturbed_FixedSpread()
    {
        MixingResult result = Twin.Solve(ModelOf("fixed"), Twin.Disturbed);

        AssertSolution(result, [0.329547, 0.394168, 0.167782, 0.108503], 0.163586, 6e-7);
        Assert.Equal(3.52835, result.Chi2[0], 6e-6);
    }

    // The effective errors at the exact mixture, and what they mean for the fractions: the answer is linear in the sample while no
    // bound is met, so the covariance of the fractions follows from how they answer to a small change of each tracer.
    [Fact]
    public void Solve_EffectiveErrors_GiveTheStandardErrors()
    {
        double[] effective = [.. Twin.Tracers.Select((_, t) =>
            Math.Sqrt(Square(Twin.MeasurementSd[t]) + (Twin.Fractions.Sum(x => x * x) * Square(Twin.SourceSd[t]))))];
        double[] expectedEffective = [0.085659, 0.0173638, 3.22102, 0.396232, 0.0348210, 1.28841];
        Assert.All(effective.Zip(expectedEffective), p => Assert.Equal(p.Second, p.First, 6e-6 * Math.Max(1, p.Second)));

        MixingModel model = Twin.LeastSquares(EndMemberSpread.None, effective);
        double[][] moved = [.. Twin.Tracers.Select((_, t) => Twin.Exact.Select((v, k) => k == t ? v + (0.01 * effective[t]) : v).ToArray())];
        MixingResult result = Twin.Solve(model, moved);
        double[][] columns = [.. result.Fractions, result.Amounts[0]];
        double[] truth = [.. Twin.Fractions, Twin.Amount];
        double[] errors = [.. columns.Select((c, j) => Math.Sqrt(c.Sum(v => Square((v - truth[j]) / 0.01))))];
        double covariance = columns[0].Zip(columns[1]).Sum(p => (p.First - truth[0]) * (p.Second - truth[1]) / 1e-4);

        Assert.All(errors.Zip([0.0211581, 0.0336488, 0.0136963, 0.0102254, 0.0188374]), p => Assert.Equal(p.Second, p.First, 1e-6));
        Assert.Equal(-0.794, covariance / (errors[0] * errors[1]), 6e-4);
    }

    // Quality with centred rows: while all fractions are positive, the mass row is met exactly at any weight, so it measures nothing.
    [Theory]
    [InlineData(0.01)]
    [InlineData(1)]
    [InlineData(1000)]
    public void Solve_CentredRows_MeetTheMassRowAtAnyWeight(double weight)
    {
        MixingModel model = Twin.Model(WeightedFit(WeightMeaning.RowFactors, Standardisation.MeanAndSd), new MassConservation(weight));

        // The rounding of the means, about 1e-15 of salinity, is divided by the weight.
        Assert.Equal(0, Twin.Solve(model, Twin.Disturbed).ResidualMass[0], 1e-9 * Math.Max(1, 1 / weight));
    }

    private static double Square(double value) => value * value;

    private static MixingModel ModelOf(string mode)
    {
        var soft = new MassConservation(RecipeWeights.Max());
        return mode switch
        {
            "none" => Twin.LeastSquares(EndMemberSpread.None),
            "fixed" => Twin.LeastSquares(EndMemberSpread.Fixed),
            "iterated" => Twin.LeastSquares(EndMemberSpread.Iterated),
            "rows" => Twin.Model(WeightedFit(WeightMeaning.RowFactors, Standardisation.MeanAndSd)),
            "squared" => Twin.Model(WeightedFit(WeightMeaning.Squared, Standardisation.MeanAndSd)),
            "rows-soft" => Twin.Model(WeightedFit(WeightMeaning.RowFactors, Standardisation.MeanAndSd), soft),
            "squared-soft" => Twin.Model(WeightedFit(WeightMeaning.Squared, Standardisation.MeanAndSd), soft),
            "uncentred" => Twin.Model(WeightedFit(WeightMeaning.RowFactors, Standardisation.Sd), soft),
            _ => Twin.Model(WeightedFit(WeightMeaning.RowFactors, Standardisation.None)),
        };
    }

    private static WeightedRows WeightedFit(WeightMeaning meaning, Standardisation standardise) =>
        new(Twin.ByTracer(RecipeWeights)) { WeightsAre = meaning, Standardise = standardise };

    private static void AssertSolution(MixingResult result, double[] fractions, double amount, double tolerance)
    {
        for (int i = 0; i < fractions.Length; i++)
        {
            Assert.Equal(fractions[i], result.Fractions[i][0], tolerance);
        }

        Assert.Equal(amount, result.Amounts[0][0], tolerance);
    }
}
