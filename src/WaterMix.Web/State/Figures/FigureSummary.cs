namespace WaterMix.Web.State.Figures;

/// <summary>A line of the table that says in numbers what a figure shows.</summary>
/// <param name="What">Which values: the layer and the quantity.</param>
/// <param name="Unit">Their unit; may be empty.</param>
/// <param name="Present">Number of values.</param>
/// <param name="Missing">Number of points without one.</param>
/// <param name="Lowest">The lowest.</param>
/// <param name="Median">The middle one.</param>
/// <param name="Highest">The highest.</param>
public sealed record FigureSummary(string What, string Unit, string Present, string Missing, string Lowest, string Median, string Highest)
{
    /// <summary>The lines of a figure: for each layer of points its x, y and colour values, then its marks.</summary>
    /// <param name="x">The x axis.</param>
    /// <param name="y">The y axis.</param>
    /// <param name="layers">The layers.</param>
    public static IReadOnlyList<FigureSummary> Of(FigureAxis x, FigureAxis y, IReadOnlyList<FigureLayer> layers)
    {
        ArgumentNullException.ThrowIfNull(x);
        ArgumentNullException.ThrowIfNull(y);
        ArgumentNullException.ThrowIfNull(layers);
        return [.. layers.OfType<PointLayer>().SelectMany(layer => Lines(x, y, layer))];
    }

    /// <summary>The line of the values that colour points; none where the colour is no number.</summary>
    /// <param name="colour">The colour.</param>
    public static IEnumerable<FigureSummary> OfColour(PointColour colour) => colour switch
    {
        StrengthColour s => [Line($"fraction of {s.Title}", "", s.Fractions)],
        SequentialColour q => [Line(q.Title, q.Unit, q.Values)],
        DivergingColour d => [Line(d.Title, d.Unit, d.Values)],
        _ => [],
    };

    private static IEnumerable<FigureSummary> Lines(FigureAxis x, FigureAxis y, PointLayer layer)
    {
        string prefix = layer.Name.Length > 0 ? $"{layer.Name}: " : "";
        return [Line(prefix + x.Title, x.Unit, layer.X), Line(prefix + y.Title, y.Unit, layer.Y), .. OfColour(layer.Colour)];
    }

    private static FigureSummary Line(string what, string unit, double[] values)
    {
        double[] sorted = ScaleRange.Sorted(values);
        bool any = sorted.Length > 0;
        return new FigureSummary(
            FigureText.Sentence(what),
            unit,
            FigureText.Count(sorted.Length),
            FigureText.Count(values.Length - sorted.Length),
            FigureText.Number(any ? sorted[0] : double.NaN),
            FigureText.Number(any ? ScaleRange.Percentile(sorted, 0.5) : double.NaN),
            FigureText.Number(any ? sorted[^1] : double.NaN));
    }
}
