using System.Globalization;

namespace WaterMix.Cli.Tests;

/// <summary>A written result, by column name.</summary>
internal sealed class ResultTable
{
    private readonly string[] _names;
    private readonly string[][] _rows;

    private ResultTable(string[] names, string[][] rows) => (_names, _rows) = (names, rows);

    public IReadOnlyList<string> Names => _names;

    public int RowCount => _rows.Length;

    public static ResultTable Parse(string csv)
    {
        string[] lines = csv.Split('\n', StringSplitOptions.RemoveEmptyEntries);
        return new ResultTable(lines[0].Split(','), [.. lines[1..].Select(Fields)]);
    }

    public string Text(int row, string column) => _rows[row][Array.IndexOf(_names, column)];

    public double Number(int row, string column) =>
        Text(row, column) is { Length: > 0 } text ? double.Parse(text, CultureInfo.InvariantCulture) : double.NaN;

    // Quoted fields hold commas only in the notes, the last column.
    private static string[] Fields(string line)
    {
        int quote = line.IndexOf('"', StringComparison.Ordinal);
        return quote < 0 ? line.Split(',') : [.. line[..(quote - 1)].Split(','), line[(quote + 1)..^1]];
    }
}
