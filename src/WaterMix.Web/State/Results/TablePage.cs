namespace WaterMix.Web.State.Results;

/// <summary>One page of the table of samples, as text.</summary>
/// <param name="Columns">The columns that are shown.</param>
/// <param name="Lines">The lines of this page, at most <see cref="Size"/>.</param>
/// <param name="Page">The page, from 1; the last one where the view named a later one.</param>
/// <param name="PageCount">Number of pages, at least 1.</param>
/// <param name="RowCount">Number of samples on all pages.</param>
public sealed record TablePage(IReadOnlyList<ResultColumn> Columns, IReadOnlyList<TableLine> Lines, int Page, int PageCount, int RowCount)
{
    /// <summary>Lines to a page.</summary>
    public const int Size = 50;

    /// <summary>A page of rows.</summary>
    /// <param name="results">The results.</param>
    /// <param name="ordered">The rows that are shown, in the table's order.</param>
    /// <param name="columns">Which columns.</param>
    /// <param name="page">The page, from 1.</param>
    public static TablePage Of(RunResults results, int[] ordered, ResultsColumns columns, int page)
    {
        ArgumentNullException.ThrowIfNull(results);
        ArgumentNullException.ThrowIfNull(ordered);
        IReadOnlyList<ResultColumn> shown = ResultTableColumns.Shown(results, columns);
        int count = Math.Max(1, (ordered.Length + Size - 1) / Size);
        int own = Math.Clamp(page, 1, count);
        IEnumerable<int> rows = ordered.Skip((own - 1) * Size).Take(Size);
        return new TablePage(shown, [.. rows.Select(row => new TableLine(row, results.Columns.NameOf(row), [.. shown.Select(c => c.Text(row))]))], own, count, ordered.Length);
    }

    /// <summary>Which samples are on this page: <c>1–50 of 832</c>.</summary>
    public string Words => RowCount == 0
        ? "No sample"
        : $"{PlainText.Count(((Page - 1) * (long)Size) + 1)}–{PlainText.Count(((Page - 1) * (long)Size) + Lines.Count)} of {PlainText.Count(RowCount, "sample")}";
}

/// <summary>A line of the table.</summary>
/// <param name="Row">The row of all cruises, from 0.</param>
/// <param name="Name">The sample in words.</param>
/// <param name="Cells">The texts, one per column.</param>
public sealed record TableLine(int Row, string Name, IReadOnlyList<string> Cells)
{
    /// <summary>The row as people and result files count it, from 1.</summary>
    public string Number => PlainText.Count(Row + 1L);

    /// <summary>What the line's button is called.</summary>
    public string Label => $"{Number}, card of {Name}";
}
