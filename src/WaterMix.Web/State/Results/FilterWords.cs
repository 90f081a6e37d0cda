using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Results;

/// <summary>Which samples are shown, in a sentence.</summary>
public static class FilterWords
{
    /// <summary>The sentence: <c>412 of 832 samples are shown: solved, in layer deep.</c></summary>
    /// <param name="shown">What is shown.</param>
    public static string Of(ResultsShown shown)
    {
        ArgumentNullException.ThrowIfNull(shown);
        RowFilter filter = shown.View.Filter;
        if (filter.IsNone)
        {
            return $"All {PlainText.Count(shown.RowCount, "sample")} are shown.";
        }

        List<string> parts = [];
        if (filter.Status is { } status)
        {
            parts.Add(StatusText.Of(status));
        }

        if (filter.Layer is not null)
        {
            parts.Add($"in layer {filter.Layer}");
        }

        if (filter.Cruise is { } cruise)
        {
            parts.Add(cruise <= shown.Results.Results.Count ? $"of {shown.Results.Results[cruise - 1].CruiseName}" : "of a cruise that is not in the run");
        }

        parts.AddRange(filter.Conditions.Select(c => Of(shown.Results, c)));
        return $"{PlainText.Count(shown.RowCount)} of {PlainText.Count(shown.Results.RowCount, "sample")} {(shown.RowCount == 1 ? "is" : "are")} shown: {string.Join(", ", parts)}.";
    }

    /// <summary>A condition in words: <c>fraction NDW from 0.5 to below 0.9</c>.</summary>
    /// <param name="results">The results.</param>
    /// <param name="condition">The condition.</param>
    public static string Of(RunResults results, RowCondition condition)
    {
        ArgumentNullException.ThrowIfNull(results);
        ArgumentNullException.ThrowIfNull(condition);
        ResultColumn? column = results.Table.FirstOrDefault(c => c.Id == condition.Column);
        string name = column is null ? $"{condition.Column} (not in this run)" : NameOf(column);
        string unit = column is { Unit.Length: > 0 } ? " " + column.Unit : "";
        return (condition.AtLeast, condition.LessThan) switch
        {
            ({ } low, { } high) => $"{name} from {FigureText.Number(low, 6)} to below {FigureText.Number(high, 6)}{unit}",
            ({ } low, null) => $"{name} at least {FigureText.Number(low, 6)}{unit}",
            _ => $"{name} below {FigureText.Number(condition.LessThan ?? double.NaN, 6)}{unit}",
        };
    }

    /// <summary>A column's name where it stands alone, without the heads beside it.</summary>
    /// <param name="column">The column.</param>
    public static string NameOf(ResultColumn column)
    {
        ArgumentNullException.ThrowIfNull(column);
        int mark = column.Id.IndexOf('_', StringComparison.Ordinal);
        return mark > 0 && column.Id[..mark] is "fraction" or "amount" or "residual" && column.Id != "residual_mass"
            ? $"{column.Id[..mark]} {(column.Id == "fraction_sum" ? "sum" : column.Id.StartsWith("fraction", StringComparison.Ordinal) ? column.Name : column.Name.ToLowerInvariant())}"
            : column.Name.ToLowerInvariant();
    }
}
