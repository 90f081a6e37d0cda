using Parquet;
using Parquet.Schema;

namespace WaterMix.Workspace.Storage.Columns;

/// <summary>Reads what <see cref="ColumnFileWriter"/> wrote, whole columns at a time.</summary>
internal sealed class ColumnFileReader : IAsyncDisposable
{
    private readonly ParquetReader _reader;
    private readonly Dictionary<string, DataField> _fields;

    private ColumnFileReader(ParquetReader reader)
    {
        _reader = reader;
        _fields = reader.Schema.DataFields.ToDictionary(f => f.Name, StringComparer.Ordinal);
        RowCount = (int)reader.RowGroups.Sum(g => g.RowCount);
    }

    /// <summary>Number of rows.</summary>
    public int RowCount { get; }

    /// <summary>Opens a file.</summary>
    /// <param name="path">The file.</param>
    /// <param name="what">What it holds, for the message where it cannot be read.</param>
    /// <exception cref="InvalidDataException">The file is missing or damaged; the message says what to do.</exception>
    public static async Task<ColumnFileReader> OpenAsync(string path, string what)
    {
        try
        {
            return new ColumnFileReader(await ParquetReader.CreateAsync(path));
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException or ParquetException or InvalidDataException)
        {
            throw new InvalidDataException(
                $"{what} cannot be read: {fault.Message.TrimEnd('.')}. Put the data folder's file {Path.GetFileName(path)} back from a copy, or read the cruise again from its upload.", fault);
        }
    }

    /// <summary>What <see cref="ColumnFileWriter.FinishAsync"/> was given under this name.</summary>
    /// <param name="name">What kind of file it should be.</param>
    /// <exception cref="InvalidDataException">It is another kind of file.</exception>
    public string Description(string name) =>
        _reader.CustomMetadata.GetValueOrDefault(name) ?? throw new InvalidDataException($"Expected a column file of kind {name}; this one is another. Put the data folder's file back from a copy.");

    /// <summary>A column of numbers, all rows.</summary>
    /// <typeparam name="T">double, int or byte.</typeparam>
    /// <param name="name">The column's name.</param>
    public async Task<T[]> NumbersAsync<T>(string name)
        where T : struct
    {
        var values = new T[RowCount];
        await FillAsync(name, values.AsMemory());
        return values;
    }

    /// <summary>A column of numbers into somebody's array.</summary>
    /// <typeparam name="T">double, int or byte.</typeparam>
    /// <param name="name">The column's name.</param>
    /// <param name="into">As long as there are rows.</param>
    public async Task FillAsync<T>(string name, Memory<T> into)
        where T : struct
    {
        for (int k = 0; k < _reader.RowGroupCount; k++)
        {
            using ParquetRowGroupReader group = _reader.OpenRowGroupReader(k);
            await group.ReadAsync(_fields[name], into[..(int)group.RowCount]);
            into = into[(int)group.RowCount..];
        }
    }

    /// <summary>A column of texts into somebody's array; null where there is none.</summary>
    /// <param name="name">The column's name.</param>
    /// <param name="into">As long as there are rows.</param>
    public async Task FillAsync(string name, Memory<string?> into)
    {
        for (int k = 0; k < _reader.RowGroupCount; k++)
        {
            using ParquetRowGroupReader group = _reader.OpenRowGroupReader(k);
            Memory<string?> part = into[..(int)group.RowCount];
            part.Span.Clear();
            await group.ReadAsync(_fields[name], part);
            into = into[part.Length..];
        }
    }

    /// <summary>Closes the file.</summary>
    public ValueTask DisposeAsync() => _reader.DisposeAsync();
}
