namespace WaterMix.Web.State.Figures;

/// <summary>A closed range of values on an axis or a scale.</summary>
/// <param name="From">The lower end.</param>
/// <param name="To">The upper end, greater than <paramref name="From"/>.</param>
public readonly record struct FigureRange(double From, double To)
{
    /// <summary>The upper end less the lower.</summary>
    public double Width => To - From;

    /// <summary>The range of the finite values; null where there are none. A single value gets a width of its own.</summary>
    /// <param name="values">Values, NaN where missing.</param>
    public static FigureRange? Of(IEnumerable<double> values)
    {
        ArgumentNullException.ThrowIfNull(values);
        double low = double.PositiveInfinity;
        double high = double.NegativeInfinity;
        foreach (double value in values)
        {
            if (double.IsFinite(value))
            {
                low = Math.Min(low, value);
                high = Math.Max(high, value);
            }
        }

        if (low > high)
        {
            return null;
        }

        double half = low == high ? Math.Max(Math.Abs(low) * 0.05, 0.5) : 0;
        return new FigureRange(low - half, high + half);
    }

    /// <summary>The range with a margin on both sides.</summary>
    /// <param name="share">The margin as a share of the width, >= 0.</param>
    public FigureRange WithMargin(double share) => new(From - (share * Width), To + (share * Width));
}
