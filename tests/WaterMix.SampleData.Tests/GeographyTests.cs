using System.Text.Json;
using WaterMix.Core.Seawater;
using WaterMix.Testing;

namespace WaterMix.SampleData.Tests;

/// <summary>Property. The coast is valid GeoJSON (RFC 7946, section 3.1.6), the ship stays at sea, and the anomaly atlas knows the place.</summary>
public class GeographyTests
{
    private static readonly Cruise _cruise = new(Cruise.Seed);

    [Fact]
    public void Coastline_EveryRing_IsClosedCounterclockwiseAndDoesNotCrossItself() =>
        Assert.All(Rings(), ring =>
        {
            Assert.True(ring.Length > 4);
            Assert.Equal(ring[0], ring[^1]);
            Assert.True(Segments(ring).Sum(s => (s.A.X * s.B.Y) - (s.B.X * s.A.Y)) > 0);
            (Point A, Point B)[] segments = [.. Segments(ring)];
            for (int i = 0; i < segments.Length; i++)
            {
                for (int j = i + 1; j < segments.Length; j++)
                {
                    bool neighbours = j == i + 1 || (i == 0 && j == segments.Length - 1);
                    Assert.False(!neighbours && Cross(segments[i], segments[j]), $"segments {i} and {j} cross at {segments[i].A}");
                }
            }
        });

    [Fact]
    public void Coastline_StationsAndSources_AreAtSea()
    {
        Point[][] rings = [.. Rings()];
        Assert.Equal(3, rings.Length);
        Assert.All(_cruise.Stations, s => Assert.DoesNotContain(rings, ring => Holds(ring, new Point(s.Longitude, s.Latitude))));
        Assert.All(Sources.Set.EndMembers, e => Assert.DoesNotContain(rings, ring => Holds(ring, new Point(e.Position!.Longitude, e.Position.Latitude))));

        // The centre of an island is on land: the test can fail.
        Assert.Contains(rings, ring => Holds(ring, new Point(-126.4, -35.3)));
    }

    // The ratio is 0 on land and up to about 0.001 in the open Pacific, McDougall et al. (2012).
    [Fact]
    public void Atlas_EveryBottleAndSource_HasOrdinaryValues()
    {
        foreach (Bottle bottle in _cruise.Bottles)
        {
            IsOrdinary(bottle.Pressure, bottle.Station.Longitude, bottle.Station.Latitude);
        }

        Assert.All(Sources.Set.EndMembers, e => IsOrdinary(e.Position!.Pressure, e.Position.Longitude, e.Position.Latitude));
    }

    [Fact]
    public void Bottles_EveryStation_ReachFromTheSurfaceToNearTheFloor() =>
        Assert.All(_cruise.Bottles.GroupBy(b => b.Station), station =>
        {
            Assert.InRange(station.Count(), 5, 24);
            Assert.InRange(station.First().Pressure, 0, 10);
            Assert.InRange(station.Key.BottomDepth - Depth.FromPressure(station.Last().Pressure, station.Key.Latitude), 5, 20);
        });

    private static void IsOrdinary(double pressure, double longitude, double latitude)
    {
        Assert.InRange(SalinityAnomalyAtlas.Ratio(pressure, longitude, latitude), 1e-6, 1e-3);
        int west = (int)((longitude + 360) / 4);
        int south = (int)((latitude + 86) / 4);
        foreach ((int i, int j) in ((int, int)[])[(west, south), (west + 1, south), (west, south + 1), (west + 1, south + 1)])
        {
            Assert.True(SalinityAnomalyAtlas.LevelsAt(i, j) > 30, $"the atlas is shallow or on land at {SalinityAnomalyAtlas.Longitudes[i]}, {SalinityAnomalyAtlas.Latitudes[j]}");
        }
    }

    private static IEnumerable<Point[]> Rings()
    {
        using var document = JsonDocument.Parse(File.ReadAllBytes(Path.Combine(TestData.Root, "sample-data", "halcyon-coastline.geojson")));
        Assert.Equal("FeatureCollection", document.RootElement.GetProperty("type").GetString());
        foreach (JsonElement feature in document.RootElement.GetProperty("features").EnumerateArray())
        {
            JsonElement geometry = feature.GetProperty("geometry");
            Assert.Equal("Polygon", geometry.GetProperty("type").GetString());
            JsonElement ring = Assert.Single(geometry.GetProperty("coordinates").EnumerateArray());
            yield return [.. ring.EnumerateArray().Select(c => new Point(c[0].GetDouble(), c[1].GetDouble()))];
        }
    }

    private static IEnumerable<(Point A, Point B)> Segments(Point[] ring) => ring.Zip(ring.Skip(1));

    /// <summary>Even-odd rule: a ray to the east meets the ring an odd number of times.</summary>
    private static bool Holds(Point[] ring, Point p) =>
        Segments(ring).Count(s => s.A.Y > p.Y != s.B.Y > p.Y && p.X < s.A.X + ((s.B.X - s.A.X) * (p.Y - s.A.Y) / (s.B.Y - s.A.Y))) % 2 == 1;

    private static bool Cross((Point A, Point B) s, (Point A, Point B) t) =>
        Turn(s.A, s.B, t.A) * Turn(s.A, s.B, t.B) <= 0 && Turn(t.A, t.B, s.A) * Turn(t.A, t.B, s.B) <= 0;

    private static double Turn(Point a, Point b, Point c) => ((b.X - a.X) * (c.Y - a.Y)) - ((b.Y - a.Y) * (c.X - a.X));

    private readonly record struct Point(double X, double Y);
}
