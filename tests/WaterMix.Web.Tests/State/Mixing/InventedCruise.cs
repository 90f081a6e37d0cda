using WaterMix.Core.Mixing;
using WaterMix.Core.Samples;
using WaterMix.Formats.MixingModels;
using WaterMix.Formats.Reading;
using WaterMix.Web.State.Figures;
using WaterMix.Workspace.Demo;

namespace WaterMix.Web.Tests.State.Mixing;

/// <summary>The cruise and the model of the invented ocean.</summary>
internal static class InventedCruise
{
    private static readonly Lazy<SampleTable> Read = new(() =>
    {
        using OpenedSamples opened = SampleReader.Open([new InputFile("halcyon_hy1.csv", () => InventedOcean.Open("halcyon_hy1.csv"))], new ReadingOptions());
        return Assert.Single(opened.ReadBlocks()).Table;
    });

    public static SampleTable Samples => Read.Value;

    public static MixingModel Model { get; } =
        MixingModelFile.Read(InventedOcean.Read("halcyon.mixmodel.json"), "halcyon.mixmodel.json", set => (InventedOcean.Read(set), set)).Value! with { EndMembersFile = null };

    public static FigureColumns Columns(MixingModel model) =>
        new([new FigureCruise("Halcyon", Samples, null)], new AcceptedFlags(model.AcceptFlags, model.AcceptCtdFlags), model.Fit.Factors);
}
