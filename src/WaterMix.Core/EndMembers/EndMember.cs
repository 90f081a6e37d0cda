namespace WaterMix.Core.EndMembers;

/// <summary>A source water type: the value and the spread of each tracer, and where the numbers come from.</summary>
/// <param name="Id">Matches <c>[A-Za-z0-9][A-Za-z0-9._-]{0,31}</c>; unique without case within a set and the processes of a model.</param>
/// <param name="Name">The name for people; may be empty.</param>
/// <param name="Values">Value by quantity id, in the quantity's canonical unit.</param>
/// <param name="Provenance">Where the numbers come from.</param>
public sealed record EndMember(string Id, string Name, IReadOnlyDictionary<string, double> Values, Provenance Provenance)
{
    /// <summary>Spread within the source (one standard deviation, >= 0) by quantity id: each parcel differs by it.</summary>
    public IReadOnlyDictionary<string, double> Sd { get; init; } = new Dictionary<string, double>();

    /// <summary>Standard error of the source's mean by quantity id, where it is given; shared by all samples.</summary>
    public IReadOnlyDictionary<string, double> MeanSd { get; init; } = new Dictionary<string, double>();

    /// <summary>Correlations of the spread between tracers, or null where none are given.</summary>
    public TracerMatrix? Correlations { get; init; }

    /// <summary>Number of independent determinations (cruises or years, never bottles), >= 1, or null where it is not given (then it counts as 1).</summary>
    public int? Observations { get; init; }

    /// <summary>The typical position, or null.</summary>
    public EndMemberPosition? Position { get; init; }

    /// <summary>True where the other holds the same content; dictionaries in any order.</summary>
    /// <param name="other">Another one, or null.</param>
    public bool Equals(EndMember? other) =>
        other is not null
        && Id == other.Id
        && Name == other.Name
        && Structural.Same(Values, other.Values)
        && Structural.Same(Sd, other.Sd)
        && Structural.Same(MeanSd, other.MeanSd)
        && Correlations == other.Correlations
        && Observations == other.Observations
        && Position == other.Position
        && Provenance == other.Provenance;

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(Id, Structural.Hash(Values), Structural.Hash(Sd));
}
