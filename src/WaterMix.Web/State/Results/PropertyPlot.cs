using WaterMix.Core.Quantities;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Results;

/// <summary>Two quantities of the samples against one another, coloured by a result.</summary>
/// <param name="XId">The quantity along x.</param>
/// <param name="YId">The quantity along y.</param>
/// <param name="ColourId">What colours the samples: one of <see cref="Colours"/>.</param>
/// <param name="X">The axis along x.</param>
/// <param name="Y">The axis along y.</param>
/// <param name="Samples">The samples.</param>
/// <param name="Sources">The sources, those permitted in the layer that is looked at.</param>
/// <param name="Processes">The processes.</param>
public sealed record PropertyPlot(
    string XId,
    string YId,
    string ColourId,
    FigureAxis X,
    FigureAxis Y,
    PointLayer Samples,
    IReadOnlyList<PropertySource> Sources,
    IReadOnlyList<ProcessDirection> Processes)
{
    /// <summary>The quantities that can stand along an axis: the tracers, then whatever else every source has a value of.</summary>
    /// <param name="results">The results.</param>
    public static IReadOnlyList<Quantity> Axes(RunResults results)
    {
        ArgumentNullException.ThrowIfNull(results);
        IEnumerable<string> shared = results.Sources.Count == 0 ? [] : results.Sources[0].Values.Keys.Where(id => results.Sources.All(s => s.Values.ContainsKey(id)));
        return [.. results.Model.Tracers.Concat(shared).Distinct().Select(results.QuantityOf)];
    }

    /// <summary>What can colour the samples: id and name.</summary>
    /// <param name="results">The results.</param>
    public static IReadOnlyList<(string Id, string Name)> Colours(RunResults results)
    {
        ArgumentNullException.ThrowIfNull(results);
        return [.. results.Sources.Select(s => (s.Id, $"fraction of {s.Id}")), ("misfit", "misfit"), ("layer", "layer"), ("status", "status")];
    }

    /// <summary>The plot of a view; what the view names and is not there is as it is at first.</summary>
    /// <param name="results">The results.</param>
    /// <param name="view">The view.</param>
    /// <param name="rows">The rows that are shown; null for all.</param>
    public static PropertyPlot Of(RunResults results, ResultsView view, int[]? rows)
    {
        ArgumentNullException.ThrowIfNull(results);
        ArgumentNullException.ThrowIfNull(view);
        IReadOnlyList<Quantity> axes = Axes(results);
        Quantity y = axes.FirstOrDefault(q => q.Id == view.Y) ?? axes[0];
        Quantity x = axes.FirstOrDefault(q => q.Id == view.X) ?? axes[Math.Min(1, axes.Count - 1)];
        IReadOnlyList<(string Id, string Name)> colours = Colours(results);
        string colour = colours.FirstOrDefault(c => c.Id == view.Colour, colours[0]).Id;
        IReadOnlyList<string>? permitted = results.Model.LayersOrAll.FirstOrDefault(l => l.Id == view.Filter.Layer)?.EndMembers;
        return new PropertyPlot(
            x.Id,
            y.Id,
            colour,
            FigureAxis.For(x),
            FigureAxis.For(y),
            new PointLayer("samples", "Samples", SectionPanels.At(results.Columns.Values(x.Id), rows), SectionPanels.At(results.Columns.Values(y.Id), rows), ColourOf(results, colour, rows)) { Rows = rows },
            PropertySource.Of(results.Model.EndMembers, x.Id, y.Id, results.Model.Fit.Factors, permitted),
            ProcessDirection.Of(results.Model.Processes, x.Id, y.Id, results.Model.Fit.Factors));
    }

    private static PointColour ColourOf(RunResults results, string id, int[]? rows)
    {
        switch (id)
        {
            case "misfit":
                return new SequentialColour("Misfit", "", SectionPanels.At(results.Misfit, rows));
            case "status":
                return SectionPanels.StatusColour(results, rows);
            case "layer":
                return new CategoryColour(
                    "Layer",
                    SectionPanels.At(results.Layer, rows),
                    [.. results.LayerIds.Select((layer, k) => new FigureCategory(layer, SourceColours.At(k), (PointShape)(k % Enum.GetValues<PointShape>().Length)))]);
            default:
                int index = results.Sources.ToList().FindIndex(s => s.Id == id);
                return new StrengthColour(id, SourceColours.At(index), SectionPanels.At(results.Columns.Fractions(id), rows));
        }
    }
}
