namespace WaterMix.Core.Seawater;

/// <summary>Temperature as a thermometer at depth reads it (ITS-90).</summary>
public static class InSituTemperature
{
    /// <summary>From Conservative Temperature, by way of potential temperature at 0 dbar, <c>IOC2010</c>, section 3.3.</summary>
    /// <param name="absoluteSalinity">Absolute Salinity, g/kg, 0 to 42.</param>
    /// <param name="conservativeTemperature">Conservative Temperature, degC, -2 to 40.</param>
    /// <param name="pressureDbar">Sea pressure, dbar, 0 to 10,000.</param>
    /// <returns>In-situ temperature, degC (ITS-90). NaN where an input is NaN or the salinity is negative.</returns>
    public static double FromConservative(double absoluteSalinity, double conservativeTemperature, double pressureDbar)
    {
        double pt0 = PotentialTemperature.FromConservative(absoluteSalinity, conservativeTemperature);
        return PotentialTemperature.FromInSitu(absoluteSalinity, pt0, 0, pressureDbar);
    }
}
