using Microsoft.AspNetCore.Components;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.Components.Figures;

/// <summary>A figure in numbers, made when it is opened.</summary>
public sealed partial class SummaryTable
{
    private IReadOnlyList<FigureSummary>? _lines;
    private bool _open;

    /// <summary>What the figure shows.</summary>
    [Parameter, EditorRequired]
    public string Title { get; set; } = "";

    /// <summary>Makes the lines.</summary>
    [Parameter, EditorRequired]
    public Func<IReadOnlyList<FigureSummary>> Lines { get; set; } = () => [];

    /// <inheritdoc/>
    protected override void OnParametersSet() => _lines = _open ? Lines() : null;

    private void Toggle()
    {
        _open = !_open;
        _lines = _open ? Lines() : null;
    }
}
