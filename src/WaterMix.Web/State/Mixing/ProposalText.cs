using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Mixing;

/// <summary>Proposals of errors in words.</summary>
public static class ProposalText
{
    /// <summary>What replicates say.</summary>
    /// <param name="proposal">The proposal, or null where there are too few pairs.</param>
    /// <param name="unit">The unit as people write it.</param>
    /// <param name="means">Number of values that are means of replicates already.</param>
    public static string Replicates(ErrorProposal? proposal, string unit, long means)
    {
        string also = means > 0 ? $" {PlainText.Count(means, "value is a mean", "values are means")} of replicates (flag 6); their scatter is not in the file." : "";
        return proposal is null
            ? $"fewer than {PlainText.Count(ErrorProposals.FewestPairs)} pairs of bottles closed at one pressure.{also}"
            : $"{Sd(proposal, unit)} from {PlainText.Count(proposal.Pairs, "pair", "pairs")} of bottles closed at one pressure; half of them differ by less than {WithUnit(proposal.MedianAbsolute, unit)}.{also}";
    }

    /// <summary>What bottle against CTD says.</summary>
    /// <param name="proposal">The proposal, or null where there are too few pairs.</param>
    /// <param name="unit">The unit as people write it.</param>
    public static string BottleAndCtd(ErrorProposal? proposal, string unit) => proposal is null
        ? $"fewer than {PlainText.Count(ErrorProposals.FewestPairs)} samples with both a bottle and a CTD value."
        : $"{Sd(proposal, unit)} from {PlainText.Count(proposal.Pairs, "sample", "samples")} with both; bottle less CTD has the median {WithUnit(proposal.Offset, unit)}, and half of the differences lie within {WithUnit(proposal.MedianAbsolute, unit)} of it. It holds the errors of both instruments.";

    /// <summary>The proposed number, rounded to two digits as an error deserves.</summary>
    /// <param name="proposal">The proposal.</param>
    public static double Rounded(ErrorProposal proposal)
    {
        ArgumentNullException.ThrowIfNull(proposal);
        if (!(proposal.Sd > 0))
        {
            return 0;
        }

        int decimals = Math.Clamp(1 - (int)Math.Floor(Math.Log10(proposal.Sd)), 0, 15);
        return Math.Round(proposal.Sd, decimals);
    }

    private static string Sd(ErrorProposal proposal, string unit)
    {
        double sd = Rounded(proposal);
        string share = proposal.Typical > 0 && sd > 0 ? $" ({FigureText.Number(sd / proposal.Typical * 100, 2)} % of the median)" : "";
        return $"{$"{TypedNumber.Text(sd)} {unit}".TrimEnd()}{share}";
    }

    private static string WithUnit(double value, string unit) => $"{FigureText.Number(value, 2)} {unit}".TrimEnd();
}
