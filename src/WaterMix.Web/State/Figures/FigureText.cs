using System.Globalization;

namespace WaterMix.Web.State.Figures;

/// <summary>Numbers and units as people read them in figures: a true minus sign, few digits.</summary>
public static class FigureText
{
    /// <summary>A number with as many decimals as its size asks for; an en dash where it is missing.</summary>
    /// <param name="value">The number; NaN is missing.</param>
    /// <param name="digits">Significant digits, 1 to 15.</param>
    public static string Number(double value, int digits = 4)
    {
        if (!double.IsFinite(value))
        {
            return "–";
        }

        if (value == 0)
        {
            return "0";
        }

        int decimals = Math.Clamp(digits - 1 - (int)Math.Floor(Math.Log10(Math.Abs(value))), 0, 9);
        return Fixed(value, decimals);
    }

    /// <summary>A measured value with up to six significant digits, without zeros at the end.</summary>
    /// <param name="value">The value; NaN is missing.</param>
    public static string Measured(double value)
    {
        string text = Number(value, 6);
        return text.Contains('.') ? text.TrimEnd('0').TrimEnd('.') : text;
    }

    /// <summary>A number with fixed decimals and a true minus sign; never minus zero. An en dash where it is missing.</summary>
    /// <param name="value">The number; NaN is missing.</param>
    /// <param name="decimals">Digits after the point, 0 to 15.</param>
    public static string Fixed(double value, int decimals)
    {
        if (!double.IsFinite(value))
        {
            return "–";
        }

        string text = value.ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
        return text.AsSpan().TrimStart('-').IndexOfAnyInRange('1', '9') < 0 ? text.TrimStart('-') : text.Replace('-', '−');
    }

    /// <summary>A number followed by its unit.</summary>
    /// <param name="value">The number; NaN is missing.</param>
    /// <param name="unit">The unit as people write it; may be empty.</param>
    public static string WithUnit(double value, string unit) =>
        string.IsNullOrEmpty(unit) || !double.IsFinite(value) ? Number(value) : $"{Number(value)} {unit}";

    /// <summary>A whole count with thin spaces between thousands.</summary>
    /// <param name="count">The count.</param>
    public static string Count(long count) => count.ToString("#,0", CultureInfo.InvariantCulture).Replace(",", "\u202f", StringComparison.Ordinal);

    /// <summary>A share of one as per cent.</summary>
    /// <param name="share">0 to 1; NaN is missing.</param>
    public static string PerCent(double share) =>
        double.IsFinite(share) ? $"{Fixed(share * 100, Math.Abs(share) is > 0 and < 0.1 ? 1 : 0)} %" : "–";

    /// <summary>A unit of the contract as people write it: <c>umol/kg</c> is µmol/kg, <c>1</c> is nothing.</summary>
    /// <param name="unit">A unit as files write it.</param>
    public static string Unit(string unit) => unit switch
    {
        "1" => "",
        "degC" => "°C",
        "umol/kg" => "µmol/kg",
        "kg/m3" => "kg/m³",
        "permil" => "‰",
        "degrees north" => "°N",
        "degrees east" => "°E",
        _ => unit ?? "",
    };

    /// <summary>A latitude with its hemisphere: 12.50° S.</summary>
    /// <param name="degrees">Degrees north.</param>
    /// <param name="decimals">Digits after the point.</param>
    public static string Latitude(double degrees, int decimals = 2) => Degrees(degrees, decimals, "N", "S");

    /// <summary>A longitude with its hemisphere: 130.00° W.</summary>
    /// <param name="degrees">Degrees east; any turn of the circle.</param>
    /// <param name="decimals">Digits after the point.</param>
    public static string Longitude(double degrees, int decimals = 2) => Degrees(Math.IEEERemainder(degrees, 360), decimals, "E", "W");

    /// <summary>Text with a capital at its beginning.</summary>
    /// <param name="text">Any text.</param>
    public static string Sentence(string text) => string.IsNullOrEmpty(text) || char.IsUpper(text[0]) ? text : char.ToUpperInvariant(text[0]) + text[1..];

    private static string Degrees(double degrees, int decimals, string positive, string negative)
    {
        if (!double.IsFinite(degrees))
        {
            return "–";
        }

        string text = Fixed(Math.Abs(degrees), decimals);
        bool isZero = text.AsSpan().IndexOfAnyInRange('1', '9') < 0;
        return isZero ? $"{text}°" : $"{text}° {(degrees > 0 ? positive : negative)}";
    }
}
