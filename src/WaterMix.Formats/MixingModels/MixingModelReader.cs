using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;
using WaterMix.Core.Samples;
using WaterMix.Formats.Json;

namespace WaterMix.Formats.MixingModels;

/// <summary>The shape of a mixing model without its end-members; what it means is checked in the core.</summary>
internal static class MixingModelReader
{
    private static readonly string[] ModelKeys =
        ["schema", "name", "endMembers", "tracers", "fit", "massConservation", "processes", "layers", "acceptFlags", "acceptCtdFlags", "samples"];

    /// <summary>Reads as much as can be understood, so that the meaning of that can be checked too; faults are the document's findings.</summary>
    /// <param name="node">The model.</param>
    /// <param name="endMembers">Reads the value under <c>endMembers</c>: the set, and the file's name where it names a file.</param>
    public static MixingModel? Read(StrictJsonNode node, Func<StrictJsonNode, (EndMemberSet? Set, string? File)> endMembers)
    {
        if (node.Child("schema") is { } schema && !SchemaName.Check(schema, MixingModelFile.Schema))
        {
            return null;
        }

        if (node.AsObject(ModelKeys) is not { } model)
        {
            return null;
        }

        model.Required("schema");
        string? name = model.Required("name")?.AsText();
        (EndMemberSet? set, string? file) = model.Required("endMembers") is { } setNode ? endMembers(setNode) : default;
        IReadOnlyList<string> tracers = JsonValues.Texts(model.Required("tracers"));
        Fit? fit = model.Required("fit") is { } fitNode ? FitReader.Read(fitNode) : null;
        MassConservation mass = ReadMass(model.Required("massConservation"));
        Process[] processes = [.. (model.Optional("processes")?.AsList() ?? []).Select(ReadProcess)];
        Layer[] layers = [.. (model.Optional("layers")?.AsList() ?? []).Select(ReadLayer)];
        IReadOnlyList<int>? flags = ReadFlags(model.Optional("acceptFlags"));
        IReadOnlyList<int>? ctdFlags = ReadFlags(model.Optional("acceptCtdFlags"));
        ValueOrigin prefer = model.Optional("samples")?.AsObject("prefer")?.Optional("prefer")?.AsChoice(MixingModelWords.Origins) ?? ValueOrigin.Bottle;
        if (set is null || fit is null)
        {
            return null;
        }

        var read = new MixingModel(name ?? "", set, tracers, fit, mass) { EndMembersFile = file, Processes = processes, Layers = layers, Prefer = prefer };
        return read with { AcceptFlags = flags ?? read.AcceptFlags, AcceptCtdFlags = ctdFlags ?? read.AcceptCtdFlags };
    }

    private static MassConservation ReadMass(StrictJsonNode? node)
    {
        bool isExact = node?.Child("kind")?.IsText(MixingModelWords.Exact) == true;
        StrictJsonObject? mass = isExact ? node!.AsObject("kind") : node?.AsObject("kind", "weight");
        bool? weighted = mass?.Required("kind")?.AsChoice((MixingModelWords.Exact, false), (MixingModelWords.Weighted, true));
        return weighted == true ? new MassConservation(mass!.Required("weight")?.AsNumber() ?? double.NaN) : MassConservation.Exact;
    }

    private static Process ReadProcess(StrictJsonNode node)
    {
        StrictJsonObject? process = node.AsObject("id", "per", "ratios", "sign", "where");
        string? id = process?.Required("id")?.AsText();
        string? per = process?.Required("per")?.AsText();
        return new Process(id ?? "", per ?? "", JsonValues.Numbers(process?.Required("ratios")))
        {
            Sign = process?.Optional("sign")?.AsChoice(MixingModelWords.Signs) ?? ProcessSign.NonNegative,
            Where = ReadConditions(process?.Optional("where")),
        };
    }

    private static Layer ReadLayer(StrictJsonNode node)
    {
        StrictJsonObject? layer = node.AsObject("id", "endMembers", "where");
        string? id = layer?.Required("id")?.AsText();
        return new Layer(id ?? "", JsonValues.Texts(layer?.Required("endMembers")), ReadConditions(layer?.Optional("where")));
    }

    private static Condition[] ReadConditions(StrictJsonNode? node) => [.. (node?.AsList() ?? []).Select(ReadCondition)];

    private static Condition ReadCondition(StrictJsonNode node)
    {
        StrictJsonObject? condition = node.AsObject("quantity", "atLeast", "lessThan", "scale");
        string? quantity = condition?.Required("quantity")?.AsText();
        return new Condition(quantity ?? "", condition?.Optional("atLeast")?.AsNumber(), condition?.Optional("lessThan")?.AsNumber())
        {
            Scale = condition?.Optional("scale")?.AsChoice(MixingModelWords.Scales) ?? DensityScale.Teos10,
        };
    }

    private static int[]? ReadFlags(StrictJsonNode? node) => node?.AsList()?.Select(flag => flag.AsInteger(0, 9) ?? 0).ToArray();
}
