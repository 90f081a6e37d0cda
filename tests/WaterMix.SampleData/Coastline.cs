using System.Globalization;
using System.Text;

namespace WaterMix.SampleData;

/// <summary>
/// The invented lands round Halcyon Basin, in a part of the real South Pacific that holds no land (135 to 102 W, 46 to 28 S, from memory),
/// so that the anomaly atlas of TEOS-10 gives ordinary values.
/// </summary>
public static class Coastline
{
    private const int Halvings = 3;

    private static readonly (string Name, double[] Corners)[] _lands =
    [
        ("Orrin",
        [
            -103, -45, -102.5, -38, -103, -31, -104, -28.6, -110, -28.4, -118, -28.3, -126, -28.6, -126.5, -30,
            -123.5, -30.4, -122, -29.2, -120, -29.1, -119, -30.5, -115.5, -30.6, -112.3, -31.2, -112, -33.4,
            -111, -33.5, -110.2, -32.6, -107.5, -32.2, -105.5, -33, -105, -35, -106.2, -36.6, -108.8, -36.8, -110.3, -35.6,
            -111, -34.2, -111.9, -34.1, -111.6, -36.5, -112.2, -39, -111, -41.5, -110.2, -44, -108.5, -45.6,
        ]),
        ("Westmark",
        [
            -132.8, -44, -131.8, -42, -131.4, -39, -132, -36, -131.2, -33, -131.9, -30.2, -133.6, -30, -134.5, -34, -134.2, -39, -133.9, -42.5,
        ]),
        ("Petrel Island", [-126.6, -35.9, -126.1, -35.7, -125.9, -35.2, -126.3, -34.8, -126.8, -34.9, -127, -35.5]),
    ];

    /// <summary>The outer rings, longitude and latitude in degrees, counterclockwise; the first point is not repeated.</summary>
    /// <param name="noise">The ocean's random numbers.</param>
    public static IReadOnlyList<(string Name, IReadOnlyList<(double Longitude, double Latitude)> Ring)> Lands(Noise noise)
    {
        ArgumentNullException.ThrowIfNull(noise);
        var lands = new List<(string, IReadOnlyList<(double, double)>)>();
        for (int land = 0; land < _lands.Length; land++)
        {
            (string name, double[] corners) = _lands[land];
            List<(double X, double Y)> ring = [.. corners.Chunk(2).Select(c => (c[0], c[1]))];
            for (int halving = 0; halving < Halvings; halving++)
            {
                ring = Roughen(ring, noise, land, halving);
            }

            lands.Add((name, [.. ring.Select(c => (Math.Round(c.X, 3), Math.Round(c.Y, 3)))]));
        }

        return lands;
    }

    /// <summary>The lands as GeoJSON (<c>Rfc7946</c>): a polygon each, first and last point the same, counterclockwise.</summary>
    /// <param name="noise">The ocean's random numbers.</param>
    public static string GeoJson(Noise noise)
    {
        var text = new StringBuilder("{ \"type\": \"FeatureCollection\", \"features\": [\n");
        string between = "";
        foreach ((string name, IReadOnlyList<(double Longitude, double Latitude)> ring) in Lands(noise))
        {
            text.Append(between).Append("{ \"type\": \"Feature\", \"properties\": { \"name\": \"").Append(name);
            text.Append("\", \"note\": \"invented\" },\n  \"geometry\": { \"type\": \"Polygon\", \"coordinates\": [[\n    ");
            text.AppendJoin(", ", ring.Append(ring[0]).Select(c => string.Create(CultureInfo.InvariantCulture, $"[{c.Longitude:F3}, {c.Latitude:F3}]")));
            text.Append("\n  ]] } }");
            between = ",\n";
        }

        return text.Append("\n] }\n").ToString();
    }

    /// <summary>A point between every two, off the line by up to 0.13 of their distance.</summary>
    private static List<(double X, double Y)> Roughen(List<(double X, double Y)> ring, Noise noise, int land, int halving)
    {
        var rougher = new List<(double, double)>(ring.Count * 2);
        for (int k = 0; k < ring.Count; k++)
        {
            (double X, double Y) a = ring[k];
            (double X, double Y) b = ring[(k + 1) % ring.Count];
            double off = 0.26 * (noise.Uniform(Purpose.Coast, land, k, halving) - 0.5);
            rougher.Add(a);
            rougher.Add((((a.X + b.X) / 2) - (off * (b.Y - a.Y)), ((a.Y + b.Y) / 2) + (off * (b.X - a.X))));
        }

        return rougher;
    }
}
