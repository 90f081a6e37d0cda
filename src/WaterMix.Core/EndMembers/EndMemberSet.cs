namespace WaterMix.Core.EndMembers;

/// <summary>A named, versioned collection of end-members: the thing a lab shares.</summary>
/// <param name="Name">The set's name.</param>
/// <param name="Version">The set's version, >= 1.</param>
/// <param name="EndMembers">The end-members, at least one, in the order that results keep.</param>
public sealed record EndMemberSet(string Name, int Version, IReadOnlyList<EndMember> EndMembers)
{
    /// <summary>What the set is for; null where the file has none.</summary>
    public string? Description { get; init; }

    /// <summary>Sources of the set as a whole; null where the file has none.</summary>
    public IReadOnlyList<string>? Citations { get; init; }

    /// <summary>The unit of each user-defined tracer, by its id.</summary>
    public IReadOnlyDictionary<string, string> Units { get; init; } = new Dictionary<string, string>();

    /// <summary>True where the other holds the same content; dictionaries in any order.</summary>
    /// <param name="other">Another one, or null.</param>
    public bool Equals(EndMemberSet? other) =>
        other is not null
        && Name == other.Name
        && Version == other.Version
        && Description == other.Description
        && Structural.Same(Citations, other.Citations)
        && Structural.Same(Units, other.Units)
        && Structural.Same(EndMembers, other.EndMembers);

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(Name, Version, Structural.Hash(EndMembers));
}
