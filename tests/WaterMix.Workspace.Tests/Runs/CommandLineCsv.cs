using WaterMix.Core.Mixing;
using WaterMix.Formats.Reading;
using WaterMix.Formats.Results;

namespace WaterMix.Workspace.Tests.Runs;

/// <summary>What the command line writes for files and a model, by the path that it takes.</summary>
internal static class CommandLineCsv
{
    public static byte[] Of(MixingModel model, params (string Name, byte[] Bytes)[] files)
    {
        var prepared = PreparedModel.From(model);
        var options = new ReadingOptions { NeededQuantities = prepared.InputIds, Prefer = model.Prefer };
        using OpenedSamples opened = SampleReader.Open(
            [.. files.OrderBy(f => f.Name, StringComparer.Ordinal).Select(f => new InputFile(f.Name, () => new MemoryStream(f.Bytes)))], options);
        using var output = new MemoryStream();
        SolveSummary summary = StreamedSolve.Run(opened, prepared, new SolveOptions { Threads = 1 }, output, null);
        Assert.False(summary.HasErrors, string.Join("\n", summary.Findings));
        return output.ToArray();
    }
}
