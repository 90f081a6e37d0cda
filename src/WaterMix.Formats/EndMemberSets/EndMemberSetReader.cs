using WaterMix.Core.EndMembers;
using WaterMix.Formats.Json;

namespace WaterMix.Formats.EndMemberSets;

/// <summary>The shape of an end-member set; what the numbers mean is checked in the core.</summary>
internal static class EndMemberSetReader
{
    private static readonly string[] SetKeys = ["schema", "name", "version", "description", "citations", "units", "endMembers"];
    private static readonly string[] EndMemberKeys = ["id", "name", "values", "sd", "meanSd", "correlations", "observations", "position", "provenance"];

    /// <summary>Reads as much as can be understood, so that the meaning of that can be checked too; faults are the document's findings.</summary>
    /// <param name="node">The set.</param>
    /// <param name="needsSchema">False for a set within a model, whose schema covers it.</param>
    public static EndMemberSet? Read(StrictJsonNode node, bool needsSchema)
    {
        if (node.Child("schema") is { } schema && !SchemaName.Check(schema, EndMemberSetFile.Schema))
        {
            return null;
        }

        if (node.AsObject(SetKeys) is not { } set)
        {
            return null;
        }

        if (needsSchema)
        {
            set.Required("schema");
        }

        string? name = set.Required("name")?.AsText();
        int? version = set.Required("version")?.AsInteger(1, int.MaxValue);
        IReadOnlyList<StrictJsonNode>? endMembers = set.Required("endMembers")?.AsList();
        return new EndMemberSet(name ?? "", version ?? 1, [.. (endMembers ?? []).Select(OfOne)])
        {
            Description = set.Optional("description")?.AsText(),
            Citations = set.Optional("citations")?.AsList()?.Select(c => c.AsText() ?? "").ToArray(),
            Units = JsonValues.Map(set.Optional("units"), unit => unit.AsText()),
        };
    }

    private static EndMember OfOne(StrictJsonNode node)
    {
        // An end-member that is no object still takes its place, so that the paths of later findings count the same items.
        if (node.AsObject(EndMemberKeys) is not { } item)
        {
            return new EndMember("", "", new Dictionary<string, double>(), new Provenance(ProvenanceKind.Manual));
        }

        string? id = item.Required("id")?.AsText();
        string? name = item.Required("name")?.AsText();
        IReadOnlyDictionary<string, double> values = JsonValues.Numbers(item.Required("values"));
        return new EndMember(id ?? "", name ?? "", values, ReadProvenance(item.Required("provenance")))
        {
            Sd = JsonValues.Numbers(item.Optional("sd")),
            MeanSd = JsonValues.Numbers(item.Optional("meanSd")),
            Correlations = JsonValues.Matrix(item.Optional("correlations")),
            Observations = item.Optional("observations")?.AsInteger(1, int.MaxValue),
            Position = ReadPosition(item.Optional("position")),
        };
    }

    private static Provenance ReadProvenance(StrictJsonNode? node)
    {
        StrictJsonObject? provenance = node?.AsObject("kind", "note", "citation");
        ProvenanceKind? kind = provenance?.Required("kind")?.AsChoice(EndMemberSetWords.Kinds);
        return new Provenance(kind ?? ProvenanceKind.Manual, provenance?.Optional("note")?.AsText(), provenance?.Optional("citation")?.AsText());
    }

    private static EndMemberPosition? ReadPosition(StrictJsonNode? node)
    {
        if (node?.AsObject("latitude", "longitude", "pressure") is not { } position)
        {
            return null;
        }

        double? latitude = position.Required("latitude")?.AsNumber();
        double? longitude = position.Required("longitude")?.AsNumber();
        double? pressure = position.Required("pressure")?.AsNumber();
        return new EndMemberPosition(latitude ?? 0, longitude ?? 0, pressure ?? 0);
    }
}
