namespace WaterMix.Core.EndMembers;

/// <summary>What <see cref="TemperatureSalinityConversion"/> made of a set.</summary>
/// <param name="Set">The converted set, or null where a finding is an error.</param>
/// <param name="Findings">What stood in the way, one finding for each end-member; paths into the set.</param>
public sealed record ConvertedSet(EndMemberSet? Set, IReadOnlyList<Finding> Findings);
