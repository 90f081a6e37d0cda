namespace WaterMix.Web.State.Figures;

/// <summary>A colour in both themes.</summary>
public static class FigureColour
{
    /// <summary>The sheet's colour in the dark theme, before which dark colours would vanish.</summary>
    private static readonly Rgb DarkSheet = Rgb.Parse("#1B2226");

    /// <summary>The least contrast of a mark to what is behind it, <c>Wcag22</c>, criterion 1.4.11.</summary>
    private const double LeastContrast = 3;

    /// <summary>The colour in the light and in the dark theme: a theme's variable follows the theme by itself; a colour too dark for the dark sheet is lightened.</summary>
    /// <param name="colour"><c>#rrggbb</c>, or the name of a theme variable such as <c>--ink</c>.</param>
    public static (string Light, string Dark) InThemes(string colour)
    {
        ArgumentNullException.ThrowIfNull(colour);
        if (colour.StartsWith("--", StringComparison.Ordinal))
        {
            return ($"var({colour})", $"var({colour})");
        }

        Rgb given = Rgb.Parse(colour);
        Rgb dark = given;
        for (int step = 1; dark.ContrastTo(DarkSheet) < LeastContrast; step++)
        {
            dark = given.Mixed(new Rgb(255, 255, 255), step / 50.0);
        }

        return (given.Hex, dark.Hex);
    }
}
