using WaterMix.Core.EndMembers;

namespace WaterMix.Core.Mixing;

/// <summary>A biogeochemical column of the fit; its amount is solved with the fractions, <c>KarstensenTomczak1998</c>.</summary>
/// <param name="Id">As an end-member's id, unique together with those.</param>
/// <param name="Per">The quantity id that the amount counts; its own ratio is 1. Need not be a tracer of the fit.</param>
/// <param name="Ratios">Change seen in the sample per 1 of <paramref name="Per"/>, by quantity id.</param>
public sealed record Process(string Id, string Per, IReadOnlyDictionary<string, double> Ratios)
{
    /// <summary>The sign that the amount may have.</summary>
    public ProcessSign Sign { get; init; } = ProcessSign.NonNegative;

    /// <summary>Where the process acts: all conditions hold. Empty: everywhere.</summary>
    public IReadOnlyList<Condition> Where { get; init; } = [];

    /// <summary>True where the other holds the same content; dictionaries in any order.</summary>
    /// <param name="other">Another one, or null.</param>
    public bool Equals(Process? other) =>
        other is not null
        && Id == other.Id
        && Per == other.Per
        && Structural.Same(Ratios, other.Ratios)
        && Sign == other.Sign
        && Structural.Same(Where, other.Where);

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(Id, Per, Structural.Hash(Ratios), Sign);
}
