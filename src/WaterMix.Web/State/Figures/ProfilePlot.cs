using WaterMix.Core.Quantities;

namespace WaterMix.Web.State.Figures;

/// <summary>One plot of a profile: the series of one axis against pressure.</summary>
/// <param name="X">What the series hold.</param>
/// <param name="Y">Pressure, downwards, the same range in every plot.</param>
/// <param name="Layers">Lines first, then points.</param>
public sealed record ProfilePlot(FigureAxis X, FigureAxis Y, IReadOnlyList<FigureLayer> Layers)
{
    /// <summary>The plots of series, one for each axis, in the order in which the axes first come.</summary>
    /// <param name="pressure">Pressure of every row, dbar; NaN is missing.</param>
    /// <param name="series">The series.</param>
    public static IReadOnlyList<ProfilePlot> Of(double[] pressure, IReadOnlyList<ProfileSeries> series)
    {
        ArgumentNullException.ThrowIfNull(pressure);
        ArgumentNullException.ThrowIfNull(series);
        FigureRange reach = FigureRange.Of(series.SelectMany(s => s.Rows).Select(row => pressure[row]).Append(0)) ?? new FigureRange(0, 1);
        FigureAxis y = FigureAxis.For(Quantity.Pressure) with { Range = new FigureRange(reach.From - (0.01 * reach.Width), reach.To + (0.04 * reach.Width)) };
        return [.. series.GroupBy(s => s.Axis).Select(plot => new ProfilePlot(plot.Key, y, LayersOf(pressure, [.. plot])))];
    }

    private static IReadOnlyList<FigureLayer> LayersOf(double[] pressure, IReadOnlyList<ProfileSeries> series)
    {
        IEnumerable<FigureLayer> lines = series.Where(s => s.Joined).Select(s => Line(pressure, s));
        IEnumerable<FigureLayer> points = series.Select(s =>
            new PointLayer(s.Id, s.Name, s.Values, Pressures(pressure, s), new OneColour(s.Colour)) { Rows = s.Rows, Shape = s.Shape });
        return [.. lines, .. points];
    }

    private static LineLayer Line(double[] pressure, ProfileSeries series)
    {
        int[] order = [.. Enumerable.Range(0, series.Rows.Length)
            .Where(i => double.IsFinite(series.Values[i]) && double.IsFinite(pressure[series.Rows[i]]))
            .OrderBy(i => pressure[series.Rows[i]])];
        return new LineLayer(series.Id + " line", "", [.. order.Select(i => series.Values[i])], [.. order.Select(i => pressure[series.Rows[i]])], series.Colour) { Width = 1 };
    }

    private static double[] Pressures(double[] pressure, ProfileSeries series) => [.. series.Rows.Select(row => pressure[row])];
}
