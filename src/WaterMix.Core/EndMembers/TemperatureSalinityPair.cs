namespace WaterMix.Core.EndMembers;

/// <summary>The temperature and the salinity that belong together.</summary>
public enum TemperatureSalinityPair
{
    /// <summary>Potential temperature and Practical Salinity.</summary>
    PotentialAndPractical,

    /// <summary>Conservative Temperature and Absolute Salinity (TEOS-10).</summary>
    ConservativeAndAbsolute,
}
