namespace WaterMix.Core.Mixing;

/// <summary>How the spread within the sources enters the covariance of a sample.</summary>
public enum EndMemberSpread
{
    /// <summary>Not at all: S is the measurement covariance.</summary>
    None,

    /// <summary>(1/n^2) sum V_i over the layer's n permitted end-members: one matrix for all samples of a layer.</summary>
    Fixed,

    /// <summary>sum x_i^2 V_i with the sample's own fractions, iterated to a fixed point.</summary>
    Iterated,
}
