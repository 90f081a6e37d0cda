namespace WaterMix.Web.State.Figures;

/// <summary>What a section runs along.</summary>
public enum SectionAlong
{
    /// <summary>Kilometres along the cruise's track.</summary>
    Distance,

    /// <summary>Degrees north.</summary>
    Latitude,

    /// <summary>Degrees east.</summary>
    Longitude,
}

/// <summary>What a section runs down.</summary>
public enum SectionAgainst
{
    /// <summary>Sea pressure, dbar.</summary>
    Pressure,

    /// <summary>Depth, m.</summary>
    Depth,

    /// <summary>Potential density anomaly sigma-0, kg/m3.</summary>
    Sigma0,

    /// <summary>Potential density anomaly sigma-2, kg/m3.</summary>
    Sigma2,
}
