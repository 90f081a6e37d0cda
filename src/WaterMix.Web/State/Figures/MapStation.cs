namespace WaterMix.Web.State.Figures;

/// <summary>A station on the map.</summary>
/// <param name="Id">Unique on the map, such as cruise and station together.</param>
/// <param name="Label">Its name for people.</param>
/// <param name="Latitude">Degrees north, -90 to 90; NaN: not drawn.</param>
/// <param name="Longitude">Degrees east, -180 to 180.</param>
/// <param name="Colour">The colour, such as its cruise's; a theme variable such as <c>--pencil</c> or <c>#rrggbb</c>.</param>
/// <param name="Shape">The shape, such as its cruise's.</param>
public sealed record MapStation(string Id, string Label, double Latitude, double Longitude, string Colour = "--pencil", PointShape Shape = PointShape.Circle)
{
    /// <summary>Its name in the file, without the cruise; for ticks.</summary>
    public string Name { get; init; } = Label;

    /// <summary>The rows of its samples, the deepest last.</summary>
    public IReadOnlyList<int> Rows { get; init; } = [];
}
