using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;

namespace WaterMix.Web.State.EndMembers;

/// <summary>Counts the versions of a set, so that one name and version never stand for two sets of numbers.</summary>
public static class SetVersions
{
    /// <summary>
    /// The changed model, its set with the next version where the set before the change has been published: used in a run, read from a
    /// file or written to one. A version that the change itself sets is kept.
    /// </summary>
    /// <param name="before">The model before the change.</param>
    /// <param name="after">The changed model.</param>
    /// <param name="published">The sets that have been published.</param>
    public static MixingModel Counted(MixingModel before, MixingModel after, IEnumerable<EndMemberSet> published)
    {
        ArgumentNullException.ThrowIfNull(before);
        ArgumentNullException.ThrowIfNull(after);
        ArgumentNullException.ThrowIfNull(published);
        EndMemberSet set = after.EndMembers;
        if (set == before.EndMembers || set.Version != before.EndMembers.Version || set.Name != before.EndMembers.Name)
        {
            return after;
        }

        EndMemberSet[] same = [.. published.Where(s => s.Name == set.Name)];
        return same.Contains(before.EndMembers) ? after with { EndMembers = set with { Version = same.Max(s => s.Version) + 1 } } : after;
    }
}
