using WaterMix.Core;
using WaterMix.Core.Samples;
using WaterMix.Formats.Matching;

namespace WaterMix.Formats.Reading;

/// <summary>Counts what passes by, for the import report.</summary>
internal sealed class ImportTally(SampleTable columns, AcceptedFlags accepted)
{
    private readonly ColumnCount[] _counts = [.. columns.Columns.Select(_ => new ColumnCount())];
    private readonly long[] _bottleFlags = new long[10];
    private readonly Dictionary<string, long> _rows = new(StringComparer.Ordinal);
    private readonly Dictionary<string, long> _voided = new(StringComparer.Ordinal);
    private long _total;

    /// <summary>Counts a block.</summary>
    public void Count(SampleBlock block)
    {
        _rows[block.File] = block.FirstFileRow + block.Table.RowCount - 1;
        _total += block.Table.RowCount;
        for (int c = 0; c < _counts.Length; c++)
        {
            _counts[c].Add(block.Table.Columns[c], accepted);
        }

        foreach (byte flag in block.Table.BottleFlags)
        {
            _bottleFlags[flag]++;
        }
    }

    /// <summary>Counts the values that were made void, by quantity id.</summary>
    public void CountVoided(IEnumerable<(string Quantity, long Count)> voided)
    {
        foreach ((string quantity, long count) in voided)
        {
            _voided[quantity] = _voided.GetValueOrDefault(quantity) + count;
        }
    }

    /// <summary>The counts so far as a report.</summary>
    public ImportReport Report(IReadOnlyList<FilePlan> plans, TableSchema schema, IReadOnlyList<Finding> findings)
    {
        Dictionary<string, SchemaQuantity> byId = schema.Quantities.ToDictionary(q => q.Quantity.Id, StringComparer.Ordinal);
        return new ImportReport(
            _total,
            [.. plans.Select(p => new ImportedFile(p.Header.File.Name, Text(p.Header.Format), _rows.GetValueOrDefault(p.Header.File.Name)))],
            schema.Identity,
            [.. columns.Columns.Select((c, i) => _counts[i].Report(c, Text(byId[c.Quantity.Id].By), _voided.GetValueOrDefault(c.Id)))],
            [.. plans.SelectMany(p => p.LeftOut).Distinct(StringComparer.Ordinal)],
            Counts(_bottleFlags),
            findings);
    }

    private static string Text(SampleFormat format) => format switch
    {
        SampleFormat.ExchangeBottle => "exchange-bottle",
        SampleFormat.ExchangeCtd => "exchange-ctd",
        _ => "csv",
    };

    private static string Text(MatchedBy by) => by switch
    {
        MatchedBy.Id => "id",
        MatchedBy.WhpName => "whp-name",
        MatchedBy.Name => "name",
        MatchedBy.MatchFile => "match-file",
        _ => "own-name",
    };

    private static Dictionary<int, long> Counts(long[] flags) =>
        Enumerable.Range(1, 9).Where(f => flags[f] > 0).ToDictionary(f => f, f => flags[f]);

    private sealed class ColumnCount
    {
        private readonly long[] _flags = new long[10];
        private long _values;
        private long _missing;
        private long _usable;
        private long _fromCtd;

        public void Add(SampleColumn column, AcceptedFlags accepted)
        {
            ReadOnlySpan<double> values = column.Values;
            for (int i = 0; i < values.Length; i++)
            {
                byte flag = column.FlagAt(i);
                _flags[flag]++;
                if (double.IsNaN(values[i]))
                {
                    _missing++;
                    continue;
                }

                ValueOrigin origin = column.OriginAt(i);
                _values++;
                _usable += accepted.Accepts(flag, origin) ? 1 : 0;
                _fromCtd += origin == ValueOrigin.Ctd ? 1 : 0;
            }
        }

        public ImportedColumn Report(SampleColumn column, string by, long voided) =>
            new(column.Id, column.Quantity.Unit, column.Source, by, column.Conversion, _values, _missing, _usable, _values - _fromCtd, _fromCtd, voided, Counts(_flags));
    }
}
