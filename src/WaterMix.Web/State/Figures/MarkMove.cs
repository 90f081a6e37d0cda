namespace WaterMix.Web.State.Figures;

/// <summary>A mark was moved to another place.</summary>
/// <param name="Layer">The layer's id.</param>
/// <param name="Mark">The mark's id.</param>
/// <param name="X">Where it stands now, in the axis' unit.</param>
/// <param name="Y">Where it stands now, in the axis' unit.</param>
/// <param name="Released">False while the pointer still moves it (several times a second at most), true at the end: keep this one.</param>
public sealed record MarkMove(string Layer, string Mark, double X, double Y, bool Released);
