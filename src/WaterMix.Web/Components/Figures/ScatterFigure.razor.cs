using Microsoft.AspNetCore.Components;
using Microsoft.JSInterop;
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

    private readonly string _helpId = "figure-help-" + Guid.NewGuid().ToString("N");
    private DotNetObjectReference<ScatterFigure>? _self;
    private IJSObjectReference? _plot;
    private ElementReference _host;
    private bool _movesByDragging;
    private Drawn? _drawn;

    /// <summary>What is said of a point: its description and its values at the axes.</summary>
    /// <param name="layer">The layer's id.</param>
    /// <param name="point">Index of the point in its layer.</param>
    /// <returns>The text; empty where the layer is gone.</returns>
    [JSInvokable]
    public string Say(string layer, int point) => PointLayer(layer, point) is { } points ? TextOf(points, point) : "";

    /// <summary>A point was chosen.</summary>
    /// <param name="layer">The layer's id.</param>
    /// <param name="point">Index of the point in its layer.</param>
    [JSInvokable]
    public Task Pick(string layer, int point) =>
        PointLayer(layer, point) is { } points
            ? InvokeAsync(() => OnSelect.InvokeAsync(new FigurePoint(points.Id, points.RowOf(point))))
            : Task.CompletedTask;

    /// <summary>The point that an arrow key steps to.</summary>
    /// <param name="layer">The id of the layer to step from; empty at first.</param>
    /// <param name="point">Index of the point to step from; -1 at first.</param>
    /// <param name="direction">Which way.</param>
    /// <param name="left">The x at the left edge of the view.</param>
    /// <param name="right">The x at the right edge.</param>
    /// <param name="bottom">The y at the bottom edge.</param>
    /// <param name="top">The y at the top edge.</param>
    /// <returns>The point and what is said of it; null where there is none in view.</returns>
    [JSInvokable]
    public FigureStep? Step(string layer, int point, StepDirection direction, double left, double right, double bottom, double top)
    {
        PointLayer? points = PointLayer(layer, point) ?? Layers.OfType<PointLayer>().LastOrDefault(l => l.CanSelect);
        if (points is null)
        {
            return null;
        }

        int from = points.Id == layer && point < points.X.Length ? point : -1;
        int next = PointStepper.Next(points.X, points.Y, from, direction, left, right, bottom, top);
        return next < 0 ? null : new FigureStep(points.Id, next, TextOf(points, next));
    }

    /// <summary>A mark was moved.</summary>
    /// <param name="layer">The layer's id.</param>
    /// <param name="mark">The mark's id.</param>
    /// <param name="x">Where it stands now.</param>
    /// <param name="y">Where it stands now.</param>
    /// <param name="released">False while the pointer still moves it.</param>
    [JSInvokable]
    public Task Move(string layer, string mark, double x, double y, bool released) =>
        InvokeAsync(() => OnMarkMoved.InvokeAsync(new MarkMove(layer, mark, x, y, released)));

    /// <inheritdoc/>
    public async ValueTask DisposeAsync()
    {
        _self?.Dispose();
        await FigureModule.DisposeAsync(_plot);
    }

    /// <inheritdoc/>
    protected override async Task OnAfterRenderAsync(bool firstRender)
    {
        if (firstRender)
        {
            _self = DotNetObjectReference.Create(this);
            _plot = await FigureModule.CreateAsync(JS, "figure.js", _host, _self);
        }

        if (_plot is null)
        {
            return;
        }

        var now = new Drawn(X, Y, Layers, TopTicks, SelectedRow);
        if (_drawn is null || !_drawn.HasSamePicture(now))
        {
            IReadOnlyList<FigureLayer> before = _drawn?.Layers ?? [];
            _drawn = now;
            var drawing = new FigureDrawing();
            object[] layers = [.. now.Layers.Select(l => before.Any(b => ReferenceEquals(b, l)) ? new { id = l.Id, keep = true } : drawing.Layer(l))];
            var picture = new
            {
                x = FigureDrawing.Axis(X, FigureRanges.X(X, Layers)),
                y = FigureDrawing.Axis(Y, FigureRanges.Y(Y, Layers)),
                topTicks = TopTicks.Select(t => new { at = t.At, label = t.Label }),
                layers,
                selected = Selected(),
            };
            await _plot.InvokeVoidAsync("draw", picture, drawing.Bytes);
        }
        else if (_drawn.SelectedRow != now.SelectedRow)
        {
            _drawn = now;
            await _plot.InvokeVoidAsync("select", [Selected()]);
        }
    }

    private string HeightClass => Height switch
    {
        FigureHeight.Small => "is-small",
        FigureHeight.Tall => "is-tall",
        _ => "is-hero",
    };

    private object[] Selected() =>
        SelectedRow is not { } row
            ? []
            : [.. Layers.OfType<PointLayer>().Where(l => l.CanSelect).Select(l => (l.Id, Point: PointOf(l, row))).Where(p => p.Point >= 0).Select(p => new { layer = p.Id, point = p.Point })];

    private static int PointOf(PointLayer layer, int row) =>
        layer.Rows is null ? (row < layer.X.Length ? row : -1) : Array.IndexOf(layer.Rows, row);

    private PointLayer? PointLayer(string id, int point) =>
        Layers.OfType<PointLayer>().FirstOrDefault(l => l.Id == id && point >= 0 && point < l.X.Length);

    private string TextOf(PointLayer layer, int point)
    {
        string values = $"{X.Title} {FigureText.WithUnit(layer.X[point], X.Unit)}, {Y.Title} {FigureText.WithUnit(layer.Y[point], Y.Unit)}";
        string colour = ColourText.Of(layer.Colour, point);
        string described = Describe is null ? layer.Name : Describe(new FigurePoint(layer.Id, layer.RowOf(point)));
        return FigureText.Sentence(string.Join("; ", new[] { described, values, colour }.Where(t => t.Length > 0)));
    }

    private Task ZoomAsync(double factor) => _plot?.InvokeVoidAsync("zoom", factor).AsTask() ?? Task.CompletedTask;

    private Task ResetAsync() => _plot?.InvokeVoidAsync("reset").AsTask() ?? Task.CompletedTask;

    private Task ToggleDraggingAsync()
    {
        _movesByDragging = !_movesByDragging;
        return _plot?.InvokeVoidAsync("moveByDragging", _movesByDragging).AsTask() ?? Task.CompletedTask;
    }

    /// <summary>What was last sent to the browser.</summary>
    private sealed record Drawn(FigureAxis X, FigureAxis Y, IReadOnlyList<FigureLayer> Layers, IReadOnlyList<FigureTick> TopTicks, int? SelectedRow)
    {
        public bool HasSamePicture(Drawn other) =>
            X == other.X
            && Y == other.Y
            && ReferenceEquals(TopTicks, other.TopTicks)
            && Layers.Count == other.Layers.Count
            && Layers.Zip(other.Layers).All(pair => ReferenceEquals(pair.First, pair.Second));
    }
}
