using static WaterMix.Core.Seawater.GibbsCoefficients;
using static WaterMix.Core.Seawater.Polynomial;

namespace WaterMix.Core.Seawater;

/// <summary>
/// The derivatives of the TEOS-10 Gibbs function g(S_A, t, p) that temperatures need, <c>IOC2010</c>, appendices G and H.
/// Each row of the code is one printed row of coefficients: fixed powers of salinity and pressure, rising powers of temperature.
/// </summary>
/// <remarks>Arguments are scaled: x2 = S_A times <see cref="Teos10.SalinityScale"/>, x its root, y = t / 40, z = p / 10,000.</remarks>
internal static class GibbsFunction
{
    private const double Y0 = Teos10.Zero * Teos10.TemperatureScale;

    /// <summary>
    /// Specific entropy less the terms of salinity alone, J/(kg K): -dg/dt. Those terms are the same at every temperature and
    /// pressure, so they fall out wherever the entropies of one parcel are compared.
    /// </summary>
    public static double EntropyPart(double x2, double x, double y, double z) =>
        EntropyPartAtSurface(x2, x, y) - (Teos10.TemperatureScale * z * FirstByPressure(x2, x, y, z));

    /// <summary>The same at 0 dbar.</summary>
    public static double EntropyPartAtSurface(double x2, double x, double y)
    {
        double w = Of(y, 2 * W20, 3 * W30, 4 * W40, 5 * W50, 6 * W60, 7 * W70);
        double s2 = Of(y, 2 * S220, 3 * S230, 4 * S240, 5 * S250, 6 * S260);
        double s3 = Of(y, 2 * S320, 3 * S330, 4 * S340);
        double s4 = Of(y, 2 * S420, 3 * S430, 4 * S440, 5 * S450);
        return -Teos10.TemperatureScale * y * (w + (x2 * Of(x, s2, s3, s4)));
    }

    /// <summary>d2g/dt2, J/(kg K2).</summary>
    public static double SecondByTemperature(double x2, double x, double y, double z) =>
        SecondByTemperatureAtSurface(x2, x, y)
        + (Teos10.TemperatureScale * Teos10.TemperatureScale * z * SecondByPressure(x2, x, y, z));

    /// <summary>The same at 0 dbar.</summary>
    public static double SecondByTemperatureAtSurface(double x2, double x, double y)
    {
        double w = Of(y, 2 * W20, 6 * W30, 12 * W40, 20 * W50, 30 * W60, 42 * W70);
        double s2 = Of(y, 2 * S220, 6 * S230, 12 * S240, 20 * S250, 30 * S260);
        double s3 = Of(y, 2 * S320, 6 * S330, 12 * S340);
        double s4 = Of(y, 2 * S420, 6 * S430, 12 * S440, 20 * S450);
        return Teos10.TemperatureScale * Teos10.TemperatureScale * (w + (x2 * Of(x, s2, s3, s4)));
    }

    /// <summary>
    /// Potential enthalpy, J/kg: h = g - (T0 + t) dg/dt at 0 dbar, which is y^j (1 - j) g_j - (j + 1) Y0 g_j+1 row by row.
    /// The logarithm cancels: S100 = Y0 S110.
    /// </summary>
    public static double PotentialEnthalpy(double x2, double x, double y)
    {
        double w = Of(
            y,
            W00 - (Y0 * W10),
            -2 * Y0 * W20,
            -W20 - (3 * Y0 * W30),
            (-2 * W30) - (4 * Y0 * W40),
            (-3 * W40) - (5 * Y0 * W50),
            (-4 * W50) - (6 * Y0 * W60),
            (-5 * W60) - (7 * Y0 * W70),
            -6 * W70);
        double s2 = Of(
            y,
            S200 - (Y0 * S210),
            -2 * Y0 * S220,
            -S220 - (3 * Y0 * S230),
            (-2 * S230) - (4 * Y0 * S240),
            (-3 * S240) - (5 * Y0 * S250),
            (-4 * S250) - (6 * Y0 * S260),
            -5 * S260);
        double s3 = Of(
            y,
            S300 - (Y0 * S310),
            -2 * Y0 * S320,
            -S320 - (3 * Y0 * S330),
            (-2 * S330) - (4 * Y0 * S340),
            -3 * S340);
        double s4 = Of(
            y,
            S400 - (Y0 * S410),
            -2 * Y0 * S420,
            -S420 - (3 * Y0 * S430),
            (-2 * S430) - (4 * Y0 * S440),
            (-3 * S440) - (5 * Y0 * S450),
            -4 * S450);
        return w + (x2 * Of(x, s2, s3, s4, S500 - (Y0 * S510), S600 - (Y0 * S610), S700));
    }

    /// <summary>What pressure adds to dg/dy, divided by z.</summary>
    private static double FirstByPressure(double x2, double x, double y, double z)
    {
        double z1 = Of(y, W11, 2 * W21, 3 * W31, 4 * W41, 5 * W51, 6 * W61, 7 * W71)
            + (x2 * Of(x, Of(y, S211, 2 * S221, 3 * S231, 4 * S241), Of(y, S311, 2 * S321, 3 * S331, 4 * S341), S411));
        double z2 = Of(y, W12, 2 * W22, 3 * W32, 4 * W42, 5 * W52, 6 * W62)
            + (x2 * Of(x, Of(y, S212, 2 * S222, 3 * S232, 4 * S242), Of(y, S312, 2 * S322)));
        double z3 = Of(y, W13, 2 * W23, 3 * W33, 4 * W43, 5 * W53, 6 * W63)
            + (x2 * Of(x, Of(y, S213, 2 * S223, 3 * S233, 4 * S243), Of(y, S313, 2 * S323)));
        double z4 = Of(y, W14, 2 * W24, 3 * W34, 4 * W44, 5 * W54) + (x2 * Of(y, S214, 2 * S224, 3 * S234));
        double z5 = Of(y, W15, 2 * W25, 3 * W35) + (x2 * Of(y, S215, 2 * S225));
        return Of(z, z1, z2, z3, z4, z5);
    }

    /// <summary>What pressure adds to d2g/dy2, divided by z.</summary>
    private static double SecondByPressure(double x2, double x, double y, double z)
    {
        double z1 = Of(y, 2 * W21, 6 * W31, 12 * W41, 20 * W51, 30 * W61, 42 * W71)
            + (x2 * Of(x, Of(y, 2 * S221, 6 * S231, 12 * S241), Of(y, 2 * S321, 6 * S331, 12 * S341)));
        double z2 = Of(y, 2 * W22, 6 * W32, 12 * W42, 20 * W52, 30 * W62)
            + (x2 * Of(x, Of(y, 2 * S222, 6 * S232, 12 * S242), 2 * S322));
        double z3 = Of(y, 2 * W23, 6 * W33, 12 * W43, 20 * W53, 30 * W63)
            + (x2 * Of(x, Of(y, 2 * S223, 6 * S233, 12 * S243), 2 * S323));
        double z4 = Of(y, 2 * W24, 6 * W34, 12 * W44, 20 * W54) + (x2 * Of(y, 2 * S224, 6 * S234));
        double z5 = Of(y, 2 * W25, 6 * W35) + (x2 * 2 * S225);
        return Of(z, z1, z2, z3, z4, z5);
    }
}
