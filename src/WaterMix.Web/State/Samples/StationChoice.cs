using System.Globalization;

namespace WaterMix.Web.State.Samples;

/// <summary>Some stations by their names, as a person types them: <c>12, 20-35, A7</c>.</summary>
public sealed class StationChoice
{
    private readonly HashSet<string> _names = new(StringComparer.OrdinalIgnoreCase);
    private readonly List<(double From, double To)> _ranges = [];

    private StationChoice()
    {
    }

    /// <summary>Reads a list of names and ranges of numbers.</summary>
    /// <param name="text">Parted by commas; null or blank: every station.</param>
    /// <returns>The choice, or null for every station.</returns>
    public static StationChoice? Parse(string? text)
    {
        string[] parts = (text ?? "").Split(',', StringSplitOptions.RemoveEmptyEntries | StringSplitOptions.TrimEntries);
        if (parts.Length == 0)
        {
            return null;
        }

        var choice = new StationChoice();
        foreach (string part in parts)
        {
            choice._names.Add(part);
            int dash = part.IndexOfAny(['-', '–']);
            if (dash > 0 && Number(part[..dash]) is { } from && Number(part[(dash + 1)..]) is { } to)
            {
                choice._ranges.Add((Math.Min(from, to), Math.Max(from, to)));
            }
        }

        return choice;
    }

    /// <summary>True where the choice holds a station.</summary>
    /// <param name="name">The station's name in its file.</param>
    public bool Holds(string name) =>
        _names.Contains(name) || (_ranges.Count > 0 && Number(name) is { } n && _ranges.Exists(r => n >= r.From && n <= r.To));

    private static double? Number(string text) =>
        double.TryParse(text.Trim(), NumberStyles.AllowDecimalPoint, CultureInfo.InvariantCulture, out double n) ? n : null;
}
