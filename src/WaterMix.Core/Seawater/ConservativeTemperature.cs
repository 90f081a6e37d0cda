namespace WaterMix.Core.Seawater;

/// <summary>Conservative Temperature (TEOS-10): potential enthalpy over a fixed heat capacity, the temperature that mixes linearly.</summary>
public static class ConservativeTemperature
{
    /// <summary>From in-situ temperature, by way of potential temperature at 0 dbar.</summary>
    /// <param name="absoluteSalinity">Absolute Salinity, g/kg, 0 to 42.</param>
    /// <param name="inSituTemperature">In-situ temperature, degC (ITS-90), -2 to 40.</param>
    /// <param name="pressureDbar">Sea pressure, dbar, 0 to 10,000.</param>
    /// <returns>Conservative Temperature, degC. NaN where an input is NaN or the salinity is negative.</returns>
    public static double FromInSitu(double absoluteSalinity, double inSituTemperature, double pressureDbar) =>
        FromPotential(absoluteSalinity, PotentialTemperature.FromInSitu(absoluteSalinity, inSituTemperature, pressureDbar));

    /// <summary>CT = h(S_A, pt0, 0 dbar) / 3991.86795711963 J/(kg K), <c>IOC2010</c>, section 3.3.</summary>
    /// <param name="absoluteSalinity">Absolute Salinity, g/kg, 0 to 42.</param>
    /// <param name="potentialTemperature">Potential temperature referred to 0 dbar, degC (ITS-90), -2 to 40.</param>
    /// <returns>Conservative Temperature, degC. NaN where an input is NaN or the salinity is negative.</returns>
    public static double FromPotential(double absoluteSalinity, double potentialTemperature)
    {
        double x2 = absoluteSalinity * Teos10.SalinityScale;
        double y = potentialTemperature * Teos10.TemperatureScale;
        return GibbsFunction.PotentialEnthalpy(x2, Math.Sqrt(x2), y) / Teos10.HeatCapacity;
    }
}
