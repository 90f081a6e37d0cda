using WaterMix.Core;
using WaterMix.Core.Mixing;
using WaterMix.Web.State.Mixing;

namespace WaterMix.Web.Tests.State.Mixing;

public class ModelEditsTests
{
    private readonly MixingModel _model = SmallModel.Make();

    [Fact]
    public void AddTracer_ADerivedOne_BringsTheErrorsOfItsParents()
    {
        MixingModel with = ModelEdits.AddTracer(_model, "no");
        Assert.Equal(["potential_temperature", "practical_salinity", "oxygen", "no"], with.Tracers);
        Assert.Contains("nitrate", with.Fit.MeasurementSd.Keys);
        Assert.Equal(["potential_temperature", "practical_salinity", "oxygen", "nitrate"], ModelEdits.Parents(with));
    }

    [Fact]
    public void RemoveTracer_AddedBefore_GivesTheModelOfBefore()
    {
        Assert.Equal(_model, ModelEdits.RemoveTracer(ModelEdits.AddTracer(_model, "silicate"), "silicate"));
        MixingModel rows = ModelEdits.WithWeightedRows(_model);
        Assert.Equal(rows, ModelEdits.RemoveTracer(ModelEdits.AddTracer(rows, "silicate"), "silicate"));
    }

    [Fact]
    public void WithOtherPair_Twice_GivesTheModelOfBefore()
    {
        MixingModel other = ModelEdits.WithOtherPair(_model);
        Assert.Equal(["conservative_temperature", "absolute_salinity", "oxygen"], other.Tracers);
        Assert.Equal(_model, ModelEdits.WithOtherPair(other));
    }

    [Fact]
    public void WithLeastSquares_AfterWeightedRows_KeepsTheErrors()
    {
        MixingModel rows = ModelEdits.WithWeightedRows(_model);
        Assert.DoesNotContain(ModelCheck.Findings(rows), f => f.Severity == Severity.Error);
        Assert.Equal(_model, ModelEdits.WithLeastSquares(rows, EndMemberSpread.Iterated));
    }

    // By hand, oxygen: values 280 and 200, so s^2 = 40^2 over n = 2; the largest variance within a source 2^2; W = 1600 / 4 = 400.
    // The row factor of W on rows over the set is W/s = 10; of the square root sqrt(400)/40 = 0.5 = 1/2, one by the spread within the source.
    [Fact]
    public void ProposedWeights_OfTheRecipe_GiveTheRowFactorsComputedByHand()
    {
        MixingModel rows = ModelEdits.WithWeightedRows(_model);
        Assert.Equal(400, ((WeightedRows)rows.Fit).Weights["oxygen"], 1e-9);
        Assert.Equal(10, PreparedModel.From(rows).RowFactors(0)[2], 1e-9);
        MixingModel squared = ModelEdits.OfRows(rows, r => r with { WeightsAre = WeightMeaning.Squared });
        Assert.Equal(0.5, PreparedModel.From(squared).RowFactors(0)[2], 1e-9);
    }

    [Fact]
    public void WithPermitted_TickedAndUnticked_KeepsTheOrderOfTheSet()
    {
        MixingModel without = ModelEdits.WithPermitted(_model, 0, "A", false);
        Assert.Equal(["B"], without.Layers[0].EndMembers);
        Assert.Equal(["A", "B"], ModelEdits.WithPermitted(without, 0, "A", true).Layers[0].EndMembers);
    }

    [Fact]
    public void AddLayer_ToAModelWithout_KeepsTheLayerOfAllAndAddsOne()
    {
        MixingModel two = ModelEdits.AddLayer(_model with { Layers = [] });
        Assert.Equal(["all", "layer-2"], two.Layers.Select(l => l.Id));
        Assert.All(two.Layers, l => Assert.Equal(["A", "B"], l.EndMembers));
    }

    [Fact]
    public void AddProcess_TheSameTwice_GivesTheSecondAnIdOfItsOwn()
    {
        Process respiration = ProcessPreset.All[0].For(_model);
        MixingModel twice = ModelEdits.AddProcess(ModelEdits.AddProcess(_model, respiration), respiration);
        Assert.Equal(["respiration", "respiration-2"], twice.Processes.Select(p => p.Id));
    }

    // Respiration in units of oxygen: the amount is then negative where phosphate is released.
    [Fact]
    public void CountedIn_AnotherQuantity_KeepsTheProportionsAndTurnsTheSign()
    {
        Process inOxygen = ModelEdits.CountedIn(ProcessPreset.All[0].For(_model), "oxygen");
        Assert.Equal(1, inOxygen.Ratios["oxygen"]);
        Assert.Equal(-1.0 / 170, inOxygen.Ratios["phosphate"], 1e-15);
        Assert.Equal(ProcessSign.NonPositive, inOxygen.Sign);
    }

    [Fact]
    public void WithFlag_AcceptedTwice_StandsOnce()
    {
        Assert.Equal([2, 3, 6], ModelEdits.WithFlag(ModelEdits.WithFlag(_model, 3, true), 3, true).AcceptFlags);
        Assert.Equal([2], ModelEdits.WithFlag(_model, 6, false).AcceptFlags);
    }

    [Fact]
    public void All_EveryPresetInAModelWithItsTracers_HasNoError()
    {
        MixingModel wide = new[] { "nitrate", "phosphate", "silicate", "dissolved_inorganic_carbon", "total_alkalinity" }.Aggregate(InventedCruise.Model, ModelEdits.AddTracer);
        foreach (ProcessPreset preset in ProcessPreset.All)
        {
            MixingModel with = ModelEdits.AddProcess(wide with { Processes = [] }, preset.For(wide));
            Assert.DoesNotContain(ModelCheck.Findings(with), f => f.Severity == Severity.Error && f.Path!.StartsWith("/processes", StringComparison.Ordinal));
            Assert.Equal(preset, ProcessPreset.Like(with.Processes[0]));
        }
    }
}
