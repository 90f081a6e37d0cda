using WaterMix.Core.EndMembers;

namespace WaterMix.Formats.EndMemberSets;

/// <summary>The words of the file format, for reader and writer alike.</summary>
internal static class EndMemberSetWords
{
    public static readonly (string Word, ProvenanceKind Value)[] Kinds =
    [
        ("manual", ProvenanceKind.Manual),
        ("samples", ProvenanceKind.Samples),
        ("literature", ProvenanceKind.Literature),
        ("remembered", ProvenanceKind.Remembered),
        ("proposal", ProvenanceKind.Proposal),
    ];
}
