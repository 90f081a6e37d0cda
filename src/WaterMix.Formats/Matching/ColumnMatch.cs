using WaterMix.Core.Samples;

namespace WaterMix.Formats.Matching;

/// <summary>How a match came about, the surest first: of two columns for one quantity the surer is taken.</summary>
public enum MatchedBy
{
    /// <summary>A match file says so.</summary>
    MatchFile,

    /// <summary>The header is the id of a quantity or of an identity column.</summary>
    Id,

    /// <summary>The header is a WHP parameter name.</summary>
    WhpName,

    /// <summary>Guessed from a name in use and its unit.</summary>
    Name,

    /// <summary>The name says nothing known: kept as a further tracer under its own name.</summary>
    OwnName,
}

/// <summary>What one column of a file is: a quantity, an identity column, or ignored. Exactly one of the three.</summary>
/// <param name="Column">The header name as it stands in the file, without the spaces around it.</param>
public sealed record ColumnMatch(string Column)
{
    /// <summary>The id of a quantity, or the user's own name for a further tracer; null where the column is none.</summary>
    public string? Quantity { get; init; }

    /// <summary>The id of an identity column, <c>date</c> (with <c>time</c> then the time of day) or <c>bottle_flag</c>; null where the column is none.</summary>
    public string? Identity { get; init; }

    /// <summary>True where the column is left out.</summary>
    public bool Ignore => Quantity is null && Identity is null;

    /// <summary>The unit, or null to take it from the file's header.</summary>
    public string? Unit { get; init; }

    /// <summary>The header name of a column that gives the unit, or the temperature scale, row by row; or null.</summary>
    public string? UnitColumn { get; init; }

    /// <summary>The header name of the column of WHP flags that belongs to this one, or null.</summary>
    public string? Flag { get; init; }

    /// <summary>The instrument, which also says in which table the flags are read; null: the usual one for the quantity.</summary>
    public ValueOrigin? Origin { get; init; }

    /// <summary>The header name of a column that says <c>bottle</c> or <c>ctd</c> row by row, where the values are merged already; or null.</summary>
    public string? Source { get; init; }

    /// <summary>How the match came about. Not part of a match file.</summary>
    public MatchedBy By { get; init; } = MatchedBy.MatchFile;

    /// <summary>The header names of the columns that are read: the column itself and its flag, unit and source columns.</summary>
    public IEnumerable<string> Columns => new[] { Column, UnitColumn, Flag, Source }.OfType<string>();
}
