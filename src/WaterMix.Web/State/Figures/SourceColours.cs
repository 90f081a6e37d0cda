using WaterMix.Core.EndMembers;

namespace WaterMix.Web.State.Figures;

/// <summary>The colour of each source, the same in every figure, table and chip of a study.</summary>
public static class SourceColours
{
    /// <summary>Nine colours that people with any colour vision tell apart: the muted scheme of <c>Tol2021</c>.</summary>
    public static IReadOnlyList<string> Muted { get; } =
        ["#CC6677", "#332288", "#DDCC77", "#117733", "#88CCEE", "#882255", "#44AA99", "#999933", "#AA4499"];

    /// <summary>The colour of the source at a place in its set. From the tenth on colours come again, and only the label tells them apart.</summary>
    /// <param name="index">Place in the end-member set, from 0.</param>
    public static string At(int index) => Muted[index % Muted.Count];

    /// <summary>The colour of each end-member of a set, by its id.</summary>
    /// <param name="set">The end-member set.</param>
    public static IReadOnlyDictionary<string, string> Of(EndMemberSet set)
    {
        ArgumentNullException.ThrowIfNull(set);
        return set.EndMembers.Select((member, index) => (member.Id, Colour: At(index))).ToDictionary(p => p.Id, p => p.Colour, StringComparer.Ordinal);
    }
}
