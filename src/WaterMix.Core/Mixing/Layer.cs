namespace WaterMix.Core.Mixing;

/// <summary>A domain with the end-members permitted in it.</summary>
/// <param name="Id">The layer's id, unique in the model.</param>
/// <param name="EndMembers">Ids of the permitted end-members.</param>
/// <param name="Where">All conditions hold for a sample of this layer. Empty: every sample.</param>
public sealed record Layer(string Id, IReadOnlyList<string> EndMembers, IReadOnlyList<Condition> Where);
