using Microsoft.AspNetCore.Components;
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
}
