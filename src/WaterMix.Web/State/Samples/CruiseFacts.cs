using WaterMix.Core.Samples;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Samples;

/// <summary>Where and when the samples on screen were taken, one fact each.</summary>
public static class CruiseFacts
{
    /// <summary>The facts of some rows: what it is and its value.</summary>
    /// <param name="samples">The samples of the study.</param>
    /// <param name="stations">The stations with samples on screen.</param>
    /// <param name="rows">The rows on screen.</param>
    public static IReadOnlyList<(string Label, string Value)> Of(StudySamples samples, IReadOnlyList<MapStation> stations, int[] rows)
    {
        ArgumentNullException.ThrowIfNull(samples);
        ArgumentNullException.ThrowIfNull(stations);
        ArgumentNullException.ThrowIfNull(rows);
        var facts = new List<(string, string)> { ("Stations", PlainText.Count(stations.Count)), ("Samples", PlainText.Count(rows.Length)) };
        Add(facts, "Latitude", FigureRange.Of(stations.Select(s => s.Latitude)), v => FigureText.Latitude(v));
        Add(facts, "Longitude", FigureRange.Of(stations.Select(s => s.Longitude)), v => FigureText.Longitude(v));
        double[] pressure = samples.Columns.Values("pressure");
        Add(facts, "Pressure", FigureRange.Of(rows.Select(row => pressure[row])), v => $"{PlainText.Number(v, 0)} dbar");
        if (Days(samples, rows) is { } days)
        {
            facts.Add(("Time", days));
        }

        return facts;
    }

    private static void Add(List<(string Label, string Value)> facts, string label, FigureRange? range, Func<double, string> text)
    {
        if (range is { } r)
        {
            facts.Add((label, text(r.From) == text(r.To) ? text(r.From) : $"{text(r.From)} to {text(r.To)}"));
        }
    }

    // ISO 8601 texts of one form sort as times do; the day is their beginning.
    private static string? Days(StudySamples samples, int[] rows)
    {
        IdentityColumn?[] times = [.. samples.Columns.Cruises.Select(c => c.Samples.Identity.FirstOrDefault(i => i.Id == "time"))];
        string? first = null;
        string? last = null;
        string? before = null;
        foreach (int row in rows)
        {
            (int cruise, int own) = samples.Columns.Locate(row);
            string time = times[cruise]?[own] ?? "";
            if (time.Length >= 10 && !ReferenceEquals(time, before)) // The samples of a cast share one text.
            {
                first = first is null || string.CompareOrdinal(time, first) < 0 ? time : first;
                last = last is null || string.CompareOrdinal(time, last) > 0 ? time : last;
                before = time;
            }
        }

        return first is null ? null : first[..10] == last![..10] ? first[..10] : $"{first[..10]} to {last[..10]}";
    }
}
