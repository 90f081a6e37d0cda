using static WaterMix.Core.Seawater.Polynomial;
using static WaterMix.Core.Seawater.SpecificVolumeCoefficients;

namespace WaterMix.Core.Seawater;

/// <summary>
/// The 75-term polynomial of specific volume and its two derivatives, <c>Roquet2015</c>. Each row of the code is one row of
/// coefficients: fixed powers of temperature and pressure, rising powers of salinity.
/// </summary>
/// <remarks>Arguments are scaled: s by <see cref="ScaledSalinity"/>, y = CT / 40, z = p / 10,000.</remarks>
internal static class SpecificVolumePolynomial
{
    /// <summary>s = sqrt((S_A + 24) / 40.188617); the offset keeps the root smooth down to fresh water.</summary>
    public static double ScaledSalinity(double absoluteSalinity) => Math.Sqrt((absoluteSalinity + 24) * Teos10.SalinityScale);

    /// <summary>v, m3/kg.</summary>
    public static double Value(double s, double y, double z)
    {
        double v0 = Of(
            y,
            Of(s, V000, V100, V200, V300, V400, V500, V600),
            Of(s, V010, V110, V210, V310, V410, V510),
            Of(s, V020, V120, V220, V320, V420),
            Of(s, V030, V130, V230, V330),
            Of(s, V040, V140, V240),
            Of(s, V050, V150),
            V060);
        double v1 = Of(
            y,
            Of(s, V001, V101, V201, V301, V401, V501),
            Of(s, V011, V111, V211, V311, V411),
            Of(s, V021, V121, V221, V321),
            Of(s, V031, V131, V231),
            Of(s, V041, V141),
            V051);
        double v2 = Of(
            y,
            Of(s, V002, V102, V202, V302, V402),
            Of(s, V012, V112, V212, V312),
            Of(s, V022, V122, V222),
            Of(s, V032, V132),
            V042);
        double v3 = Of(y, Of(s, V003, V103, V203), Of(s, V013, V113), V023);
        double v4 = Of(y, Of(s, V004, V104), V014);
        return Of(z, v0, v1, v2, v3, v4, V005, V006);
    }

    /// <summary>dv/dy, m3/kg.</summary>
    public static double ByTemperature(double s, double y, double z)
    {
        double v0 = Of(
            y,
            Of(s, V010, V110, V210, V310, V410, V510),
            2 * Of(s, V020, V120, V220, V320, V420),
            3 * Of(s, V030, V130, V230, V330),
            4 * Of(s, V040, V140, V240),
            5 * Of(s, V050, V150),
            6 * V060);
        double v1 = Of(
            y,
            Of(s, V011, V111, V211, V311, V411),
            2 * Of(s, V021, V121, V221, V321),
            3 * Of(s, V031, V131, V231),
            4 * Of(s, V041, V141),
            5 * V051);
        double v2 = Of(y, Of(s, V012, V112, V212, V312), 2 * Of(s, V022, V122, V222), 3 * Of(s, V032, V132), 4 * V042);
        double v3 = Of(y, Of(s, V013, V113), 2 * V023);
        return Of(z, v0, v1, v2, v3, V014);
    }

    /// <summary>dv/ds, m3/kg.</summary>
    public static double BySalinity(double s, double y, double z)
    {
        double v0 = Of(
            y,
            Of(s, V100, 2 * V200, 3 * V300, 4 * V400, 5 * V500, 6 * V600),
            Of(s, V110, 2 * V210, 3 * V310, 4 * V410, 5 * V510),
            Of(s, V120, 2 * V220, 3 * V320, 4 * V420),
            Of(s, V130, 2 * V230, 3 * V330),
            Of(s, V140, 2 * V240),
            V150);
        double v1 = Of(
            y,
            Of(s, V101, 2 * V201, 3 * V301, 4 * V401, 5 * V501),
            Of(s, V111, 2 * V211, 3 * V311, 4 * V411),
            Of(s, V121, 2 * V221, 3 * V321),
            Of(s, V131, 2 * V231),
            V141);
        double v2 = Of(
            y,
            Of(s, V102, 2 * V202, 3 * V302, 4 * V402),
            Of(s, V112, 2 * V212, 3 * V312),
            Of(s, V122, 2 * V222),
            V132);
        double v3 = Of(y, Of(s, V103, 2 * V203), V113);
        return Of(z, v0, v1, v2, v3, V104);
    }
}
