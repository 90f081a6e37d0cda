namespace WaterMix.Web.State.Figures;

/// <summary>A labelled tick on the upper edge of a figure, such as a station.</summary>
/// <param name="At">Where it stands on the x axis.</param>
/// <param name="Label">Its label; labels that would touch are left out, their ticks stay.</param>
public sealed record FigureTick(double At, string Label);
