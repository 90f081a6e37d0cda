namespace WaterMix.Formats.Matching;

/// <summary>A saved column match, <c>watermix/column-match/1</c>: what the columns of a kind of file are, and how its numbers are written.</summary>
/// <param name="Columns">One entry for each column that the file speaks of; others are guessed as without it.</param>
public sealed partial record ColumnMatchFile(IReadOnlyList<ColumnMatch> Columns)
{
    /// <summary>The value of the <c>schema</c> key.</summary>
    public const string Schema = "watermix/column-match/1";

    /// <summary>The delimiter, or null for commas.</summary>
    public char? Delimiter { get; init; }

    /// <summary>The decimal mark, <c>.</c> or <c>,</c>.</summary>
    public char DecimalMark { get; init; } = '.';

    /// <summary>Texts that stand for a missing value, beside those that always do; one that is a number stands for every spelling of that number.</summary>
    public IReadOnlyList<string> Missing { get; init; } = [];
}
