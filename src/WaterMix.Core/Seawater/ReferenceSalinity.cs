namespace WaterMix.Core.Seawater;

/// <summary>
/// Salinity of water with the composition of the Standard Ocean: what Absolute Salinity would be without the regional anomaly.
/// It stands in for Absolute Salinity where the position is unknown; the two differ by up to about 0.03 g/kg in the open ocean.
/// </summary>
public static class ReferenceSalinity
{
    /// <summary>S_R = (35.16504 / 35) S_P, <c>IOC2010</c>, section 2.4.</summary>
    /// <param name="practicalSalinity">Practical Salinity (PSS-78), 2 to 42.</param>
    /// <returns>Reference salinity, g/kg. NaN in gives NaN out.</returns>
    public static double FromPractical(double practicalSalinity) => Teos10.GramsPerPracticalSalinity * practicalSalinity;
}
