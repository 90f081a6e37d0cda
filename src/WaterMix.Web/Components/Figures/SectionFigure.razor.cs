using Microsoft.AspNetCore.Components;
using Microsoft.JSInterop;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.Components.Figures;

/// <summary>
/// A section as coloured dots, one panel or several that share their points and axes: one enlarged, the others small under it.
/// </summary>
public sealed partial class SectionFigure
{
    /// <summary>What the figure shows, such as <c>Fractions along the section</c>.</summary>
    [Parameter, EditorRequired]
    public string Title { get; set; } = "";

    /// <summary>One sentence under the figure; empty: none.</summary>
    [Parameter]
    public string Caption { get; set; } = "";

    /// <summary>Where the samples stand; from <see cref="FigureColumns.Section"/>. Keep the object while it stays the same.</summary>
    [Parameter, EditorRequired]
    public SectionColumns Section { get; set; } = null!;

    /// <summary>The panels, at least one; their colours have one entry per point of the section.</summary>
    [Parameter, EditorRequired]
    public IReadOnlyList<SectionPanel> Panels { get; set; } = [];

    /// <summary>The id of the enlarged panel; null: the first.</summary>
    [Parameter]
    public string? Enlarged { get; set; }

    /// <summary>Another panel was chosen to be enlarged.</summary>
    [Parameter]
    public EventCallback<string> EnlargedChanged { get; set; }

    /// <summary>The row that is highlighted in every panel; null for none.</summary>
    [Parameter]
    public int? SelectedRow { get; set; }

    /// <summary>The row of a sample that was chosen.</summary>
    [Parameter]
    public EventCallback<int> OnSelect { get; set; }

    /// <summary>What is said of a row, such as <see cref="FigureColumns.NameOf"/>.</summary>
    [Parameter]
    public Func<int, string>? Describe { get; set; }

    private const string SamplesLayer = "samples";

    private DotNetObjectReference<SectionFigure>? _self;
    private IJSObjectReference? _panels;
    private ElementReference _root;
    private IReadOnlyList<FigureLayer> _layers = [];
    private Func<FigurePoint, string>? _describe;
    private (SectionColumns Section, SectionPanel Panel)? _hero;
    private (SectionColumns Section, IReadOnlyList<SectionPanel> Panels)? _drawn;
    private int? _drawnRow;

    private SectionPanel Current => Panels.FirstOrDefault(p => p.Id == Enlarged) ?? Panels[0];

    private string HeroTitle => Panels.Count > 1 ? $"{Title}: {Current.Title}" : Title;

    /// <summary>A point of a small panel was chosen.</summary>
    /// <param name="point">Index of the point in the section.</param>
    [JSInvokable]
    public Task PickPoint(int point) =>
        point >= 0 && point < Section.Rows.Length ? InvokeAsync(() => OnSelect.InvokeAsync(Section.Rows[point])) : Task.CompletedTask;

    /// <inheritdoc/>
    public async ValueTask DisposeAsync()
    {
        _self?.Dispose();
        await FigureModule.DisposeAsync(_panels);
    }

    /// <inheritdoc/>
    protected override void OnParametersSet()
    {
        _describe = Describe is null ? null : point => Describe(point.Row);
        if (_hero is { } hero && ReferenceEquals(hero.Section, Section) && hero.Panel == Current)
        {
            return;
        }

        _hero = (Section, Current);
        var points = new PointLayer(SamplesLayer, "", Section.X, Section.Y, Current.Colour) { Rows = Section.Rows, Size = Section.X.Length > 5000 ? 5 : 8 };
        _layers = Section.Bottom is null ? [points] : [Section.Bottom, points];
    }

    /// <inheritdoc/>
    protected override async Task OnAfterRenderAsync(bool firstRender)
    {
        if (Panels.Count < 2)
        {
            return;
        }

        if (_self is null)
        {
            _self = DotNetObjectReference.Create(this);
            _panels = await FigureModule.CreateAsync(JS, "panels.js", _root, _self);
        }

        if (_panels is null)
        {
            return;
        }

        if (_drawn is not { } drawn || !ReferenceEquals(drawn.Section, Section) || !drawn.Panels.SequenceEqual(Panels))
        {
            _drawn = (Section, Panels);
            _drawnRow = SelectedRow;
            await DrawPanelsAsync(_panels);
        }
        else if (_drawnRow != SelectedRow)
        {
            _drawnRow = SelectedRow;
            await _panels.InvokeVoidAsync("select", SelectedPoint());
        }
    }

    private async Task DrawPanelsAsync(IJSObjectReference panels)
    {
        var drawing = new FigureDrawing();
        var picture = new
        {
            xAxis = FigureDrawing.Axis(Section.XAxis, FigureRanges.X(Section.XAxis, _layers)),
            yAxis = FigureDrawing.Axis(Section.YAxis, FigureRanges.Y(Section.YAxis, _layers)),
            n = Section.X.Length,
            x = drawing.Add(Section.X),
            y = drawing.Add(Section.Y),
            size = Section.X.Length > 5000 ? 3 : 4,
            floor = Section.Bottom is null ? null : drawing.Layer(Section.Bottom),
            panels = Panels.Select(p => new { id = p.Id, colour = drawing.Colour(p.Colour, PointShape.Circle) }).ToArray(),
            selected = SelectedPoint(),
        };
        await panels.InvokeVoidAsync("draw", picture, drawing.Bytes);
    }

    private int? SelectedPoint() =>
        SelectedRow is { } row && Array.IndexOf(Section.Rows, row) is >= 0 and var point ? point : null;
}
