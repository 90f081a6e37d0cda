namespace WaterMix.SampleData;

/// <summary>One level of a CTD cast.</summary>
/// <param name="Pressure">Sea pressure, dbar.</param>
/// <param name="Temperature">In-situ temperature, degC (ITS-90).</param>
/// <param name="Salinity">Practical Salinity.</param>
/// <param name="Oxygen">Oxygen, umol/kg.</param>
/// <param name="IsInterpolated">True where the values were lost and filled in from the neighbours (flag 6).</param>
public readonly record struct CtdLevel(double Pressure, double Temperature, double Salinity, double Oxygen, bool IsInterpolated);
