using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;
using WaterMix.Web.State.Mixing;

namespace WaterMix.Web.State.EndMembers;

/// <summary>The columns of the table of end-members, and what is missing in it.</summary>
public static class SetColumns
{
    /// <summary>The quantities that the table shows: what the model's tracers follow from, then what the end-members have values of besides.</summary>
    /// <param name="model">The model.</param>
    /// <param name="added">Columns that a person opened and may not have filled yet.</param>
    public static IReadOnlyList<string> Of(MixingModel model, IEnumerable<string> added)
    {
        ArgumentNullException.ThrowIfNull(model);
        IEnumerable<string> parents = ModelEdits.Parents(model);
        return [.. parents.Concat(TracerText.InOrder(model.EndMembers.EndMembers.SelectMany(e => e.Values.Keys.Concat(e.Sd.Keys)).Concat(added))).Distinct()];
    }

    /// <summary>Quantities that could be a further column.</summary>
    /// <param name="model">The model.</param>
    /// <param name="shown">The columns shown.</param>
    public static IReadOnlyList<string> Further(MixingModel model, IReadOnlyList<string> shown)
    {
        ArgumentNullException.ThrowIfNull(model);
        return [.. Quantity.All.Where(q => q.Use == TracerUse.Row).Select(q => q.Id).Concat(model.EndMembers.Units.Keys).Where(id => !shown.Contains(id))];
    }

    /// <summary>What is missing of where an end-member's numbers come from; null where a note or a citation is there.</summary>
    /// <param name="endMember">The end-member.</param>
    public static string? MissingProvenance(EndMember endMember)
    {
        ArgumentNullException.ThrowIfNull(endMember);
        Provenance from = endMember.Provenance;
        bool hasCitation = !string.IsNullOrWhiteSpace(from.Citation);
        return from.Kind switch
        {
            ProvenanceKind.Literature when !hasCitation => "No citation given",
            ProvenanceKind.Proposal => "A proposal, not yet judged",
            _ => hasCitation || !string.IsNullOrWhiteSpace(from.Note) ? null : "No source given",
        };
    }

    /// <summary>A kind of provenance in words.</summary>
    /// <param name="kind">The kind.</param>
    public static string Words(ProvenanceKind kind) => kind switch
    {
        ProvenanceKind.Manual => "Typed in",
        ProvenanceKind.Samples => "Computed from samples",
        ProvenanceKind.Literature => "From a publication",
        ProvenanceKind.Remembered => "From memory, unchecked",
        _ => "Proposed, not yet judged",
    };
}
