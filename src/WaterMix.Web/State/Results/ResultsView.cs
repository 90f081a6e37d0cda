using WaterMix.Core.Mixing;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Results;

/// <summary>Everything that a person chose on the Results page. The address holds it (<see cref="ResultsAddress"/>), so that the back button and a reload keep it.</summary>
public sealed record ResultsView
{
    /// <summary>The run; null: the newest that is finished.</summary>
    public Guid? Run { get; init; }

    /// <summary>What the figure shows.</summary>
    public ResultsFigure Figure { get; init; }

    /// <summary>What a section runs along.</summary>
    public SectionAlong Along { get; init; }

    /// <summary>What a section runs down.</summary>
    public SectionAgainst Against { get; init; }

    /// <summary>The id of the enlarged panel of a section; null or one that is not there: the first.</summary>
    public string? Enlarged { get; init; }

    /// <summary>The id of the station whose profiles are shown; null or one that is not there: the selected sample's, or the first.</summary>
    public string? Station { get; init; }

    /// <summary>The quantity along x of the property plot; null: the model's second tracer.</summary>
    public string? X { get; init; }

    /// <summary>The quantity along y of the property plot; null: the model's first tracer.</summary>
    public string? Y { get; init; }

    /// <summary>What colours the property plot: a source's id, <c>layer</c>, <c>status</c> or <c>misfit</c>; null: the first source.</summary>
    public string? Colour { get; init; }

    /// <summary>Which samples are shown.</summary>
    public RowFilter Filter { get; init; } = RowFilter.None;

    /// <summary>Which columns the table shows.</summary>
    public ResultsColumns Columns { get; init; }

    /// <summary>The id of the column that the table is sorted by; null: the order of the samples.</summary>
    public string? Sort { get; init; }

    /// <summary>True where the largest value comes first.</summary>
    public bool Descending { get; init; }

    /// <summary>The page of the table, from 1.</summary>
    public int Page { get; init; } = 1;

    /// <summary>The selected sample: a row of all cruises, from 0; null for none.</summary>
    public int? Sample { get; init; }

    /// <summary>The view with other samples shown, from the table's first page.</summary>
    /// <param name="filter">Which samples.</param>
    public ResultsView With(RowFilter filter) => this with { Filter = filter, Page = 1 };

    /// <summary>The view with the samples of a status; the same status again: all samples.</summary>
    /// <param name="status">The status.</param>
    public ResultsView Toggle(SolveStatus status) => With(Filter with { Status = Filter.Status == status ? null : status });

    /// <summary>The view sorted by a column: smallest first, then largest first, then in the order of the samples.</summary>
    /// <param name="column">The column's id.</param>
    public ResultsView SortBy(string column)
    {
        if (Sort != column)
        {
            return this with { Sort = column, Descending = false, Page = 1 };
        }

        return Descending ? this with { Sort = null, Descending = false, Page = 1 } : this with { Descending = true, Page = 1 };
    }
}
