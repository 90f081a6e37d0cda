namespace WaterMix.Core.Seawater;

/// <summary>Sea pressure at a depth (TEOS-10).</summary>
public static class SeaPressure
{
    /// <summary>The inverse of <see cref="Depth.FromPressure"/>, good to 1e-8 dbar.</summary>
    /// <param name="depthM">Depth below the sea surface, m, positive downwards, -5 to 12,000.</param>
    /// <param name="latitudeDeg">Latitude, degrees north, -90 to 90.</param>
    /// <returns>Sea pressure, dbar. NaN where an input is NaN, the depth is above -5 m or the latitude is outside its range.</returns>
    /// <remarks>First guess of <c>Saunders1981</c>, then one step of the modified Newton method, <c>McDougallWotherspoon2013</c>.</remarks>
    public static double FromDepth(double depthM, double latitudeDeg)
    {
        if (!(depthM >= -5))
        {
            return double.NaN;
        }

        double d = depthM;
        double g = Gravity.AtSurface(latitudeDeg);
        double c = 1 - (5.92e-3 + (5.25e-3 * Elementary.SineSquared(latitudeDeg)));
        double start = 2 * d / (c + Math.Sqrt((c * c) - (8.84e-6 * d)));
        double excess = StandardOcean.Enthalpy(start) - (g * (d + (0.5 * Gravity.FractionPerMetre * d * d)));
        double middle = start - (0.5 * excess / (Teos10.PascalPerDecibar * StandardOcean.SpecificVolume(start)));
        return start - (excess / (Teos10.PascalPerDecibar * StandardOcean.SpecificVolume(middle)));
    }
}
