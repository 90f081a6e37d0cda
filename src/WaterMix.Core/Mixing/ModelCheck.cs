using System.Globalization;
using WaterMix.Core.EndMembers;
using WaterMix.Core.Quantities;

namespace WaterMix.Core.Mixing;

/// <summary>Whether a mixing model makes sense: tracers that may be rows, values and errors for each, processes, layers.</summary>
public static partial class ModelCheck
{
    /// <summary>The end-member set's place in the model.</summary>
    public const string EndMembersPath = "/endMembers";

    /// <summary>
    /// Everything that is wrong or worth saying. An error makes the model unusable; a warning affects a tracer, a layer or a source; a
    /// note says what was assumed.
    /// </summary>
    /// <param name="model">The model.</param>
    /// <returns>The findings, with RFC 6901 paths into the model as if the set stood in it.</returns>
    public static IReadOnlyList<Finding> Findings(MixingModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        var findings = new CheckFindings();
        OfTracers(model, findings);
        OfFit(model, findings);
        OfSources(model, findings);
        OfProcesses(model, findings);
        OfLayers(model, findings);
        OfFlags(model.AcceptFlags, "/acceptFlags", findings);
        OfFlags(model.AcceptCtdFlags, "/acceptCtdFlags", findings);
        return [.. EndMemberSetCheck.Findings(model.EndMembers, EndMembersPath), .. findings.Items];
    }

    /// <summary>The tracers that may be rows, each once, with their index in the model. A refused one is not asked for values and errors as well.</summary>
    private static IEnumerable<(int Index, string Tracer)> Rows(MixingModel model) => model.Tracers.Index()
        .Where(t => EndMemberSetCheck.IsKnown(t.Item, model.EndMembers) && Quantity.FindOrFurther(t.Item).Use != TracerUse.Never)
        .DistinctBy(t => t.Item);

    /// <summary>The quantities that the tracers are computed from, each once: what end-members and errors must be given for.</summary>
    private static IReadOnlyList<string> Parents(MixingModel model) =>
        [.. Rows(model).Select(row => row.Tracer).SelectMany(tracer => model.Fit.Factors.FormOf(tracer).Terms).Select(term => term.Parent).Distinct()];

    /// <summary>The end-members that a layer permits, with their index in the set; ids that are not in the set are passed over.</summary>
    private static List<(int Index, EndMember EndMember)> Permitted(MixingModel model, Layer layer)
    {
        var ids = layer.EndMembers.ToHashSet(StringComparer.Ordinal);
        return [.. model.EndMembers.EndMembers.Index().Where(e => ids.Contains(e.Item.Id))];
    }

    private static string EndMemberPath(int index, params ReadOnlySpan<string> tokens)
    {
        string path = JsonPointer.Append(EndMembersPath + "/endMembers", index);
        foreach (string token in tokens)
        {
            path = JsonPointer.Append(path, token);
        }

        return path;
    }

    private static void OfFlags(IReadOnlyList<int> flags, string at, CheckFindings findings)
    {
        for (int i = 0; i < flags.Count; i++)
        {
            if (flags[i] is < 0 or > 9)
            {
                findings.Error(JsonPointer.Append(at, i), "a WHP quality flag from 0 to 9", Text(flags[i]), "Give flags of the WHP tables.");
            }
        }
    }

    private static string Text(double value) => value.ToString("R", CultureInfo.InvariantCulture);
}
