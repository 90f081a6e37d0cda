using WaterMix.Core.EndMembers;

namespace WaterMix.Core.Mixing;

public static partial class ModelCheck
{
    private static void OfSources(MixingModel model, CheckFindings findings)
    {
        IReadOnlyList<string> parents = Parents(model);
        var permitted = model.LayersOrAll.SelectMany(layer => Permitted(model, layer)).DistinctBy(p => p.Index).OrderBy(p => p.Index).ToList();
        var lacking = parents.Where(parent => permitted.Count > 0 && !permitted.Exists(p => p.EndMember.Values.ContainsKey(parent))).ToHashSet();
        foreach ((int i, string tracer) in Rows(model))
        {
            foreach (string parent in model.Fit.Factors.FormOf(tracer).Terms.Select(t => t.Parent).Where(lacking.Contains))
            {
                findings.Error(
                    JsonPointer.Append("/tracers", i),
                    parent == tracer ? "a tracer that the end-members have values of" : $"end-members with values of {parent}, which {tracer} is computed from",
                    $"no value of {parent} in any permitted end-member",
                    $"Give each end-member a value of {parent}, or take {tracer} out.");
            }
        }

        foreach ((int index, EndMember endMember) in permitted)
        {
            foreach (string parent in parents.Where(p => !lacking.Contains(p) && !endMember.Values.ContainsKey(p)))
            {
                findings.Error(
                    EndMemberPath(index, "values", parent),
                    $"a value of {parent} for each end-member that a layer permits",
                    $"none for {endMember.Id}",
                    $"Give the value, or take {endMember.Id} out of the layers or the tracer out of the fit.");
            }

            Assumptions(model, index, endMember, parents, findings);
        }
    }

    // What is assumed about an end-member's spread where it does not say.
    private static void Assumptions(MixingModel model, int index, EndMember endMember, IReadOnlyList<string> parents, CheckFindings findings)
    {
        string[] without = [.. parents.Where(parent => !endMember.Sd.ContainsKey(parent))];
        if (model.Fit is GeneralisedLeastSquares { Spread: not EndMemberSpread.None } && without.Length > 0)
        {
            findings.Note(
                EndMemberPath(index, "sd"),
                "the spread of each tracer within the source",
                $"none for {string.Join(", ", without)} of {endMember.Id}",
                "It counts as 0; give \"sd\" where parcels of this source differ.");
        }

        if (endMember.Observations is null && endMember.Sd.Keys.Any(tracer => !endMember.MeanSd.ContainsKey(tracer)))
        {
            findings.Note(
                EndMemberPath(index, "observations"),
                "the number of independent determinations (cruises or years)",
                $"none for {endMember.Id}",
                "It counts as 1, so the error of the mean is taken as large as the spread.");
        }

        if (endMember.Provenance.Kind == ProvenanceKind.Samples && endMember.Correlations is null)
        {
            findings.Note(
                EndMemberPath(index, "correlations"),
                "the correlations between tracers of an end-member made from samples",
                $"none for {endMember.Id}",
                "The tracers' spreads count as independent; keep the correlations when making end-members from samples.");
        }
    }

    // Two sources that no tracer tells apart share their fraction in any way.
    private static void Twins(MixingModel model, Layer layer, CheckFindings findings)
    {
        List<(int Index, EndMember EndMember)> permitted = Permitted(model, layer);
        string[] rows = [.. Rows(model).Select(row => row.Tracer)];
        var firstWith = new Dictionary<string, int>(StringComparer.Ordinal);
        for (int j = 0; j < permitted.Count; j++)
        {
            double[] values = [.. rows.Select(tracer => model.Fit.Factors.ValueOf(tracer, permitted[j].EndMember.Values))];
            string key = string.Join(' ', values.Select(Text));
            bool isComplete = values.Length > 0 && Array.TrueForAll(values, double.IsFinite);
            if (isComplete && !firstWith.TryAdd(key, j) && firstWith[key] is var i)
            {
                findings.Warning(
                    EndMemberPath(permitted[j].Index),
                    $"end-members of layer \"{layer.Id}\" that differ in a fitted tracer",
                    $"{permitted[i].EndMember.Id} and {permitted[j].EndMember.Id} with the same values",
                    "Their fractions are not unique, only the sum is; keep one of them, or add a tracer that tells them apart.");
            }
        }
    }
}
