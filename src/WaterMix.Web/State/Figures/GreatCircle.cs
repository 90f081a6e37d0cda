namespace WaterMix.Web.State.Figures;

/// <summary>Distances on a sphere.</summary>
public static class GreatCircle
{
    /// <summary>The earth's radius, km, as the TEOS-10 library has it (<c>McDougallBarker2011</c>, function distance).</summary>
    private const double RadiusKm = 6371;

    /// <summary>Length of the great circle between two places.</summary>
    /// <param name="latitudeA">Degrees north, -90 to 90.</param>
    /// <param name="longitudeA">Degrees east.</param>
    /// <param name="latitudeB">Degrees north, -90 to 90.</param>
    /// <param name="longitudeB">Degrees east.</param>
    /// <returns>Kilometres; NaN where a place is missing.</returns>
    /// <remarks>The haversine formula, <c>Sinnott1984</c>, which keeps its digits for near places.</remarks>
    public static double Kilometres(double latitudeA, double longitudeA, double latitudeB, double longitudeB)
    {
        double phiA = double.DegreesToRadians(latitudeA);
        double phiB = double.DegreesToRadians(latitudeB);
        double halfPhi = Math.Sin((phiB - phiA) / 2);
        double halfLambda = Math.Sin(double.DegreesToRadians(longitudeB - longitudeA) / 2);
        double a = (halfPhi * halfPhi) + (Math.Cos(phiA) * Math.Cos(phiB) * halfLambda * halfLambda);
        return 2 * RadiusKm * Math.Asin(Math.Min(1, Math.Sqrt(a)));
    }
}
