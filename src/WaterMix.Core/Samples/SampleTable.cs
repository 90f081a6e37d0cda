using WaterMix.Core.Quantities;

namespace WaterMix.Core.Samples;

/// <summary>
/// Samples as columns: identity, measured quantities, flags. One sample is a row index into every column. A table is immutable;
/// a reader hands out a long file as several tables (blocks) with the same columns.
/// </summary>
public sealed class SampleTable
{
    private readonly Dictionary<string, SampleColumn> _byId;
    private readonly byte[]? _bottleFlags;

    /// <summary>A table over columns of equal length.</summary>
    /// <param name="rowCount">Number of samples.</param>
    /// <param name="identity">The identity columns present, in the tidy table's order.</param>
    /// <param name="columns">The quantity columns, each id once.</param>
    /// <param name="bottleFlags">WHP bottle flags, length n (0 none), or null where the input has none.</param>
    /// <exception cref="ArgumentException">A column differs in length, or an id stands twice.</exception>
    public SampleTable(int rowCount, IReadOnlyList<IdentityColumn> identity, IReadOnlyList<SampleColumn> columns, byte[]? bottleFlags = null)
    {
        ArgumentNullException.ThrowIfNull(identity);
        ArgumentNullException.ThrowIfNull(columns);
        _byId = new Dictionary<string, SampleColumn>(columns.Count, StringComparer.Ordinal);
        foreach (SampleColumn column in columns)
        {
            if (column.Length != rowCount)
            {
                throw new ArgumentException($"The table has {rowCount} samples, but column {column.Id} has {column.Length} values.");
            }

            if (!_byId.TryAdd(column.Id, column))
            {
                throw new ArgumentException($"Column {column.Id} stands twice in the table.");
            }
        }

        foreach (IdentityColumn column in identity)
        {
            if (column.Length != rowCount)
            {
                throw new ArgumentException($"The table has {rowCount} samples, but column {column.Id} has {column.Length} names.");
            }
        }

        if (bottleFlags is not null && bottleFlags.Length != rowCount)
        {
            throw new ArgumentException($"The table has {rowCount} samples, but {bottleFlags.Length} bottle flags.");
        }

        RowCount = rowCount;
        Identity = identity;
        Columns = columns;
        _bottleFlags = bottleFlags;
    }

    /// <summary>Number of samples.</summary>
    public int RowCount { get; }

    /// <summary>The identity columns present, in the tidy table's order.</summary>
    public IReadOnlyList<IdentityColumn> Identity { get; }

    /// <summary>The quantity columns.</summary>
    public IReadOnlyList<SampleColumn> Columns { get; }

    /// <summary>True where the input has bottle flags.</summary>
    public bool HasBottleFlags => _bottleFlags is not null;

    /// <summary>WHP bottle flags, one per sample (0 none); empty where the input has none.</summary>
    public ReadOnlySpan<byte> BottleFlags => _bottleFlags;

    /// <summary>The column with this id, or null.</summary>
    /// <param name="id">A quantity's id, or one with a suffix such as <c>practical_salinity_ctd</c>.</param>
    public SampleColumn? Find(string id) => _byId.GetValueOrDefault(id);

    /// <summary>The main column of this quantity, or null.</summary>
    /// <param name="quantity">The quantity.</param>
    public SampleColumn? Find(Quantity quantity) => _byId.GetValueOrDefault(quantity.Id);

    /// <summary>The same samples with further columns; a column whose id is already there replaces that one.</summary>
    /// <param name="columns">The columns to add.</param>
    public SampleTable With(IReadOnlyList<SampleColumn> columns)
    {
        var replaced = columns.Select(c => c.Id).ToHashSet(StringComparer.Ordinal);
        return new SampleTable(RowCount, Identity, [.. Columns.Where(c => !replaced.Contains(c.Id)), .. columns], _bottleFlags);
    }
}
