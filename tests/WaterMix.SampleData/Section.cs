using WaterMix.Core.Seawater;

namespace WaterMix.SampleData;

/// <summary>One station of the section.</summary>
/// <param name="Number">From 1 in the southwest.</param>
/// <param name="Along">Place along the section, 0 to 1.</param>
/// <param name="Latitude">Degrees north.</param>
/// <param name="Longitude">Degrees east.</param>
/// <param name="BottomDepth">Sounding, m.</param>
/// <param name="Start">When the first cast began, UTC.</param>
public sealed record Station(int Number, double Along, double Latitude, double Longitude, int BottomDepth, DateTime Start);

/// <summary>The cruise track from Southgate in the southwest over Lantern Ridge to the coast of Orrin in the northeast.</summary>
public static class Section
{
    private const int Count = 36;

    /// <summary>The stations in the order of their numbers.</summary>
    /// <param name="noise">The ocean's random numbers.</param>
    public static IReadOnlyList<Station> Stations(Noise noise)
    {
        ArgumentNullException.ThrowIfNull(noise);
        var start = new DateTime(2024, 2, 6, 4, 10, 0, DateTimeKind.Utc);
        var stations = new List<Station>(Count);
        for (int number = 1; number <= Count; number++)
        {
            double s = (number - 1) / (Count - 1.0);
            bool second = s > 0.5;
            double leg = second ? (2 * s) - 1 : 2 * s;
            double latitude = second ? -38 + (6 * leg) : -45 + (7 * leg);
            double longitude = second ? -121.5 + (8.5 * leg) : -129 + (7.5 * leg);
            double rough = 60 * noise.Normal(Purpose.SeaFloor, number, 0, 0);
            stations.Add(new Station(number, s, Math.Round(latitude, 4), Math.Round(longitude, 4), (int)Math.Round(Depth(s) + rough), start));
            start = start.AddMinutes(395 + Math.Round(120 * noise.Uniform(Purpose.SeaFloor, number, 0, 1)));
        }

        return stations;
    }

    /// <summary>The pressures at which a station's bottles are closed, dbar, from the surface down.</summary>
    /// <param name="station">The station.</param>
    /// <param name="noise">The ocean's random numbers.</param>
    public static IReadOnlyList<double> BottlePressures(Station station, Noise noise)
    {
        ArgumentNullException.ThrowIfNull(station);
        ArgumentNullException.ThrowIfNull(noise);
        double deepest = SeaPressure.FromDepth(station.BottomDepth - 12, station.Latitude);
        double[] upper = [6, 40, 90, 142, 200, 280, 370, 480, 600, 720, 850, 980, 1120, 1280];
        List<double> levels = [.. upper.Where(p => p < deepest - 60)];
        double from = levels[^1];
        int below = Math.Clamp((int)((deepest - from) / 130), 1, 10);
        for (int k = 1; k <= below; k++)
        {
            levels.Add(from + ((deepest - from) * k / below));
        }

        for (int k = 0; k < levels.Count - 1; k++)
        {
            double gap = levels[k + 1] - levels[k];
            levels[k] += 0.22 * Math.Min(gap, levels[k]) * ((2 * noise.Uniform(Purpose.Pressure, station.Number, k, 0)) - 1);
        }

        return [.. levels.Select(p => Math.Round(p, 1))];
    }

    /// <summary>The sounding in m: a basin, Lantern Ridge, a second basin and the slope of Orrin.</summary>
    private static double Depth(double s) => 4750 - (200 * s) - (1950 * Shape.Bump((s - 0.55) / 0.14)) - (3900 * Shape.Step((s - 0.84) / 0.165));
}
