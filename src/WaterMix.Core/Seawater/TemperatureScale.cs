namespace WaterMix.Core.Seawater;

/// <summary>The two practical temperature scales of hydrography.</summary>
public static class TemperatureScale
{
    /// <summary>T68 = 1.00024 T90, exact by convention over -2 to 40 degC, <c>Saunders1990</c>.</summary>
    private const double Ipts68PerIts90 = 1.00024;

    /// <summary>ITS-90 from IPTS-68 temperature, degC. NaN in gives NaN out.</summary>
    /// <param name="ipts68Temperature">Temperature, degC (IPTS-68), -2 to 40.</param>
    public static double FromIpts68(double ipts68Temperature) => ipts68Temperature / Ipts68PerIts90;

    /// <summary>IPTS-68 from ITS-90 temperature, degC. NaN in gives NaN out.</summary>
    /// <param name="its90Temperature">Temperature, degC (ITS-90), -2 to 40.</param>
    public static double ToIpts68(double its90Temperature) => its90Temperature * Ipts68PerIts90;
}
