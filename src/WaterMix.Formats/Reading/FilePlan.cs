using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Formats.Matching;

namespace WaterMix.Formats.Reading;

/// <summary>A column of one file on its way into the table.</summary>
/// <param name="Column">Where it stands.</param>
/// <param name="Quantity">What it holds.</param>
/// <param name="Role">The instrument; <see cref="ValueOrigin.None"/> where the file has merged the two already.</param>
/// <param name="Conversion">From its unit to the canonical one.</param>
/// <param name="Unit">Its unit as the file or the match gives it; empty where there is none.</param>
/// <param name="By">How it was matched.</param>
internal sealed record PlannedColumn(SourceColumn Column, Quantity Quantity, ValueOrigin Role, UnitConversion Conversion, string Unit, MatchedBy By)
{
    /// <summary>The column of its flags, or null.</summary>
    public SourceColumn? Flag { get; init; }

    /// <summary>The column of its unit row by row, or null.</summary>
    public SourceColumn? UnitColumn { get; init; }

    /// <summary>The column of its instrument row by row, or null.</summary>
    public SourceColumn? Source { get; init; }

    /// <summary>True where a bottle that did not trip voids the value: measured on its water.</summary>
    public bool IsWaterSample =>
        Role != ValueOrigin.Ctd && (Flag is not null || (Quantity.Find(Quantity.Id) is { Use: not TracerUse.Never }));
}

/// <summary>What is read from one file.</summary>
/// <param name="Header">The file's header.</param>
/// <param name="Columns">The quantity columns, in the file's order.</param>
/// <param name="Identity">The identity columns by id, <c>date</c> among them.</param>
/// <param name="BottleFlag">The column of bottle flags, or null.</param>
/// <param name="Matches">The whole match, as it would be saved.</param>
internal sealed record FilePlan(
    FileHeader Header,
    IReadOnlyList<PlannedColumn> Columns,
    IReadOnlyDictionary<string, SourceColumn> Identity,
    SourceColumn? BottleFlag,
    IReadOnlyList<ColumnMatch> Matches)
{
    /// <summary>The columns that nothing is read from.</summary>
    public IEnumerable<string> LeftOut
    {
        get
        {
            var read = Matches.Where(m => !m.Ignore).SelectMany(m => m.Columns).ToHashSet(StringComparer.Ordinal);
            return Header.Columns.Select(c => c.Name).Where(n => !read.Contains(n));
        }
    }
}
