using WaterMix.Core.Mixing;

namespace WaterMix.Web.State.Mixing;

/// <summary>A way to weigh residuals.</summary>
/// <param name="Words">What it does.</param>
/// <param name="Is">True where a fit does it.</param>
/// <param name="Edit">Makes a model do it.</param>
public sealed record FitChoice(string Words, Func<Fit, bool> Is, Func<MixingModel, MixingModel> Edit)
{
    /// <summary>The ways, the usual one first.</summary>
    public static IReadOnlyList<FitChoice> All { get; } =
    [
        LeastSquares("Errors of measurement and the spread within the sources, in the proportions of each sample (least squares, iterated)", EndMemberSpread.Iterated),
        LeastSquares("Errors of measurement and the spread within the sources, alike for all samples of a layer (least squares, fixed)", EndMemberSpread.Fixed),
        LeastSquares("Errors of measurement alone (least squares, sources exact)", EndMemberSpread.None),
        new("Weights that you give (weighted rows, as in the older papers)", fit => fit is WeightedRows, ModelEdits.WithWeightedRows),
    ];

    private static FitChoice LeastSquares(string words, EndMemberSpread spread) =>
        new(words, fit => fit is GeneralisedLeastSquares least && least.Spread == spread, model => ModelEdits.WithLeastSquares(model, spread));
}
