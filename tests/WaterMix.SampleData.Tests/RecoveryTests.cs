using MathNet.Numerics.LinearAlgebra;
using WaterMix.Core.Mixing;
using WaterMix.Core.Samples;

namespace WaterMix.SampleData.Tests;

/// <summary>Property. Solving the invented cruise gives back the true fractions, as well as its errors allow and no better.</summary>
public class RecoveryTests
{
    private static readonly Cruise _cruise = new(Cruise.Seed);

    private static readonly MixingResult _result = Solve(Models.TwoLayers);

    // A sample without any salinity has no density, so no layer takes it.
    [Fact]
    public void Solve_TwoLayers_TakesEverySampleBelowTheMixedLayerThatHasItsTracers()
    {
        Assert.All(_cruise.Bottles.Index(), b =>
        {
            bool hasSalinity = b.Item[Column.Ctdsal].Flag == 2 || (b.Item.Flag is 2 or 3 && b.Item[Column.Salnty].Flag is 2 or 6);
            SolveStatus status = _result.Status[b.Index];
            Assert.Equal(b.Item.Pressure < Models.MixedLayer || !hasSalinity, status == SolveStatus.OutsideLayers);
            Assert.True(status is SolveStatus.OutsideLayers or SolveStatus.TooFewTracers or SolveStatus.Solved);
        });
        Assert.InRange(_result.Status.Count(s => s == SolveStatus.TooFewTracers), 20, 60);
    }

    // The errors of a weighted least squares fit are (A' S^-1 A)^-1. Where every unknown is well off its bound the bounds do not matter.
    [Fact]
    public void Solve_SimpleModelOffItsBounds_ErrsAsItsCovarianceSays()
    {
        double[][] scaled = [.. Compare(Models.Simple, Models.Simple.Layers[0])
            .Where(c => c.Truth.Zip(c.Expected).All(t => t.First > 3 * t.Second))
            .Select(c => c.Error.Zip(c.Expected, (e, s) => e / s).ToArray())];
        Assert.True(scaled.Length > 80, $"{scaled.Length} samples");
        double tolerance = 4 / Math.Sqrt(2 * scaled.Length);
        for (int k = 0; k < scaled[0].Length; k++)
        {
            Assert.Equal(1, Rms(scaled.Select(z => z[k])), tolerance);
        }
    }

    // Bounds can only help: over all samples the error is no more than that of the fit without them (a tenth is left to chance).
    [Theory]
    [InlineData(0)]
    [InlineData(1)]
    public void Solve_AllSamplesOfALayer_ErrNoMoreThanExpectedOfEachFraction(int layer)
    {
        (double[] Truth, double[] Error, double[] Expected)[] compared = [.. Compare(Models.TwoLayers, Models.TwoLayers.Layers[layer])];
        Assert.True(compared.Length > 250, $"{compared.Length} samples");
        for (int k = 0; k < compared[0].Error.Length; k++)
        {
            double error = Rms(compared.Select(c => c.Error[k]));
            double expected = Rms(compared.Select(c => c.Expected[k]));
            TestContext.Current.TestOutputHelper!.WriteLine($"layer {layer}, unknown {k}: RMS error {error:F4}, at most {expected:F4} expected");
            Assert.InRange(error, 0.4 * expected, 1.1 * expected);
        }
    }

    [Fact]
    public void Solve_AllSamples_FitWithinTheirErrors()
    {
        double[] p = [.. _result.PValue.Where(v => !double.IsNaN(v))];
        Assert.InRange(p.Length, 500, _cruise.Bottles.Count);
        Assert.InRange(p.Count(v => v < 0.001), 0, p.Length / 100);
    }

    /// <summary>For each solved sample of a layer with all tracers: its true fractions and amounts, their errors as fitted, and the errors to expect.</summary>
    private static IEnumerable<(double[] Truth, double[] Error, double[] Expected)> Compare(MixingModel model, Layer layer)
    {
        MixingResult result = ReferenceEquals(model, Models.TwoLayers) ? _result : Solve(model);
        int[] permitted = [.. layer.EndMembers.Select(id => Sources.Set.EndMembers.ToList().FindIndex(e => e.Id == id))];
        for (int row = 0; row < result.RowCount; row++)
        {
            if (result.Layer[row] == model.Layers.ToList().IndexOf(layer) && result.Status[row] == SolveStatus.Solved && result.TracerCount[row] == model.Tracers.Count)
            {
                Water water = _cruise.Bottles[row].Water;
                double[] amounts = [water.Respiration, water.Opal];
                double[] truth = [.. permitted.Select(i => water.Fractions[i]), .. amounts.Take(model.Processes.Count)];
                double[] fitted = [.. permitted.Select(i => result.Fractions[i][row]), .. result.Amounts.Select(a => a[row])];
                yield return (truth, [.. fitted.Zip(truth, (f, t) => f - t)], ExpectedErrors(model, permitted, _cruise.Bottles[row]));
            }
        }
    }

    /// <summary>Standard errors of all fractions and amounts with exact mass: the first fraction is one less the others.</summary>
    private static double[] ExpectedErrors(MixingModel model, int[] permitted, Bottle bottle)
    {
        int m = model.Tracers.Count;
        int n = permitted.Length;
        var a = Matrix<double>.Build.Dense(m, n - 1 + model.Processes.Count, (t, k) =>
            k < n - 1
                ? Sources.Values[permitted[k + 1]][t] - Sources.Values[permitted[0]][t]
                : model.Processes[k - (n - 1)].Ratios.GetValueOrDefault(model.Tracers[t]));
        var inverse = Matrix<double>.Build.Diagonal(m, m, t =>
            1 / (Math.Pow(Cruise.ErrorSd(t, bottle.Parcel[t]), 2) + bottle.Water.Fractions.Zip(Sources.Spread, (f, sd) => Math.Pow(f * sd[t], 2)).Sum()));
        Matrix<double> covariance = (a.Transpose() * inverse * a).Inverse();
        double first = covariance.SubMatrix(0, n - 1, 0, n - 1).Enumerate().Sum();
        return [Math.Sqrt(first), .. covariance.Diagonal().Select(Math.Sqrt)];
    }

    private static double Rms(IEnumerable<double> values) => Math.Sqrt(values.Average(v => v * v));

    private static MixingResult Solve(MixingModel model)
    {
        SampleTable table = ReadingTests.ReadAll("halcyon_hy1.csv");
        return MixingSolver.Solve(PreparedModel.From(model), table, new SolveOptions { Threads = 1 }).Result;
    }
}
