namespace WaterMix.Core.Mixing;

/// <summary>Which end-members a tracer's mean and sd are taken over.</summary>
public enum StandardiseOver
{
    /// <summary>Those permitted in the layer.</summary>
    Layer,

    /// <summary>All of the set.</summary>
    Set,
}
