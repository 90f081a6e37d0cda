namespace WaterMix.Core.Mixing;

/// <summary>What is done to a tracer row before it is weighed.</summary>
public enum Standardisation
{
    /// <summary>(value - mean) / sd over the end-members' values; process columns are divided by the sd only.</summary>
    MeanAndSd,

    /// <summary>value / sd.</summary>
    Sd,

    /// <summary>Nothing.</summary>
    None,
}
