using static WaterMix.Core.Seawater.Polynomial;

namespace WaterMix.Core.Seawater;

/// <summary>Oxygen that seawater holds in equilibrium with moist air at one atmosphere, umol/kg.</summary>
/// <remarks><c>GarciaGordon1992</c>, with the coefficients fitted to the data of Benson and Krause; in the fit temperature is IPTS-68.</remarks>
public static class OxygenSolubility
{
    /// <summary>ln C = A(T) + S B(T) + C0 S^2, T = ln((298.15 - t) / (273.15 + t)) with t in IPTS-68.</summary>
    /// <param name="practicalSalinity">Practical Salinity (PSS-78), 0 to 42.</param>
    /// <param name="potentialTemperature">Potential temperature referred to 0 dbar, degC (ITS-90), freezing to 40.</param>
    /// <returns>Solubility, umol/kg. NaN in gives NaN out.</returns>
    public static double FromPractical(double practicalSalinity, double potentialTemperature)
    {
        double s = practicalSalinity;
        double t = TemperatureScale.ToIpts68(potentialTemperature);
        double y = Elementary.Log((298.15 - t) / (273.15 + t));
        double a = Of(y, 5.80871, 3.20291, 4.17887, 5.10006, -9.86643e-2, 3.80369);
        double b = Of(y, -7.01577e-3, -7.70028e-3, -1.13864e-2, -9.51519e-3);
        return Elementary.Exp(Of(s, a, b, -2.75915e-7));
    }

    /// <summary>The same from TEOS-10 variables, by way of Practical Salinity and potential temperature.</summary>
    /// <param name="absoluteSalinity">Absolute Salinity, g/kg, 0 to 42.</param>
    /// <param name="conservativeTemperature">Conservative Temperature, degC, freezing to 40.</param>
    /// <param name="pressureDbar">Sea pressure, dbar; it only places the sample in the anomaly atlas.</param>
    /// <param name="longitudeDeg">Longitude, degrees east, -180 to 360.</param>
    /// <param name="latitudeDeg">Latitude, degrees north, -86 to 90.</param>
    /// <returns>Solubility, umol/kg. NaN where an input is NaN or the position is outside its range.</returns>
    public static double FromAbsolute(
        double absoluteSalinity, double conservativeTemperature, double pressureDbar, double longitudeDeg, double latitudeDeg) =>
        FromPractical(
            PracticalSalinity.FromAbsolute(absoluteSalinity, pressureDbar, longitudeDeg, latitudeDeg),
            PotentialTemperature.FromConservative(absoluteSalinity, conservativeTemperature));
}
