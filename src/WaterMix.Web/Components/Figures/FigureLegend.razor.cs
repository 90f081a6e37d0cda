using Microsoft.AspNetCore.Components;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.Components.Figures;

/// <summary>The legend of a figure: a key for each named layer and category, a scale for each mapped value.</summary>
public sealed partial class FigureLegend
{
    /// <summary>The layers of the figure.</summary>
    [Parameter, EditorRequired]
    public IReadOnlyList<FigureLayer> Layers { get; set; } = [];

    private IReadOnlyList<LegendKey> Keys { get; set; } = [];

    private IReadOnlyList<ScaleKey> Scales { get; set; } = [];

    /// <inheritdoc/>
    protected override void OnParametersSet()
    {
        Keys = [.. Layers.SelectMany(LegendKey.Of)];
        Scales = [.. Layers.OfType<PointLayer>().Select(l => ScaleKey.Of(l.Colour)).OfType<ScaleKey>()];
    }
}
