namespace WaterMix.Web.State.Figures;

/// <summary>A line of a legend.</summary>
/// <param name="Name">What it is.</param>
/// <param name="Colour">Its colour, or null where a scale shows it.</param>
/// <param name="Shape">Its shape.</param>
public sealed record LegendKey(string Name, string? Colour, PointShape Shape)
{
    /// <summary>How strong the colour is over the sheet's, 0 to 1.</summary>
    public double Strength { get; init; } = 1;

    /// <summary>The lines of a layer; none for one without a name, and none for marks, which carry their labels.</summary>
    /// <param name="layer">The layer.</param>
    public static IEnumerable<LegendKey> Of(FigureLayer layer) => layer switch
    {
        PointLayer { Colour: CategoryColour c } => c.Categories.Select(k => new LegendKey(k.Name, k.Colour, k.Shape)),
        PointLayer { Colour: OneColour one, Name.Length: > 0 } p => [new LegendKey(p.Name, one.Colour, p.Shape)],
        LineLayer { Name.Length: > 0 } l => [new LegendKey(l.Name, l.Colour, PointShape.Square)],
        PolygonLayer { Name.Length: > 0 } g => [new LegendKey(g.Name, g.Colour, PointShape.Square) { Strength = 2 * g.Opacity }],
        _ => [],
    };
}
