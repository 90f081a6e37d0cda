namespace WaterMix.Web.State.Figures;

/// <summary>The ranges that a figure shows at first: those of its axes, else what its points, lines and marks reach, with a margin.</summary>
internal static class FigureRanges
{
    private const double Margin = 0.04;

    /// <summary>The range along x.</summary>
    public static FigureRange X(FigureAxis axis, IReadOnlyList<FigureLayer> layers) => Of(axis, layers.SelectMany(ValuesX));

    /// <summary>The range along y.</summary>
    public static FigureRange Y(FigureAxis axis, IReadOnlyList<FigureLayer> layers) => Of(axis, layers.SelectMany(ValuesY));

    private static FigureRange Of(FigureAxis axis, IEnumerable<double> values) =>
        axis.Range ?? FigureRange.Of(values)?.WithMargin(Margin) ?? new FigureRange(0, 1);

    private static IEnumerable<double> ValuesX(FigureLayer layer) => layer switch
    {
        PointLayer p => p.X,
        LineLayer l => l.X,
        MarkLayer m => m.Marks.Select(k => k.X),
        _ => [],
    };

    private static IEnumerable<double> ValuesY(FigureLayer layer) => layer switch
    {
        PointLayer p => p.Y,
        LineLayer l => l.Y,
        MarkLayer m => m.Marks.Select(k => k.Y),
        _ => [],
    };
}
