namespace WaterMix.Core.Seawater;

/// <summary>Density of seawater and what follows from it, by the 75-term polynomial of TEOS-10, <c>Roquet2015</c>.</summary>
/// <remarks>
/// Every function takes Absolute Salinity (g/kg, 0 to 42), Conservative Temperature (degC, -2 to 40) and sea pressure
/// (dbar, 0 to 10,000), and gives NaN where one of them is NaN. The polynomial was fitted over the range met in the ocean.
/// </remarks>
public static class Density
{
    /// <summary>In-situ density, kg/m3.</summary>
    /// <param name="absoluteSalinity">Absolute Salinity, g/kg.</param>
    /// <param name="conservativeTemperature">Conservative Temperature, degC.</param>
    /// <param name="pressureDbar">Sea pressure, dbar.</param>
    public static double FromConservative(double absoluteSalinity, double conservativeTemperature, double pressureDbar) =>
        1 / SpecificVolume(absoluteSalinity, conservativeTemperature, pressureDbar);

    /// <summary>Specific volume, m3/kg.</summary>
    /// <param name="absoluteSalinity">Absolute Salinity, g/kg.</param>
    /// <param name="conservativeTemperature">Conservative Temperature, degC.</param>
    /// <param name="pressureDbar">Sea pressure, dbar.</param>
    public static double SpecificVolume(double absoluteSalinity, double conservativeTemperature, double pressureDbar) =>
        SpecificVolumePolynomial.Value(
            SpecificVolumePolynomial.ScaledSalinity(absoluteSalinity),
            conservativeTemperature * Teos10.TemperatureScale,
            pressureDbar * Teos10.PressureScale);

    /// <summary>Potential density less 1,000, kg/m3: sigma0 at a reference of 0 dbar, sigma1 at 1,000, up to sigma4 at 4,000.</summary>
    /// <param name="absoluteSalinity">Absolute Salinity, g/kg.</param>
    /// <param name="conservativeTemperature">Conservative Temperature, degC; the parcel keeps it when it is moved.</param>
    /// <param name="referencePressureDbar">Reference pressure, dbar.</param>
    public static double PotentialAnomaly(double absoluteSalinity, double conservativeTemperature, double referencePressureDbar) =>
        FromConservative(absoluteSalinity, conservativeTemperature, referencePressureDbar) - 1000;

    /// <summary>Thermal expansion at constant S_A and p, 1/K: alpha = (dv/dCT) / v.</summary>
    /// <param name="absoluteSalinity">Absolute Salinity, g/kg.</param>
    /// <param name="conservativeTemperature">Conservative Temperature, degC.</param>
    /// <param name="pressureDbar">Sea pressure, dbar.</param>
    public static double ThermalExpansion(double absoluteSalinity, double conservativeTemperature, double pressureDbar)
    {
        double s = SpecificVolumePolynomial.ScaledSalinity(absoluteSalinity);
        double y = conservativeTemperature * Teos10.TemperatureScale;
        double z = pressureDbar * Teos10.PressureScale;
        return Teos10.TemperatureScale * SpecificVolumePolynomial.ByTemperature(s, y, z) / SpecificVolumePolynomial.Value(s, y, z);
    }

    /// <summary>Haline contraction at constant CT and p, kg/g: beta = -(dv/dS_A) / v.</summary>
    /// <param name="absoluteSalinity">Absolute Salinity, g/kg.</param>
    /// <param name="conservativeTemperature">Conservative Temperature, degC.</param>
    /// <param name="pressureDbar">Sea pressure, dbar.</param>
    public static double HalineContraction(double absoluteSalinity, double conservativeTemperature, double pressureDbar)
    {
        double s = SpecificVolumePolynomial.ScaledSalinity(absoluteSalinity);
        double y = conservativeTemperature * Teos10.TemperatureScale;
        double z = pressureDbar * Teos10.PressureScale;
        double bySalinity = SpecificVolumePolynomial.BySalinity(s, y, z) * (0.5 * Teos10.SalinityScale / s);
        return -bySalinity / SpecificVolumePolynomial.Value(s, y, z);
    }
}
