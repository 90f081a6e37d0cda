namespace WaterMix.Core;

/// <summary>Keeps a long file's findings short: the same thing found again only adds to the count of the first.</summary>
public static class FindingFolding
{
    /// <summary>Adds findings; one that differs from one already there in nothing but its count is folded into it.</summary>
    /// <param name="findings">The list to add to.</param>
    /// <param name="more">What was found next.</param>
    public static void AddFolded(this List<Finding> findings, IEnumerable<Finding> more)
    {
        ArgumentNullException.ThrowIfNull(findings);
        ArgumentNullException.ThrowIfNull(more);
        foreach (Finding finding in more)
        {
            int same = findings.FindIndex(f => f with { Count = finding.Count } == finding);
            if (same < 0)
            {
                findings.Add(finding);
            }
            else
            {
                findings[same] = findings[same] with { Count = findings[same].Count + finding.Count };
            }
        }
    }
}
