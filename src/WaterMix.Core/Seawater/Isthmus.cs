namespace WaterMix.Core.Seawater;

/// <summary>Central America, where neighbouring nodes of the atlas lie in different oceans, <c>McDougall2012</c>.</summary>
internal static class Isthmus
{
    // The line from the Gulf of Mexico to Colombia, its corners as in the anomaly atlas.
    private static ReadOnlySpan<double> LineLongitudes => [260.00, 272.59, 276.50, 278.65, 280.73, 292.0];

    private static ReadOnlySpan<double> LineLatitudes => [19.55, 13.97, 9.60, 8.10, 9.33, 3.4];

    /// <summary>True in the box around the line; longitude from 0 to 360.</summary>
    public static bool Contains(double longitude, double latitude) =>
        longitude >= 260 && longitude <= 291.999 && latitude >= 3.4 && latitude <= 19.55;

    /// <summary>Which corners of the cell, 4 degrees wide, lie on the point's side of the line.</summary>
    public static Corners SameSide(double longitude, double latitude, double west, double south)
    {
        bool side = IsNorth(longitude, latitude);
        return new Corners(
            IsNorth(west, south) == side,
            IsNorth(west + 4, south) == side,
            IsNorth(west + 4, south + 4) == side,
            IsNorth(west, south + 4) == side);
    }

    private static bool IsNorth(double longitude, double latitude)
    {
        int i = 0;
        while (i < LineLongitudes.Length - 2 && longitude >= LineLongitudes[i + 1])
        {
            i++;
        }

        double along = (longitude - LineLongitudes[i]) / (LineLongitudes[i + 1] - LineLongitudes[i]);
        return latitude >= LineLatitudes[i] + (along * (LineLatitudes[i + 1] - LineLatitudes[i]));
    }
}
