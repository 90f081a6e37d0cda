using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Results;

/// <summary>The summary numbers of a layer as text.</summary>
/// <param name="Layer">The layer.</param>
/// <param name="Cells">Samples, answered, the mean fraction of each source, the largest mass residual, the median of chi2 / dof, the share with p below 0.05.</param>
public sealed record LayerLine(string Layer, IReadOnlyList<string> Cells)
{
    // Sums that are 1 to rounding are exact to people.
    private const double Rounding = 5e-13;

    /// <summary>The line of a summary.</summary>
    /// <param name="summary">The summary.</param>
    public static LayerLine Of(LayerSummary summary)
    {
        ArgumentNullException.ThrowIfNull(summary);
        return new LayerLine(
            summary.Layer,
            [
                PlainText.Count(summary.Samples),
                PlainText.Count(summary.Answered),
                .. summary.MeanFractions.Select(f => PlainText.Number(f, 3)),
                summary.LargestMassResidual < Rounding ? "0" : FigureText.Number(summary.LargestMassResidual, 2),
                PlainText.Number(summary.MedianReducedChi2, 2),
                FigureText.PerCent(summary.ShareImprobable),
            ]);
    }
}
