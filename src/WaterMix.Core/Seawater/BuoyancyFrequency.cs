namespace WaterMix.Core.Seawater;

/// <summary>How strongly a water column is stratified (TEOS-10).</summary>
public static class BuoyancyFrequency
{
    /// <summary>N^2 between neighbouring levels of one profile: N^2 = g^2 rho (beta dS_A - alpha dCT) / dP, at the mid pressures.</summary>
    /// <param name="absoluteSalinity">Absolute Salinity, g/kg; length n, one value per level.</param>
    /// <param name="conservativeTemperature">Conservative Temperature, degC; length n.</param>
    /// <param name="pressureDbar">Sea pressure, dbar; length n, in order down or up.</param>
    /// <param name="latitudeDeg">Latitude of the profile, degrees north, -90 to 90.</param>
    /// <param name="squared">Receives N^2, 1/s2; length n - 1. NaN where a neighbour is NaN or both share one pressure; negative where the column is unstable.</param>
    /// <param name="middlePressureDbar">Receives the pressures it belongs to, dbar; length n - 1.</param>
    /// <exception cref="ArgumentException">The lengths do not fit together.</exception>
    /// <remarks><c>IOC2010</c>, section 3.10; rho, alpha and beta at the means of the two levels, g the mean of the two.</remarks>
    public static void Squared(
        ReadOnlySpan<double> absoluteSalinity,
        ReadOnlySpan<double> conservativeTemperature,
        ReadOnlySpan<double> pressureDbar,
        double latitudeDeg,
        Span<double> squared,
        Span<double> middlePressureDbar)
    {
        int n = absoluteSalinity.Length;
        int pairs = Math.Max(n - 1, 0);
        if (conservativeTemperature.Length != n || pressureDbar.Length != n || squared.Length != pairs || middlePressureDbar.Length != pairs)
        {
            throw new ArgumentException(
                $"Salinity, temperature and pressure hold one value per level and the results one fewer, but their lengths are {n}, {conservativeTemperature.Length}, {pressureDbar.Length}, {squared.Length} and {middlePressureDbar.Length}.");
        }

        for (int i = 0; i < pairs; i++)
        {
            double p = 0.5 * (pressureDbar[i] + pressureDbar[i + 1]);
            double sa = 0.5 * (absoluteSalinity[i] + absoluteSalinity[i + 1]);
            double ct = 0.5 * (conservativeTemperature[i] + conservativeTemperature[i + 1]);
            double g = 0.5 * (Gravity.At(pressureDbar[i], latitudeDeg) + Gravity.At(pressureDbar[i + 1], latitudeDeg));
            double lighter = (Density.HalineContraction(sa, ct, p) * (absoluteSalinity[i + 1] - absoluteSalinity[i]))
                - (Density.ThermalExpansion(sa, ct, p) * (conservativeTemperature[i + 1] - conservativeTemperature[i]));
            double dp = Teos10.PascalPerDecibar * (pressureDbar[i + 1] - pressureDbar[i]);
            middlePressureDbar[i] = p;
            squared[i] = dp == 0 ? double.NaN : g * g * Density.FromConservative(sa, ct, p) * lighter / dp;
        }
    }
}
