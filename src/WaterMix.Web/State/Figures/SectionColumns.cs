namespace WaterMix.Web.State.Figures;

/// <summary>Where the samples of a section stand, its stations and the sea floor under them. Made by <see cref="FigureColumns.Section"/>.</summary>
/// <param name="XAxis">What the section runs along.</param>
/// <param name="YAxis">What it runs down, reversed.</param>
/// <param name="X">Length n, one value per point; NaN is missing.</param>
/// <param name="Y">Length n.</param>
/// <param name="Rows">The row of each point, length n.</param>
/// <param name="Stations">A tick for each station, in the order of x.</param>
/// <param name="Bottom">The sea floor as a closed polygon; null where no sounding is known, or where the section runs down density.</param>
public sealed record SectionColumns(
    FigureAxis XAxis,
    FigureAxis YAxis,
    double[] X,
    double[] Y,
    int[] Rows,
    IReadOnlyList<FigureTick> Stations,
    PolygonLayer? Bottom);
