using System.Globalization;

namespace WaterMix.Web.State.Samples;

/// <summary>A range of values as a person types it; half-open as in a model's conditions: from &lt;= value &lt; to.</summary>
/// <param name="From">The lower bound, or null for none.</param>
/// <param name="To">The upper bound, or null for none.</param>
public readonly record struct ValueRange(double? From, double? To)
{
    /// <summary>True where there is no bound.</summary>
    public bool IsOpen => From is null && To is null;

    /// <summary>True where the value lies in the range; a missing value only lies in an open one.</summary>
    /// <param name="value">The value; NaN is missing.</param>
    public bool Holds(double value) => IsOpen || (value >= (From ?? double.NegativeInfinity) && value < (To ?? double.PositiveInfinity));

    /// <summary>The range in words: <c>from 100 to under 2000 dbar</c>.</summary>
    /// <param name="unit">The unit; may be empty.</param>
    public string InWords(string unit)
    {
        string after = unit.Length > 0 ? " " + unit : "";
        return (From, To) switch
        {
            ({ } from, { } to) => $"from {Text(from)} to under {Text(to)}{after}",
            ({ } from, null) => $"from {Text(from)}{after}",
            (null, { } to) => $"under {Text(to)}{after}",
            _ => "any",
        };
    }

    /// <summary>A bound as it is typed; empty for none.</summary>
    /// <param name="bound">The bound.</param>
    public static string Text(double? bound) => bound?.ToString("R", CultureInfo.InvariantCulture) ?? "";

    /// <summary>Reads a bound.</summary>
    /// <param name="text">A number with a decimal point, or blank for none.</param>
    /// <param name="bound">The bound; null for none.</param>
    /// <returns>False where the text is no number.</returns>
    public static bool TryParse(string? text, out double? bound)
    {
        bound = null;
        if (string.IsNullOrWhiteSpace(text))
        {
            return true;
        }

        if (double.TryParse(text.Trim().Replace('−', '-'), NumberStyles.Float, CultureInfo.InvariantCulture, out double value) && double.IsFinite(value))
        {
            bound = value;
            return true;
        }

        return false;
    }
}
