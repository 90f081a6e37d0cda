using WaterMix.Core.Mixing;

namespace WaterMix.Web.State.Figures;

/// <summary>A property plot: the reachable region, the samples, the sources and the processes, from back to front, and what they say in a sentence.</summary>
/// <param name="Layers">The layers.</param>
/// <param name="Sentence">The share of samples outside; empty without sources.</param>
public sealed record PropertyPicture(IReadOnlyList<FigureLayer> Layers, string Sentence)
{
    /// <summary>Makes the plot.</summary>
    /// <param name="samples">The samples.</param>
    /// <param name="sources">The sources.</param>
    /// <param name="processes">The processes in force.</param>
    /// <param name="draggable">True where sources can be moved.</param>
    public static PropertyPicture Of(PointLayer samples, IReadOnlyList<PropertySource> sources, IReadOnlyList<ProcessDirection> processes, bool draggable)
    {
        ArgumentNullException.ThrowIfNull(samples);
        ArgumentNullException.ThrowIfNull(sources);
        ArgumentNullException.ThrowIfNull(processes);
        PlaneExtent extent = PlaneExtent.Of(samples.X.Concat(sources.Select(s => s.X)), samples.Y.Concat(sources.Select(s => s.Y)));
        ReachableRegion region = ReachableRegion.Of(sources.Where(s => s.Permitted).Select(s => new PlanePoint(s.X, s.Y)), processes, extent);
        bool moves = region.WithProcesses.Count > 2 && !ReferenceEquals(region.WithProcesses, region.Mixtures);
        var layers = new List<FigureLayer>();
        if (moves)
        {
            layers.Add(Polygon("with-processes", "mixtures and processes (dashed)", region.WithProcesses, "--faint") with { Opacity = 0.05, Dashed = true });
        }

        if (region.Mixtures.Count > 1)
        {
            layers.Add(Polygon("mixtures", "mixtures of the sources", region.Mixtures, "--pencil"));
        }

        layers.Add(samples);
        if (moves)
        {
            layers.Add(new ArrowLayer("processes", "", [.. Arrows(region.Mixtures, processes, extent)]));
        }

        if (sources.Count > 0)
        {
            layers.Add(new MarkLayer("sources", "", [.. sources.Select(Mark)]) { Draggable = draggable });
        }

        return new PropertyPicture(layers, Outside(region, samples, moves));
    }

    private static PolygonLayer Polygon(string id, string name, IReadOnlyList<PlanePoint> corners, string colour) =>
        new(id, name, [.. corners.Select(c => c.X)], [.. corners.Select(c => c.Y)], colour);

    private static FigureMark Mark(PropertySource source) =>
        new(source.Id, source.Permitted ? source.Id : $"{source.Id} (not in this layer)", source.X, source.Y, source.Colour)
        {
            Shape = source.Permitted ? PointShape.Diamond : PointShape.Plus,
            Spread = source.Spread,
        };

    /// <summary>An arrow for each process from the middle of the mixtures, a fifth of the plot long.</summary>
    private static IEnumerable<FigureArrow> Arrows(IReadOnlyList<PlanePoint> mixtures, IReadOnlyList<ProcessDirection> processes, PlaneExtent extent)
    {
        double x = mixtures.Average(m => m.X);
        double y = mixtures.Average(m => m.Y);
        foreach (ProcessDirection process in processes)
        {
            double dx = process.Dx / extent.X.Width;
            double dy = process.Dy / extent.Y.Width;
            double scale = (process.Sign == ProcessSign.NonPositive ? -0.2 : 0.2) / Math.Sqrt((dx * dx) + (dy * dy));
            yield return new FigureArrow(process.Id, x, y, x + (process.Dx * scale), y + (process.Dy * scale), "--ink");
        }
    }

    private static string Outside(ReachableRegion region, PointLayer samples, bool moves)
    {
        double outside = ReachableRegion.ShareOutside(region.Mixtures, samples.X, samples.Y);
        if (region.Mixtures.Count == 0 || double.IsNaN(outside))
        {
            return "";
        }

        string sentence = $"{FigureText.PerCent(outside)} of the samples lie outside what mixtures of these sources reach in this plane";
        return moves
            ? $"{sentence}, {FigureText.PerCent(ReachableRegion.ShareOutside(region.WithProcesses, samples.X, samples.Y))} also with the processes."
            : sentence + ".";
    }
}
