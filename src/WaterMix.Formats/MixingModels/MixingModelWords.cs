using WaterMix.Core.Mixing;
using WaterMix.Core.Samples;

namespace WaterMix.Formats.MixingModels;

/// <summary>The words of the file format, for reader and writer alike.</summary>
internal static class MixingModelWords
{
    public const string GeneralisedLeastSquares = "generalised-least-squares";
    public const string WeightedRows = "weighted-rows";
    public const string Exact = "exact";
    public const string Weighted = "weighted";

    public static readonly (string Word, EndMemberSpread Value)[] Spreads =
        [("none", EndMemberSpread.None), ("fixed", EndMemberSpread.Fixed), ("iterated", EndMemberSpread.Iterated)];

    public static readonly (string Word, Standardisation Value)[] Standardisations =
        [("mean-and-sd", Standardisation.MeanAndSd), ("sd", Standardisation.Sd), ("none", Standardisation.None)];

    public static readonly (string Word, StandardiseOver Value)[] Overs = [("layer", StandardiseOver.Layer), ("set", StandardiseOver.Set)];

    public static readonly (string Word, SdDivisor Value)[] Divisors = [("n", SdDivisor.N), ("n-1", SdDivisor.NMinus1)];

    public static readonly (string Word, WeightMeaning Value)[] Meanings =
        [("row-factors", WeightMeaning.RowFactors), ("squared", WeightMeaning.Squared)];

    public static readonly (string Word, ProcessSign Value)[] Signs =
        [("non-negative", ProcessSign.NonNegative), ("non-positive", ProcessSign.NonPositive), ("free", ProcessSign.Free)];

    public static readonly (string Word, DensityScale Value)[] Scales = [("teos10", DensityScale.Teos10), ("eos80", DensityScale.Eos80)];

    public static readonly (string Word, ValueOrigin Value)[] Origins = [("bottle", ValueOrigin.Bottle), ("ctd", ValueOrigin.Ctd)];
}
