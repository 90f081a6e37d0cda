using static WaterMix.Core.Seawater.Polynomial;

namespace WaterMix.Core.Seawater;

/// <summary>
/// The older equation of state, EOS-80, for density thresholds that were published in it: below 2,000 dbar its sigma2 is lower than
/// TEOS-10's by about 0.007 to 0.018 kg/m3. New work uses <see cref="Density"/>.
/// </summary>
/// <remarks>
/// Every function takes ITS-90 temperatures and converts to the fits' IPTS-68 inside. Valid for Practical Salinity 0 to 42,
/// -2 to 40 degC, 0 to 10,000 dbar; NaN in gives NaN out.
/// </remarks>
public static class Eos80
{
    /// <summary>In-situ density, kg/m3: rho(S, t, 0) / (1 - p / K(S, t, p)), p in bar; <c>Unesco44</c>, algorithm 3, <c>MilleroPoisson1981</c>.</summary>
    /// <param name="practicalSalinity">Practical Salinity (PSS-78).</param>
    /// <param name="inSituTemperature">In-situ temperature, degC (ITS-90).</param>
    /// <param name="pressureDbar">Sea pressure, dbar.</param>
    public static double Density(double practicalSalinity, double inSituTemperature, double pressureDbar) =>
        DensityAt68(practicalSalinity, TemperatureScale.ToIpts68(inSituTemperature), pressureDbar);

    /// <summary>
    /// Potential temperature, degC (ITS-90): the lapse rate of <c>Bryden1973</c> integrated in one step of a fourth-order
    /// Runge-Kutta scheme, <c>Fofonoff1977</c>, <c>Unesco44</c>, algorithm 7.
    /// </summary>
    /// <param name="practicalSalinity">Practical Salinity (PSS-78).</param>
    /// <param name="inSituTemperature">In-situ temperature, degC (ITS-90).</param>
    /// <param name="pressureDbar">Sea pressure, dbar.</param>
    /// <param name="referencePressureDbar">Reference pressure, dbar.</param>
    public static double PotentialTemperature(
        double practicalSalinity, double inSituTemperature, double pressureDbar, double referencePressureDbar) =>
        TemperatureScale.FromIpts68(PotentialTemperatureAt68(
            practicalSalinity, TemperatureScale.ToIpts68(inSituTemperature), pressureDbar, referencePressureDbar));

    /// <summary>Potential density less 1,000, kg/m3: sigma-theta at a reference of 0 dbar, up to sigma4 at 4,000.</summary>
    /// <param name="practicalSalinity">Practical Salinity (PSS-78).</param>
    /// <param name="inSituTemperature">In-situ temperature, degC (ITS-90); at 0 dbar potential temperature is the same.</param>
    /// <param name="pressureDbar">Sea pressure that the temperature belongs to, dbar.</param>
    /// <param name="referencePressureDbar">Reference pressure, dbar.</param>
    public static double PotentialAnomaly(
        double practicalSalinity, double inSituTemperature, double pressureDbar, double referencePressureDbar)
    {
        double theta = PotentialTemperatureAt68(
            practicalSalinity, TemperatureScale.ToIpts68(inSituTemperature), pressureDbar, referencePressureDbar);
        return DensityAt68(practicalSalinity, theta, referencePressureDbar) - 1000;
    }

    /// <summary>
    /// Depth, m, positive downwards, of a pressure surface in a standard ocean (S = 35, t = 0 degC):
    /// (c1 p + c2 p^2 + c3 p^3 + c4 p^4) / (g(latitude) + 1.092e-6 p), <c>Unesco44</c>, algorithm 4, <c>Saunders1976</c>.
    /// </summary>
    /// <param name="pressureDbar">Sea pressure, dbar.</param>
    /// <param name="latitudeDeg">Latitude, degrees north, -90 to 90.</param>
    public static double Depth(double pressureDbar, double latitudeDeg)
    {
        double p = pressureDbar;
        double gravity = (9.780318 * Of(Elementary.SineSquared(latitudeDeg), 1.0, 5.2788e-3, 2.36e-5)) + (1.092e-6 * p);
        return p * Of(p, 9.72659, -2.2512e-5, 2.279e-10, -1.82e-15) / gravity;
    }

    private static double DensityAt68(double s, double t, double pressureDbar)
    {
        double root = Math.Sqrt(s);
        double p = pressureDbar / 10;

        double surface = Of(t, 999.842594, 6.793952e-2, -9.095290e-3, 1.001685e-4, -1.120083e-6, 6.536332e-9)
            + (s * Of(
                root,
                Of(t, 8.24493e-1, -4.0899e-3, 7.6438e-5, -8.2467e-7, 5.3875e-9),
                Of(t, -5.72466e-3, 1.0227e-4, -1.6546e-6),
                4.8314e-4));

        // Secant bulk modulus, bar: K = K0 + A p + B p^2.
        double k0 = Of(t, 19652.21, 148.4206, -2.327105, 1.360477e-2, -5.155288e-5)
            + (s * Of(root, Of(t, 54.6746, -0.603459, 1.09987e-2, -6.1670e-5), Of(t, 7.944e-2, 1.6483e-2, -5.3009e-4)));
        double a = Of(t, 3.239908, 1.43713e-3, 1.16092e-4, -5.77905e-7)
            + (s * Of(root, Of(t, 2.2838e-3, -1.0981e-5, -1.6078e-6), 1.91075e-4));
        double b = Of(t, 8.50935e-5, -6.12293e-6, 5.2787e-8) + (s * Of(t, -9.9348e-7, 2.0816e-8, 9.1697e-10));
        return surface / (1 - (p / Of(p, k0, a, b)));
    }

    private static double PotentialTemperatureAt68(double s, double t, double p, double reference)
    {
        // The numbers are those of Gill's form of the scheme: 1 - sqrt(1/2), 2 - sqrt(2), -2 + 3 sqrt(1/2) and their mates with +.
        double h = reference - p;
        double step = h * LapseRate(s, t, p);
        double theta = t + (0.5 * step);
        double q = step;

        step = h * LapseRate(s, theta, p + (0.5 * h));
        theta += 0.29289322 * (step - q);
        q = (0.58578644 * step) + (0.121320344 * q);

        step = h * LapseRate(s, theta, p + (0.5 * h));
        theta += 1.707106781 * (step - q);
        q = (3.414213562 * step) - (4.121320344 * q);

        step = h * LapseRate(s, theta, reference);
        return theta + ((step - (2 * q)) / 6);
    }

    /// <summary>Adiabatic lapse rate, degC/dbar; temperature IPTS-68.</summary>
    private static double LapseRate(double s, double t, double p)
    {
        double fresher = s - 35;
        double p0 = Of(t, 3.5803e-5, 8.5258e-6, -6.836e-8, 6.6228e-10) + (fresher * Of(t, 1.8932e-6, -4.2393e-8));
        double p1 = Of(t, 1.8741e-8, -6.7795e-10, 8.733e-12, -5.4481e-14) + (fresher * Of(t, -1.1351e-10, 2.7759e-12));
        double p2 = Of(t, -4.6206e-13, 1.8676e-14, -2.1687e-16);
        return Of(p, p0, p1, p2);
    }
}
