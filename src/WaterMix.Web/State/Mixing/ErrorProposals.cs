using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Mixing;

/// <summary>
/// Measurement errors from the samples: from bottles closed at the same place, and from bottle against CTD. Both are robust: half of the
/// pairs may be wrong without a large effect.
/// </summary>
/// <remarks>
/// For normal errors the standard deviation is 1.4826 times the median absolute deviation (1/Φ⁻¹(3/4)). The difference of two replicates has
/// √2 times the error of one.
/// </remarks>
public static class ErrorProposals
{
    /// <summary>Bottles of one cast within this pressure of one another count as closed at the same place, dbar (common practice, no source).</summary>
    public const double SamePlaceDbar = 1;

    /// <summary>Fewer pairs than this say too little to propose an error.</summary>
    public const int FewestPairs = 5;

    private const double SdPerMedian = 1.482602218505602;

    /// <summary>From pairs of bottles of the same station and cast that were closed at the same pressure.</summary>
    /// <param name="columns">The samples under the model's flags.</param>
    /// <param name="quantity">The quantity's id.</param>
    /// <param name="counts">True for each row that counts.</param>
    /// <returns>The proposal, or null where there are fewer than <see cref="FewestPairs"/> pairs.</returns>
    public static ErrorProposal? FromReplicates(FigureColumns columns, string quantity, bool[] counts)
    {
        ArgumentNullException.ThrowIfNull(columns);
        ArgumentNullException.ThrowIfNull(counts);
        double[] values = columns.Values(quantity);
        var differences = new List<double>();
        var typical = new List<double>();
        foreach ((int one, int other) in Pairs(columns).Where(p => counts[p.One] && counts[p.Other]))
        {
            double difference = values[one] - values[other];
            if (double.IsFinite(difference))
            {
                differences.Add(Math.Abs(difference));
                typical.Add((values[one] + values[other]) / 2);
            }
        }

        if (differences.Count < FewestPairs)
        {
            return null;
        }

        double median = Median(differences);
        return new ErrorProposal(quantity, SdPerMedian * median / Math.Sqrt(2), differences.Count, Median(typical), 0, median);
    }

    /// <summary>From bottle against CTD, where the samples keep both; the proposal holds the errors of both, so that it is generous for either.</summary>
    /// <param name="columns">The samples under the model's flags.</param>
    /// <param name="quantity">The quantity's id; salinity or oxygen.</param>
    /// <param name="counts">True for each row that counts.</param>
    /// <returns>The proposal, or null where there are fewer than <see cref="FewestPairs"/> pairs.</returns>
    public static ErrorProposal? FromBottleAndCtd(FigureColumns columns, string quantity, bool[] counts)
    {
        ArgumentNullException.ThrowIfNull(columns);
        ArgumentNullException.ThrowIfNull(counts);
        double[] bottle = columns.Values(quantity + "_bottle");
        double[] ctd = columns.Values(quantity + "_ctd");
        int[] rows = [.. Enumerable.Range(0, bottle.Length).Where(row => counts[row] && double.IsFinite(bottle[row] - ctd[row]))];
        if (rows.Length < FewestPairs)
        {
            return null;
        }

        double offset = Median(rows.Select(row => bottle[row] - ctd[row]));
        double deviation = Median(rows.Select(row => Math.Abs(bottle[row] - ctd[row] - offset)));
        return new ErrorProposal(quantity, SdPerMedian * deviation, rows.Length, Median(rows.Select(row => bottle[row])), offset, deviation);
    }

    /// <summary>Number of values that are means of replicates already (water-sample flag 6): their own scatter is not in the file.</summary>
    /// <param name="tables">The samples.</param>
    /// <param name="quantity">The quantity's id.</param>
    public static long MeansOfReplicates(IReadOnlyList<FigureCruise> tables, string quantity)
    {
        ArgumentNullException.ThrowIfNull(tables);
        long count = 0;
        foreach (SampleColumn column in tables.Select(t => t.Samples.Find(quantity)).OfType<SampleColumn>())
        {
            for (int row = 0; row < column.Length; row++)
            {
                count += column.FlagAt(row) == QualityFlags.MeanOrInterpolated && column.OriginAt(row) == ValueOrigin.Bottle ? 1 : 0;
            }
        }

        return count;
    }

    // Neighbours in pressure of one station and cast of a cruise, each sample in one pair at most.
    private static IEnumerable<(int One, int Other)> Pairs(FigureColumns columns)
    {
        double[] pressure = columns.Values(Quantity.Pressure.Id);
        foreach ((int c, FigureCruise cruise) in columns.Cruises.Index())
        {
            IdentityColumn? station = cruise.Samples.Identity.FirstOrDefault(i => i.Id == "station");
            IdentityColumn? cast = cruise.Samples.Identity.FirstOrDefault(i => i.Id == "cast");
            if (station is null)
            {
                continue;
            }

            int first = columns.FirstRow(c);
            var casts = Enumerable.Range(0, cruise.Samples.RowCount)
                .Where(row => double.IsFinite(pressure[first + row]))
                .GroupBy(row => (station[row], cast?[row] ?? ""));
            foreach (int[] rows in casts.Select(g => g.OrderBy(row => pressure[first + row]).ToArray()))
            {
                for (int i = 1; i < rows.Length; i++)
                {
                    if (pressure[first + rows[i]] - pressure[first + rows[i - 1]] <= SamePlaceDbar)
                    {
                        yield return (first + rows[i - 1], first + rows[i]);
                        i++;
                    }
                }
            }
        }
    }

    private static double Median(IEnumerable<double> values)
    {
        double[] sorted = [.. values.Order()];
        int half = sorted.Length / 2;
        return sorted.Length % 2 == 1 ? sorted[half] : (sorted[half - 1] + sorted[half]) / 2;
    }
}
