using CsvHelper;
using WaterMix.Core;
using WaterMix.Core.Samples;
using WaterMix.Formats.Matching;

namespace WaterMix.Formats.Reading;

/// <summary>Reads the rows of one file into blocks of columns. No row becomes an object, and no cell a string.</summary>
internal sealed partial class FileReader
{
    private const int FirstCapacity = 1_024;

    private readonly FilePlan _plan;
    private readonly string _file;
    private readonly FindingList _findings;
    private readonly ReadingOptions _options;
    private readonly MissingValues _missing;
    private readonly byte _decimalMark;
    private readonly ColumnTarget[] _targets;
    private readonly (NameCodes Names, SourceColumn? Column)[] _identity;
    private readonly BlockBuilder _builder;
    private readonly NameOf _text = FieldText.ToText;
    private readonly NameOf _time;
    private byte[] _bottleFlags = [];
    private byte[] _timeKey = new byte[64];
    private int _timeSplit;
    private bool _sawEnd;

    /// <summary>A reader for one file.</summary>
    public FileReader(FilePlan plan, TableSchema schema, ReadingOptions options, IPerKilogram perKilogram, FindingList findings)
    {
        _plan = plan;
        _file = plan.Header.File.Name;
        _findings = findings;
        _options = options;
        _missing = new MissingValues(options.Match);
        _decimalMark = (byte)(options.Match is { } match && !plan.Header.IsExchange ? match.DecimalMark : '.');
        _targets = [.. plan.Columns.Select(c => new ColumnTarget(c))];
        _identity = [.. schema.Identity.Select(id => (new NameCodes(id), plan.Identity.GetValueOrDefault(id)))];
        _builder = new BlockBuilder(_file, plan.BottleFlag, schema, _targets, options, perKilogram, findings);
        _time = TimeOf;
    }

    /// <summary>Rows read so far.</summary>
    public long Rows { get; private set; }

    /// <summary>Values that bottles which did not trip made void, by the id of the main column.</summary>
    public IEnumerable<(string Quantity, long Count)> Voided => _targets.Where(t => t.Voided > 0).Select(t => (t.Plan.Quantity.Id, t.Voided));

    /// <summary>The blocks of the file, in order.</summary>
    /// <param name="rowsBefore">Number of rows of the files before this one.</param>
    /// <param name="cancellation">Asked between blocks and every 1,024 rows.</param>
    public IEnumerable<SampleBlock> Blocks(long rowsBefore, CancellationToken cancellation)
    {
        FileHeader header = _plan.Header;
        using CsvReader csv = CsvFiles.Open(header.File, header.Delimiter, header.HasComments);
        bool more = true;
        while (more)
        {
            int capacity = FirstCapacity;
            int rows = 0;
            Resize(capacity, isNew: true);
            while (rows < SampleBlock.MostRows && (more = NextRow(csv)))
            {
                if (rows == capacity)
                {
                    cancellation.ThrowIfCancellationRequested();
                    capacity = Math.Min(capacity * 4, SampleBlock.MostRows);
                    Resize(capacity, isNew: false);
                }

                ReadRow(csv, rows++);
            }

            cancellation.ThrowIfCancellationRequested();
            if (rows > 0)
            {
                IdentityColumn[] identity = [.. _identity.Select(i => i.Names.End(rows))];
                SampleTable table = _builder.Build(rows, identity, _bottleFlags);
                yield return new SampleBlock(table, _file, rowsBefore + Rows + 1, Rows + 1);
                Rows += rows;
            }
        }

        Close();
    }

    private void Resize(int capacity, bool isNew)
    {
        foreach (ColumnTarget target in _targets)
        {
            target.Buffer.Resize(capacity, isNew);
        }

        foreach ((NameCodes names, _) in _identity)
        {
            if (isNew)
            {
                names.Begin(capacity);
            }
            else
            {
                names.Grow(capacity);
            }
        }

        _bottleFlags = isNew ? [] : _bottleFlags;
        Array.Resize(ref _bottleFlags, _plan.BottleFlag is null ? 0 : capacity);
    }

