using WaterMix.Core.Samples;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Samples;

/// <summary>The first rows of an import as text: a look at whether each number stands where it should.</summary>
/// <param name="Headers">The columns' names with their units.</param>
/// <param name="Rows">The rows, a text per column.</param>
public sealed record FirstRows(IReadOnlyList<string> Headers, IReadOnlyList<IReadOnlyList<string>> Rows)
{
    private const int Most = 8;

    /// <summary>The first rows of a table.</summary>
    /// <param name="table">The table.</param>
    public static FirstRows Of(SampleTable table)
    {
        ArgumentNullException.ThrowIfNull(table);
        return new FirstRows(
            [
                .. table.Identity.Select(c => FigureText.Sentence(c.Id)),
                .. table.Columns.Select(c => FigureText.Sentence(c.Quantity.Name) + c.Suffix.Replace("_ctd", ", CTD", StringComparison.Ordinal).Replace("_bottle", ", bottle", StringComparison.Ordinal)
                    + (FigureText.Unit(c.Quantity.Unit) is { Length: > 0 } unit ? $" ({unit})" : "")),
            ],
            [
                .. Enumerable.Range(0, Math.Min(Most, table.RowCount)).Select(row => (IReadOnlyList<string>)
                [
                    .. table.Identity.Select(c => c[row]),
                    .. table.Columns.Select(c => FigureText.Number(c.Values[row], 6)),
                ]),
            ]);
    }
}
