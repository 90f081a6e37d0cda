using WaterMix.Core.Mixing;
using WaterMix.Web.State.EndMembers;
using WaterMix.Web.State.Figures;
using WaterMix.Web.State.Mixing;
using WaterMix.Web.Tests.State.Mixing;

namespace WaterMix.Web.Tests.State.EndMembers;

public class PlaneSharesTests
{
    // Between A (2 degC, 34.9, 280) and B (12, 36.2, 200): halfway is (7, 35.55, 240).
    private static readonly double[][] Values = [[7, 7, 7, 30], [35.55, 35.55, 35.55, 35.55], [240, 200, 280, 240]];

    [Fact]
    public void Of_SamplesOnAndOffTheMixingLine_CountsThoseOff()
    {
        MixingModel model = SmallModel.Make();
        PlaneShares shares = PlaneShares.Of(model, null, Values, [true, true, true, true]);
        Assert.Equal(3, shares.Planes.Count);
        Assert.Equal(0.25, shares.Planes.Single(p => p.X == "practical_salinity" && p.Y == "potential_temperature").Outside);
        Assert.Equal(0.75, shares.OutsideAny);
    }

    [Fact]
    public void Of_WithRespiration_ReachesSamplesThatLostOxygen()
    {
        MixingModel model = WithRespiration(SmallModel.Make());
        PlaneShares shares = PlaneShares.Of(model, null, Values, [true, true, true, false]);
        PlaneShare plane = shares.Planes.Single(p => p.X == "oxygen" && p.Y == "practical_salinity");
        Assert.Equal(2.0 / 3, plane.OutsideMixtures, 1e-12);
        Assert.Equal(1.0 / 3, plane.Outside, 1e-12);
    }

    [Fact]
    public void Of_OnlyOneSourcePermitted_LeavesThePointOfThatSource() =>
        Assert.Equal(1, PlaneShares.Of(SmallModel.Make(), ["A"], Values, [true, true, true, true]).OutsideAny);

    [Fact]
    public void Of_NoSampleCounts_HasNoShare() =>
        Assert.True(double.IsNaN(PlaneShares.Of(SmallModel.Make(), null, Values, [false, false, false, false]).OutsideAny));

    // A property of the invented ocean: with its processes its own sources reach nearly all samples below the mask.
    [Fact]
    public void Of_TheInventedCruise_IsReachedByItsOwnSourcesUpToErrorsOfMeasurement()
    {
        MixingModel model = InventedCruise.Model;
        FigureColumns columns = InventedCruise.Columns(model);
        bool[] counts = Array.ConvertAll(LayerCensus.Of(model, columns).LayerOf, layer => layer >= 0);
        PlaneShares shares = PlaneShares.Of(model, null, [.. model.Tracers.Select(columns.Values)], counts);
        Assert.Equal(15, shares.Planes.Count);
        Assert.InRange(shares.OutsideAny, 0, 0.35);
        Assert.True(shares.Planes[0].Outside >= shares.Planes[^1].Outside);
    }

    private static MixingModel WithRespiration(MixingModel model) =>
        ModelEdits.AddProcess(model, ProcessPreset.All[0].For(model));
}
