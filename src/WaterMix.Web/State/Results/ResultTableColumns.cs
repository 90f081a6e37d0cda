using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Results;

/// <summary>The columns of the table of samples.</summary>
internal static class ResultTableColumns
{
    private static readonly string[] Naming = ["cruise", "station", "cast", "sample", "pressure"];
    private static readonly string[] Places = ["layer", "status"];
    private static readonly string[] Quality = ["tracers", "misfit", "chi2", "dof", "p_value", "residual_mass", "note"];

    /// <summary>Every column, in the order of the result file.</summary>
    public static IReadOnlyList<ResultColumn> Of(RunResults results) =>
    [
        .. Identity(results),
        Values(results, Quantity.Latitude, 3),
        Values(results, Quantity.Longitude, 3),
        Values(results, Quantity.Pressure, 0),
        ResultColumn.OfTexts("layer", "Layer", results.RowCount, row => results.Layer[row] < 0 ? "" : results.LayerIds[results.Layer[row]]),
        ResultColumn.OfTexts("status", "Status", results.RowCount, row => StatusText.Of(results.Status[row])),
        ResultColumn.OfNumbers("tracers", "Tracers used", "", results.TracerCount, 0),
        .. results.Sources.Select((source, index) => Fraction(results, source, index)),
        ResultColumn.OfNumbers("fraction_sum", "Sum", "", results.FractionSum, 3),
        .. results.Model.Processes.Select(p => Amount(results, p)),
        .. results.Model.Tracers.Select(t => Residual(results, t)),
        ResultColumn.OfNumbers("residual_mass", "Mass residual", "", results.ResidualMass, 4),
        ResultColumn.OfNumbers("misfit", "Misfit", "", results.Misfit, 2),
        ResultColumn.OfNumbers("chi2", "χ²", "", results.Chi2, 2),
        ResultColumn.OfNumbers("dof", "Degrees of freedom", "", results.DegreesOfFreedom, 0),
        ResultColumn.OfNumbers("p_value", "p", "", results.PValue, 3),
        ResultColumn.OfTexts("note", "Note", results.RowCount, row => results.NoteOf(row) ?? ""),
    ];

    /// <summary>The columns that a choice shows.</summary>
    public static IReadOnlyList<ResultColumn> Shown(RunResults results, ResultsColumns choice) =>
        choice == ResultsColumns.All ? results.Table : [.. results.Table.Where(c => Naming.Contains(c.Id) || IsIn(c.Id, choice))];

    private static bool IsIn(string id, ResultsColumns choice) => choice switch
    {
        ResultsColumns.Residuals => id.StartsWith("residual_", StringComparison.Ordinal) || id == "misfit",
        ResultsColumns.Fit => Places.Contains(id) || Quality.Contains(id),
        _ => Places.Contains(id) || id.StartsWith("fraction_", StringComparison.Ordinal) || id.StartsWith("amount_", StringComparison.Ordinal),
    };

    private static IEnumerable<ResultColumn> Identity(RunResults results)
    {
        if (results.Results.Count > 1)
        {
            yield return ResultColumn.OfTexts("cruise", "Cruise", results.RowCount, row => results.Results[results.Columns.Locate(row).Cruise].CruiseName);
        }

        IEnumerable<string> present = results.Columns.Cruises.SelectMany(c => c.Samples.Identity.Select(i => i.Id));
        foreach (string id in IdentityColumn.Ids.Where(present.Contains))
        {
            IdentityColumn?[] columns = [.. results.Columns.Cruises.Select(c => c.Samples.Identity.FirstOrDefault(i => i.Id == id))];
            yield return ResultColumn.OfTexts(id, FigureText.Sentence(id), results.RowCount, row =>
            {
                (int cruise, int own) = results.Columns.Locate(row);
                return columns[cruise]?[own] ?? "";
            });
        }
    }

    private static ResultColumn Values(RunResults results, Quantity quantity, int decimals) => ResultColumn.OfNumbers(
        quantity.Id, FigureText.Sentence(quantity.Name), FigureText.Unit(quantity.Unit), results.Columns.Values(quantity.Id), decimals);

    private static ResultColumn Fraction(RunResults results, EndMember source, int index)
    {
        ResultColumn column = ResultColumn.OfNumbers("fraction_" + source.Id, source.Id, "", results.Columns.Fractions(source.Id), 3);
        column.Colour = SourceColours.At(index);
        return column;
    }

    private static ResultColumn Amount(RunResults results, Process process) => ResultColumn.OfNumbers(
        "amount_" + process.Id, FigureText.Sentence(process.Id), FigureText.Unit(results.QuantityOf(process.Per).Unit), results.Columns.Amounts(process.Id));

    private static ResultColumn Residual(RunResults results, string tracer)
    {
        Quantity quantity = results.QuantityOf(tracer);
        return ResultColumn.OfNumbers("residual_" + tracer, FigureText.Sentence(quantity.Name), FigureText.Unit(quantity.Unit), results.Columns.Residuals(tracer));
    }
}
