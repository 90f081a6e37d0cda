using Microsoft.AspNetCore.Components;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.Components.Figures;

/// <summary>One sample's full apportionment.</summary>
public sealed partial class SampleCard
{
    /// <summary>What the card says; from <see cref="SampleCardText.Of"/>.</summary>
    [Parameter, EditorRequired]
    public SampleCardText Text { get; set; } = null!;

    /// <summary>The card was closed; without a handler it has no close button.</summary>
    [Parameter]
    public EventCallback OnClose { get; set; }
}
