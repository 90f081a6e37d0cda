using Microsoft.AspNetCore.Components;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.Components.Figures;

/// <summary>
/// Two quantities against one another, with the end-members and the region that their mixtures can reach. The figure says which share
/// of the samples lies outside it.
/// </summary>
public sealed partial class PropertyFigure
{
    /// <summary>What the figure shows.</summary>
    [Parameter, EditorRequired]
    public string Title { get; set; } = "";

    /// <summary>One sentence under the figure, before the share outside; empty: none.</summary>
    [Parameter]
    public string Caption { get; set; } = "";

    /// <summary>The quantity along x.</summary>
    [Parameter, EditorRequired]
    public FigureAxis X { get; set; } = new("", "");

    /// <summary>The quantity along y.</summary>
    [Parameter, EditorRequired]
    public FigureAxis Y { get; set; } = new("", "");

    /// <summary>The samples. Keep the object while it stays the same.</summary>
    [Parameter, EditorRequired]
    public PointLayer Samples { get; set; } = null!;

    /// <summary>The end-members, permitted or not.</summary>
    [Parameter]
    public IReadOnlyList<PropertySource> Sources { get; set; } = [];

    /// <summary>The processes in force.</summary>
    [Parameter]
    public IReadOnlyList<ProcessDirection> Processes { get; set; } = [];

    /// <summary>True where end-members can be moved.</summary>
    [Parameter]
    public bool Draggable { get; set; }

    /// <summary>An end-member was moved.</summary>
    [Parameter]
    public EventCallback<MarkMove> OnSourceMoved { get; set; }

    /// <summary>The row that is highlighted; null for none.</summary>
    [Parameter]
    public int? SelectedRow { get; set; }

    /// <summary>The row of a sample that was chosen.</summary>
    [Parameter]
    public EventCallback<int> OnSelect { get; set; }

    /// <summary>What is said of a row, such as <see cref="FigureColumns.NameOf"/>.</summary>
    [Parameter]
    public Func<int, string>? Describe { get; set; }

    private IReadOnlyList<FigureLayer> _layers = [];
    private Func<FigurePoint, string>? _describe;
    private string _caption = "";
    private (PointLayer Samples, IReadOnlyList<PropertySource> Sources, IReadOnlyList<ProcessDirection> Processes, bool Draggable)? _made;

    /// <inheritdoc/>
    protected override void OnParametersSet()
    {
        _describe = Describe is null ? null : point => Describe(point.Row);
        if (_made is not { } made
            || !ReferenceEquals(made.Samples, Samples)
            || made.Draggable != Draggable
            || !made.Sources.SequenceEqual(Sources)
            || !made.Processes.SequenceEqual(Processes))
        {
            _made = (Samples, Sources, Processes, Draggable);
            PropertyPicture picture = PropertyPicture.Of(Samples, Sources, Processes, Draggable);
            _layers = picture.Layers;
            _caption = picture.Sentence;
        }
    }
}
