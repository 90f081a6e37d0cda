using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;

namespace WaterMix.Web.State.Figures;

/// <summary>The stations of cruises and how far along its cruise's track each sample was taken.</summary>
internal sealed class CruiseTrack
{
    private CruiseTrack(IReadOnlyList<MapStation> stations, double[] distanceKm, int[] stationOf)
    {
        Stations = stations;
        DistanceKm = distanceKm;
        StationOf = stationOf;
    }

    /// <summary>The stations, in the order in which the files first name them.</summary>
    public IReadOnlyList<MapStation> Stations { get; }

    /// <summary>Length n, km; NaN where the station has no position.</summary>
    public double[] DistanceKm { get; }

    /// <summary>Length n, index into <see cref="Stations"/>, or -1.</summary>
    public int[] StationOf { get; }

    /// <summary>Walks the stations of each cruise in their order.</summary>
    public static CruiseTrack Of(FigureColumns columns)
    {
        double[] latitude = columns.Values(Quantity.Latitude.Id);
        double[] longitude = columns.Values(Quantity.Longitude.Id);
        double[] pressure = columns.Values(Quantity.Pressure.Id);
        double[] distance = new double[columns.RowCount];
        int[] stationOf = new int[columns.RowCount];
        distance.AsSpan().Fill(double.NaN);
        stationOf.AsSpan().Fill(-1);
        var stations = new List<MapStation>();
        foreach ((int cruise, FigureCruise of) in columns.Cruises.Index())
        {
            int first = columns.FirstRow(cruise);
            IdentityColumn? names = of.Samples.Identity.FirstOrDefault(c => c.Id == "station");
            var rowsOf = Enumerable.Range(first, of.Samples.RowCount)
                .Select(row => (Row: row, Key: Key(names?[row - first], latitude[row], longitude[row])))
                .Where(r => r.Key.Length > 0)
                .GroupBy(r => r.Key, r => r.Row, StringComparer.Ordinal);
            double travelled = 0;
            (double Latitude, double Longitude)? last = null;
            foreach (IGrouping<string, int> station in rowsOf)
            {
                int? at = station.Select(row => (int?)row).FirstOrDefault(row => double.IsFinite(latitude[row!.Value]) && double.IsFinite(longitude[row.Value]));
                if (at is { } placed)
                {
                    travelled += last is { } l ? GreatCircle.Kilometres(l.Latitude, l.Longitude, latitude[placed], longitude[placed]) : 0;
                    last = (latitude[placed], longitude[placed]);
                }

                foreach (int row in station)
                {
                    stationOf[row] = stations.Count;
                    distance[row] = at is null ? double.NaN : travelled;
                }

                string colour = columns.Cruises.Count > 1 ? SourceColours.At(cruise) : "--pencil";
                stations.Add(new MapStation(
                    FormattableString.Invariant($"{cruise}/{station.Key}"),
                    columns.Cruises.Count > 1 ? $"{of.Name}, station {station.Key}" : $"station {station.Key}",
                    at is null ? double.NaN : latitude[at.Value],
                    at is null ? double.NaN : longitude[at.Value],
                    colour,
                    (PointShape)(cruise % Enum.GetValues<PointShape>().Length))
                {
                    Name = station.Key,
                    Rows = [.. station.OrderBy(row => pressure[row])],
                });
            }
        }

        return new CruiseTrack(stations, distance, stationOf);
    }

    private static string Key(string? name, double latitude, double longitude)
    {
        if (!string.IsNullOrEmpty(name))
        {
            return name;
        }

        return double.IsFinite(latitude) && double.IsFinite(longitude) ? $"{FigureText.Latitude(latitude, 4)} {FigureText.Longitude(longitude, 4)}" : "";
    }
}
