namespace WaterMix.Web.State.Figures;

/// <summary>The values at the ends of a colour scale where nobody has chosen them.</summary>
public static class ScaleRange
{
    /// <summary>The ends of a one-sided scale.</summary>
    /// <param name="colour">The scale.</param>
    /// <returns>The chosen range, else the 1st and the 99th percentile; 0 to 1 without values.</returns>
    public static FigureRange Of(SequentialColour colour)
    {
        ArgumentNullException.ThrowIfNull(colour);
        if (colour.Range is { } chosen)
        {
            return chosen;
        }

        double[] sorted = Sorted(colour.Values);
        return sorted.Length == 0
            ? new FigureRange(0, 1)
            : FigureRange.Of([Percentile(sorted, 0.01), Percentile(sorted, 0.99)])!.Value;
    }

    /// <summary>The size at either end of a scale about 0.</summary>
    /// <param name="colour">The scale.</param>
    /// <returns>The chosen size, else the 98th percentile of the sizes; 1 without values other than 0.</returns>
    public static double Of(DivergingColour colour)
    {
        ArgumentNullException.ThrowIfNull(colour);
        if (colour.Half is { } chosen)
        {
            return chosen;
        }

        double[] sorted = Sorted([.. colour.Values.Select(Math.Abs)]);
        double half = sorted.Length == 0 ? 1 : Percentile(sorted, 0.98);
        return half > 0 ? half : 1;
    }

    /// <summary>The nearest-rank percentile of sorted values.</summary>
    /// <param name="sorted">Finite values in rising order, at least one.</param>
    /// <param name="share">0 to 1.</param>
    public static double Percentile(double[] sorted, double share)
    {
        ArgumentNullException.ThrowIfNull(sorted);
        return sorted[Math.Clamp((int)Math.Ceiling(share * sorted.Length) - 1, 0, sorted.Length - 1)];
    }

    /// <summary>The finite values in rising order.</summary>
    /// <param name="values">Values, NaN where missing.</param>
    public static double[] Sorted(double[] values)
    {
        double[] sorted = [.. values.Where(double.IsFinite)];
        Array.Sort(sorted);
        return sorted;
    }
}
