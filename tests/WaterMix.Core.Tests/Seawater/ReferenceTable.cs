using System.Globalization;
using System.IO.Compression;
using WaterMix.Testing;

namespace WaterMix.Core.Tests.Seawater;

/// <summary>A table of reference values: a header of names, then numbers, empty for missing; lines that begin with # say where it is from.</summary>
internal sealed class ReferenceTable
{
    private readonly Dictionary<string, int> _columns;
    private readonly string[][] _rows;

    private ReferenceTable(IEnumerable<string> lines)
    {
        string[][] cells = [.. lines.Where(l => l.Length > 0 && l[0] != '#').Select(l => l.Split(','))];
        _columns = cells[0].Select((name, i) => (name, i)).ToDictionary(c => c.name, c => c.i, StringComparer.Ordinal);
        _rows = cells[1..];
    }

    public int Count => _rows.Length;

    /// <summary>A table among the project's own reference files; a name that ends in .gz is unpacked.</summary>
    public static ReferenceTable Open(string name) => OpenFile(Path.Combine(TestData.Root, "tests", "Reference", "seawater", name));

    public static ReferenceTable OpenFile(string path)
    {
        if (!path.EndsWith(".gz", StringComparison.Ordinal))
        {
            return new ReferenceTable(File.ReadLines(path));
        }

        using var reader = new StreamReader(new GZipStream(File.OpenRead(path), CompressionMode.Decompress));
        return Parse(reader.ReadToEnd());
    }

    public static ReferenceTable Parse(string text) => new(text.Split('\n').Select(l => l.TrimEnd('\r')));

    public string Text(int row, string column) => _rows[row][_columns[column]];

    public double this[int row, string column] =>
        Text(row, column) is { Length: > 0 } text ? double.Parse(text, NumberStyles.Float, CultureInfo.InvariantCulture) : double.NaN;
}
