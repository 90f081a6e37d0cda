using System.Text.Json.Nodes;
using WaterMix.Core.Mixing;
using WaterMix.Core.Samples;
using WaterMix.Formats.EndMemberSets;
using WaterMix.Formats.Json;

namespace WaterMix.Formats.MixingModels;

/// <summary>A mixing model as JSON; also what its hash is taken of. What equals its default is left out, but for the keys a model must have.</summary>
internal static class MixingModelWriter
{
    /// <param name="model">The model.</param>
    /// <param name="endMembersFile">The file to name in place of the set, or null to write the set inline.</param>
    public static JsonObject ToJson(MixingModel model, string? endMembersFile)
    {
        var json = new JsonObject
        {
            ["schema"] = MixingModelFile.Schema,
            ["name"] = model.Name,
            ["endMembers"] = endMembersFile is null ? EndMemberSetWriter.ToJson(model.EndMembers) : new JsonObject { ["file"] = endMembersFile },
            ["tracers"] = JsonValues.Array(model.Tracers),
            ["fit"] = OfFit(model.Fit),
            ["massConservation"] = model.Mass.Weight is { } weight
                ? new JsonObject { ["kind"] = MixingModelWords.Weighted, ["weight"] = weight }
                : new JsonObject { ["kind"] = MixingModelWords.Exact },
        };
        if (model.Processes.Count > 0)
        {
            json["processes"] = new JsonArray([.. model.Processes.Select(OfProcess)]);
        }

        if (model.Layers.Count > 0)
        {
            json["layers"] = new JsonArray([.. model.Layers.Select(OfLayer)]);
        }

        if (!model.AcceptFlags.SequenceEqual(AcceptedFlags.Default.WaterSample))
        {
            json["acceptFlags"] = JsonValues.Array(model.AcceptFlags.Select(flag => (double)flag));
        }

        if (!model.AcceptCtdFlags.SequenceEqual(AcceptedFlags.Default.Ctd))
        {
            json["acceptCtdFlags"] = JsonValues.Array(model.AcceptCtdFlags.Select(flag => (double)flag));
        }

        if (model.Prefer != ValueOrigin.Bottle)
        {
            json["samples"] = new JsonObject { ["prefer"] = JsonValues.Word(MixingModelWords.Origins, model.Prefer) };
        }

        return json;
    }

    private static JsonObject OfFit(Fit fit)
    {
        bool isWeighted = fit is WeightedRows;
        var json = new JsonObject { ["kind"] = isWeighted ? MixingModelWords.WeightedRows : MixingModelWords.GeneralisedLeastSquares };
        if (fit is WeightedRows { } rows)
        {
            AddUnless(json, "standardise", MixingModelWords.Standardisations, rows.Standardise, Standardisation.MeanAndSd);
            AddUnless(json, "standardiseOver", MixingModelWords.Overs, rows.Over, StandardiseOver.Layer);
            AddUnless(json, "sdOver", MixingModelWords.Divisors, rows.SdOver, SdDivisor.N);
            json["weights"] = JsonValues.Object(rows.Weights);
            AddUnless(json, "weightsAre", MixingModelWords.Meanings, rows.WeightsAre, WeightMeaning.RowFactors);
        }

        if (fit.MeasurementSd.Count > 0)
        {
            json["measurementSd"] = JsonValues.Object(fit.MeasurementSd, OfError);
        }

        if (fit is GeneralisedLeastSquares leastSquares)
        {
            if (leastSquares.MeasurementCovariance is not null)
            {
                json["measurementCovariance"] = JsonValues.Object(leastSquares.MeasurementCovariance);
            }

            AddUnless(json, "endMemberSpread", MixingModelWords.Spreads, leastSquares.Spread, EndMemberSpread.Iterated);
        }

        if (OfFactors(fit.Factors) is { Count: > 0 } factors)
        {
            json["factors"] = factors;
        }

        return json;
    }

    private static JsonNode OfError(MeasurementError error) => error.Relative == 0
        ? JsonValue.Create(error.Absolute)
        : new JsonObject { ["absolute"] = error.Absolute, ["relative"] = error.Relative };

    private static JsonObject OfFactors(DerivedTracerFactors factors)
    {
        var standard = new DerivedTracerFactors();
        var json = new JsonObject();
        if (factors.NoOxygenPerNitrate != standard.NoOxygenPerNitrate)
        {
            json["no"] = new JsonObject { ["oxygenPerNitrate"] = factors.NoOxygenPerNitrate };
        }

        if (factors.PoOxygenPerPhosphate != standard.PoOxygenPerPhosphate)
        {
            json["po"] = new JsonObject { ["oxygenPerPhosphate"] = factors.PoOxygenPerPhosphate };
        }

        if ((factors.NStarNitratePerPhosphate, factors.NStarOffset) != (standard.NStarNitratePerPhosphate, standard.NStarOffset))
        {
            json["n_star"] = new JsonObject { ["nitratePerPhosphate"] = factors.NStarNitratePerPhosphate, ["offset"] = factors.NStarOffset };
        }

        if ((factors.Po4StarOxygenPerPhosphate, factors.Po4StarOffset) != (standard.Po4StarOxygenPerPhosphate, standard.Po4StarOffset))
        {
            json["po4_star"] = new JsonObject { ["oxygenPerPhosphate"] = factors.Po4StarOxygenPerPhosphate, ["offset"] = factors.Po4StarOffset };
        }

        return json;
    }

    private static JsonObject OfProcess(Process process)
    {
        var json = new JsonObject { ["id"] = process.Id, ["per"] = process.Per, ["ratios"] = JsonValues.Object(process.Ratios) };
        AddUnless(json, "sign", MixingModelWords.Signs, process.Sign, ProcessSign.NonNegative);
        AddConditions(json, process.Where);
        return json;
    }

    private static JsonObject OfLayer(Layer layer)
    {
        var json = new JsonObject { ["id"] = layer.Id, ["endMembers"] = JsonValues.Array(layer.EndMembers) };
        AddConditions(json, layer.Where);
        return json;
    }

    private static void AddConditions(JsonObject json, IReadOnlyList<Condition> conditions)
    {
        if (conditions.Count > 0)
        {
            json["where"] = new JsonArray([.. conditions.Select(OfCondition)]);
        }
    }

    private static JsonObject OfCondition(Condition condition)
    {
        var json = new JsonObject { ["quantity"] = condition.Quantity };
        if (condition.AtLeast is not null)
        {
            json["atLeast"] = condition.AtLeast;
        }

        if (condition.LessThan is not null)
        {
            json["lessThan"] = condition.LessThan;
        }

        AddUnless(json, "scale", MixingModelWords.Scales, condition.Scale, DensityScale.Teos10);
        return json;
    }

    private static void AddUnless<T>(JsonObject json, string key, IEnumerable<(string Word, T Value)> words, T value, T standard)
        where T : struct
    {
        if (!value.Equals(standard))
        {
            json[key] = JsonValues.Word(words, value);
        }
    }
}
