using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Results;

/// <summary>The panels of each figure that is a section.</summary>
internal static class SectionPanels
{
    private static readonly string[] StatusColours = ["#882255", "#999933", "#CC6677", "#DDCC77", "#AA4499", "--pencil"];

    /// <summary>The panels of a figure; empty where it is no section, or the model has nothing to show in it.</summary>
    /// <param name="results">The results.</param>
    /// <param name="figure">The figure.</param>
    /// <param name="rows">The rows of the section's points; null for all.</param>
    public static IReadOnlyList<SectionPanel> Of(RunResults results, ResultsFigure figure, int[]? rows) => figure switch
    {
        ResultsFigure.Fractions => [.. results.Sources.Select((source, index) => new SectionPanel(
            source.Id,
            source.Name.Length > 0 ? $"{source.Name} ({source.Id})" : source.Id,
            new StrengthColour(source.Id, SourceColours.At(index), At(results.Columns.Fractions(source.Id), rows))))],
        ResultsFigure.Processes => [.. results.Model.Processes.Select(process => Amount(results, process, rows))],
        ResultsFigure.Residuals => [.. results.Model.Tracers.Select(tracer => Residual(results, tracer, rows))],
        ResultsFigure.Fit =>
        [
            new SectionPanel("misfit", "Misfit", new SequentialColour("Misfit", "", At(results.Misfit, rows))),
            new SectionPanel("p_value", "p, the chance of a larger χ²", new SequentialColour("p", "", At(results.PValue, rows), new FigureRange(0, 1))),
            new SectionPanel("status", "Status", StatusColour(results, rows)),
        ],
        _ => [],
    };

    /// <summary>A colour and a shape for each status that occurs.</summary>
    /// <param name="results">The results.</param>
    /// <param name="rows">The rows; null for all.</param>
    public static CategoryColour StatusColour(RunResults results, int[]? rows)
    {
        // The most wanted first, as in the legend.
        SolveStatus[] present = [.. results.Status.Distinct().OrderDescending()];
        int[] codes = [.. At(results.Status, rows).Select(s => Array.IndexOf(present, s))];
        return new CategoryColour("Status", codes, [.. present.Select(s => new FigureCategory(StatusText.Of(s), StatusColours[(int)s], ShapeOf(s)))]);
    }

    /// <summary>The entries of some rows; the array itself for all.</summary>
    /// <param name="column">Length n.</param>
    /// <param name="rows">The rows; null for all.</param>
    public static T[] At<T>(T[] column, int[]? rows) => rows is null ? column : [.. rows.Select(row => column[row])];

    private static SectionPanel Amount(RunResults results, Process process, int[]? rows)
    {
        Quantity per = results.QuantityOf(process.Per);
        string unit = FigureText.Unit(per.Unit);
        double[] amounts = At(results.Columns.Amounts(process.Id), rows);
        string title = $"{FigureText.Sentence(process.Id)}, as {per.Name}";
        PointColour colour = process.Sign == ProcessSign.Free ? new DivergingColour(process.Id, unit, amounts) : new SequentialColour(process.Id, unit, amounts);
        return new SectionPanel(process.Id, title, colour);
    }

    private static SectionPanel Residual(RunResults results, string tracer, int[]? rows)
    {
        Quantity quantity = results.QuantityOf(tracer);
        return new SectionPanel(
            tracer,
            FigureText.Sentence(quantity.Name),
            new DivergingColour($"{quantity.Name}, observed minus fitted", FigureText.Unit(quantity.Unit), At(results.Columns.Residuals(tracer), rows)));
    }

    private static PointShape ShapeOf(SolveStatus status) => status switch
    {
        SolveStatus.Solved => PointShape.Circle,
        SolveStatus.NotUnique => PointShape.Diamond,
        SolveStatus.NotConverged => PointShape.Triangle,
        SolveStatus.TooFewTracers => PointShape.TriangleDown,
        SolveStatus.OutsideLayers => PointShape.Plus,
        _ => PointShape.Square,
    };
}
