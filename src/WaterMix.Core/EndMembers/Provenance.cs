namespace WaterMix.Core.EndMembers;

/// <summary>Where an end-member's numbers come from.</summary>
/// <param name="Kind">How they came about.</param>
/// <param name="Note">Free text; null where the file has none.</param>
/// <param name="Citation">The source; null where the file has none.</param>
public sealed record Provenance(ProvenanceKind Kind, string? Note = null, string? Citation = null);
