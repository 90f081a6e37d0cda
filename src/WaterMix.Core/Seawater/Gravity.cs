namespace WaterMix.Core.Seawater;

/// <summary>Gravitational acceleration in the ocean (TEOS-10).</summary>
public static class Gravity
{
    /// <summary>Decrease of gravity upwards as a fraction, 1/m, <c>IOC2010</c>, appendix D.</summary>
    internal const double FractionPerMetre = 2.26e-7;

    /// <summary>At a latitude and a pressure: g = g0(latitude) (1 - 2.26e-7 z), z the height, negative in the sea.</summary>
    /// <param name="pressureDbar">Sea pressure, dbar, 0 to 12,000.</param>
    /// <param name="latitudeDeg">Latitude, degrees north, -90 to 90.</param>
    /// <returns>Acceleration, m/s2. NaN where an input is NaN or the latitude is outside its range.</returns>
    /// <remarks><c>IOC2010</c>, appendix D, equation D.3; <c>Moritz2000</c>.</remarks>
    public static double At(double pressureDbar, double latitudeDeg) =>
        AtSurface(latitudeDeg) * (1 + (FractionPerMetre * Depth.FromPressure(pressureDbar, latitudeDeg)));

    /// <summary>At the sea surface: 9.780327 (1 + 5.2792e-3 sin^2 + 2.32e-5 sin^4), m/s2.</summary>
    internal static double AtSurface(double latitudeDeg)
    {
        double sin2 = Elementary.SineSquared(latitudeDeg);
        return 9.780327 * Polynomial.Of(sin2, 1.0, 5.2792e-3, 2.32e-5);
    }
}
