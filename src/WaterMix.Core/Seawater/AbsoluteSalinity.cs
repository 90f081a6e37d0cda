namespace WaterMix.Core.Seawater;

/// <summary>Mass of dissolved matter in seawater (TEOS-10), from what a salinometer or a CTD measures.</summary>
public static class AbsoluteSalinity
{
    /// <summary>
    /// S_A = (35.16504 / 35) S_P (1 + R), R the anomaly ratio of the atlas; in the Baltic S_A = ((35.16504 - 0.087) / 35) S_P + 0.087.
    /// </summary>
    /// <param name="practicalSalinity">Practical Salinity (PSS-78), 2 to 42. Lower values go through the same line; nothing is clipped.</param>
    /// <param name="pressureDbar">Sea pressure, dbar, 0 to 10,000.</param>
    /// <param name="longitudeDeg">Longitude, degrees east, -180 to 360.</param>
    /// <param name="latitudeDeg">Latitude, degrees north, -86 to 90; the atlas has nothing further south.</param>
    /// <returns>Absolute Salinity, g/kg. NaN where an input is NaN or the position is outside the range.</returns>
    /// <remarks><c>McDougall2012</c>, <c>IOC2010</c>, appendix A.5. 0 p makes a missing pressure count in the Baltic as it does elsewhere.</remarks>
    public static double FromPractical(double practicalSalinity, double pressureDbar, double longitudeDeg, double latitudeDeg) =>
        BalticSea.Contains(longitudeDeg, latitudeDeg)
            ? (BalticSea.GramsPerPracticalSalinity * practicalSalinity) + BalticSea.RiverSalt + (0 * pressureDbar)
            : Teos10.GramsPerPracticalSalinity * practicalSalinity
                * (1 + SalinityAnomalyAtlas.Ratio(pressureDbar, longitudeDeg, latitudeDeg));
}
