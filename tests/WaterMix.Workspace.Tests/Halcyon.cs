using WaterMix.Core.Mixing;
using WaterMix.Formats.MixingModels;

namespace WaterMix.Workspace.Tests;

/// <summary>The invented ocean's models, their sets inline.</summary>
internal static class Halcyon
{
    public static MixingModel Model => Read("halcyon.mixmodel.json");

    public static MixingModel Simple => Read("halcyon-simple.mixmodel.json");

    private static MixingModel Read(string name) =>
        MixingModelFile.Read(OpenWorkspace.Sample(name), name, set => (OpenWorkspace.Sample(set), set)).Value! with { EndMembersFile = null };
}
