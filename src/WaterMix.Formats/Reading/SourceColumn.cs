namespace WaterMix.Formats.Reading;

/// <summary>A column of a file as its header gives it, or a value of a CTD file's header that holds for every row.</summary>
/// <param name="Index">The field's index from 0; -1 where a constant stands for every row.</param>
/// <param name="Name">The whole name as it stands in the header, without the spaces around it.</param>
/// <param name="BaseName">The name without a unit in brackets.</param>
/// <param name="Unit">The unit, from the unit line or from brackets in the name; empty where there is none.</param>
public sealed record SourceColumn(int Index, string Name, string BaseName, string Unit)
{
    /// <summary>The UTF-8 text that stands for every row, or null where the column is read.</summary>
    public byte[]? Constant { get; init; }

    /// <summary>Takes a header name apart: <c>oxygen [mL/L]</c>, <c>PO4 (umol/L)</c>, <c>CTDSAL [PSS-78]_FLAG_W</c>.</summary>
    /// <param name="index">The field's index.</param>
    /// <param name="name">The name as it stands in the header.</param>
    /// <param name="unitLine">The unit from a unit line, or empty.</param>
    public static SourceColumn Parse(int index, string name, string unitLine = "")
    {
        ArgumentNullException.ThrowIfNull(name);
        ArgumentNullException.ThrowIfNull(unitLine);
        string whole = name.Trim();
        int open = whole.IndexOf('[', StringComparison.Ordinal);
        int close = open < 0 ? -1 : whole.IndexOf(']', open);
        if (close < 0 && whole.EndsWith(')'))
        {
            open = whole.LastIndexOf('(');
            close = open < 0 ? -1 : whole.Length - 1;
        }

        if (close < 0)
        {
            return new SourceColumn(index, whole, whole, unitLine.Trim());
        }

        string unit = whole[(open + 1)..close].Trim();
        string baseName = string.Concat(whole[..open].TrimEnd(), whole[(close + 1)..].TrimStart());
        return new SourceColumn(index, whole, baseName.Length == 0 ? whole : baseName, unitLine.Trim().Length > 0 ? unitLine.Trim() : unit);
    }
}
