using System.Text.Json.Nodes;
using WaterMix.Core.EndMembers;
using WaterMix.Formats.Json;

namespace WaterMix.Formats.EndMemberSets;

/// <summary>An end-member set as JSON; also what its hash is taken of.</summary>
internal static class EndMemberSetWriter
{
    public static JsonObject ToJson(EndMemberSet set)
    {
        var json = new JsonObject { ["schema"] = EndMemberSetFile.Schema, ["name"] = set.Name, ["version"] = set.Version };
        if (set.Description is not null)
        {
            json["description"] = set.Description;
        }

        if (set.Citations is not null)
        {
            json["citations"] = JsonValues.Array(set.Citations);
        }

        if (set.Units.Count > 0)
        {
            json["units"] = JsonValues.Object(set.Units, unit => JsonValue.Create(unit));
        }

        json["endMembers"] = new JsonArray([.. set.EndMembers.Select(OfOne)]);
        return json;
    }

    private static JsonObject OfOne(EndMember endMember)
    {
        var json = new JsonObject
        {
            ["id"] = endMember.Id,
            ["name"] = endMember.Name,
            ["values"] = JsonValues.Object(endMember.Values),
        };
        if (endMember.Sd.Count > 0)
        {
            json["sd"] = JsonValues.Object(endMember.Sd);
        }

        if (endMember.MeanSd.Count > 0)
        {
            json["meanSd"] = JsonValues.Object(endMember.MeanSd);
        }

        if (endMember.Correlations is not null)
        {
            json["correlations"] = JsonValues.Object(endMember.Correlations);
        }

        if (endMember.Observations is not null)
        {
            json["observations"] = endMember.Observations;
        }

        if (endMember.Position is { } position)
        {
            json["position"] = new JsonObject { ["latitude"] = position.Latitude, ["longitude"] = position.Longitude, ["pressure"] = position.Pressure };
        }

        json["provenance"] = OfProvenance(endMember.Provenance);
        return json;
    }

    private static JsonObject OfProvenance(Provenance provenance)
    {
        var json = new JsonObject { ["kind"] = JsonValues.Word(EndMemberSetWords.Kinds, provenance.Kind) };
        if (provenance.Note is not null)
        {
            json["note"] = provenance.Note;
        }

        if (provenance.Citation is not null)
        {
            json["citation"] = provenance.Citation;
        }

        return json;
    }
}
