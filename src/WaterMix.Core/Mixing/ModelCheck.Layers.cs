using WaterMix.Core.EndMembers;
using WaterMix.Core.Quantities;

namespace WaterMix.Core.Mixing;

public static partial class ModelCheck
{
    private static readonly Quantity[] Sigmas = [Quantity.Sigma0, Quantity.Sigma1, Quantity.Sigma2, Quantity.Sigma3, Quantity.Sigma4];

    private static void OfLayers(MixingModel model, CheckFindings findings)
    {
        var ids = new HashSet<string>(StringComparer.Ordinal);
        for (int i = 0; i < model.Layers.Count; i++)
        {
            Layer layer = model.Layers[i];
            string at = JsonPointer.Append("/layers", i);
            if (string.IsNullOrWhiteSpace(layer.Id))
            {
                findings.Error(JsonPointer.Append(at, "id"), "an id for the layer", $"\"{layer.Id}\"", "Name the layer; results show its id.");
            }
            else if (!ids.Add(layer.Id))
            {
                findings.Error(JsonPointer.Append(at, "id"), "each layer's id once", $"\"{layer.Id}\" a second time", "Give one of them another id.");
            }

            Sources(model, layer, JsonPointer.Append(at, "endMembers"), findings);
            Conditions(model, layer.Where, at, findings);
            if (layer.Where.Count == 0 && i < model.Layers.Count - 1)
            {
                findings.Warning(at, "conditions in every layer but the last", $"none in \"{layer.Id}\"", "It takes every sample, so the layers after it get none; add conditions or put it last.");
            }
        }

        foreach ((int i, Layer layer) in model.LayersOrAll.Index())
        {
            Twins(model, layer, findings);
            Unknowns(model, layer, model.Layers.Count > 0 ? JsonPointer.Append("/layers", i) : "/tracers", findings);
        }
    }

    private static void Sources(MixingModel model, Layer layer, string at, CheckFindings findings)
    {
        if (layer.EndMembers.Count == 0)
        {
            findings.Error(at, "at least one end-member", "none", "Name the sources that may be found in this layer.");
        }

        var known = model.EndMembers.EndMembers.Select(e => e.Id).ToHashSet(StringComparer.Ordinal);
        var seen = new HashSet<string>(StringComparer.Ordinal);
        for (int i = 0; i < layer.EndMembers.Count; i++)
        {
            string id = layer.EndMembers[i];
            if (!known.Contains(id))
            {
                findings.Error(JsonPointer.Append(at, i), "the id of an end-member of the set", $"\"{id}\"", $"{NearestName.Suggestion(id, known)}The set has {string.Join(", ", known)}.");
            }
            else if (!seen.Add(id))
            {
                findings.Error(JsonPointer.Append(at, i), "each end-member once", $"\"{id}\" a second time", "Take one out.");
            }
        }
    }

    private static void Unknowns(MixingModel model, Layer layer, string at, CheckFindings findings)
    {
        int tracers = RowsIn(model, layer);
        int sources = Permitted(model, layer).Count;
        Process[] acting = [.. model.Processes.Where(process => Acts(model, process))];
        int always = sources - 1 + acting.Count(process => process.Where.Count == 0);
        int most = sources - 1 + acting.Length;
        if (sources == 0 || !Rows(model).Any() || Math.Max(most, 1) <= tracers)
        {
            return;
        }

        string which = Math.Max(always, 1) > tracers ? "no sample" : "no sample where all processes act";
        findings.Warning(
            at,
            $"no more unknowns (end-members less one, plus processes) than tracers, of which there are {Text(tracers)}",
            $"{Text(most)} unknowns in layer \"{layer.Id}\"",
            $"With these, {which} can be solved; add tracers, or permit fewer end-members or processes.");
    }

    // A longitude range may wrap round, so that only what names one meridian twice, or one bound beyond the date line alone, says nothing.
    private static void Meridians(Condition condition, string at, CheckFindings findings)
    {
        if (condition.AtLeast is { } start && condition.LessThan is { } end)
        {
            if (end - start < 360 && (end - start) % 360 == 0)
            {
                findings.Error(at, "a range between two meridians", $"{Text(start)} and {Text(end)}, which are the same one", "No longitude is in such a range; correct the bounds, or take the condition out.");
            }
        }
        else if ((condition.AtLeast ?? condition.LessThan) is > 180)
        {
            findings.Error(at, "both bounds, or one of at most 180 degrees east", $"{Text((condition.AtLeast ?? condition.LessThan)!.Value)} alone", "Longitudes of samples count from -180 to 180; give the other bound.");
        }
    }

    private static void Conditions(MixingModel model, IReadOnlyList<Condition> conditions, string owner, CheckFindings findings)
    {
        for (int i = 0; i < conditions.Count; i++)
        {
            Condition condition = conditions[i];
            string at = JsonPointer.Append(JsonPointer.Append(owner, "where"), i);
            EndMemberSetCheck.IsKnown(condition.Quantity, model.EndMembers, JsonPointer.Append(at, "quantity"), findings);
            if (condition.AtLeast is null && condition.LessThan is null)
            {
                findings.Error(at, "\"atLeast\", \"lessThan\" or both", "neither", "Give a bound, or take the condition out.");
            }

            Bound(condition, condition.AtLeast, JsonPointer.Append(at, "atLeast"), findings);
            Bound(condition, condition.LessThan, JsonPointer.Append(at, "lessThan"), findings);
            bool isLongitude = condition.Quantity == Quantity.Longitude.Id;
            if (isLongitude)
            {
                Meridians(condition, at, findings);
            }
            else if (condition.AtLeast >= condition.LessThan)
            {
                findings.Error(
                    at,
                    "\"atLeast\" below \"lessThan\"",
                    $"{Text(condition.AtLeast.Value)} and {Text(condition.LessThan.Value)}",
                    "No value is in such a range; swap or correct the bounds (only longitude wraps round).");
            }

            if (condition.Scale == DensityScale.Eos80 && !Sigmas.Any(sigma => sigma.Id == condition.Quantity))
            {
                findings.Error(JsonPointer.Append(at, "scale"), "the scale eos80 on sigma0 to sigma4 only", $"it on {condition.Quantity}", "Take \"scale\" out.");
            }
        }
    }

    private static void Bound(Condition condition, double? bound, string at, CheckFindings findings)
    {
        if (bound is not { } value)
        {
            return;
        }

        if (!double.IsFinite(value))
        {
            findings.Error(at, "a finite number", Text(value), "Leave a bound out that does not matter.");
        }
        else if (condition.Quantity == Quantity.Longitude.Id && value is (< -180 or > 360))
        {
            findings.Error(at, "a longitude from -180 to 360 degrees east", Text(value), "Correct the bound.");
        }
    }
}