    // Stands on the next row of data, or returns false at the end: END_DATA, the end of the file, or a place that cannot be read past.
    private bool NextRow(CsvReader csv)
    {
        FileHeader header = _plan.Header;
        try
        {
            while (csv.Read())
            {
                ReadOnlySpan<byte> record = csv.RawRecord;
                if (csv.LineNumber <= header.LastLine || (csv.FieldCount == 1 && FieldText.Trim(record).IsEmpty))
                {
                    continue;
                }

                if (record[0] is (byte)'E' or (byte)' ' && FieldText.Trim(csv.GetSpan(0)).SequenceEqual("END_DATA"u8))
                {
                    _sawEnd = true;
                    return false;
                }

                if (!FieldText.IsText(record))
                {
                    NotText(csv);
                }
                else if (csv.FieldCount != header.FieldCount && !HasOnlyBlanksBeyond(csv, header.FieldCount))
                {
                    int found = csv.FieldCount;
                    long line = csv.LineNumber;
                    _findings.Fold("width " + _file, null, () => new Finding(Severity.Error, $"{header.FieldCount} columns, as in the header", $"{found}", "Mend the rows: a cell that holds the delimiter (a decimal comma too) is two cells unless it is quoted.") { File = _file, Line = line });
                    continue;
                }

                return true;
            }

            return false;
        }
        catch (CsvFormatException e)
        {
            _findings.Add(HeaderReader.TooLong(_file, e.LineNumber));
            _sawEnd = true;
            return false;
        }
        catch (Exception e) when (e is IOException or InvalidDataException)
        {
            _findings.Add(UnreadableFile.Of(e, "a file that can be read to its end", "Fetch or pack the file again.", _file));
            _sawEnd = true;
            return false;
        }
    }

    private static bool HasOnlyBlanksBeyond(CsvReader csv, int count)
    {
        if (csv.FieldCount < count)
        {
            return false;
        }

        for (int i = count; i < csv.FieldCount; i++)
        {
            if (!FieldText.Trim(csv.GetSpan(i)).IsEmpty)
            {
                return false;
            }
        }

        return true;
    }

    private void ReadRow(CsvReader csv, int row)
    {
        foreach (ColumnTarget target in _targets)
        {
            ReadCell(csv, target, row);
        }

        if (_plan.BottleFlag is { } bottleFlag)
        {
            _bottleFlags[row] = FlagOf(csv, bottleFlag);
        }

        foreach ((NameCodes names, SourceColumn? column) in _identity)
        {
            if (names.Id == "time")
            {
                ReadTime(csv, names, column, row);
            }
            else if (column is null)
            {
                names.SetNone(row);
            }
            else
            {
                names.Set(row, FieldOf(csv, column), _text);
            }
        }
    }

    private static ReadOnlySpan<byte> FieldOf(CsvReader csv, SourceColumn column) =>
        FieldText.Trim(column.Constant is { } constant ? constant : csv.GetSpan(column.Index));

    private void ReadCell(CsvReader csv, ColumnTarget target, int row)
    {
        PlannedColumn plan = target.Plan;
        ReadOnlySpan<byte> field = FieldOf(csv, plan.Column);
        ColumnBuffer buffer = target.Buffer;
        byte flag = QualityFlags.NoFlag;
        if (plan.Flag is { } flagColumn)
        {
            flag = FlagOf(csv, flagColumn);
            buffer.Flags[row] = flag;
        }

        if (plan.Source is { } sourceColumn)
        {
            buffer.Origins[row] = ColumnTarget.OriginOf(FieldOf(csv, sourceColumn)) ?? BadOrigin(csv, sourceColumn);
        }

        double value = double.NaN;
        if (!field.IsEmpty)
        {
            if (!NumberText.TryParse(field, _decimalMark, out value) || double.IsInfinity(value))
            {
                BadCell(csv, plan.Column, field);
                value = double.NaN;
            }
            else
            {
                target.Numbers++;
                value = _missing.Holds(value, flag, target.MinusNineIsData) ? double.NaN : Convert(csv, target, row, value);
            }
        }

        buffer.Values[row] = value;
    }

