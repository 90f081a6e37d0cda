using System.Buffers;
using System.Buffers.Binary;

namespace WaterMix.Web.Api;

/// <summary>Writes columns as little-endian 32-bit floats.</summary>
internal static class FloatColumns
{
    private const int BlockRows = 16_384;

    /// <summary>Writes column after column.</summary>
    public static async Task WriteAsync(Stream output, IReadOnlyList<ColumnValues> columns, int rows, CancellationToken cancellation)
    {
        byte[] buffer = ArrayPool<byte>.Shared.Rent(BlockRows * sizeof(float));
        try
        {
            foreach (ColumnValues column in columns)
            {
                for (int first = 0; first < rows; first += BlockRows)
                {
                    int count = Math.Min(BlockRows, rows - first);
                    for (int i = 0; i < count; i++)
                    {
                        BinaryPrimitives.WriteSingleLittleEndian(buffer.AsSpan(i * sizeof(float)), (float)column(first + i));
                    }

                    await output.WriteAsync(buffer.AsMemory(0, count * sizeof(float)), cancellation);
                }
            }
        }
        finally
        {
            ArrayPool<byte>.Shared.Return(buffer);
        }
    }
}
