namespace WaterMix.Web.State.Figures;

/// <summary>One section among several that share their axes: the same points, other colours.</summary>
/// <param name="Id">Unique among the panels, such as an end-member's id.</param>
/// <param name="Title">Its heading.</param>
/// <param name="Colour">The colours, one entry per point of the section.</param>
public sealed record SectionPanel(string Id, string Title, PointColour Colour);
