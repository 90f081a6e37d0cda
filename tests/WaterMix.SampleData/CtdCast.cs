namespace WaterMix.SampleData;

/// <summary>CTD casts: the same water as in the bottles, every ten dbar.</summary>
public static class CtdCast
{
    /// <summary>The stations whose first cast has a CTD file.</summary>
    public static IReadOnlyList<int> Stations { get; } = [4, 12, 22, 30, 35];

    private const int Spacing = 10;

    /// <summary>The levels of a station's first cast, from 10 dbar to its deepest bottle.</summary>
    /// <param name="cruise">The cruise.</param>
    /// <param name="station">The station.</param>
    /// <remarks>What a parcel has of its sources' spread is known at the bottles and varies linearly between them.</remarks>
    public static IReadOnlyList<CtdLevel> Levels(Cruise cruise, Station station)
    {
        ArgumentNullException.ThrowIfNull(cruise);
        ArgumentNullException.ThrowIfNull(station);
        Bottle[] bottles = [.. cruise.Bottles.Where(b => b.Station == station)];
        double[][] spread = [.. bottles.Select(b => Difference(b.Parcel, b.Water.Tracers(station.Along, b.Pressure)))];
        var levels = new List<CtdLevel>();
        int above = 0;
        for (int p = Spacing; p <= bottles[^1].Pressure; p += Spacing)
        {
            while (above < bottles.Length - 2 && bottles[above + 1].Pressure < p)
            {
                above++;
            }

            double span = bottles[above + 1].Pressure - bottles[above].Pressure;
            double part = Math.Clamp((p - bottles[above].Pressure) / span, 0, 1);
            double[] parcel = Water.At(station.Along, p).Tracers(station.Along, p);
            for (int t = 0; t < parcel.Length; t++)
            {
                parcel[t] += ((1 - part) * spread[above][t]) + (part * spread[above + 1][t]);
            }

            bool interpolated = station.Number == Stations[1] && p is >= 2110 and < 2150;
            levels.Add(new CtdLevel(p, Cruise.InSitu(station, p, parcel), parcel[1], parcel[Sources.Oxygen], interpolated));
        }

        return levels;
    }

    private static double[] Difference(double[] a, double[] b) => [.. a.Zip(b, (x, y) => x - y)];
}
