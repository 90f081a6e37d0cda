namespace WaterMix.Core.Seawater;

/// <summary>Practical Salinity (PSS-78) from Absolute Salinity.</summary>
public static class PracticalSalinity
{
    /// <summary>The inverse of <see cref="AbsoluteSalinity.FromPractical"/>, which is linear in salinity.</summary>
    /// <param name="absoluteSalinity">Absolute Salinity, g/kg, 2 to 42.</param>
    /// <param name="pressureDbar">Sea pressure, dbar, 0 to 10,000.</param>
    /// <param name="longitudeDeg">Longitude, degrees east, -180 to 360.</param>
    /// <param name="latitudeDeg">Latitude, degrees north, -86 to 90.</param>
    /// <returns>Practical Salinity. NaN where an input is NaN or the position is outside the range.</returns>
    /// <remarks><c>McDougall2012</c>, <c>IOC2010</c>, appendix A.5. 0 p makes a missing pressure count in the Baltic as it does elsewhere.</remarks>
    public static double FromAbsolute(double absoluteSalinity, double pressureDbar, double longitudeDeg, double latitudeDeg) =>
        BalticSea.Contains(longitudeDeg, latitudeDeg)
            ? ((absoluteSalinity - BalticSea.RiverSalt) / BalticSea.GramsPerPracticalSalinity) + (0 * pressureDbar)
            : absoluteSalinity / Teos10.GramsPerPracticalSalinity
                / (1 + SalinityAnomalyAtlas.Ratio(pressureDbar, longitudeDeg, latitudeDeg));
}
