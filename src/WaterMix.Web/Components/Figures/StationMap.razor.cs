using System.Globalization;
using Microsoft.AspNetCore.Components;
using Microsoft.JSInterop;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.Components.Figures;

/// <summary>
/// Stations on a plain map. With the map focused, arrow keys step to the next station that way, Enter chooses it, plus and minus zoom, 0 shows all stations.
/// </summary>
public sealed partial class StationMap
{
    /// <summary>What the map shows.</summary>
    [Parameter, EditorRequired]
    public string Title { get; set; } = "Stations";

    /// <summary>One sentence under the map; empty: none.</summary>
    [Parameter]
    public string Caption { get; set; } = "";

    /// <summary>The stations, such as <see cref="FigureColumns.Stations"/>.</summary>
    [Parameter, EditorRequired]
    public IReadOnlyList<MapStation> Stations { get; set; } = [];

    /// <summary>True where a thin line joins the stations in their order.</summary>
    [Parameter]
    public bool ShowTrack { get; set; }

    /// <summary>The study's own land instead of the earth's: from <see cref="Coastline.FromGeoJson"/>; null: the earth's.</summary>
    [Parameter]
    public Coastline? Land { get; set; }

    /// <summary>The id of the highlighted station; null for none.</summary>
    [Parameter]
    public string? Selected { get; set; }

    /// <summary>A station was chosen.</summary>
    [Parameter]
    public EventCallback<MapStation> OnSelect { get; set; }

    private readonly string _helpId = "map-help-" + Guid.NewGuid().ToString("N");
    private readonly string _viewBox = string.Create(CultureInfo.InvariantCulture, $"0 0 {MapView.Width} {MapView.Height}");
    private Coastline _land = null!;
    private MapView _view = MapView.Of([]);
    private MapDrawing _drawing = null!;
    private (IReadOnlyList<MapStation> Stations, Coastline? Land)? _made;
    private string? _stepped;
    private string _said = "";
    private DotNetObjectReference<StationMap>? _self;
    private IJSObjectReference? _map;
    private ElementReference _host;

    /// <inheritdoc/>
    protected override void OnParametersSet()
    {
        if (_made is { } made && ReferenceEquals(made.Stations, Stations) && ReferenceEquals(made.Land, Land))
        {
            return;
        }

        _made = (Stations, Land);
        _land = Land ?? EarthCoastline.Of(Host.WebRootFileProvider);
        Show(MapView.Of(Stations));
    }

    private void Show(MapView view)
    {
        _view = view;
        _drawing = MapDrawing.Of(view, _land, Stations);
    }

    private string ClassOf(MapMark mark) =>
        mark.Station.Id == Selected ? "map-station is-selected" : mark.Station.Id == _stepped ? "map-station is-stepped" : "map-station";

    /// <summary>An arrow key: steps to the next station that way.</summary>
    /// <param name="way">Which way.</param>
    [JSInvokable]
    public void Step(StepDirection way)
    {
        double[] x = [.. _drawing.Stations.Select(m => m.X)];
        double[] y = [.. _drawing.Stations.Select(m => m.Y)];
        int from = _drawing.Stations.ToList().FindIndex(m => m.Station.Id == (_stepped ?? Selected));
        int next = PointStepper.Next(x, y, from, way, 0, MapView.Width, MapView.Height, 0);
        if (next >= 0)
        {
            MapStation station = _drawing.Stations[next].Station;
            _stepped = station.Id;
            _said = FigureText.Sentence($"{station.Label}, {FigureText.Latitude(station.Latitude)}, {FigureText.Longitude(station.Longitude)}, {FigureText.Count(station.Rows.Count)} samples");
            StateHasChanged();
        }
    }

    /// <summary>The Enter key: chooses the station that was stepped to.</summary>
    [JSInvokable]
    public Task Choose() =>
        Stations.FirstOrDefault(s => s.Id == _stepped) is { } station ? InvokeAsync(() => OnSelect.InvokeAsync(station)) : Task.CompletedTask;

    /// <summary>A key or the pointer moved the window.</summary>
    /// <param name="east">To the east, 1 a whole width.</param>
    /// <param name="north">To the north, 1 a whole height.</param>
    [JSInvokable]
    public void Pan(double east, double north) => ShowNow(_view.Moved(east, north));

    /// <summary>The plus and minus keys.</summary>
    /// <param name="factor">2 shows half as much.</param>
    [JSInvokable]
    public void Zoom(double factor) => ShowNow(_view.Zoomed(factor));

    /// <summary>The key 0: the window that shows all stations.</summary>
    [JSInvokable]
    public void ShowAll() => ShowNow(MapView.Of(Stations));

    /// <inheritdoc/>
    public async ValueTask DisposeAsync()
    {
        _self?.Dispose();
        await FigureModule.DisposeAsync(_map);
    }

    /// <inheritdoc/>
    protected override async Task OnAfterRenderAsync(bool firstRender)
    {
        if (firstRender)
        {
            _self = DotNetObjectReference.Create(this);
            _map = await FigureModule.CreateAsync(JS, "map.js", _host, _self);
        }
    }

    private void ShowNow(MapView view)
    {
        Show(view);
        StateHasChanged();
    }
}
