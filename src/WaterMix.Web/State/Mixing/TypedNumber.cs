using System.Globalization;

namespace WaterMix.Web.State.Mixing;

/// <summary>A number as a person typed it: the value, or why it was not taken.</summary>
/// <param name="Value">The number; null where the field was left empty.</param>
/// <param name="Problem">What was expected and found; null where the number is good.</param>
public sealed record TypedNumber(double? Value, string? Problem)
{
    private const int LongestShown = 9;

    /// <summary>Reads what was typed. A hyphen and a true minus sign are the same; spaces around do not matter.</summary>
    /// <param name="text">The text.</param>
    /// <param name="rule">What is possible.</param>
    public static TypedNumber Read(string? text, NumberRule rule)
    {
        ArgumentNullException.ThrowIfNull(rule);
        string typed = (text ?? "").Trim();
        if (typed.Length == 0)
        {
            return rule.MayBeEmpty ? new TypedNumber(null, null) : new TypedNumber(null, $"A number is needed here: {rule.Range}.");
        }

        string plain = typed.Replace('\u2212', '-');
        if (!double.TryParse(plain, NumberStyles.Float, CultureInfo.InvariantCulture, out double value) || !double.IsFinite(value))
        {
            bool comma = plain.Contains(',', StringComparison.Ordinal);
            return new TypedNumber(null, $"\u201c{Shortened(typed)}\u201d is not a number.{(comma ? " The decimal mark is a point." : "")}");
        }

        if (rule.IsWhole && value != Math.Floor(value))
        {
            return new TypedNumber(null, $"{typed} is not a whole number.");
        }

        return rule.Holds(value) ? new TypedNumber(value, null) : new TypedNumber(null, $"{typed} is not possible here: {rule.Range}.");
    }

    /// <summary>A number as it stands in a field: all its digits, a true minus sign; empty where there is none.</summary>
    /// <param name="value">The number, or null.</param>
    public static string Text(double? value) => value?.ToString("R", CultureInfo.InvariantCulture).Replace('-', '\u2212') ?? "";

    /// <summary>A number as a field shows it: as <see cref="Text"/>, but a long one, such as the outcome of a conversion, in seven digits.</summary>
    /// <param name="value">The number, or null.</param>
    public static string Shown(double? value)
    {
        string all = Text(value);
        return all.Length <= LongestShown ? all : value!.Value.ToString("G7", CultureInfo.InvariantCulture).Replace('-', '\u2212');
    }

    /// <summary>A fraction as per cent, without the rounding of a multiplication in binary.</summary>
    /// <param name="fraction">The fraction, or null.</param>
    public static double? PerCent(double? fraction) => fraction is { } f ? (double)((decimal)f * 100m) : null;

    /// <summary>Per cent as a fraction.</summary>
    /// <param name="perCent">Per cent, or null.</param>
    public static double? Fraction(double? perCent) => perCent is { } p ? (double)((decimal)p / 100m) : null;

    private static string Shortened(string text) => text.Length <= 24 ? text : text[..23] + "\u2026";
}
