namespace WaterMix.Core.Mixing;

/// <summary>Whether a weight multiplies the row or the square of the row.</summary>
public enum WeightMeaning
{
    /// <summary>The weight multiplies the row.</summary>
    RowFactors,

    /// <summary>The weight multiplies the square of the row: the row factor is its square root.</summary>
    Squared,
}
