using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Results;

/// <summary>
/// Makes what the page shows of one run. What a view has in common with the one before is the same object again, so that a figure
/// sends only what changed. Not for several threads at once.
/// </summary>
/// <param name="results">The run.</param>
public sealed class ResultsMaker(RunResults results)
{
    private readonly Kept<RowFilter, int[]?> _rows = new();
    private readonly Kept<(RowFilter Filter, string? Sort, bool Descending), int[]> _ordered = new();
    private readonly Kept<RowFilter, IReadOnlyList<LayerSummary>> _layers = new();
    private readonly Kept<RowFilter, IReadOnlyList<ResidualSummary>> _residuals = new();
    private readonly Kept<(RowFilter Filter, SectionAlong Along, SectionAgainst Against), SectionColumns> _section = new();
    private readonly Kept<(RowFilter Filter, ResultsFigure Figure), IReadOnlyList<SectionPanel>> _panels = new();
    private readonly Kept<string, StationProfile> _profile = new();
    private readonly Kept<(RowFilter Filter, string? X, string? Y, string? Colour), PropertyPlot> _property = new();
    private readonly Kept<int, SampleCardText> _card = new();
    private readonly Lazy<IReadOnlyList<StatusCount>> _statuses = new(() => StatusCount.Of(results));
    private readonly Lazy<int[]> _all = new(() => [.. Enumerable.Range(0, results.RowCount)]);

    /// <summary>The run.</summary>
    public RunResults Results => results;

    /// <summary>What a view shows.</summary>
    /// <param name="view">The view.</param>
    public ResultsShown Make(ResultsView view)
    {
        ArgumentNullException.ThrowIfNull(view);
        RowFilter filter = view.Filter;
        int[]? some = _rows.Get(filter, () => RowSelection.Of(results, filter));
        int[] rows = some ?? _all.Value;
        int[] ordered = _ordered.Get((filter, view.Sort, view.Descending), () => Ordered(rows, view));
        var shown = new ResultsShown(
            view,
            results,
            rows.Length,
            TablePage.Of(results, ordered, view.Columns, view.Page),
            _layers.Get(filter, () => LayerSummary.Of(results, rows)),
            _statuses.Value)
        {
            Card = view.Sample is { } sample && sample < results.RowCount ? _card.Get(sample, () => SampleCardText.Of(results.Columns, sample)) : null,
        };
        return view.Figure switch
        {
            ResultsFigure.Profiles => shown with { Profile = ProfileOf(view) },
            ResultsFigure.Properties => shown with
            {
                Property = results.Model.Tracers.Count == 0
                    ? null
                    : _property.Get((filter, view.X, view.Y, view.Colour), () => PropertyPlot.Of(results, view, some)),
            },
            _ => shown with
            {
                Section = _section.Get((filter, view.Along, view.Against), () => results.Columns.Section(view.Along, view.Against, some)),
                Panels = _panels.Get((filter, view.Figure), () => SectionPanels.Of(results, view.Figure, some)),
                Residuals = view.Figure == ResultsFigure.Residuals ? _residuals.Get(filter, () => ResidualSummary.Of(results, rows)) : [],
            },
        };
    }

    private int[] Ordered(int[] rows, ResultsView view) =>
        results.Table.FirstOrDefault(c => c.Id == view.Sort) is { } column ? RowSelection.Sorted(rows, column.Keys, view.Descending) : rows;

    private StationProfile? ProfileOf(ResultsView view)
    {
        IReadOnlyList<MapStation> stations = results.Columns.Stations;
        if (stations.Count == 0)
        {
            return null;
        }

        int sampled = view.Sample is { } sample && sample < results.RowCount ? results.Columns.StationOf[sample] : -1;
        MapStation station = stations.FirstOrDefault(s => s.Id == view.Station) ?? stations[Math.Max(sampled, 0)];
        return _profile.Get(station.Id, () => StationProfile.Of(results, station));
    }
}
