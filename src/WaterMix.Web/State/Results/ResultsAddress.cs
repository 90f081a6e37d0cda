using System.Globalization;
using System.Text;
using Microsoft.AspNetCore.WebUtilities;
using Microsoft.Extensions.Primitives;
using WaterMix.Core.Mixing;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Results;

/// <summary>Writes a view of the Results page into its address, and reads it back. What is as it is at first is left out; what is not understood is as it is at first.</summary>
public static class ResultsAddress
{
    private const int MostConditions = 12;

    /// <summary>The address of a view, relative to the base address.</summary>
    /// <param name="study">The study.</param>
    /// <param name="view">The view.</param>
    public static string Of(Guid study, ResultsView view)
    {
        ArgumentNullException.ThrowIfNull(view);
        var query = new StringBuilder();
        Add(query, "run", view.Run?.ToString());
        Add(query, "figure", view.Figure);
        Add(query, "along", view.Along);
        Add(query, "against", view.Against);
        Add(query, "enlarged", view.Enlarged);
        Add(query, "station", view.Station);
        Add(query, "x", view.X);
        Add(query, "y", view.Y);
        Add(query, "colour", view.Colour);
        Add(query, "status", view.Filter.Status?.Name());
        Add(query, "layer", view.Filter.Layer);
        Add(query, "cruise", view.Filter.Cruise?.ToString(CultureInfo.InvariantCulture));
        foreach (RowCondition condition in view.Filter.Conditions)
        {
            Add(query, "where", condition.ToAddress());
        }

        Add(query, "columns", view.Columns);
        Add(query, "sort", view.Sort is null ? null : (view.Descending ? "-" : "") + view.Sort);
        Add(query, "page", view.Page > 1 ? view.Page.ToString(CultureInfo.InvariantCulture) : null);
        Add(query, "sample", view.Sample is { } row ? (row + 1).ToString(CultureInfo.InvariantCulture) : null);
        return $"studies/{study}/results{query}";
    }

    /// <summary>The view that an address names.</summary>
    /// <param name="address">A full or relative address.</param>
    public static ResultsView Read(string address)
    {
        ArgumentNullException.ThrowIfNull(address);
        int question = address.IndexOf('?', StringComparison.Ordinal);
        Dictionary<string, StringValues> query = QueryHelpers.ParseQuery(question < 0 ? "" : address[question..].Split('#')[0]);
        string? sort = One(query, "sort");
        bool descending = sort?.StartsWith('-') ?? false;
        return new ResultsView
        {
            Run = Guid.TryParse(One(query, "run"), out Guid run) ? run : null,
            Figure = Choice<ResultsFigure>(One(query, "figure")),
            Along = Choice<SectionAlong>(One(query, "along")),
            Against = Choice<SectionAgainst>(One(query, "against")),
            Enlarged = One(query, "enlarged"),
            Station = One(query, "station"),
            X = One(query, "x"),
            Y = One(query, "y"),
            Colour = One(query, "colour"),
            Filter = new RowFilter
            {
                Status = Enum.GetValues<SolveStatus>().Cast<SolveStatus?>().FirstOrDefault(s => s!.Value.Name() == One(query, "status")),
                Layer = One(query, "layer"),
                Cruise = Positive(One(query, "cruise")),
                Conditions = [.. query.GetValueOrDefault("where").Select(RowCondition.FromAddress).OfType<RowCondition>().Take(MostConditions)],
            },
            Columns = Choice<ResultsColumns>(One(query, "columns")),
            Sort = descending ? sort![1..] : sort,
            Descending = descending,
            Page = Positive(One(query, "page")) ?? 1,
            Sample = Positive(One(query, "sample")) - 1,
        };
    }

    private static void Add<T>(StringBuilder query, string name, T choice)
        where T : struct, Enum =>
        Add(query, name, EqualityComparer<T>.Default.Equals(choice, default) ? null : choice.ToString().ToLowerInvariant());

    private static void Add(StringBuilder query, string name, string? value)
    {
        if (!string.IsNullOrEmpty(value))
        {
            query.Append(query.Length == 0 ? '?' : '&').Append(name).Append('=').Append(Uri.EscapeDataString(value));
        }
    }

    private static string? One(Dictionary<string, StringValues> query, string name) =>
        query.TryGetValue(name, out StringValues values) && values.Count > 0 && !string.IsNullOrEmpty(values[0]) ? values[0] : null;

    private static int? Positive(string? text) =>
        int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out int number) && number > 0 ? number : null;

    private static T Choice<T>(string? text)
        where T : struct, Enum =>
        Enum.GetValues<T>().FirstOrDefault(value => string.Equals(value.ToString(), text, StringComparison.OrdinalIgnoreCase));
}
