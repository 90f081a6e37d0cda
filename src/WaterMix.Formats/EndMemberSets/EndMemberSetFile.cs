using WaterMix.Core.EndMembers;
using WaterMix.Formats.Json;

namespace WaterMix.Formats.EndMemberSets;

/// <summary>
/// Reads and writes end-member sets (<c>*.endmembers.json</c>, schema <c>watermix/end-member-set/1</c>). Reading is strict: unknown keys,
/// wrong types and everything that <see cref="EndMemberSetCheck"/> knows are findings, all of them at once.
/// </summary>
public static class EndMemberSetFile
{
    /// <summary>The schema that is read and written.</summary>
    public const string Schema = "watermix/end-member-set/1";

    /// <summary>Reads a set.</summary>
    /// <param name="utf8">The file's bytes.</param>
    /// <param name="fileName">The file's name for findings.</param>
    /// <returns>The set, or null where a finding is an error.</returns>
    public static Reading<EndMemberSet> Read(ReadOnlySpan<byte> utf8, string fileName)
    {
        StrictJsonDocument document = StrictJsonDocument.Parse(utf8, fileName);
        EndMemberSet? set = document.Root is null ? null : EndMemberSetReader.Read(document.Root, needsSchema: true);
        if (set is not null)
        {
            document.AddMeaning(EndMemberSetCheck.Findings(set));
        }

        return document.Finish(set);
    }

    /// <summary>Reads a set from a stream, from its present position to its end.</summary>
    /// <param name="stream">The file's content; it stays open.</param>
    /// <param name="fileName">The file's name for findings.</param>
    /// <returns>The set, or null where a finding is an error.</returns>
    public static Reading<EndMemberSet> Read(Stream stream, string fileName)
    {
        ArgumentNullException.ThrowIfNull(stream);
        using var bytes = new MemoryStream();
        stream.CopyTo(bytes);
        return Read(bytes.ToArray(), fileName);
    }

    /// <summary>
    /// Writes a set: keys in the contract's order, tracers in the order of the quantities (further ones by name), numbers with the fewest
    /// digits that read back to the same double. What is absent in the set is absent in the file.
    /// </summary>
    /// <param name="set">The set.</param>
    /// <returns>The file's bytes: UTF-8, lines ended by LF.</returns>
    /// <exception cref="ArgumentException">A number is not finite.</exception>
    public static byte[] Write(EndMemberSet set) => PrettyJson.Write(EndMemberSetWriter.ToJson(set));
}
