using CsvHelper;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Formats.Matching;

namespace WaterMix.Formats.Csv;

/// <summary>
/// Writes samples as a tidy table: one header line of ids, one row a sample, UTF-8, LF, empty for missing, doubles that read back to
/// the same bits. Reading it back gives the same table.
/// </summary>
/// <remarks>
/// The columns: the identity columns present, <c>bottle_flag</c>, then for each quantity its id (a further tracer with its unit in
/// brackets), <c>&lt;id&gt;_flag</c> where it has flags, and <c>&lt;id&gt;_source</c> (<c>bottle</c> or <c>ctd</c>) where the instrument differs
/// from row to row or is not the usual one.
/// </remarks>
public sealed class TidyCsvWriter : IDisposable
{
    private readonly CsvWriter _csv;
    private bool _hasHeader;

    /// <summary>A writer onto a stream, which stays open.</summary>
    /// <param name="stream">Where the bytes go.</param>
    public TidyCsvWriter(Stream stream) =>
        _csv = CsvWriter.Create(stream, new CsvWriterOptions { NewLine = "\n" }, leaveOpen: true);

    /// <summary>Writes the samples of a table; the first table's columns become the header, and all later ones have the same.</summary>
    /// <param name="table">The samples. A table without samples writes the header only.</param>
    public void Write(SampleTable table)
    {
        ArgumentNullException.ThrowIfNull(table);
        if (!_hasHeader)
        {
            WriteHeader(table);
            _hasHeader = true;
        }

        for (int row = 0; row < table.RowCount; row++)
        {
            WriteRow(table, row);
        }
    }

    /// <inheritdoc/>
    public void Dispose() => _csv.Dispose();

    private static bool HasSource(SampleColumn column) =>
        column.Suffix.Length == 0 && (column.IsMerged || column.Origin != Origins.Usual(column.Quantity));

    private void WriteHeader(SampleTable table)
    {
        foreach (IdentityColumn identity in table.Identity)
        {
            _csv.WriteField(identity.Id);
        }

        if (table.HasBottleFlags)
        {
            _csv.WriteField("bottle_flag");
        }

        foreach (SampleColumn column in table.Columns)
        {
            // A further tracer says its unit, once.
            string unit = $"[{column.Quantity.Unit}]";
            bool saysUnit = Quantity.Find(column.Quantity.Id) is null && unit.Length > 2 && !column.Id.EndsWith(unit, StringComparison.Ordinal);
            _csv.WriteField(saysUnit ? $"{column.Id} {unit}" : column.Id);
            if (column.HasFlags)
            {
                _csv.WriteField(column.Id + "_flag");
            }

            if (HasSource(column))
            {
                _csv.WriteField(column.Id + "_source");
            }
        }

        _csv.EndRecord();
    }

    private void WriteRow(SampleTable table, int row)
    {
        foreach (IdentityColumn identity in table.Identity)
        {
            _csv.WriteField(identity[row]);
        }

        if (table.HasBottleFlags)
        {
            WriteFlag(table.BottleFlags[row]);
        }

        foreach (SampleColumn column in table.Columns)
        {
            double value = column.Values[row];
            if (double.IsNaN(value))
            {
                _csv.WriteField(""u8);
            }
            else
            {
                _csv.WriteField(value);
            }

            if (column.HasFlags)
            {
                WriteFlag(column.FlagAt(row));
            }

            if (HasSource(column))
            {
                _csv.WriteField(column.OriginAt(row) switch { ValueOrigin.Bottle => "bottle"u8, ValueOrigin.Ctd => "ctd"u8, _ => ""u8 });
            }
        }

        _csv.EndRecord();
    }

    private void WriteFlag(byte flag)
    {
        if (flag == QualityFlags.NoFlag)
        {
            _csv.WriteField(""u8);
        }
        else
        {
            _csv.WriteField((int)flag);
        }
    }
}
