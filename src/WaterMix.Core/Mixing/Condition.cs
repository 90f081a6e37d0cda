namespace WaterMix.Core.Mixing;

/// <summary>A half-open range of a quantity: atLeast &lt;= value &lt; lessThan. Either bound may be absent; a missing value never holds.</summary>
/// <param name="Quantity">The quantity id.</param>
/// <param name="AtLeast">Lower bound, included, or null.</param>
/// <param name="LessThan">Upper bound, excluded, or null.</param>
public sealed record Condition(string Quantity, double? AtLeast, double? LessThan)
{
    /// <summary>Which equation of state a sigma condition tests.</summary>
    public DensityScale Scale { get; init; } = DensityScale.Teos10;

    /// <summary>
    /// True where the value is in the range. A longitude range whose start exceeds its end wraps round, and its bounds may count to 360
    /// as well as from -180: both name the same meridians.
    /// </summary>
    /// <param name="value">The sample's value in the quantity's unit, longitude in [-180, 180); NaN is missing.</param>
    public bool Holds(double value)
    {
        if (double.IsNaN(value))
        {
            return false;
        }

        if (Quantity == Quantities.Quantity.Longitude.Id && AtLeast is { } start && LessThan is { } end && (start > end || end > 180))
        {
            return end - start >= 360 || EastOf(start, value) < EastOf(start, end);
        }

        bool above = AtLeast is not { } low || value >= low;
        bool below = LessThan is not { } high || value < high;
        return above && below;
    }

    // Degrees from one meridian eastwards to another, 0 to below 360.
    private static double EastOf(double from, double to) => to - from - (360 * Math.Floor((to - from) / 360));
}
