namespace WaterMix.Core.Seawater;

/// <summary>The constants that TEOS-10 defines, <c>IOC2010</c>, appendix D.</summary>
internal static class Teos10
{
    /// <summary>Salinity of the Standard Ocean, g/kg.</summary>
    public const double StandardOceanSalinity = 35.16504;

    /// <summary>Reference salinity per unit of Practical Salinity, g/kg.</summary>
    public const double GramsPerPracticalSalinity = StandardOceanSalinity / 35;

    /// <summary>The heat capacity that defines Conservative Temperature, J/(kg K).</summary>
    public const double HeatCapacity = 3991.86795711963;

    /// <summary>0 degC in kelvin.</summary>
    public const double Zero = 273.15;

    /// <summary>Pascal in a decibar.</summary>
    public const double PascalPerDecibar = 1e4;

    /// <summary>1 / (40 times the reference salinity per unit of Practical Salinity), kg/g: scales S_A to the order of 1.</summary>
    public const double SalinityScale = 1 / (40 * GramsPerPracticalSalinity);

    /// <summary>Scales temperature: 1 / 40 degC.</summary>
    public const double TemperatureScale = 1.0 / 40;

    /// <summary>Scales pressure: 1 / 10,000 dbar.</summary>
    public const double PressureScale = 1e-4;
}
