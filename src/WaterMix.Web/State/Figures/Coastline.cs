using System.Text.Json;

namespace WaterMix.Web.State.Figures;

/// <summary>Land as closed rings of positions.</summary>
public sealed class Coastline
{
    private Coastline(IReadOnlyList<PlanePoint[]> rings) => Rings = rings;

    /// <summary>Each ring's corners: x degrees east, y degrees north; the first stands again at the end.</summary>
    public IReadOnlyList<PlanePoint[]> Rings { get; }

    /// <summary>Reads polygons from GeoJSON (RFC 7946); what is no polygon is passed over.</summary>
    /// <param name="json">A geometry, a feature or a collection of them, UTF-8.</param>
    /// <exception cref="ArgumentException">It is not GeoJSON; the message says what was expected.</exception>
    public static Coastline FromGeoJson(Stream json)
    {
        ArgumentNullException.ThrowIfNull(json);
        var rings = new List<PlanePoint[]>();
        try
        {
            using var document = JsonDocument.Parse(json);
            AddGeoJson(document.RootElement, rings);
        }
        catch (Exception e) when (e is JsonException or InvalidOperationException or KeyNotFoundException)
        {
            throw new ArgumentException($"The coastline is to be GeoJSON with polygons of longitude and latitude, but: {e.Message} Export it as GeoJSON (RFC 7946) again.", nameof(json), e);
        }

        return new Coastline(rings);
    }

    /// <summary>Reads the object <c>land</c> of a TopoJSON file with quantised, delta-encoded arcs.</summary>
    /// <param name="json">The file, UTF-8.</param>
    public static Coastline FromTopoJson(Stream json)
    {
        ArgumentNullException.ThrowIfNull(json);
        using var document = JsonDocument.Parse(json);
        JsonElement root = document.RootElement;
        double[] scale = Pair(root.GetProperty("transform").GetProperty("scale"));
        double[] translate = Pair(root.GetProperty("transform").GetProperty("translate"));
        PlanePoint[][] arcs = [.. root.GetProperty("arcs").EnumerateArray().Select(arc => Decoded(arc, scale, translate))];
        var rings = new List<PlanePoint[]>();
        foreach (JsonElement geometry in root.GetProperty("objects").GetProperty("land").GetProperty("geometries").EnumerateArray())
        {
            IEnumerable<JsonElement> polygons = geometry.GetProperty("type").ValueEquals("Polygon")
                ? [geometry.GetProperty("arcs")]
                : geometry.GetProperty("arcs").EnumerateArray();
            rings.AddRange(polygons.SelectMany(p => p.EnumerateArray()).Select(ring => Joined(ring, arcs)));
        }

        return new Coastline(rings);
    }

    private static void AddGeoJson(JsonElement element, List<PlanePoint[]> rings)
    {
        switch (element.GetProperty("type").GetString())
        {
            case "FeatureCollection":
                foreach (JsonElement feature in element.GetProperty("features").EnumerateArray())
                {
                    AddGeoJson(feature, rings);
                }

                break;
            case "GeometryCollection":
                foreach (JsonElement geometry in element.GetProperty("geometries").EnumerateArray())
                {
                    AddGeoJson(geometry, rings);
                }

                break;
            case "Feature" when element.GetProperty("geometry").ValueKind != JsonValueKind.Null:
                AddGeoJson(element.GetProperty("geometry"), rings);
                break;
            case "Polygon":
                rings.AddRange(element.GetProperty("coordinates").EnumerateArray().Select(Ring));
                break;
            case "MultiPolygon":
                rings.AddRange(element.GetProperty("coordinates").EnumerateArray().SelectMany(p => p.EnumerateArray()).Select(Ring));
                break;
        }
    }

    private static PlanePoint[] Ring(JsonElement ring) => [.. ring.EnumerateArray().Select(position => new PlanePoint(position[0].GetDouble(), position[1].GetDouble()))];

    private static double[] Pair(JsonElement element) => [element[0].GetDouble(), element[1].GetDouble()];

    private static PlanePoint[] Decoded(JsonElement arc, double[] scale, double[] translate)
    {
        var points = new PlanePoint[arc.GetArrayLength()];
        long x = 0;
        long y = 0;
        foreach ((int index, JsonElement step) in arc.EnumerateArray().Index())
        {
            x += step[0].GetInt64();
            y += step[1].GetInt64();
            points[index] = new PlanePoint((x * scale[0]) + translate[0], (y * scale[1]) + translate[1]);
        }

        return points;
    }

    /// <summary>The arcs of a ring end to end; an index below zero, ~i, is arc i backwards.</summary>
    private static PlanePoint[] Joined(JsonElement ring, PlanePoint[][] arcs)
    {
        var points = new List<PlanePoint>();
        foreach (JsonElement entry in ring.EnumerateArray())
        {
            int index = entry.GetInt32();
            IEnumerable<PlanePoint> arc = index < 0 ? arcs[~index].Reverse() : arcs[index];
            points.AddRange(points.Count > 0 ? arc.Skip(1) : arc);
        }

        return [.. points];
    }
}
