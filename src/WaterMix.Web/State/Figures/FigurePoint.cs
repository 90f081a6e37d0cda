namespace WaterMix.Web.State.Figures;

/// <summary>A point of a figure: which layer, and which row of the table it stands for.</summary>
/// <param name="Layer">The layer's id.</param>
/// <param name="Row">The row, from 0.</param>
public sealed record FigurePoint(string Layer, int Row);
