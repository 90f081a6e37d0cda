using WaterMix.Core.Mixing;

namespace WaterMix.Web.State.Results;

/// <summary>The model of a run in sentences.</summary>
public static class ModelWords
{
    /// <summary>The sentences, one fact each.</summary>
    /// <param name="model">The model.</param>
    public static IReadOnlyList<string> Of(MixingModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        return
        [
            $"{PlainText.Count(model.EndMembers.EndMembers.Count, "source")} of the set “{model.EndMembers.Name}”, version {PlainText.Count(model.EndMembers.Version)}.",
            $"{PlainText.Count(model.Tracers.Count, "tracer")}, {FitOf(model.Fit)}.",
            model.Mass.IsExact ? "Mass is conserved exactly." : "Mass is conserved by a weighted row.",
            model.Processes.Count == 0 ? "No process." : $"{(model.Processes.Count == 1 ? "Process" : "Processes")}: {string.Join(", ", model.Processes.Select(p => p.Id))}.",
            model.Layers.Count == 0 ? "Every sample is in one layer." : $"{(model.Layers.Count == 1 ? "Layer" : "Layers")}: {string.Join(", ", model.Layers.Select(l => l.Id))}.",
        ];
    }

    /// <summary>The first characters of a hash, as people quote it.</summary>
    /// <param name="hash">A hash in hexadecimal digits.</param>
    public static string HashStart(string hash)
    {
        ArgumentNullException.ThrowIfNull(hash);
        return hash.Length > 8 ? hash[..8] : hash;
    }

    private static string FitOf(Fit fit) => fit is WeightedRows ? "weighted rows" : "generalised least squares";
}
