using WaterMix.Core.EndMembers;

namespace WaterMix.Core.Mixing;

/// <summary>A domain with the end-members permitted in it.</summary>
/// <param name="Id">The layer's id, unique in the model.</param>
/// <param name="EndMembers">Ids of the permitted end-members.</param>
/// <param name="Where">All conditions hold for a sample of this layer. Empty: every sample.</param>
public sealed record Layer(string Id, IReadOnlyList<string> EndMembers, IReadOnlyList<Condition> Where)
{
    /// <summary>True where the other holds the same content.</summary>
    /// <param name="other">Another one, or null.</param>
    public bool Equals(Layer? other) =>
        other is not null
        && Id == other.Id
        && Structural.Same(EndMembers, other.EndMembers)
        && Structural.Same(Where, other.Where);

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(Id, Structural.Hash(EndMembers));
}
