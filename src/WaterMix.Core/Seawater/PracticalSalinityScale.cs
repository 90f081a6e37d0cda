using static WaterMix.Core.Seawater.Polynomial;

namespace WaterMix.Core.Seawater;

/// <summary>The Practical Salinity Scale 1978: salinity from conductivity.</summary>
public static class PracticalSalinityScale
{
    /// <summary>Practical Salinity from the ratio of conductivities C(S, t, p) / C(35, 15 degC, 0), <c>Unesco44</c>, algorithm 1.</summary>
    /// <param name="conductivityRatio">The ratio R, about 0.05 to 2.</param>
    /// <param name="inSituTemperature">In-situ temperature, degC (ITS-90), -2 to 35.</param>
    /// <param name="pressureDbar">Sea pressure, dbar, 0 to 10,000.</param>
    /// <returns>Practical Salinity, 2 to 42; NaN outside, where the scale is not defined. NaN in gives NaN out.</returns>
    public static double FromConductivityRatio(double conductivityRatio, double inSituTemperature, double pressureDbar)
    {
        double r = conductivityRatio;
        double t = TemperatureScale.ToIpts68(inSituTemperature);
        double p = pressureDbar;
        double byPressure = 1 + (p * Of(p, 2.070e-5, -6.370e-10, 3.989e-15) / (Of(t, 1.0, 3.426e-2, 4.464e-4) + ((4.215e-1 - (3.107e-3 * t)) * r)));
        double byTemperature = Of(t, 0.6766097, 2.00564e-2, 1.104259e-4, -6.9698e-7, 1.0031e-9);
        double root = Math.Sqrt(r / (byPressure * byTemperature));
        double s = Of(root, 0.0080, -0.1692, 25.3851, 14.0941, -7.0261, 2.7081)
            + ((t - 15) / (1 + (0.0162 * (t - 15))) * Of(root, 0.0005, -0.0056, -0.0066, -0.0375, 0.0636, -0.0144));
        return s is >= 2 and <= 42 ? s : double.NaN;
    }
}
