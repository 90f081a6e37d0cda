using Microsoft.AspNetCore.Components;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.Components.Figures;

/// <summary>
/// A plot of points, lines, polygons, arrows and labelled marks. The pointer and the keyboard reach the same points: with the figure
/// focused, arrow keys step to the next point that way, Enter chooses it, plus and minus zoom, 0 shows everything again.
/// </summary>
public sealed partial class ScatterFigure
{
    /// <summary>What the figure shows, for people who do not see it and as its heading for screen readers.</summary>
    [Parameter, EditorRequired]
    public string Title { get; set; } = "";

    /// <summary>One sentence under the figure; empty: none.</summary>
    [Parameter]
    public string Caption { get; set; } = "";

    /// <summary>The x axis.</summary>
    [Parameter, EditorRequired]
    public FigureAxis X { get; set; } = new("", "");

    /// <summary>The y axis.</summary>
    [Parameter, EditorRequired]
    public FigureAxis Y { get; set; } = new("", "");

    /// <summary>What is drawn, from back to front; see <see cref="FigureLayer"/> on when a layer is sent again.</summary>
    [Parameter, EditorRequired]
    public IReadOnlyList<FigureLayer> Layers { get; set; } = [];

    /// <summary>Ticks along the upper edge, such as stations.</summary>
    [Parameter]
    public IReadOnlyList<FigureTick> TopTicks { get; set; } = [];

    /// <summary>The row that is highlighted, in every layer that shows it; null for none.</summary>
    [Parameter]
    public int? SelectedRow { get; set; }

    /// <summary>A point was chosen, by a click or with Enter.</summary>
    [Parameter]
    public EventCallback<FigurePoint> OnSelect { get; set; }

    /// <summary>What is said of a point when it is pointed at or stepped to, such as the sample's name; the values at the axes are said after it.</summary>
    [Parameter]
    public Func<FigurePoint, string>? Describe { get; set; }

    /// <summary>A mark of a draggable layer was moved.</summary>
    [Parameter]
    public EventCallback<MarkMove> OnMarkMoved { get; set; }

    /// <summary>The plot's shape.</summary>
    [Parameter]
    public FigureHeight Height { get; set; } = FigureHeight.Hero;

    /// <summary>True where the legend is left out because something near says the same.</summary>
    [Parameter]
    public bool HideLegend { get; set; }
}
