namespace WaterMix.Core.Mixing;

/// <summary>The divisor of the variance of n values.</summary>
public enum SdDivisor
{
    /// <summary>n: population.</summary>
    N,

    /// <summary>n - 1: sample.</summary>
    NMinus1,
}
