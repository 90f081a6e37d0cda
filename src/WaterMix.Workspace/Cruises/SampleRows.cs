using WaterMix.Core.Samples;

namespace WaterMix.Workspace.Cruises;

/// <summary>Consecutive rows of a table as a table of their own.</summary>
internal static class SampleRows
{
    /// <summary>Some rows, all columns.</summary>
    /// <param name="table">The samples.</param>
    /// <param name="from">Index of the first.</param>
    /// <param name="count">How many.</param>
    public static SampleTable Slice(SampleTable table, int from, int count) => new(
        count,
        [.. table.Identity.Select(c => Slice(c, from, count))],
        [.. table.Columns.Select(c => Slice(c, from, count))],
        table.HasBottleFlags ? table.BottleFlags.Slice(from, count).ToArray() : null);

    /// <summary>Some rows of the columns that a model can use: no names, and of each quantity its main column.</summary>
    /// <param name="table">The samples.</param>
    /// <param name="from">Index of the first.</param>
    /// <param name="count">How many.</param>
    public static SampleTable ForSolving(SampleTable table, int from, int count) =>
        new(count, [], [.. table.Columns.Where(c => c.Suffix.Length == 0).Select(c => Slice(c, from, count))]);

    /// <summary>Some rows of an identity column.</summary>
    public static IdentityColumn Slice(IdentityColumn column, int from, int count)
    {
        var codes = new int[count];
        var names = new List<string>();
        for (int i = 0; i < count; i++)
        {
            string name = column[from + i];
            if (name.Length == 0)
            {
                codes[i] = -1;
                continue;
            }

            // Neighbours mostly share a name.
            if (names.Count == 0 || names[^1] != name)
            {
                names.Add(name);
            }

            codes[i] = names.Count - 1;
        }

        return new IdentityColumn(column.Id, codes, [.. names]);
    }

    /// <summary>Some rows of a quantity column.</summary>
    public static SampleColumn Slice(SampleColumn column, int from, int count)
    {
        ValueOrigin[]? origins = null;
        if (column.IsMerged)
        {
            origins = new ValueOrigin[count];
            for (int i = 0; i < count; i++)
            {
                origins[i] = column.OriginAt(from + i);
            }
        }

        byte[]? flags = column.HasFlags ? column.Flags.Slice(from, count).ToArray() : null;
        return new SampleColumn(column.Quantity, column.Values.Slice(from, count).ToArray(), flags, origins, column.Origin)
        {
            Suffix = column.Suffix,
            Source = column.Source,
            Conversion = column.Conversion,
        };
    }
}
