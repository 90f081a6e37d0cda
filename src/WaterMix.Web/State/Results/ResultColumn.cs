using System.Globalization;

namespace WaterMix.Web.State.Results;

/// <summary>A column of the table of samples: its head, the text of one cell, and what it is sorted by. Nothing is kept per cell.</summary>
public sealed class ResultColumn
{
    private static readonly StringComparer NumbersInTextByValue = StringComparer.Create(CultureInfo.InvariantCulture, CompareOptions.NumericOrdering);

    private readonly Func<int, string> _text;
    private readonly Lazy<double[]> _keys;

    private ResultColumn(string id, string name, string unit, bool isNumber, Func<int, string> text, Func<double[]> keys)
    {
        Id = id;
        Name = name;
        Unit = unit;
        IsNumber = isNumber;
        _text = text;
        _keys = new Lazy<double[]>(keys);
    }

    /// <summary>The column's name in the result file, such as <c>fraction_NDW</c>.</summary>
    public string Id { get; }

    /// <summary>Its head.</summary>
    public string Name { get; }

    /// <summary>The unit as people write it; may be empty.</summary>
    public string Unit { get; }

    /// <summary>True where it holds numbers, which stand to the right and can be filtered by a range.</summary>
    public bool IsNumber { get; }

    /// <summary>The colour of the source whose fraction it is, or null.</summary>
    public string? Colour { get; internal set; }

    /// <summary>What it is sorted and filtered by: the numbers, or the places of the texts in order; length n.</summary>
    public double[] Keys => _keys.Value;

    /// <summary>The text of one cell.</summary>
    /// <param name="row">A row of all cruises, from 0.</param>
    public string Text(int row) => _text(row);

    /// <summary>A column of numbers.</summary>
    /// <param name="id">Its name in the result file.</param>
    /// <param name="name">Its head.</param>
    /// <param name="unit">The unit as people write it.</param>
    /// <param name="values">Length n, NaN is missing.</param>
    /// <param name="decimals">Decimals shown; null: as many as give a typical value three digits.</param>
    public static ResultColumn OfNumbers(string id, string name, string unit, double[] values, int? decimals = null)
    {
        var shown = new Lazy<int>(() => decimals ?? DecimalsFor(values));
        return new ResultColumn(id, name, unit, true, row => PlainText.Number(Plain(values[row], shown.Value), shown.Value), () => values);
    }

    /// <summary>A column of texts; numbers within them are sorted by value, empty texts last.</summary>
    /// <param name="id">Its name in the result file.</param>
    /// <param name="name">Its head.</param>
    /// <param name="rowCount">Number of rows.</param>
    /// <param name="text">The text of a row.</param>
    public static ResultColumn OfTexts(string id, string name, int rowCount, Func<int, string> text) =>
        new(id, name, "", false, text, () => Places(rowCount, text));

    /// <summary>The decimals that give a typical value (the median of the sizes) three digits, 0 to 6.</summary>
    /// <param name="values">Values, NaN where missing.</param>
    public static int DecimalsFor(IReadOnlyList<double> values)
    {
        double[] sizes = [.. values.Where(v => double.IsFinite(v) && v != 0).Select(Math.Abs)];
        if (sizes.Length == 0)
        {
            return 0;
        }

        Array.Sort(sizes);
        return Math.Clamp(2 - (int)Math.Floor(Math.Log10(sizes[sizes.Length / 2])), 0, 6);
    }

    // What rounds to zero has no sign.
    private static double Plain(double value, int decimals) => Math.Round(value, decimals) == 0 ? 0 : value;

    private static double[] Places(int rowCount, Func<int, string> text)
    {
        string[] texts = new string[rowCount];
        for (int row = 0; row < rowCount; row++)
        {
            texts[row] = text(row);
        }

        var place = texts.Distinct(StringComparer.Ordinal)
            .OrderBy(t => t, NumbersInTextByValue)
            .ThenBy(t => t, StringComparer.Ordinal)
            .Select((t, index) => (t, Place: t.Length == 0 ? double.NaN : index))
            .ToDictionary(p => p.t, p => p.Place, StringComparer.Ordinal);
        return [.. texts.Select(t => place[t])];
    }
}
