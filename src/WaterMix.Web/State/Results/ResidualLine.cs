using System.Globalization;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Results;

/// <summary>The residuals of a tracer in a layer as text.</summary>
/// <param name="Key">Unique among the lines.</param>
/// <param name="Tracer">The tracer's name.</param>
/// <param name="Unit">Its unit as people write it.</param>
/// <param name="Layer">The layer.</param>
/// <param name="IsFirst">True for the tracer's first layer.</param>
/// <param name="Samples">Number of residuals.</param>
/// <param name="Mean">Their mean.</param>
/// <param name="Sd">Their standard deviation.</param>
/// <param name="Ends">How far the histogram reaches.</param>
/// <param name="Words">The histogram in words.</param>
/// <param name="Bars">The histogram.</param>
public sealed record ResidualLine(
    string Key, string Tracer, string Unit, string Layer, bool IsFirst, string Samples, string Mean, string Sd, string Ends, string Words, IReadOnlyList<HistogramBar> Bars)
{
    /// <summary>What the drawing of a histogram shows.</summary>
    public static string ViewBox { get; } = string.Create(CultureInfo.InvariantCulture, $"0 0 {HistogramBar.Width} {HistogramBar.Height}");

    /// <summary>Where zero stands in the drawing.</summary>
    public static string Middle { get; } = ((HistogramBar.Width - 1) / 2.0).ToString(CultureInfo.InvariantCulture);

    /// <summary>The lines of summaries. Every line of a tracer has the same decimals.</summary>
    /// <param name="summaries">Tracer by tracer.</param>
    public static IReadOnlyList<ResidualLine> Of(IReadOnlyList<ResidualSummary> summaries)
    {
        ArgumentNullException.ThrowIfNull(summaries);
        return
        [
            .. summaries.Select((summary, index) =>
            {
                int decimals = ResultColumn.DecimalsFor([.. summaries.Where(s => s.Tracer.Id == summary.Tracer.Id).Select(s => s.Sd)]);
                string unit = FigureText.Unit(summary.Tracer.Unit);
                return new ResidualLine(
                    $"{summary.Tracer.Id} {summary.Layer}",
                    FigureText.Sentence(summary.Tracer.Name),
                    unit,
                    summary.Layer,
                    index == 0 || summaries[index - 1].Tracer.Id != summary.Tracer.Id,
                    PlainText.Count(summary.Count),
                    FigureText.Fixed(summary.Mean, decimals),
                    FigureText.Fixed(summary.Sd, decimals),
                    $"± {FigureText.Number(summary.Half, 2)}",
                    HistogramBar.Words(summary, unit),
                    HistogramBar.Of(summary));
            }),
        ];
    }
}
