using System.Globalization;

namespace WaterMix.Web.State.Results;

/// <summary>A bar of a small histogram, as text for the drawing; the drawing is <see cref="Width"/> wide and <see cref="Height"/> high.</summary>
/// <param name="X">Its left edge.</param>
/// <param name="Y">Its upper edge.</param>
/// <param name="High">Its height.</param>
public sealed record HistogramBar(string X, string Y, string High)
{
    /// <summary>Width of the drawing.</summary>
    public const int Width = ResidualSummary.Bins * Step;

    /// <summary>Height of the drawing.</summary>
    public const int Height = 22;

    /// <summary>Width of a bar with the gap after it.</summary>
    public const int Step = 5;

    /// <summary>The bars of a summary; steps without a residual have none, every other one can be seen.</summary>
    /// <param name="summary">The summary.</param>
    public static IReadOnlyList<HistogramBar> Of(ResidualSummary summary)
    {
        ArgumentNullException.ThrowIfNull(summary);
        int most = Math.Max(1, summary.Counts.Max());
        return
        [
            .. summary.Counts.Index().Where(bin => bin.Item > 0).Select(bin =>
            {
                double high = Math.Max(1, (double)Height * bin.Item / most);
                return new HistogramBar(Text(bin.Index * Step), Text(Height - high), Text(high));
            }),
        ];
    }

    /// <summary>The histogram in words.</summary>
    /// <param name="summary">The summary.</param>
    /// <param name="unit">The tracer's unit as people write it.</param>
    public static string Words(ResidualSummary summary, string unit)
    {
        ArgumentNullException.ThrowIfNull(summary);
        int decimals = ResultColumn.DecimalsFor([summary.Half]);
        string end = PlainText.Number(summary.Half, decimals);
        return $"Residuals from −{end} to {end}{(unit.Length > 0 ? " " + unit : "")}, {PlainText.Count(summary.Count, "sample")}";
    }

    private static string Text(double value) => value.ToString("0.##", CultureInfo.InvariantCulture);
}
