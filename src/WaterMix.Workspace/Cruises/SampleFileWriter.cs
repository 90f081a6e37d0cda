using Parquet.Schema;
using WaterMix.Core.Samples;
using WaterMix.Formats.Json;
using WaterMix.Formats.Reading;
using WaterMix.Workspace.Storage.Columns;

namespace WaterMix.Workspace.Cruises;

/// <summary>Writes samples to a column file as they are read, so that memory does not grow with the input, and takes their hash on the way.</summary>
internal sealed class SampleFileWriter : IAsyncDisposable
{
    private readonly ColumnFileWriter _file;
    private readonly SampleFileHeader _header;
    private readonly SampleHash _hash = new();
    private readonly Array[] _buffers;
    private readonly List<FileRows> _files = [];
    private int _filled;

    private SampleFileWriter(ColumnFileWriter file, SampleFileHeader header, Array[] buffers)
    {
        _file = file;
        _header = header;
        _buffers = buffers;
    }

    /// <summary>Number of samples so far.</summary>
    public int RowCount { get; private set; }

    /// <summary>Begins a file.</summary>
    /// <param name="stream">Where it goes; it stays open.</param>
    /// <param name="schema">The columns of every block.</param>
    public static async Task<SampleFileWriter> CreateAsync(Stream stream, SampleTable schema)
    {
        SampleFileHeader header = SampleFileHeader.Of(schema);
        var fields = new List<(DataField Field, Array Buffer)>();
        fields.AddRange(header.Identity.Select(id => Text(SampleFileHeader.IdentityName(id))));
        if (header.HasBottleFlags)
        {
            fields.Add(Bytes(SampleFileHeader.BottleFlags));
        }

        foreach (SampleFileHeader.Column column in header.Columns)
        {
            fields.Add((ColumnFileWriter.Field<double>(column.Values), new double[ColumnFileWriter.GroupRows]));
            if (column.HasFlags)
            {
                fields.Add(Bytes(column.Flags));
            }

            if (column.IsMerged)
            {
                fields.Add(Bytes(column.Origins));
            }
        }

        ColumnFileWriter file = await ColumnFileWriter.CreateAsync(stream, [.. fields.Select(f => f.Field)]);
        return new SampleFileWriter(file, header, [.. fields.Select(f => f.Buffer)]);
    }

    /// <summary>Adds the next samples.</summary>
    /// <param name="block">Samples with the columns of the schema.</param>
    /// <exception cref="InvalidDataException">There are more samples than one cruise can hold.</exception>
    public async Task AddAsync(SampleBlock block)
    {
        if (RowCount > Array.MaxLength - block.Table.RowCount)
        {
            throw new InvalidDataException("A cruise holds at most two thousand million samples. Upload the files as several cruises.");
        }

        _hash.Add(block.Table);
        AddFile(block);
        for (int from = 0; from < block.Table.RowCount;)
        {
            int count = Math.Min(block.Table.RowCount - from, ColumnFileWriter.GroupRows - _filled);
            Copy(block.Table, from, count);
            from += count;
            _filled += count;
            if (_filled == ColumnFileWriter.GroupRows)
            {
                await FlushAsync();
            }
        }
    }

    /// <summary>Ends the file.</summary>
    /// <param name="namesFiles">True where results name the file of each row.</param>
    /// <returns>The hash of the samples.</returns>
    public async Task<string> FinishAsync(bool namesFiles)
    {
        if (_filled > 0)
        {
            await FlushAsync();
        }

        await _file.FinishAsync(SampleFileHeader.Kind, (_header with { Files = _files, NamesFiles = namesFiles }).Write());
        return _hash.Finish();
    }

    /// <summary>Lets the file go.</summary>
    public ValueTask DisposeAsync()
    {
        _hash.Dispose();
        return _file.DisposeAsync();
    }

    private static (DataField, Array) Bytes(string name) => (ColumnFileWriter.Field<byte>(name), new byte[ColumnFileWriter.GroupRows]);

    private static (DataField, Array) Text(string name) => (ColumnFileWriter.Field<string>(name), new string?[ColumnFileWriter.GroupRows]);

    private void AddFile(SampleBlock block)
    {
        int rows = block.Table.RowCount;
        if (_files.Count > 0 && _files[^1] is { } last && last.File == block.File && last.FirstFileRow + last.Count == block.FirstFileRow)
        {
            _files[^1] = last with { Count = last.Count + rows };
        }
        else if (rows > 0)
        {
            _files.Add(new FileRows(block.File, RowCount, block.FirstFileRow, rows));
        }

        RowCount += rows;
    }

    private void Copy(SampleTable table, int from, int count)
    {
        int next = 0;
        foreach (IdentityColumn column in table.Identity)
        {
            Span<string?> names = ((string?[])_buffers[next++]).AsSpan(_filled, count);
            for (int i = 0; i < count; i++)
            {
                names[i] = column[from + i] is { Length: > 0 } name ? name : null;
            }
        }

        if (_header.HasBottleFlags)
        {
            table.BottleFlags.Slice(from, count).CopyTo(((byte[])_buffers[next++]).AsSpan(_filled));
        }

        foreach (SampleColumn column in table.Columns)
        {
            column.Values.Slice(from, count).CopyTo(((double[])_buffers[next++]).AsSpan(_filled));
            if (column.HasFlags)
            {
                column.Flags.Slice(from, count).CopyTo(((byte[])_buffers[next++]).AsSpan(_filled));
            }

            if (column.IsMerged)
            {
                Span<byte> origins = ((byte[])_buffers[next++]).AsSpan(_filled, count);
                for (int i = 0; i < count; i++)
                {
                    origins[i] = (byte)column.OriginAt(from + i);
                }
            }
        }
    }

    private async Task FlushAsync()
    {
        await _file.WriteGroupAsync(_filled, _buffers);
        _filled = 0;
    }
}