    private double Convert(CsvReader csv, ColumnTarget target, int row, double value)
    {
        PlannedColumn plan = target.Plan;
        UnitConversion conversion = plan.Conversion;
        if (plan.UnitColumn is { } unitColumn)
        {
            ReadOnlySpan<byte> unit = FieldOf(csv, unitColumn);
            if (target.ConversionOf(unit) is not { } inRow)
            {
                BadUnit(csv, unitColumn, plan.Quantity, unit);
                return double.NaN;
            }

            conversion = inRow;
            target.Buffer.Bases[row] = conversion.Basis;
        }

        value = conversion.Apply(value);
        if (target.IsLongitude)
        {
            value = ColumnTarget.WrapLongitude(value);
        }

        if (!plan.Quantity.IsPossible(value))
        {
            Impossible(csv, plan, value);
        }

        return value;
    }

    private byte FlagOf(CsvReader csv, SourceColumn column)
    {
        ReadOnlySpan<byte> field = FieldOf(csv, column);
        if (field.Length == 1 && field[0] is >= (byte)'0' and <= (byte)'9')
        {
            return (byte)(field[0] - '0');
        }

        if (field.IsEmpty)
        {
            return QualityFlags.NoFlag;
        }

        if (NumberText.TryParse(field, _decimalMark, out double number))
        {
            if (number == -999 || double.IsNaN(number))
            {
                return QualityFlags.NoFlag;
            }

            if (number is >= 0 and <= 9 && number == Math.Floor(number))
            {
                return (byte)number;
            }
        }

        string found = FieldText.Quote(field);
        long line = csv.LineNumber;
        _findings.Fold("flag", column.Name, () => new Finding(Severity.Warning, "a WHP flag, 0 to 9", found, "The flag was taken as 9 (not sampled), so the value is not used. Mend the flag.") { File = _file, Line = line, Column = column.Name });
        return QualityFlags.NotSampled;
    }

    private void ReadTime(CsvReader csv, NameCodes names, SourceColumn? time, int row)
    {
        ReadOnlySpan<byte> date = _plan.Identity.TryGetValue("date", out SourceColumn? dateColumn) ? FieldOf(csv, dateColumn) : time is null ? [] : FieldOf(csv, time);
        ReadOnlySpan<byte> clock = dateColumn is null || time is null ? [] : FieldOf(csv, time);
        int length = date.Length + clock.Length;
        if (_timeKey.Length < length)
        {
            _timeKey = new byte[length];
        }

        date.CopyTo(_timeKey);
        clock.CopyTo(_timeKey.AsSpan(date.Length));
        if (_timeSplit != date.Length)
        {
            // The same bytes split elsewhere are another time.
            names.Forget();
            _timeSplit = date.Length;
        }

        names.Set(row, _timeKey.AsSpan(0, length), _time);
        if (names.Failed)
        {
            string found = FieldText.Quote(date) + (clock.IsEmpty ? "" : " " + FieldText.Quote(clock));
            string column = (dateColumn ?? time)!.Name;
            long line = csv.LineNumber;
            _findings.Fold("time", column, () => new Finding(Severity.Warning, "a date such as 1993-09-23 or 19930923 with a time such as 22:22 or 2222, UTC", found, "The time was left out. Write it as 1993-09-23T22:22Z.") { File = _file, Line = line, Column = column });
        }
    }

    private string? TimeOf(ReadOnlySpan<byte> key) => TimeText.Join(FieldText.ToText(key[.._timeSplit]), FieldText.ToText(key[_timeSplit..]));
}
