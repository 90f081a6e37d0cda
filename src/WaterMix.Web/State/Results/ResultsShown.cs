using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Results;

/// <summary>What the page shows for a view: everything is computed, nothing changes any more.</summary>
/// <param name="View">The view that it was made for.</param>
/// <param name="Results">The run.</param>
/// <param name="RowCount">Number of samples that pass the filter.</param>
/// <param name="Table">The page of the table.</param>
/// <param name="Layers">The summary numbers per layer.</param>
/// <param name="Statuses">The statuses of the whole run.</param>
public sealed record ResultsShown(
    ResultsView View,
    RunResults Results,
    int RowCount,
    TablePage Table,
    IReadOnlyList<LayerSummary> Layers,
    IReadOnlyList<StatusCount> Statuses)
{
    /// <summary>Where the samples of the section stand; null where the figure is no section.</summary>
    public SectionColumns? Section { get; init; }

    /// <summary>The panels of the section; empty where the figure is no section.</summary>
    public IReadOnlyList<SectionPanel> Panels { get; init; } = [];

    /// <summary>The residuals in numbers; empty unless the figure shows residuals.</summary>
    public IReadOnlyList<ResidualSummary> Residuals { get; init; } = [];

    /// <summary>The profiles; null unless the figure shows them.</summary>
    public StationProfile? Profile { get; init; }

    /// <summary>The property plot; null unless the figure shows it.</summary>
    public PropertyPlot? Property { get; init; }

    /// <summary>The card of the selected sample, or null.</summary>
    public SampleCardText? Card { get; init; }

    /// <summary>The enlarged panel's id: the view's where it is there, otherwise the first; null without panels.</summary>
    public string? Enlarged => Panels.Count == 0 ? null : (Panels.FirstOrDefault(p => p.Id == View.Enlarged) ?? Panels[0]).Id;

    /// <summary>The line at the foot of the page.</summary>
    public IReadOnlyList<string> StatusLine =>
    [
        RowCount == Results.RowCount ? PlainText.Count(RowCount, "sample") : $"{PlainText.Count(RowCount)} of {PlainText.Count(Results.RowCount, "sample")} shown",
        .. Statuses.Select(s => $"{PlainText.Count(s.Count)} {StatusText.Of(s.Status)}"),
        $"model {ModelWords.HashStart(Results.Run.ModelHash)}",
        $"set v{PlainText.Count(Results.Model.EndMembers.Version)}",
    ];
}
