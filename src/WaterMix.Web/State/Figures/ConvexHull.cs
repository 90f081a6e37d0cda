namespace WaterMix.Web.State.Figures;

/// <summary>The convex hull of points in a plane, by the monotone chain of <c>Andrew1979</c>.</summary>
public static class ConvexHull
{
    /// <summary>How far outside, relative to the hull's size, still counts as on the edge: rounding, not chemistry.</summary>
    private const double Tolerance = 1e-9;

    /// <summary>The corners of the hull.</summary>
    /// <param name="points">Points; those with a missing value are left out.</param>
    /// <returns>The corners anticlockwise, none on the line between its neighbours; two for a line, one for a point, none without points.</returns>
    public static IReadOnlyList<PlanePoint> Of(IEnumerable<PlanePoint> points)
    {
        ArgumentNullException.ThrowIfNull(points);
        PlanePoint[] sorted = [.. points.Where(p => double.IsFinite(p.X) && double.IsFinite(p.Y)).Distinct().OrderBy(p => p.X).ThenBy(p => p.Y)];
        if (sorted.Length < 3)
        {
            return sorted;
        }

        List<PlanePoint> lower = Chain(sorted);
        List<PlanePoint> upper = Chain(sorted.Reverse());
        return [.. lower.SkipLast(1), .. upper.SkipLast(1)];
    }

    /// <summary>True where a point lies in the hull or on its edge.</summary>
    /// <param name="hull">Corners as <see cref="Of"/> gives them.</param>
    /// <param name="point">The point.</param>
    public static bool Contains(IReadOnlyList<PlanePoint> hull, PlanePoint point)
    {
        ArgumentNullException.ThrowIfNull(hull);
        if (hull.Count < 3)
        {
            return hull.Count > 0 && OnSegment(hull[0], hull[^1], point);
        }

        for (int i = 0; i < hull.Count; i++)
        {
            PlanePoint a = hull[i];
            PlanePoint b = hull[(i + 1) % hull.Count];
            double turn = Turn(a, b, point);
            double scale = (Math.Abs(b.X - a.X) * (Math.Abs(point.Y - a.Y) + Math.Abs(b.Y - a.Y)))
                + (Math.Abs(b.Y - a.Y) * (Math.Abs(point.X - a.X) + Math.Abs(b.X - a.X)));
            if (turn < -Tolerance * scale)
            {
                return false;
            }
        }

        return true;
    }

    private static List<PlanePoint> Chain(IEnumerable<PlanePoint> sorted)
    {
        var chain = new List<PlanePoint>();
        foreach (PlanePoint point in sorted)
        {
            while (chain.Count > 1 && Turn(chain[^2], chain[^1], point) <= 0)
            {
                chain.RemoveAt(chain.Count - 1);
            }

            chain.Add(point);
        }

        return chain;
    }

    /// <summary>Twice the area of the triangle a b c: positive where it turns left.</summary>
    private static double Turn(PlanePoint a, PlanePoint b, PlanePoint c) => ((b.X - a.X) * (c.Y - a.Y)) - ((b.Y - a.Y) * (c.X - a.X));

    private static bool OnSegment(PlanePoint a, PlanePoint b, PlanePoint point)
    {
        double width = Math.Abs(b.X - a.X);
        double height = Math.Abs(b.Y - a.Y);
        double marginX = Tolerance * Math.Max(width, Math.Abs(a.X));
        double marginY = Tolerance * Math.Max(height, Math.Abs(a.Y));
        return point.X >= Math.Min(a.X, b.X) - marginX
            && point.X <= Math.Max(a.X, b.X) + marginX
            && point.Y >= Math.Min(a.Y, b.Y) - marginY
            && point.Y <= Math.Max(a.Y, b.Y) + marginY
            && Math.Abs(Turn(a, b, point)) <= (width * marginY) + (height * marginX);
    }
}
