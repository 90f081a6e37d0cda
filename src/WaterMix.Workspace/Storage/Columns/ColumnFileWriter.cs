using Parquet;
using Parquet.Schema;

namespace WaterMix.Workspace.Storage.Columns;

/// <summary>Writes a Parquet file of plain columns, uncompressed: the same content always gives the same bytes.</summary>
internal sealed class ColumnFileWriter : IAsyncDisposable
{
    /// <summary>Rows in a row group; only a file's last group has fewer.</summary>
    public const int GroupRows = 65_536;

    private readonly ParquetWriter _writer;
    private readonly DataField[] _fields;
    private bool _finished;

    private ColumnFileWriter(ParquetWriter writer, DataField[] fields)
    {
        _writer = writer;
        _fields = fields;
    }

    /// <summary>A column of a file: double, int, byte or string (which may be null).</summary>
    /// <typeparam name="T">The type of its values.</typeparam>
    /// <param name="name">The column's name.</param>
    public static DataField Field<T>(string name) => new(name, typeof(T), isNullable: typeof(T) == typeof(string));

    /// <summary>Begins a file.</summary>
    /// <param name="stream">Where it goes; it stays open.</param>
    /// <param name="fields">The columns.</param>
    public static async Task<ColumnFileWriter> CreateAsync(Stream stream, DataField[] fields)
    {
        var options = new ParquetOptions { CompressionMethod = CompressionMethod.None };
        foreach (DataField field in fields.Where(f => f.ClrType == typeof(string)))
        {
            options.ColumnEncodingHints[field.Name] = EncodingHint.Dictionary;
        }

        return new ColumnFileWriter(await ParquetWriter.CreateAsync(new ParquetSchema(fields), stream, options), fields);
    }

    /// <summary>Writes a row group.</summary>
    /// <param name="rows">Number of rows.</param>
    /// <param name="columns">For each field an array of at least that many values: double[], int[], byte[] or string?[].</param>
    public async Task WriteGroupAsync(int rows, IReadOnlyList<Array> columns)
    {
        using ParquetRowGroupWriter group = _writer.CreateRowGroup();
        for (int i = 0; i < _fields.Length; i++)
        {
            await (columns[i] switch
            {
                double[] values => group.WriteAsync<double>(_fields[i], values.AsMemory(0, rows)),
                int[] values => group.WriteAsync<int>(_fields[i], values.AsMemory(0, rows)),
                byte[] values => group.WriteAsync<byte>(_fields[i], values.AsMemory(0, rows)),
                string?[] values => group.WriteAsync(_fields[i], new ArraySegment<string>(values!, 0, rows)),
                _ => throw new ArgumentException($"Columns hold double, int, byte or string; {_fields[i].Name} holds {columns[i].GetType().Name}.", nameof(columns)),
            });
        }
    }

    /// <summary>Ends the file.</summary>
    /// <param name="name">What kind of file it is.</param>
    /// <param name="description">What the columns mean, as JSON.</param>
    public async Task FinishAsync(string name, string description)
    {
        _writer.CustomMetadata = new Dictionary<string, string> { [name] = description };
        _finished = true;
        await _writer.DisposeAsync();
    }

    /// <summary>Ends the file where <see cref="FinishAsync"/> did not; what stands there is then not to be used.</summary>
    public ValueTask DisposeAsync() => _finished ? ValueTask.CompletedTask : _writer.DisposeAsync();
}
