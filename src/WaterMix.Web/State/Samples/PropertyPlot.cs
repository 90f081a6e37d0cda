using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Samples;

/// <summary>Two quantities of the samples against one another.</summary>
/// <param name="XId">The quantity along x.</param>
/// <param name="YId">The quantity along y.</param>
/// <param name="X">The x axis.</param>
/// <param name="Y">The y axis.</param>
/// <param name="Samples">The samples that have both.</param>
/// <param name="Caption">What is shown, in a sentence.</param>
public sealed record PropertyPlot(string XId, string YId, FigureAxis X, FigureAxis Y, PointLayer Samples, string Caption)
{
    /// <summary>The plot of some rows.</summary>
    /// <param name="samples">The samples of the study.</param>
    /// <param name="x">The quantity along x.</param>
    /// <param name="y">The quantity along y.</param>
    /// <param name="colour">The quantity that colours the points; empty: the cruise.</param>
    /// <param name="rows">The rows on screen.</param>
    public static PropertyPlot Of(StudySamples samples, string x, string y, string colour, int[] rows)
    {
        ArgumentNullException.ThrowIfNull(samples);
        ArgumentNullException.ThrowIfNull(rows);
        FigureColumns columns = samples.Columns;
        double[] xs = columns.Values(x);
        double[] ys = columns.Values(y);
        int[] shown = [.. rows.Where(row => double.IsFinite(xs[row]) && double.IsFinite(ys[row]))];
        var layer = new PointLayer("samples", "Samples", [.. shown.Select(row => xs[row])], [.. shown.Select(row => ys[row])], ColourOf(samples, colour, shown))
        {
            Rows = shown,
            Size = shown.Length > 20_000 ? 4 : 6,
        };
        string missing = rows.Length == shown.Length ? "" : $"; {PlainText.Count(rows.Length - shown.Length)} lack a usable value of one";
        return new PropertyPlot(x, y, Upwards(samples.AxisOf(x)), samples.AxisOf(y), layer, $"{PlainText.Count(shown.Length, "sample")} with both values{missing}.");
    }

    // Only along y does a reversed axis read as downwards.
    private static FigureAxis Upwards(FigureAxis axis) => axis with { Reversed = false };

    private static PointColour ColourOf(StudySamples samples, string colour, int[] shown)
    {
        if (colour.Length == 0)
        {
            int[] codes = [.. shown.Select(row => samples.Columns.Locate(row).Cruise)];
            return new CategoryColour("Cruise", codes, [.. samples.Cruises.Select((c, i) => new FigureCategory(c.Name, SourceColours.At(i), (PointShape)(i % Enum.GetValues<PointShape>().Length)))]);
        }

        FigureAxis axis = samples.AxisOf(colour);
        double[] values = samples.Columns.Values(colour);
        return TracerColour.Of(axis, [.. shown.Select(row => values[row])]);
    }
}
