using WaterMix.Core;
using WaterMix.Core.Mixing;
using WaterMix.Web.State.Mixing;

namespace WaterMix.Web.Tests.State.Mixing;

public class ModelWordsTests
{
    [Fact]
    public void Sentences_OfTheInventedModel_ReadAloud()
    {
        MixingModel model = InventedCruise.Model;
        Assert.Equal(
            "Six tracers are fitted: potential temperature, Practical Salinity, oxygen, nitrate, phosphate and silicate.",
            ModelSentences.Tracers(model));
        Assert.Equal(
            "Respiration, for each 1 \u00b5mol/kg of phosphate: oxygen \u2212170, nitrate +16; its amount is never negative; everywhere.",
            ModelSentences.Process(model.Processes[0], model.EndMembers));
        Assert.Equal(
            "A sample with pressure at least 150 dbar and sigma-2 below 36.6 kg/m\u00b3 may hold HTW, HIW, MSW and NDW.",
            ModelSentences.Layer(model.Layers[0], model.EndMembers));
        Assert.Contains("oxygen 0.4 \u00b5mol/kg and 0.3 %", ModelSentences.Errors(model), StringComparison.Ordinal);
        Assert.StartsWith("Samples above 150 dbar are left out.", ModelSentences.Mask(model), StringComparison.Ordinal);
    }

    [Fact]
    public void Of_AMissingError_SaysWhereItIsMendedInNamesAndNotInKeys()
    {
        MixingModel model = SmallModel.Make();
        model = model with { Fit = model.Fit with { MeasurementSd = model.Fit.MeasurementSd.Where(e => e.Key != "potential_temperature").ToDictionary() } };
        FindingSentence finding = Assert.Single(FindingSentence.Of(model), f => f.Severity == Severity.Error);
        Assert.Equal(ModelPlace.Errors, finding.Place);
        Assert.Equal("potential temperature", finding.About);
        Assert.Equal("Needed: a measurement error of potential temperature, which is fitted; there is none. Give it under Errors of measurement.", finding.Text);
    }

    [Fact]
    public void Of_AMissingValue_NamesTheEndMemberAndTheTracer()
    {
        MixingModel model = WaterMix.Web.State.EndMembers.SetEdits.WithValue(SmallModel.Make(), 1, "oxygen", null);
        FindingSentence finding = FindingSentence.Of(model)[0];
        Assert.Equal((ModelPlace.Sources, "B, oxygen"), (finding.Place, finding.About));
    }

    // Every path that a check can give leads to a part of the page; a process of an unknown layer to its own heading.
    [Theory]
    [InlineData("/tracers/0", ModelPlace.Tracers, "potential temperature")]
    [InlineData("/fit/weights/oxygen", ModelPlace.Fit, "oxygen")]
    [InlineData("/massConservation/weight", ModelPlace.Mass, "")]
    [InlineData("/layers/0/where/0", ModelPlace.Layers, "interior")]
    [InlineData("/processes/7", ModelPlace.Processes, "")]
    [InlineData("/acceptFlags/0", ModelPlace.Samples, "")]
    [InlineData("/endMembers/endMembers/0/id", ModelPlace.Sources, "A")]
    public void Of_APath_LeadsToItsPlace(string path, ModelPlace place, string about)
    {
        var sentence = FindingSentence.Of(new Finding(Severity.Note, "one thing", "another", "Do this.") { Path = path }, SmallModel.Make());
        Assert.Equal((place, about), (sentence.Place, sentence.About));
    }

    [Fact]
    public void Read_AModelThatNamesItsSet_TakesBothFilesInAnyOrder()
    {
        byte[] set = WaterMix.Workspace.Demo.InventedOcean.Read("halcyon.endmembers.json");
        byte[] model = WaterMix.Workspace.Demo.InventedOcean.Read("halcyon.mixmodel.json");
        var reading = ModelFiles.Read([new NamedFile("halcyon.endmembers.json", set), new NamedFile("renamed.json", model)]);
        Assert.Equal(InventedCruise.Model, reading.Value);

        var alone = ModelFiles.Read([new NamedFile("renamed.json", model)]);
        Assert.Null(alone.Value);
        Assert.Contains(alone.Findings, f => f.Found.Contains("choose both files together", StringComparison.Ordinal));
    }

    [Fact]
    public void OfSet_TheFile_IsNamedByNameAndVersion() =>
        Assert.Equal("halcyon-basin-sources-v1.endmembers.json", ModelFiles.OfSet(InventedCruise.Model).Name);
}
