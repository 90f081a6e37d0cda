using System.Globalization;

namespace WaterMix.Formats.Reading;

/// <summary>Dates and times as ISO 8601 UTC.</summary>
internal static class TimeText
{
    private static readonly string[] DateFormats = ["yyyyMMdd", "yyyy-MM-dd", "yyyy/MM/dd", "yyyy.MM.dd", "yyyy-M-d", "yyyy/M/d"];

    /// <summary>One text from a date and a time of day, or null where either cannot be read.</summary>
    /// <param name="date">A date such as <c>19930923</c>, or a whole ISO 8601 time; empty where there is none.</param>
    /// <param name="time">A time of day such as <c>2222</c>, <c>  5</c> (five past midnight), <c>22:22</c> or <c>22:22:05</c>; empty where there is none.</param>
    /// <returns><c>1993-09-23T22:22:00Z</c>, <c>1993-09-23</c> without a time, or empty without a date.</returns>
    public static string? Join(string date, string time)
    {
        date = IsMissing(date) ? "" : date.Trim();
        time = IsMissing(time) ? "" : time.Trim();
        if (date.Length == 0)
        {
            return "";
        }

        if (DateTime.TryParseExact(date, DateFormats, CultureInfo.InvariantCulture, DateTimeStyles.None, out DateTime day))
        {
            return time.Length == 0
                ? day.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture)
                : OfDay(time) is { } clock ? Iso(day + clock) : null;
        }

        // A whole time in one field: year first, so that no other reading is possible; without an offset it is UTC.
        return date.Length > 10 && char.IsAsciiDigit(date[3]) && date[4] is '-' or '/'
            && DateTimeOffset.TryParse(date, CultureInfo.InvariantCulture, DateTimeStyles.AssumeUniversal | DateTimeStyles.AdjustToUniversal, out DateTimeOffset moment)
            ? Iso(moment.UtcDateTime)
            : null;
    }

    private static string Iso(DateTime utc) =>
        utc.ToString(utc.Ticks % TimeSpan.TicksPerSecond == 0 ? "yyyy-MM-dd'T'HH:mm:ss'Z'" : "yyyy-MM-dd'T'HH:mm:ss.FFFFFFF'Z'", CultureInfo.InvariantCulture);

    private static TimeSpan? OfDay(string time)
    {
        int hours;
        int minutes;
        int seconds = 0;
        if (time.Contains(':', StringComparison.Ordinal))
        {
            string[] parts = time.TrimEnd('Z').Split(':');
            if (parts.Length is < 2 or > 3
                || !Number(parts[0], out hours) || !Number(parts[1], out minutes)
                || (parts.Length == 3 && !Number(parts[2].Split('.')[0], out seconds)))
            {
                return null;
            }
        }
        else
        {
            string whole = time.EndsWith(".0", StringComparison.Ordinal) ? time[..^2] : time;
            if (!Number(whole, out int number) || whole.Length > 6)
            {
                return null;
            }

            (hours, minutes, seconds) = whole.Length > 4 ? (number / 10_000, number / 100 % 100, number % 100) : (number / 100, number % 100, 0);
        }

        // 2400 is the midnight at the end of the day.
        bool isTime = minutes < 60 && seconds < 60 && (hours < 24 || (hours == 24 && minutes == 0 && seconds == 0));
        return isTime ? new TimeSpan(hours, minutes, seconds) : null;
    }

    private static bool Number(string text, out int number) => int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out number);

    private static bool IsMissing(string text) =>
        double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out double number) && (number is -999 or -9 || double.IsNaN(number));
}
