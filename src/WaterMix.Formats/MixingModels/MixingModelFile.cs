using WaterMix.Core;
using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;
using WaterMix.Formats.EndMemberSets;
using WaterMix.Formats.Json;

namespace WaterMix.Formats.MixingModels;

/// <summary>
/// Reads and writes mixing models (<c>*.mixmodel.json</c>, schema <c>watermix/mixing-model/1</c>). Reading is strict: unknown keys, wrong
/// types and everything that <see cref="ModelCheck"/> knows are findings, all of them at once.
/// </summary>
/// <remarks>
/// <para>Beside the contract's keys, the factors of derived tracers are <c>fit.factors</c>, each part optional; these are the defaults:
/// <c>{ "no": { "oxygenPerNitrate": 10.625 }, "po": { "oxygenPerPhosphate": 170 }, "n_star": { "nitratePerPhosphate": 16, "offset": 2.9 },
/// "po4_star": { "oxygenPerPhosphate": 175, "offset": -1.95 } }</c>.</para>
/// <para>Defaults of weighted rows: standardise <c>mean-and-sd</c>, standardiseOver <c>layer</c>, sdOver <c>n</c>, weightsAre
/// <c>row-factors</c>. A condition's scale is <c>teos10</c> unless given. An empty list of layers is as good as none.</para>
/// </remarks>
public static class MixingModelFile
{
    /// <summary>The schema that is read and written.</summary>
    public const string Schema = "watermix/mixing-model/1";

    /// <summary>Reads a model from disk, and the end-member set it names, which stands relative to the model's folder.</summary>
    /// <param name="path">The model's path; it is the file's name in findings.</param>
    /// <returns>The model, or null where a finding is an error; a file that cannot be opened is a finding too.</returns>
    public static Reading<MixingModel> Read(string path)
    {
        ArgumentNullException.ThrowIfNull(path);
        string folder = Path.GetDirectoryName(path) ?? "";
        return JsonFile.Read(path, "the mixing model", (utf8, name) =>
            Read(utf8, name, set => (File.ReadAllBytes(Path.Combine(folder, set)), Path.Combine(folder, set))));
    }

    /// <summary>Reads a model.</summary>
    /// <param name="utf8">The model's bytes.</param>
    /// <param name="fileName">The model's name for findings.</param>
    /// <param name="openSet">
    /// Gives the bytes of the set that the model names, and its name for findings; an <see cref="IOException"/>,
    /// <see cref="UnauthorizedAccessException"/> or <see cref="ArgumentException"/> (not a possible name) from it becomes a finding.
    /// </param>
    /// <returns>The model, or null where a finding is an error. Findings in the set carry the set's name and paths in the set.</returns>
    public static Reading<MixingModel> Read(ReadOnlySpan<byte> utf8, string fileName, Func<string, (byte[] Utf8, string FileName)> openSet)
    {
        ArgumentNullException.ThrowIfNull(openSet);
        StrictJsonDocument document = StrictJsonDocument.Parse(utf8, fileName);
        StrictJsonDocument? setDocument = null;
        EndMemberSet? set = null;
        MixingModel? model = document.Root is null ? null : MixingModelReader.Read(document.Root, node =>
        {
            string? file = null;
            (set, file) = node.Child("file") is null ? (EndMemberSetReader.Read(node, needsSchema: false), null) : ReadNamed(node, openSet, out setDocument);
            return (set, file);
        });

        // Without a fit there is no model to check, but its set can be.
        IReadOnlyList<Finding> meaning = model is not null ? ModelCheck.Findings(model)
            : set is not null ? EndMemberSetCheck.Findings(set, ModelCheck.EndMembersPath)
            : [];
        if (setDocument is not null)
        {
            string inSet = ModelCheck.EndMembersPath;
            setDocument.AddMeaning(meaning.Where(f => JsonPointer.IsWithin(f.Path!, inSet)).Select(f => f with { Path = f.Path![inSet.Length..] }));
            meaning = [.. meaning.Where(f => !JsonPointer.IsWithin(f.Path!, inSet))];
        }

        document.AddMeaning(meaning);
        Reading<MixingModel> reading = document.Finish(model);
        Reading<EndMemberSet>? ofSet = setDocument?.Finish(set);
        return ofSet is null ? reading
            : new Reading<MixingModel>(ofSet.Value is null ? null : reading.Value, [.. reading.Findings, .. ofSet.Findings]);
    }

    /// <summary>Reads a model that may still be incomplete, its set inline: the shape must be right, the meaning is not looked at.</summary>
    /// <param name="utf8">The model's bytes, as <see cref="Write"/> lays them out.</param>
    /// <param name="fileName">The model's name for findings.</param>
    /// <returns>The model, or null where a finding is an error. <see cref="ModelCheck"/> says what the model lacks.</returns>
    public static Reading<MixingModel> ReadDraft(ReadOnlySpan<byte> utf8, string fileName)
    {
        StrictJsonDocument document = StrictJsonDocument.Parse(utf8, fileName);
        MixingModel? draft = document.Root is null ? null
            : MixingModelReader.Read(document.Root, node => (EndMemberSetReader.Read(node, needsSchema: false), null));
        return document.Finish(draft);
    }

    /// <summary>
    /// Writes a model: keys in the contract's order, what equals its default left out. The set is written as the model holds it: inline,
    /// or as the name of its file (<see cref="MixingModel.EndMembersFile"/>), which is not written here.
    /// </summary>
    /// <param name="model">The model.</param>
    /// <returns>The file's bytes: UTF-8, lines ended by LF.</returns>
    /// <exception cref="ArgumentException">A number is not finite.</exception>
    public static byte[] Write(MixingModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        return PrettyJson.Write(MixingModelWriter.ToJson(model, model.EndMembersFile));
    }

    private static (EndMemberSet? Set, string? File) ReadNamed(StrictJsonNode node, Func<string, (byte[] Utf8, string FileName)> openSet, out StrictJsonDocument? document)
    {
        document = null;
        if (node.AsObject("file")?.Required("file") is not { } fileNode || fileNode.AsText() is not { } file)
        {
            return default;
        }

        if (file.Length == 0 || Path.IsPathRooted(file))
        {
            fileNode.Report("a file's name relative to the model's folder", $"\"{file}\"", "Put the set beside the model and give its name.");
            return default;
        }

        (byte[] Utf8, string FileName) opened;
        try
        {
            opened = openSet(file);
        }
        catch (Exception fault) when (JsonFile.IsUnreadable(fault))
        {
            Finding finding = JsonFile.Unreadable(fault, "the end-member set");
            fileNode.Report(finding.Expected, finding.Found, finding.Remedy);
            return default;
        }

        document = StrictJsonDocument.Parse(opened.Utf8, opened.FileName);
        return (document.Root is null ? null : EndMemberSetReader.Read(document.Root, needsSchema: true), file);
    }
}
