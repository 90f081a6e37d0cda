namespace WaterMix.Core.Seawater;

/// <summary>Depth of a pressure surface (TEOS-10).</summary>
public static class Depth
{
    /// <summary>Depth below the sea surface in a standard ocean (S_A = 35.16504 g/kg, CT = 0 degC), without dynamic height.</summary>
    /// <param name="pressureDbar">Sea pressure, dbar (0 at the surface), 0 to 12,000.</param>
    /// <param name="latitudeDeg">Latitude, degrees north, -90 to 90.</param>
    /// <returns>Depth, m, positive downwards: the height z of the papers is its negative. NaN where an input is NaN or the latitude is outside its range.</returns>
    /// <remarks>Root of h(p) = g0 (d + gamma d^2 / 2), h the enthalpy and gamma = 2.26e-7 1/m; <c>IOC2010</c>, section 3.32, with the 75-term volume.</remarks>
    public static double FromPressure(double pressureDbar, double latitudeDeg)
    {
        double g = Gravity.AtSurface(latitudeDeg);
        double h = StandardOcean.Enthalpy(pressureDbar);
        return 2 * h / (g + Math.Sqrt((g * g) + (2 * Gravity.FractionPerMetre * g * h)));
    }
}
