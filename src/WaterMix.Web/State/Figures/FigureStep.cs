namespace WaterMix.Web.State.Figures;

/// <summary>Where an arrow key stepped to.</summary>
/// <param name="Layer">The layer's id.</param>
/// <param name="Point">Index of the point in its layer.</param>
/// <param name="Text">What is said of it.</param>
public sealed record FigureStep(string Layer, int Point, string Text);
