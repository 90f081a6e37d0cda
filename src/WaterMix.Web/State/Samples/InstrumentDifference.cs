using WaterMix.Formats.Matching;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Samples;

/// <summary>A quantity as the bottle has it less as the CTD has it, against pressure.</summary>
/// <param name="Quantity">The quantity.</param>
/// <param name="Count">Pairs in which both values are usable.</param>
/// <param name="Mean">Mean difference, in the quantity's unit; NaN without pairs.</param>
/// <param name="Sd">Standard deviation of the differences (n - 1); NaN below two pairs.</param>
/// <param name="X">The axis of the difference.</param>
/// <param name="Y">The axis of pressure.</param>
/// <param name="Layers">Zero, the mean, and the pairs.</param>
/// <param name="Words">Mean and scatter in words.</param>
public sealed record InstrumentDifference(
    string Quantity, int Count, double Mean, double Sd, FigureAxis X, FigureAxis Y, IReadOnlyList<FigureLayer> Layers, string Words)
{
    private const double DeepDbar = 1000;

    /// <summary>The quantity that is compared: the one asked for if both instruments have it, or the first that both have; null without any.</summary>
    /// <param name="samples">The samples of the study.</param>
    /// <param name="asked">The quantity asked for; empty for none.</param>
    public static string? QuantityOf(StudySamples samples, string asked)
    {
        ArgumentNullException.ThrowIfNull(samples);
        string[] both = [.. samples.WithBothInstruments];
        return both.Contains(asked) ? asked : both.Contains("practical_salinity") ? "practical_salinity" : both.FirstOrDefault();
    }

    /// <summary>The differences of some rows.</summary>
    /// <param name="samples">The samples of the study.</param>
    /// <param name="quantity">A quantity that both instruments have.</param>
    /// <param name="rows">The rows on screen.</param>
    public static InstrumentDifference Of(StudySamples samples, string quantity, int[] rows)
    {
        ArgumentNullException.ThrowIfNull(samples);
        ArgumentNullException.ThrowIfNull(rows);
        double[] bottle = samples.Columns.Values(quantity + Origins.BottleSuffix);
        double[] ctd = samples.Columns.Values(quantity + Origins.CtdSuffix);
        double[] pressure = samples.Columns.Values("pressure");
        int[] pairs = [.. rows.Where(row => double.IsFinite(bottle[row]) && double.IsFinite(ctd[row]))];
        double[] differences = [.. pairs.Select(row => bottle[row] - ctd[row])];
        double[] down = [.. pairs.Select(row => pressure[row])];
        (double mean, double sd) = MeanAndSd(differences);
        (double Low, double High) half = MiddleHalf(differences);
        FigureRange? shown = Shown(differences, half);
        FigureAxis axis = samples.AxisOf(quantity);
        var layers = new List<FigureLayer>
        {
            new PointLayer("pairs", "Bottle less CTD", differences, down, new OneColour("--ink")) { Rows = pairs, Size = pairs.Length > 20_000 ? 4 : 5 },
        };
        if (FigureRange.Of(down) is { } range)
        {
            layers.Insert(0, new LineLayer("zero", "", [0, 0], [range.From, range.To], "--rule"));
            layers.Add(new LineLayer("mean", "Mean", [mean, mean], [range.From, range.To], "--pencil") { Width = 2 });
        }

        return new InstrumentDifference(
            quantity, pairs.Length, mean, sd,
            new FigureAxis($"{axis.Title}, bottle less CTD", axis.Unit) { Range = shown }, FigureAxis.For(Core.Quantities.Quantity.Pressure), layers,
            InWords(axis, differences, down, half, shown));
    }

    private static string InWords(FigureAxis axis, double[] differences, double[] down, (double Low, double High) half, FigureRange? shown)
    {
        if (differences.Length < 2)
        {
            return $"Fewer than two samples on screen have a usable {axis.Title} from both instruments.";
        }

        (double mean, double sd) = MeanAndSd(differences);
        (double low, double high) = half;
        int decimals = DecimalsOf(high > low ? high - low : sd);
        string words = $"In {PlainText.Count(differences.Length)} pairs {Signed(mean, decimals, axis.Unit)} on average; the standard deviation is {WithUnit(sd, decimals, axis.Unit)}; half of the differences lie between {FigureText.Fixed(low, decimals)} and {WithUnit(high, decimals, axis.Unit)}.";
        double[] deep = [.. differences.Where((_, i) => down[i] >= DeepDbar)];
        if (deep.Length >= 2 && deep.Length < differences.Length)
        {
            (double deepMean, double deepSd) = MeanAndSd(deep);
            words += $" Below {PlainText.Number(DeepDbar, 0)} dbar ({PlainText.Count(deep.Length)} pairs) {Signed(deepMean, decimals, axis.Unit)}, standard deviation {WithUnit(deepSd, decimals, axis.Unit)}.";
        }

        int far = differences.Count(d => Math.Abs(d - mean) > 3 * sd);
        int beyond = differences.Count(d => d < shown?.From || d > shown?.To);
        words += far == 0 ? "" : $" {PlainText.Count(far, "pair lies", "pairs lie")} more than three standard deviations from the mean: look at their flags.";
        return beyond == 0 ? words : $"{words} {PlainText.Count(beyond, "pair stands", "pairs stand")} outside the plot; Show all brings {(beyond == 1 ? "it" : "them")} in.";
    }

    // The middle half and five times its width on both sides: one stray pair must not hide the scatter of the others.
    private static FigureRange? Shown(double[] differences, (double Low, double High) half)
    {
        if (FigureRange.Of(differences) is not { } all)
        {
            return null;
        }

        double margin = 5 * (half.High - half.Low);
        var near = new FigureRange(Math.Max(all.From, half.Low - margin), Math.Min(all.To, half.High + margin));
        return (near.Width > 0 ? near : all).WithMargin(0.05);
    }

    private static (double Low, double High) MiddleHalf(double[] values)
    {
        double[] sorted = [.. values];
        Array.Sort(sorted);
        return sorted.Length == 0 ? (double.NaN, double.NaN) : (sorted[(sorted.Length - 1) / 4], sorted[3 * (sorted.Length - 1) / 4]);
    }

    private static (double Mean, double Sd) MeanAndSd(double[] values)
    {
        double mean = values.Length == 0 ? double.NaN : values.Sum() / values.Length;
        return (mean, values.Length < 2 ? double.NaN : Math.Sqrt(values.Sum(v => (v - mean) * (v - mean)) / (values.Length - 1)));
    }

    // Two digits of the standard deviation say all that the mean can.
    private static int DecimalsOf(double sd) => sd > 0 ? Math.Clamp(1 - (int)Math.Floor(Math.Log10(sd)), 0, 6) : 4;

    private static string WithUnit(double value, int decimals, string unit) => unit.Length == 0 ? FigureText.Fixed(value, decimals) : $"{FigureText.Fixed(value, decimals)} {unit}";

    private static string Signed(double value, int decimals, string unit) =>
        Math.Round(value, decimals) == 0 ? "bottle and CTD read the same to the digits shown" : $"the bottle reads {WithUnit(Math.Abs(value), decimals, unit)} {(value > 0 ? "more" : "less")} than the CTD";
}
