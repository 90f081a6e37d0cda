namespace WaterMix.Web.State.Figures;

/// <summary>The part of a polygon inside a rectangle, edge after edge (<c>SutherlandHodgman1974</c>).</summary>
internal static class RectangleClip
{
    /// <summary>Corners of the part inside; parts that fall apart stay joined along the rectangle's edge, which is not seen where that lies outside the drawing.</summary>
    public static IReadOnlyList<PlanePoint> Of(PlanePoint[] polygon, double left, double top, double right, double bottom)
    {
        if (polygon.All(p => p.X < left) || polygon.All(p => p.X > right) || polygon.All(p => p.Y < top) || polygon.All(p => p.Y > bottom))
        {
            return [];
        }

        IReadOnlyList<PlanePoint> inside = polygon;
        inside = Cut(inside, p => p.X - left);
        inside = Cut(inside, p => right - p.X);
        inside = Cut(inside, p => p.Y - top);
        return Cut(inside, p => bottom - p.Y);
    }

    /// <summary>Keeps the side where the depth is not negative.</summary>
    private static List<PlanePoint> Cut(IReadOnlyList<PlanePoint> polygon, Func<PlanePoint, double> depth)
    {
        var kept = new List<PlanePoint>(polygon.Count);
        for (int i = 0; i < polygon.Count; i++)
        {
            PlanePoint a = polygon[i];
            PlanePoint b = polygon[(i + 1) % polygon.Count];
            double depthA = depth(a);
            double depthB = depth(b);
            if (depthA >= 0)
            {
                kept.Add(a);
            }

            if ((depthA >= 0) != (depthB >= 0))
            {
                double share = depthA / (depthA - depthB);
                kept.Add(new PlanePoint(a.X + (share * (b.X - a.X)), a.Y + (share * (b.Y - a.Y))));
            }
        }

        return kept;
    }
}
