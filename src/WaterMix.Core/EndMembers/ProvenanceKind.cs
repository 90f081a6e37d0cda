namespace WaterMix.Core.EndMembers;

/// <summary>How an end-member's numbers came about.</summary>
public enum ProvenanceKind
{
    /// <summary>Typed in.</summary>
    Manual,

    /// <summary>Computed from samples.</summary>
    Samples,

    /// <summary>From a publication.</summary>
    Literature,

    /// <summary>From memory, not checked against a source.</summary>
    Remembered,

    /// <summary>Proposed by a method, not yet judged by a person.</summary>
    Proposal,
}
