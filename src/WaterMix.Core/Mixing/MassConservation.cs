namespace WaterMix.Core.Mixing;

/// <summary>How mass is conserved.</summary>
/// <param name="Weight">Null: exactly, sum(x) = 1. Otherwise the factor of a row weight * (sum(x) - 1), > 0.</param>
public sealed record MassConservation(double? Weight)
{
    /// <summary>sum(x) = 1.</summary>
    public static readonly MassConservation Exact = new((double?)null);

    /// <summary>True where sum(x) = 1 holds exactly.</summary>
    public bool IsExact => Weight is null;
}
