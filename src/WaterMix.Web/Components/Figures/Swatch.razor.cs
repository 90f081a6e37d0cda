using System.Globalization;
using Microsoft.AspNetCore.Components;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.Components.Figures;

/// <summary>A small mark in a source's colour, readable in both themes; beside a name, never instead of one.</summary>
public sealed partial class Swatch
{
    /// <summary>The colour, <c>#rrggbb</c> or a theme variable.</summary>
    [Parameter, EditorRequired]
    public string Colour { get; set; } = "";

    /// <summary>The shape.</summary>
    [Parameter]
    public PointShape Shape { get; set; } = PointShape.Square;

    /// <summary>How strong the colour is over the sheet's, 0 to 1.</summary>
    [Parameter]
    public double Strength { get; set; } = 1;

    private string _light = "";
    private string _dark = "";

    private string StrengthText => Strength.ToString("0.###", CultureInfo.InvariantCulture);

    private string Path => ShapePath.Of(Shape, 5);

    /// <inheritdoc/>
    protected override void OnParametersSet() => (_light, _dark) = FigureColour.InThemes(Colour);
}
