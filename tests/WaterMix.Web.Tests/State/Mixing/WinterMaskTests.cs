using WaterMix.Core.Mixing;
using WaterMix.Formats.MixingModels;
using WaterMix.Web.State.Mixing;

namespace WaterMix.Web.Tests.State.Mixing;

public class WinterMaskTests
{
    [Fact]
    public void With_AModelWithoutLayers_MakesOneThatBeginsThere()
    {
        MixingModel masked = WinterMask.With(SmallModel.Make() with { Layers = [] }, 150);
        Layer layer = Assert.Single(masked.Layers);
        Assert.Equal(["A", "B"], layer.EndMembers);
        Assert.Equal([new Condition("pressure", 150, null)], layer.Where);
        Assert.Equal(150, WinterMask.Of(masked));
    }

    [Fact]
    public void With_AnotherDepth_MovesLayersThatBeginAtTheMaskAndLeavesDeeperOnes()
    {
        MixingModel model = SmallModel.Make() with
        {
            Layers = [new Layer("upper", ["A"], [new Condition("pressure", 150, 1000)]), new Layer("deep", ["B"], [new Condition("pressure", 1000, null)])],
        };
        MixingModel moved = WinterMask.With(model, 200);
        Assert.Equal([200, 1000], moved.Layers.Select(l => l.Where[0].AtLeast!.Value));
        Assert.Equal(200, WinterMask.Of(moved));
        MixingModel back = WinterMask.With(moved, 100);
        Assert.Equal([100, 1000], back.Layers.Select(l => l.Where[0].AtLeast!.Value));
    }

    [Fact]
    public void With_Null_TakesTheConditionOutAndKeepsOthers()
    {
        MixingModel model = SmallModel.Make() with { Layers = [new Layer("all", ["A", "B"], [new Condition("pressure", 150, null), new Condition("sigma2", 36, null)])] };
        Assert.Equal([new Condition("sigma2", 36, null)], WinterMask.With(model, null).Layers[0].Where);
        Assert.Null(WinterMask.Of(WinterMask.With(model, null)));
    }

    [Fact]
    public void Of_ALayerWithoutABound_IsNoMask()
    {
        MixingModel model = SmallModel.Make();
        Assert.Null(WinterMask.Of(model with { Layers = [.. model.Layers, new Layer("rest", ["A"], [])] }));
    }

    // The mask stands in the file as conditions that the contract knows, so that the command line solves the same samples.
    [Fact]
    public void With_AMask_IsReadBackFromTheModelsFile()
    {
        MixingModel masked = WinterMask.With(SmallModel.Make() with { Layers = [] }, 175);
        MixingModel read = MixingModelFile.Read(ModelFiles.OfModel(masked).Utf8, "model", _ => throw new FileNotFoundException()).Value!;
        Assert.Equal(masked, read);
        Assert.Equal(175, WinterMask.Of(read));
    }

    [Fact]
    public void From_AnUntouchedModel_BeginsWithMeasuredTracersUsualErrorsAndTheMask()
    {
        MixingModel empty = SmallModel.Make() with { EndMembers = SmallModel.Make().EndMembers with { EndMembers = [] }, Tracers = [], Layers = [], Fit = new GeneralisedLeastSquares() };
        Assert.True(StartingModel.IsUntouched(empty));
        MixingModel begun = StartingModel.From(empty, ["potential_temperature", "practical_salinity", "oxygen", "cfc11"]);
        Assert.Equal(["potential_temperature", "practical_salinity", "oxygen"], begun.Tracers);
        Assert.Equal(begun.Tracers, begun.Fit.MeasurementSd.Keys);
        Assert.Equal(150, WinterMask.Of(begun));
        Assert.False(StartingModel.IsUntouched(begun));
    }
}
