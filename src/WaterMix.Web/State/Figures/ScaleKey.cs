using System.Globalization;

namespace WaterMix.Web.State.Figures;

/// <summary>A colour scale of a legend, as the numbers of a small drawing.</summary>
/// <param name="Title">What the values are, with their unit.</param>
/// <param name="Steps">Rectangles side by side.</param>
/// <param name="Labels">Values under the scale.</param>
/// <param name="Spoken">The scale in words.</param>
public sealed record ScaleKey(string Title, IReadOnlyList<ScaleStep> Steps, IReadOnlyList<ScaleLabel> Labels, string Spoken)
{
    private const int Width = 240;

    /// <summary>Width of the drawing, px.</summary>
    public string WidthText => Width.ToString(CultureInfo.InvariantCulture);

    /// <summary>Width of the scale's edge, px.</summary>
    public string EdgeText => (Width - 1).ToString(CultureInfo.InvariantCulture);

    /// <summary>The scale of a colour; null where the colour is no value on a scale.</summary>
    /// <param name="colour">The colour.</param>
    public static ScaleKey? Of(PointColour colour)
    {
        switch (colour)
        {
            case StrengthColour s:
                (string light, string dark) = FigureColour.InThemes(s.Colour);
                return new ScaleKey(
                    $"Fraction of {s.Title}",
                    [.. Enumerable.Range(0, 5).Select(i => Step(i, 5, light, dark, i / 4.0))],
                    [.. Enumerable.Range(0, 5).Select(i => new ScaleLabel(Text((i + 0.5) * Width / 5), "middle", $"{FigureText.Fixed(25 * i, 0)} %"))],
                    "From the sheet's colour at 0 % to the source's full colour at 100 %");
            case SequentialColour q:
                FigureRange range = ScaleRange.Of(q);
                return Continuous(q.Title, q.Unit, range.From, range.To, t => (ColourScale.Cividis(t), ColourScale.Cividis(t)), "dark blue", "yellow");
            case DivergingColour d:
                double half = ScaleRange.Of(d);
                return Continuous(d.Title, d.Unit, -half, half, t => (ColourScale.Diverging(t, false), ColourScale.Diverging(t, true)), "blue", "red");
            default:
                return null;
        }
    }

    private static ScaleKey Continuous(string title, string unit, double from, double to, Func<double, (Rgb Light, Rgb Dark)> at, string first, string last)
    {
        const int Count = 40;
        string low = FigureText.Number(from, 3);
        string middle = FigureText.Number((from + to) / 2, 3);
        string high = FigureText.Number(to, 3);
        return new ScaleKey(
            unit.Length > 0 ? $"{FigureText.Sentence(title)} ({unit})" : FigureText.Sentence(title),
            [.. Enumerable.Range(0, Count).Select(i => Step(i, Count, at(i / (Count - 1.0)).Light.Hex, at(i / (Count - 1.0)).Dark.Hex, 1))],
            [new ScaleLabel("0", "start", low), new ScaleLabel(Text(Width / 2.0), "middle", middle), new ScaleLabel(Text(Width), "end", high)],
            $"From {first} at {low} to {last} at {high} {unit}".TrimEnd());
    }

    private static ScaleStep Step(int index, int count, string light, string dark, double opacity) =>
        new(Text((double)index * Width / count), Text((double)Width / count), light, dark, Text(opacity));

    private static string Text(double number) => number.ToString("0.##", CultureInfo.InvariantCulture);
}

/// <summary>A rectangle of a scale.</summary>
/// <param name="X">Its left edge, px.</param>
/// <param name="Width">Its width, px.</param>
/// <param name="Light">Its colour in the light theme.</param>
/// <param name="Dark">Its colour in the dark theme.</param>
/// <param name="Opacity">How strong it is over the sheet, 0 to 1.</param>
public sealed record ScaleStep(string X, string Width, string Light, string Dark, string Opacity);

/// <summary>A value under a scale.</summary>
/// <param name="X">Where it stands, px.</param>
/// <param name="Anchor">start, middle or end.</param>
/// <param name="Text">The value.</param>
public sealed record ScaleLabel(string X, string Anchor, string Text);
