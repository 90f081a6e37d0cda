namespace WaterMix.Core.Mixing;

/// <summary>The equation of state that a density threshold was published in.</summary>
public enum DensityScale
{
    /// <summary>TEOS-10.</summary>
    Teos10,

    /// <summary>EOS-80.</summary>
    Eos80,
}
