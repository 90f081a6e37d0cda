using WaterMix.Formats.Matching;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Samples;

/// <summary>Quantities at one station against pressure; bottle and CTD values apart where both are kept.</summary>
/// <param name="Station">The station's id; empty where there is none.</param>
/// <param name="Title">Its name for people.</param>
/// <param name="Pressure">Pressure of every row of the study.</param>
/// <param name="Series">One series per quantity and instrument.</param>
/// <param name="Caption">What is shown, in a sentence.</param>
public sealed record StationProfiles(string Station, string Title, double[] Pressure, IReadOnlyList<ProfileSeries> Series, string Caption)
{
    private const int Most = 3;

    private static readonly string[] Usual = ["potential_temperature", "practical_salinity", "oxygen", "silicate", "nitrate", "phosphate", "in_situ_temperature"];

    /// <summary>The quantities of the profiles: those asked for that there are, or a usual choice.</summary>
    /// <param name="samples">The samples of the study.</param>
    /// <param name="asked">The quantities asked for.</param>
    public static IReadOnlyList<string> QuantitiesOf(StudySamples samples, IReadOnlyList<string> asked)
    {
        ArgumentNullException.ThrowIfNull(samples);
        ArgumentNullException.ThrowIfNull(asked);
        string[] there = [.. asked.Where(samples.Has).Distinct()];
        return there.Length > 0 ? there : [.. Usual.Where(samples.Has).Take(Most)];
    }

    /// <summary>The station whose profiles are shown: the one asked for, or the one with most samples on screen.</summary>
    /// <param name="samples">The samples of the study.</param>
    /// <param name="asked">Its id; empty for none.</param>
    /// <param name="rows">The rows on screen.</param>
    public static MapStation? StationOf(StudySamples samples, string asked, int[] rows)
    {
        ArgumentNullException.ThrowIfNull(samples);
        ArgumentNullException.ThrowIfNull(rows);
        IReadOnlyList<MapStation> stations = samples.Columns.Stations;
        if (stations.FirstOrDefault(s => s.Id == asked) is { } found)
        {
            return found;
        }

        int[] counts = new int[stations.Count];
        foreach (int row in rows)
        {
            if (samples.Columns.StationOf[row] is >= 0 and var station)
            {
                counts[station]++;
            }
        }

        return stations.Count == 0 ? null : stations[Array.IndexOf(counts, counts.Max())];
    }

    /// <summary>The profiles at a station, all its samples whatever the filter.</summary>
    /// <param name="samples">The samples of the study.</param>
    /// <param name="station">The station; null for none.</param>
    /// <param name="quantities">The quantities.</param>
    public static StationProfiles Of(StudySamples samples, MapStation? station, IReadOnlyList<string> quantities)
    {
        ArgumentNullException.ThrowIfNull(samples);
        ArgumentNullException.ThrowIfNull(quantities);
        double[] pressure = samples.Columns.Values("pressure");
        if (station is null)
        {
            return new StationProfiles("", "Profiles", pressure, [], "No sample on screen belongs to a station.");
        }

        var series = new List<ProfileSeries>();
        foreach (string id in quantities)
        {
            if (samples.WithBothInstruments.Contains(id))
            {
                series.Add(SeriesOf(samples, station, id, id + Origins.CtdSuffix, "CTD", "--faint", PointShape.Plus));
                series.Add(SeriesOf(samples, station, id, id + Origins.BottleSuffix, "bottle", "--pencil", PointShape.Circle));
            }
            else
            {
                series.Add(SeriesOf(samples, station, id, id, samples.AxisOf(id).Title, "--pencil", PointShape.Circle) with { Joined = true });
            }
        }

        string place = $"{FigureText.Latitude(station.Latitude)}, {FigureText.Longitude(station.Longitude)}";
        return new StationProfiles(station.Id, FigureText.Sentence(station.Label), pressure, series, $"{FigureText.Sentence(station.Label)}, {place}: {PlainText.Count(station.Rows.Count, "sample")}.");
    }

    private static ProfileSeries SeriesOf(StudySamples samples, MapStation station, string quantity, string column, string name, string colour, PointShape shape)
    {
        double[] values = samples.Columns.Values(column);
        int[] rows = [.. station.Rows.Where(row => !double.IsNaN(values[row]))];
        return new ProfileSeries(column, name, samples.AxisOf(quantity), [.. rows.Select(row => values[row])], rows, colour, shape);
    }
}
