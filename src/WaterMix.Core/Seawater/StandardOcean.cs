using static WaterMix.Core.Seawater.Polynomial;
using static WaterMix.Core.Seawater.SpecificVolumeCoefficients;

namespace WaterMix.Core.Seawater;

/// <summary>
/// The column of water (S_A = 35.16504 g/kg, CT = 0 degC) that heights are reckoned in: the 75-term polynomial at that salinity and
/// temperature, a polynomial of pressure alone.
/// </summary>
internal static class StandardOcean
{
    private static readonly double S = SpecificVolumePolynomial.ScaledSalinity(Teos10.StandardOceanSalinity);
    private static readonly double V0 = Of(S, V000, V100, V200, V300, V400, V500, V600);
    private static readonly double V1 = Of(S, V001, V101, V201, V301, V401, V501);
    private static readonly double V2 = Of(S, V002, V102, V202, V302, V402);
    private static readonly double V3 = Of(S, V003, V103, V203);
    private static readonly double V4 = Of(S, V004, V104);

    /// <summary>Specific volume, m3/kg.</summary>
    public static double SpecificVolume(double pressureDbar) =>
        Of(pressureDbar * Teos10.PressureScale, V0, V1, V2, V3, V4, V005, V006);

    /// <summary>Enthalpy relative to 0 dbar, J/kg: the integral of specific volume over pressure in pascal.</summary>
    public static double Enthalpy(double pressureDbar)
    {
        double z = pressureDbar * Teos10.PressureScale;
        double mean = Of(z, V0, V1 / 2, V2 / 3, V3 / 4, V4 / 5, V005 / 6, V006 / 7);
        return mean * z * (Teos10.PascalPerDecibar / Teos10.PressureScale);
    }
}
