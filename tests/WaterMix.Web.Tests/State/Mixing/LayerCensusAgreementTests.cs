using WaterMix.Core.Mixing;
using WaterMix.Web.State.Mixing;

namespace WaterMix.Web.Tests.State.Mixing;

// What the page says before the run against what the solver then does, sample by sample.
public class LayerCensusAgreementTests
{
    public static TheoryData<string, MixingModel> Models
    {
        get
        {
            MixingModel two = InventedCruise.Model;
            MixingModel many = ModelEdits.AddProcess(two, ProcessPreset.All[2].For(two) with { Where = [new Condition("oxygen", null, 200)] });
            return new TheoryData<string, MixingModel>
            {
                { "two layers", two },
                { "no layers", two with { Layers = [] } },
                { "only good values", two with { AcceptFlags = [2], AcceptCtdFlags = [2] } },
                { "few tracers and a process in places", ModelEdits.RemoveTracer(many, "potential_temperature") },
                { "EOS-80", two with { Layers = [two.Layers[0] with { Where = [new Condition("sigma2", 36.2, 36.8) { Scale = DensityScale.Eos80 }] }] } },
                { "weighted rows", ModelEdits.WithWeightedRows(two) },
            };
        }
    }

    [Theory]
    [MemberData(nameof(Models), DisableDiscoveryEnumeration = true)]
    public void Of_AModel_SortsAndCountsAsTheSolverDoes(string name, MixingModel model)
    {
        MixingResult solved = MixingSolver.Solve(PreparedModel.From(model), InventedCruise.Samples, new SolveOptions()).Result;
        var census = LayerCensus.Of(model, InventedCruise.Columns(model));
        Assert.True(InventedCruise.Samples.RowCount > 500, name);
        Assert.Equal(solved.Layer, census.LayerOf);
        Assert.Equal(solved.Status.LongCount(s => s == SolveStatus.OutsideLayers), census.Outside);
        Assert.Equal(solved.Status.LongCount(s => s == SolveStatus.TooFewTracers), census.TooFew);
    }

    [Fact]
    public void Of_MoreUnknownsThanTracers_CountsEverySampleOfTheLayer()
    {
        MixingModel model = InventedCruise.Model with { Tracers = ["potential_temperature", "practical_salinity"] };
        LayerCount layer = LayerCensus.Of(model, InventedCruise.Columns(model)).Layers[0];
        Assert.Equal(layer.Samples, layer.TooFew);
        Assert.Equal(3, layer.Unknowns);
        Assert.Contains("no sample can be solved", ModelSentences.Determinacy(layer), StringComparison.Ordinal);
    }
}
