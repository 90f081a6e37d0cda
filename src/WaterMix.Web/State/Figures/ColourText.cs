namespace WaterMix.Web.State.Figures;

/// <summary>What a point's colour stands for, in words.</summary>
internal static class ColourText
{
    /// <summary>The value or category of a point, with its unit; empty where the colour says nothing.</summary>
    public static string Of(PointColour colour, int point) => colour switch
    {
        StrengthColour s => $"{s.Title} {Value(s.Fractions[point], "")}",
        SequentialColour q => $"{q.Title} {Value(q.Values[point], q.Unit)}",
        DivergingColour d => $"{d.Title} {Value(d.Values[point], d.Unit)}",
        CategoryColour c when c.Codes[point] >= 0 => $"{c.Title} {c.Categories[c.Codes[point]].Name}",
        CategoryColour c => $"{c.Title} missing",
        _ => "",
    };

    private static string Value(double value, string unit) => double.IsFinite(value) ? FigureText.WithUnit(value, unit) : "missing";
}
