using System.Globalization;

namespace WaterMix.Web.State;

/// <summary>Numbers and times as a person reads them.</summary>
public static class PlainText
{
    private static readonly NumberFormatInfo ForPeople = new() { NumberGroupSeparator = "\u00a0", NegativeSign = "\u2212" };

    /// <summary>A count with no-break spaces between thousands: 2 841.</summary>
    /// <param name="count">The count.</param>
    public static string Count(long count) => count.ToString("N0", ForPeople);

    /// <summary>A count and what is counted: 1 sample, 2 841 samples.</summary>
    /// <param name="count">The count.</param>
    /// <param name="one">The thing in the singular.</param>
    /// <param name="many">The thing in the plural; null: the singular with an s.</param>
    public static string Count(long count, string one, string? many = null) => $"{Count(count)} {(count == 1 ? one : many ?? one + "s")}";

    /// <summary>A number with this many decimals and a true minus sign; a dash where it is missing.</summary>
    /// <param name="value">The number; NaN is missing.</param>
    /// <param name="decimals">Decimals, 0 or more.</param>
    public static string Number(double value, int decimals) =>
        double.IsNaN(value) ? "\u2013" : value.ToString("N" + decimals.ToString(CultureInfo.InvariantCulture), ForPeople);

    /// <summary>A date and time of day in a time zone: 1 Dec 2026, 15:17.</summary>
    /// <param name="time">The time.</param>
    /// <param name="zone">The zone of the person who reads.</param>
    public static string Time(DateTimeOffset time, TimeZoneInfo zone) =>
        TimeZoneInfo.ConvertTime(time, zone).ToString("d MMM yyyy, HH:mm", CultureInfo.InvariantCulture);
}
