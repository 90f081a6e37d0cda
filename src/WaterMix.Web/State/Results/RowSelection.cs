namespace WaterMix.Web.State.Results;

/// <summary>Chooses and orders the rows that are shown.</summary>
public static class RowSelection
{
    /// <summary>The rows that pass a filter, in the order of the samples; null where every row passes.</summary>
    /// <param name="results">The results.</param>
    /// <param name="filter">Which samples. A layer, a cruise or a column that is not there lets nothing pass.</param>
    public static int[]? Of(RunResults results, RowFilter filter)
    {
        ArgumentNullException.ThrowIfNull(results);
        ArgumentNullException.ThrowIfNull(filter);
        if (filter.IsNone)
        {
            return null;
        }

        int layer = filter.Layer is null ? -1 : results.LayerIds.ToList().IndexOf(filter.Layer);
        (double[]? Keys, RowCondition Condition)[] conditions =
            [.. filter.Conditions.Select(c => (results.Table.FirstOrDefault(t => t.IsNumber && t.Id == c.Column)?.Keys, c))];
        if ((filter.Layer is not null && layer < 0) || conditions.Any(c => c.Keys is null))
        {
            return [];
        }

        (int first, int count) = filter.Cruise is { } cruise ? results.RowsOfCruise(cruise) : (0, results.RowCount);
        var rows = new List<int>();
        for (int row = first; row < first + count; row++)
        {
            bool passes = (filter.Status is null || results.Status[row] == filter.Status)
                && (filter.Layer is null || results.Layer[row] == layer)
                && Array.TrueForAll(conditions, c => c.Condition.Holds(c.Keys![row]));
            if (passes)
            {
                rows.Add(row);
            }
        }

        return [.. rows];
    }

    /// <summary>Rows in the order of a column; rows with equal values keep their order, missing values come last either way.</summary>
    /// <param name="rows">The rows; not changed.</param>
    /// <param name="keys">The column, length n of the whole table.</param>
    /// <param name="descending">True for the largest first.</param>
    public static int[] Sorted(int[] rows, double[] keys, bool descending)
    {
        ArgumentNullException.ThrowIfNull(rows);
        ArgumentNullException.ThrowIfNull(keys);
        int[] sorted = [.. rows];
        double sign = descending ? -1 : 1;
        double[] own = [.. rows.Select(row => double.IsNaN(keys[row]) ? double.PositiveInfinity : sign * keys[row])];

        // The sort of the library is not stable: runs of equal keys are put back into their order.
        Array.Sort(own, sorted);
        for (int start = 0; start < own.Length;)
        {
            int end = start + 1;
            while (end < own.Length && own[end] == own[start])
            {
                end++;
            }

            Array.Sort(sorted, start, end - start);
            start = end;
        }

        return sorted;
    }
}
