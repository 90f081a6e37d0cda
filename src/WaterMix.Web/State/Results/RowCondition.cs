using System.Globalization;

namespace WaterMix.Web.State.Results;

/// <summary>A half-open range that a column's value must be in: atLeast &lt;= value &lt; lessThan. A missing value never is.</summary>
/// <param name="Column">The id of a column of the table, such as <c>fraction_NDW</c>.</param>
/// <param name="AtLeast">Lower bound, included, or null.</param>
/// <param name="LessThan">Upper bound, excluded, or null.</param>
public sealed record RowCondition(string Column, double? AtLeast, double? LessThan)
{
    /// <summary>True where a value is in the range.</summary>
    /// <param name="value">A value in the column's unit; NaN is missing.</param>
    public bool Holds(double value) => !double.IsNaN(value) && (AtLeast is not { } low || value >= low) && (LessThan is not { } high || value < high);

    /// <summary>The condition as the address holds it: <c>fraction_NDW:0.5..0.9</c>, either bound may be left out.</summary>
    public string ToAddress() => $"{Column}:{Text(AtLeast)}..{Text(LessThan)}";

    /// <summary>Reads a condition from an address; null where it is none.</summary>
    /// <param name="text">As <see cref="ToAddress"/> writes it.</param>
    public static RowCondition? FromAddress(string? text)
    {
        int colon = text?.LastIndexOf(':') ?? -1;
        if (colon < 1)
        {
            return null;
        }

        string[] bounds = text![(colon + 1)..].Split("..");
        if (bounds.Length != 2 || !TryBound(bounds[0], out double? low) || !TryBound(bounds[1], out double? high) || (low is null && high is null))
        {
            return null;
        }

        return new RowCondition(text[..colon], low, high);
    }

    private static string Text(double? bound) => bound?.ToString("R", CultureInfo.InvariantCulture) ?? "";

    private static bool TryBound(string text, out double? bound)
    {
        bound = null;
        if (text.Length == 0)
        {
            return true;
        }

        bool isNumber = double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out double value) && double.IsFinite(value);
        bound = isNumber ? value : null;
        return isNumber;
    }
}
