using WaterMix.Core.Mixing;
using WaterMix.Formats.Json;

namespace WaterMix.Formats.MixingModels;

/// <summary>The shape of <c>fit</c>: generalised least squares or weighted rows, each with keys of its own.</summary>
internal static class FitReader
{
    private static readonly string[] CommonKeys = ["kind", "measurementSd", "factors"];
    private static readonly string[] LeastSquaresKeys = [.. CommonKeys, "endMemberSpread", "measurementCovariance"];
    private static readonly string[] WeightedRowsKeys = [.. CommonKeys, "standardise", "standardiseOver", "sdOver", "weights", "weightsAre"];

    public static Fit? Read(StrictJsonNode node)
    {
        bool? isWeighted = node.Child("kind")?.AsChoice((MixingModelWords.GeneralisedLeastSquares, false), (MixingModelWords.WeightedRows, true));
        string[] keys = isWeighted switch
        {
            false => LeastSquaresKeys,
            true => WeightedRowsKeys,
            _ => [.. LeastSquaresKeys, .. WeightedRowsKeys.Except(LeastSquaresKeys)],
        };
        if (node.AsObject(keys) is not { } fit)
        {
            return null;
        }

        fit.Required("kind");
        IReadOnlyDictionary<string, MeasurementError> errors = JsonValues.Map(fit.Optional("measurementSd"), ReadError);
        DerivedTracerFactors factors = ReadFactors(fit.Optional("factors"));
        return isWeighted switch
        {
            false => new GeneralisedLeastSquares
            {
                MeasurementSd = errors,
                Factors = factors,
                Spread = fit.Optional("endMemberSpread")?.AsChoice(MixingModelWords.Spreads) ?? EndMemberSpread.Iterated,
                MeasurementCovariance = JsonValues.Matrix(fit.Optional("measurementCovariance")),
            },
            true => new WeightedRows(JsonValues.Numbers(fit.Required("weights")))
            {
                MeasurementSd = errors,
                Factors = factors,
                Standardise = fit.Optional("standardise")?.AsChoice(MixingModelWords.Standardisations) ?? Standardisation.MeanAndSd,
                Over = fit.Optional("standardiseOver")?.AsChoice(MixingModelWords.Overs) ?? StandardiseOver.Layer,
                SdOver = fit.Optional("sdOver")?.AsChoice(MixingModelWords.Divisors) ?? SdDivisor.N,
                WeightsAre = fit.Optional("weightsAre")?.AsChoice(MixingModelWords.Meanings) ?? WeightMeaning.RowFactors,
            },
            _ => null,
        };
    }

    // A number, or { "absolute": number, "relative": number }.
    private static MeasurementError ReadError(StrictJsonNode node)
    {
        if (node.Kind != System.Text.Json.JsonValueKind.Object)
        {
            return new MeasurementError(node.AsNumber() ?? double.NaN);
        }

        StrictJsonObject error = node.AsObject("absolute", "relative")!;
        double? absolute = error.Required("absolute")?.AsNumber();
        return new MeasurementError(absolute ?? double.NaN, error.Optional("relative") is { } relative ? relative.AsNumber() ?? double.NaN : 0);
    }

    private static DerivedTracerFactors ReadFactors(StrictJsonNode? node)
    {
        var standard = new DerivedTracerFactors();
        if (node?.AsObject("no", "po", "n_star", "po4_star") is not { } factors)
        {
            return standard;
        }

        StrictJsonObject? no = factors.Optional("no")?.AsObject("oxygenPerNitrate");
        StrictJsonObject? po = factors.Optional("po")?.AsObject("oxygenPerPhosphate");
        StrictJsonObject? nStar = factors.Optional("n_star")?.AsObject("nitratePerPhosphate", "offset");
        StrictJsonObject? po4Star = factors.Optional("po4_star")?.AsObject("oxygenPerPhosphate", "offset");
        return new DerivedTracerFactors
        {
            NoOxygenPerNitrate = no?.Optional("oxygenPerNitrate")?.AsNumber() ?? standard.NoOxygenPerNitrate,
            PoOxygenPerPhosphate = po?.Optional("oxygenPerPhosphate")?.AsNumber() ?? standard.PoOxygenPerPhosphate,
            NStarNitratePerPhosphate = nStar?.Optional("nitratePerPhosphate")?.AsNumber() ?? standard.NStarNitratePerPhosphate,
            NStarOffset = nStar?.Optional("offset")?.AsNumber() ?? standard.NStarOffset,
            Po4StarOxygenPerPhosphate = po4Star?.Optional("oxygenPerPhosphate")?.AsNumber() ?? standard.Po4StarOxygenPerPhosphate,
            Po4StarOffset = po4Star?.Optional("offset")?.AsNumber() ?? standard.Po4StarOffset,
        };
    }
}
