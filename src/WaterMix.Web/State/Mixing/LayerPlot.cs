using WaterMix.Core.Mixing;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Mixing;

/// <summary>The layers drawn: samples coloured by their layer, bounds on the axes' quantities as lines.</summary>
/// <param name="X">The x axis.</param>
/// <param name="Y">The y axis.</param>
/// <param name="Layers">What is drawn.</param>
public sealed record LayerPlot(FigureAxis X, FigureAxis Y, IReadOnlyList<FigureLayer> Layers)
{
    private static readonly PointShape[] Shapes = [PointShape.Circle, PointShape.Square, PointShape.Diamond, PointShape.Triangle, PointShape.TriangleDown, PointShape.Plus];

    /// <summary>Draws.</summary>
    /// <param name="model">The model.</param>
    /// <param name="columns">The samples.</param>
    /// <param name="census">Which layer takes each.</param>
    /// <param name="x">The quantity along x.</param>
    /// <param name="y">The quantity along y.</param>
    public static LayerPlot Of(MixingModel model, FigureColumns columns, LayerCensus census, string x, string y)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(columns);
        ArgumentNullException.ThrowIfNull(census);
        int first = model.EndMembers.EndMembers.Count; // Colours that no source has.
        FigureCategory[] categories =
        [
            .. model.LayersOrAll.Select((layer, k) => new FigureCategory(layer.Id, SourceColours.At(first + k), Shapes[k % Shapes.Length])),
            new FigureCategory("in no layer", "--faint", PointShape.Plus),
        ];
        int[] codes = Array.ConvertAll(census.LayerOf, layer => layer < 0 ? categories.Length - 1 : layer);
        double[] xs = columns.Values(x);
        double[] ys = columns.Values(y);
        var points = new PointLayer("samples", "Samples", xs, ys, new CategoryColour("Layer", codes, categories)) { Size = 6 };
        return new LayerPlot(
            FigureAxis.For(TracerText.Of(x, model.EndMembers)),
            FigureAxis.For(TracerText.Of(y, model.EndMembers)),
            [points, .. Bounds(model, x, y, PlaneExtent.Of(xs, ys))]);
    }

    private static IEnumerable<LineLayer> Bounds(MixingModel model, string x, string y, PlaneExtent extent)
    {
        foreach (double bound in BoundsOn(model, y))
        {
            yield return new LineLayer($"y {TypedNumber.Text(bound)}", "", [extent.X.From, extent.X.To], [bound, bound], "--ink") { Dashed = true };
        }

        foreach (double bound in BoundsOn(model, x))
        {
            yield return new LineLayer($"x {TypedNumber.Text(bound)}", "", [bound, bound], [extent.Y.From, extent.Y.To], "--ink") { Dashed = true };
        }
    }

    private static IEnumerable<double> BoundsOn(MixingModel model, string quantity) =>
        model.LayersOrAll.SelectMany(l => l.Where).Where(c => c.Quantity == quantity).SelectMany(c => new[] { c.AtLeast, c.LessThan }).OfType<double>().Distinct();
}
