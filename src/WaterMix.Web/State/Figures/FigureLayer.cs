namespace WaterMix.Web.State.Figures;

/// <summary>
/// Something drawn in a figure. Layers are drawn in their order. A figure sends a layer to the browser again only where it is another
/// object than before: make a new one when its data change, keep the old one when they do not, and never change the arrays in place.
/// </summary>
/// <param name="Id">Unique in the figure; stays the same when the data change.</param>
/// <param name="Name">Its name in the legend.</param>
public abstract record FigureLayer(string Id, string Name);

/// <summary>Points, one per sample. A point without x or y is not drawn.</summary>
/// <param name="Id">Unique in the figure.</param>
/// <param name="Name">Its name in the legend.</param>
/// <param name="X">Length n; NaN is missing.</param>
/// <param name="Y">Length n; NaN is missing.</param>
/// <param name="Colour">How the points are coloured.</param>
public sealed record PointLayer(string Id, string Name, double[] X, double[] Y, PointColour Colour) : FigureLayer(Id, Name)
{
    /// <summary>The row of the table that each point stands for, length n; null: point i is row i.</summary>
    public int[]? Rows { get; init; }

    /// <summary>The shape of the points; categories bring their own.</summary>
    public PointShape Shape { get; init; }

    /// <summary>Width of a mark, CSS px, 2 to 20.</summary>
    public double Size { get; init; } = 7;

    /// <summary>False where the points are only a background that cannot be chosen.</summary>
    public bool CanSelect { get; init; } = true;

    /// <summary>The row of a point.</summary>
    /// <param name="point">Index of the point, from 0.</param>
    public int RowOf(int point) => Rows is null ? point : Rows[point];
}

/// <summary>A line through points in order; NaN breaks it.</summary>
/// <param name="Id">Unique in the figure.</param>
/// <param name="Name">Its name in the legend; empty: not in the legend.</param>
/// <param name="X">Length n.</param>
/// <param name="Y">Length n.</param>
/// <param name="Colour">The colour.</param>
public sealed record LineLayer(string Id, string Name, double[] X, double[] Y, string Colour) : FigureLayer(Id, Name)
{
    /// <summary>Width, CSS px.</summary>
    public double Width { get; init; } = 1.5;

    /// <summary>True for a dashed line.</summary>
    public bool Dashed { get; init; }
}

/// <summary>A filled polygon.</summary>
/// <param name="Id">Unique in the figure.</param>
/// <param name="Name">Its name in the legend; empty: not in the legend.</param>
/// <param name="X">The corners, length n >= 3.</param>
/// <param name="Y">The corners, length n.</param>
/// <param name="Colour">The colour of the outline and the fill.</param>
public sealed record PolygonLayer(string Id, string Name, double[] X, double[] Y, string Colour) : FigureLayer(Id, Name)
{
    /// <summary>How much of what is behind the fill hides, 0 to 1.</summary>
    public double Opacity { get; init; } = 0.12;

    /// <summary>True for a dashed outline.</summary>
    public bool Dashed { get; init; }
}

/// <summary>Arrows, each with a name, such as the directions of processes.</summary>
/// <param name="Id">Unique in the figure.</param>
/// <param name="Name">Its name in the legend; empty: not in the legend.</param>
/// <param name="Arrows">The arrows.</param>
public sealed record ArrowLayer(string Id, string Name, IReadOnlyList<FigureArrow> Arrows) : FigureLayer(Id, Name);

/// <summary>An arrow from one place to another.</summary>
/// <param name="Label">What stands at its head.</param>
/// <param name="FromX">Its foot.</param>
/// <param name="FromY">Its foot.</param>
/// <param name="ToX">Its head.</param>
/// <param name="ToY">Its head.</param>
/// <param name="Colour">The colour.</param>
public sealed record FigureArrow(string Label, double FromX, double FromY, double ToX, double ToY, string Colour);

/// <summary>Marks with labels beside them, such as end-members. Each can be reached with the keyboard.</summary>
/// <param name="Id">Unique in the figure.</param>
/// <param name="Name">Its name in the legend; empty: not in the legend.</param>
/// <param name="Marks">The marks.</param>
public sealed record MarkLayer(string Id, string Name, IReadOnlyList<FigureMark> Marks) : FigureLayer(Id, Name)
{
    /// <summary>True where a mark can be moved, with the pointer or the arrow keys.</summary>
    public bool Draggable { get; init; }
}

/// <summary>A mark with a label.</summary>
/// <param name="Id">Unique in its layer.</param>
/// <param name="Label">The label beside it.</param>
/// <param name="X">Where it stands; NaN: not drawn.</param>
/// <param name="Y">Where it stands.</param>
/// <param name="Colour">The colour.</param>
public sealed record FigureMark(string Id, string Label, double X, double Y, string Colour)
{
    /// <summary>The shape.</summary>
    public PointShape Shape { get; init; } = PointShape.Diamond;

    /// <summary>Half widths of a cross drawn through the mark, such as its spread; null: none.</summary>
    public (double X, double Y)? Spread { get; init; }
}
