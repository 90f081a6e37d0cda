namespace WaterMix.Web.State.Figures;

/// <summary>
/// How the points of a layer take their colour. Colours are <c>#rrggbb</c>, or the name of one of the theme's variables such as
/// <c>--ink</c>, which follows a change of theme.
/// </summary>
public abstract record PointColour
{
    private protected PointColour()
    {
    }
}

/// <summary>Every point has the same colour.</summary>
/// <param name="Colour">The colour.</param>
public sealed record OneColour(string Colour) : PointColour;

/// <summary>A colour and a shape for each category, such as cruise, layer or status.</summary>
/// <param name="Title">What the categories are.</param>
/// <param name="Codes">Length n: index into <paramref name="Categories"/>; -1 is missing and drawn as a small hollow mark.</param>
/// <param name="Categories">The categories, in the legend's order.</param>
public sealed record CategoryColour(string Title, int[] Codes, IReadOnlyList<FigureCategory> Categories) : PointColour;

/// <summary>A category of a <see cref="CategoryColour"/>.</summary>
/// <param name="Name">Its name in the legend.</param>
/// <param name="Colour">Its colour.</param>
/// <param name="Shape">Its shape.</param>
public sealed record FigureCategory(string Name, string Colour, PointShape Shape = PointShape.Circle);

/// <summary>A fraction as the strength of its source's colour: the sheet's colour at 0, the full colour at 1.</summary>
/// <param name="Title">The source's name.</param>
/// <param name="Colour">The source's colour, <c>#rrggbb</c>.</param>
/// <param name="Fractions">Length n; NaN is missing. Values outside 0 to 1 take the colour of the nearer end.</param>
public sealed record StrengthColour(string Title, string Colour, double[] Fractions) : PointColour;

/// <summary>Values on the cividis scale (<c>NunezAndertonRenslow2018</c>), for one-sided quantities such as tracers.</summary>
/// <param name="Title">What the values are.</param>
/// <param name="Unit">Their unit as people write it; may be empty.</param>
/// <param name="Values">Length n; NaN is missing.</param>
/// <param name="Range">The values at the ends of the scale; null: the 1st and the 99th percentile, so that one stray value does not wash out the rest.</param>
public sealed record SequentialColour(string Title, string Unit, double[] Values, FigureRange? Range = null) : PointColour;

/// <summary>Signed values on a pair of colours about a neutral centre at 0, for residuals and differences.</summary>
/// <param name="Title">What the values are.</param>
/// <param name="Unit">Their unit as people write it; may be empty.</param>
/// <param name="Values">Length n; NaN is missing.</param>
/// <param name="Half">The size at either end of the scale, > 0; null: the 98th percentile of the sizes.</param>
public sealed record DivergingColour(string Title, string Unit, double[] Values, double? Half = null) : PointColour;
