using Microsoft.AspNetCore.Components;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.Components.Figures;

/// <summary>Values at a station against pressure, one plot per quantity side by side; bottle and CTD values have different shapes.</summary>
public sealed partial class ProfileFigure
{
    /// <summary>What the figure shows, such as <c>Station 12</c>.</summary>
    [Parameter, EditorRequired]
    public string Title { get; set; } = "";

    /// <summary>One sentence under the figure; empty: none.</summary>
    [Parameter]
    public string Caption { get; set; } = "";

    /// <summary>Pressure of every row of the study, dbar; <see cref="ProfileSeries.Rows"/> index into it.</summary>
    [Parameter, EditorRequired]
    public double[] Pressure { get; set; } = [];

    /// <summary>The series; those with equal axes share a plot. Keep the list while it stays the same.</summary>
    [Parameter, EditorRequired]
    public IReadOnlyList<ProfileSeries> Series { get; set; } = [];

    /// <summary>The row that is highlighted; null for none.</summary>
    [Parameter]
    public int? SelectedRow { get; set; }

    /// <summary>The row of a sample that was chosen.</summary>
    [Parameter]
    public EventCallback<int> OnSelect { get; set; }

    /// <summary>What is said of a row, such as <see cref="FigureColumns.NameOf"/>.</summary>
    [Parameter]
    public Func<int, string>? Describe { get; set; }

    private IReadOnlyList<ProfilePlot> _plots = [];
    private Func<FigurePoint, string>? _describe;
    private (double[] Pressure, IReadOnlyList<ProfileSeries> Series)? _made;

    /// <inheritdoc/>
    protected override void OnParametersSet()
    {
        _describe = Describe is null ? null : point => Describe(point.Row);
        if (_made is { } made && ReferenceEquals(made.Pressure, Pressure) && ReferenceEquals(made.Series, Series))
        {
            return;
        }

        _made = (Pressure, Series);
        _plots = ProfilePlot.Of(Pressure, Series);
    }
}
