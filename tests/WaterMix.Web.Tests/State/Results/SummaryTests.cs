using WaterMix.Core.Mixing;
using WaterMix.Web.State.Results;

namespace WaterMix.Web.Tests.State.Results;

// The expected numbers are worked out by hand from the values of TwoLayers.
public class SummaryTests
{
    private static readonly RunResults Results = TwoLayers.Results();
    private static readonly int[] All = [0, 1, 2, 3, 4, 5, 6, 7];

    [Fact]
    public void LayerSummary_TwoLayers_HasMeansMedianAndShareOfEach()
    {
        IReadOnlyList<LayerSummary> layers = LayerSummary.Of(Results, All);

        Assert.Equal(["upper", "deep", "all layers"], layers.Select(l => l.Layer));
        LayerSummary upper = layers[0];
        Assert.Equal((4, 4), (upper.Samples, upper.Answered));
        Assert.Equal([0.4, 0.6], upper.MeanFractions.Take(2).Select(f => Math.Round(f, 12)));
        Assert.True(double.IsNaN(upper.MeanFractions[2]), "The upper layer does not permit C.");
        Assert.Equal(3.5, upper.MedianReducedChi2); // of 1, 3, 4, 10
        Assert.Equal(0.5, upper.ShareImprobable); // 0.04 and 0.001 of four
        LayerSummary deep = layers[1];
        Assert.Equal((3, 2), (deep.Samples, deep.Answered));
        Assert.Equal(0.002, deep.LargestMassResidual);
        Assert.Equal(3.5, deep.MedianReducedChi2); // of 2 and 5
    }

    [Fact]
    public void LayerSummary_AllLayers_CountsASourceThatIsNotPermittedAsZero()
    {
        LayerSummary all = LayerSummary.Of(Results, All)[^1];

        Assert.Equal((7, 6), (all.Samples, all.Answered));
        Assert.Equal([1.6 / 6, 3.2 / 6, 1.2 / 6], all.MeanFractions.Select(f => f), (a, b) => Math.Abs(a - b) < 1e-12);
        Assert.Equal(1, all.MeanFractions.Sum(), 12);
    }

    [Fact]
    public void LayerSummary_RowsOfOneLayer_HaveNoSecondLineThatSaysTheSame() =>
        Assert.Equal(["deep"], LayerSummary.Of(Results, [2, 3, 6]).Select(l => l.Layer));

    [Fact]
    public void LayerLine_NoAnswer_HasADashForEachNumberThereIsNot()
    {
        LayerSummary only = Assert.Single(LayerSummary.Of(Results, [3]));

        Assert.Equal(["1", "0", "–", "–", "–", "–", "–", "–"], LayerLine.Of(only).Cells);
    }

    [Fact]
    public void ResidualSummary_Tracer_HasMeanAndStandardDeviationOfEachLayer()
    {
        IReadOnlyList<ResidualSummary> residuals = ResidualSummary.Of(Results, All);

        ResidualSummary upper = residuals[0];
        Assert.Equal(("potential_temperature", "upper", 4), (upper.Tracer.Id, upper.Layer, upper.Count));
        Assert.Equal(0.01, upper.Mean, 12); // of 0.02, -0.02, 0.06, -0.02
        Assert.Equal(Math.Sqrt(0.0044 / 3), upper.Sd, 12);
        Assert.Equal(4, upper.Counts.Sum());
        Assert.Equal(0.06, upper.Half);
        Assert.Equal(1, upper.Counts[^1]);
        Assert.Equal(("deep", 2), (residuals[1].Layer, residuals[1].Count));
        Assert.Equal(2, residuals.Count); // salinity has no residual
    }

    [Fact]
    public void HistogramBar_Counts_StandOnTheGroundAndTheHighestFillsTheHeight()
    {
        ResidualSummary upper = ResidualSummary.Of(Results, All)[0];

        IReadOnlyList<HistogramBar> bars = HistogramBar.Of(upper);

        Assert.Equal(3, bars.Count);
        Assert.Contains(bars, bar => bar.High == "22" && bar.Y == "0");
        Assert.Contains(bars, bar => bar.High == "11" && bar.Y == "11");
        Assert.Equal("Residuals from −0.0600 to 0.0600 °C, 4 samples", HistogramBar.Words(upper, "°C"));
    }

    [Fact]
    public void StatusCount_Run_CountsEachStatusWithItsReasons()
    {
        IReadOnlyList<StatusCount> statuses = StatusCount.Of(Results);

        Assert.Equal((SolveStatus.Solved, 6), (statuses[0].Status, statuses[0].Count));
        StatusCount few = statuses.Single(s => s.Status == SolveStatus.TooFewTracers);
        Assert.Equal([("1 usable tracers for 1 unknowns; without a usable value: potential_temperature", 1)], few.Reasons);
        Assert.Empty(statuses.Single(s => s.Status == SolveStatus.OutsideLayers).Reasons);
    }
}
