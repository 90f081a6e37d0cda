namespace WaterMix.Core.Seawater;

/// <summary>
/// The Baltic, where the salt of the rivers sets the anomaly instead of the atlas: S_A - S_R = 0.087 (1 - S_P / 35),
/// <c>Feistel2010</c>, <c>IOC2010</c>, appendix A.5.
/// </summary>
internal static class BalticSea
{
    /// <summary>Absolute Salinity of the water without sea salt, g/kg.</summary>
    public const double RiverSalt = 0.087;

    /// <summary>Grams of sea salt per unit of Practical Salinity, after the river salt.</summary>
    public const double GramsPerPracticalSalinity = (Teos10.StandardOceanSalinity - RiverSalt) / 35;

    /// <summary>
    /// True inside the polygon: west side (longitude 12.6 at latitude 50), (7 at 59), (26 at 69); east side (45 at 50), (26 at 69).
    /// </summary>
    /// <param name="longitudeDeg">Longitude, degrees east; -180 to 180 or 0 to 360.</param>
    /// <param name="latitudeDeg">Latitude, degrees north.</param>
    public static bool Contains(double longitudeDeg, double latitudeDeg)
    {
        if (!(latitudeDeg > 50 && latitudeDeg < 69 && longitudeDeg > 7 && longitudeDeg < 45))
        {
            return false;
        }

        double west = latitudeDeg < 59
            ? 12.6 + ((latitudeDeg - 50) / 9 * (7 - 12.6))
            : 7 + ((latitudeDeg - 59) / 10 * (26 - 7));
        double east = 45 + ((latitudeDeg - 50) / 19 * (26 - 45));
        return longitudeDeg >= west && longitudeDeg <= east;
    }
}
