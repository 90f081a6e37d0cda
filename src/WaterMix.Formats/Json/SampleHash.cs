using System.Buffers.Binary;
using System.Security.Cryptography;
using System.Text;
using WaterMix.Core.Samples;

namespace WaterMix.Formats.Json;

/// <summary>The hash of samples that arrive in blocks: the same for one table as for its rows in any number of blocks.</summary>
/// <remarks>
/// <para>For each column in order: V = SHA-256 of its values, 8 bytes each, little-endian IEEE 754, every NaN as 0x7FF8000000000000;
/// F = SHA-256 of its flags, one byte each, 0 where a value has none; C = SHA-256 of the column's id, a zero byte, its unit, a zero byte
/// (UTF-8), V and F. The hash is SHA-256 of all C in column order.</para>
/// <para>A column's id is its quantity's, with the suffix that tells bottle and CTD columns of one quantity apart. Identity columns, bottle
/// flags and the origin of each value are not part of it.</para>
/// </remarks>
public sealed class SampleHash : IDisposable
{
    private const ulong OneNaN = 0x7FF8000000000000;

    private readonly List<Column> _columns = [];
    private bool _begun;

    /// <summary>Adds the next rows.</summary>
    /// <param name="block">A table with the same columns, in the same order, as the blocks before it.</param>
    /// <exception cref="ArgumentException">The columns differ from those of the first block.</exception>
    public void Add(SampleTable block)
    {
        ArgumentNullException.ThrowIfNull(block);
        string[] present = [.. block.Columns.Select(Heading)];
        if (!_begun)
        {
            _columns.AddRange(present.Select(heading => new Column(heading)));
            _begun = true;
        }
        else if (!present.SequenceEqual(_columns.Select(c => c.Heading)))
        {
            throw new ArgumentException(
                $"Every block holds the same columns in the same order; the first had {Names(_columns.Select(c => c.Heading))}, this one has {Names(present)}.",
                nameof(block));
        }

        for (int i = 0; i < _columns.Count; i++)
        {
            _columns[i].Add(block.Columns[i]);
        }
    }

    /// <summary>The hash of all rows so far, in 64 lower-case hexadecimal digits. Rows may be added afterwards.</summary>
    public string Finish()
    {
        using var all = IncrementalHash.CreateHash(HashAlgorithmName.SHA256);
        foreach (Column column in _columns)
        {
            all.AppendData(column.Hash());
        }

        return ContentHash.Hex(all.GetCurrentHash());
    }

    /// <inheritdoc/>
    public void Dispose() => _columns.ForEach(column => column.Dispose());

    private static string Heading(SampleColumn column) => $"{column.Id}\0{column.Quantity.Unit}\0";

    private static string Names(IEnumerable<string> headings) => string.Join(", ", headings.Select(h => h[..h.IndexOf('\0', StringComparison.Ordinal)]));

    private sealed class Column(string heading) : IDisposable
    {
        private readonly IncrementalHash _values = IncrementalHash.CreateHash(HashAlgorithmName.SHA256);
        private readonly IncrementalHash _flags = IncrementalHash.CreateHash(HashAlgorithmName.SHA256);

        public string Heading => heading;

        public void Add(SampleColumn column)
        {
            byte[] bytes = new byte[8 * 1024];
            ReadOnlySpan<double> rest = column.Values;
            while (rest.Length > 0)
            {
                int count = Math.Min(rest.Length, bytes.Length / 8);
                for (int i = 0; i < count; i++)
                {
                    ulong bits = double.IsNaN(rest[i]) ? OneNaN : BitConverter.DoubleToUInt64Bits(rest[i]);
                    BinaryPrimitives.WriteUInt64LittleEndian(bytes.AsSpan(8 * i), bits);
                }

                _values.AppendData(bytes, 0, 8 * count);
                rest = rest[count..];
            }

            _flags.AppendData(column.HasFlags ? column.Flags : new byte[column.Length]);
        }

        public byte[] Hash()
        {
            using var own = IncrementalHash.CreateHash(HashAlgorithmName.SHA256);
            own.AppendData(Encoding.UTF8.GetBytes(heading));
            own.AppendData(_values.GetCurrentHash());
            own.AppendData(_flags.GetCurrentHash());
            return own.GetCurrentHash();
        }

        public void Dispose()
        {
            _values.Dispose();
            _flags.Dispose();
        }
    }
}
