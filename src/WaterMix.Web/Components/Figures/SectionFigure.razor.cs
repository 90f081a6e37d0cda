using Microsoft.AspNetCore.Components;
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
}
