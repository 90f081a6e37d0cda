namespace WaterMix.Formats.Reading;

/// <summary>What the opening pass learnt of one file.</summary>
/// <param name="File">The file.</param>
/// <param name="Format">Its kind.</param>
/// <param name="Columns">Its columns, those of a CTD header's constants first.</param>
/// <param name="FieldCount">Number of fields in a data row.</param>
/// <param name="LastLine">The physical line of the last header or unit line.</param>
public sealed record FileHeader(InputFile File, SampleFormat Format, IReadOnlyList<SourceColumn> Columns, int FieldCount, long LastLine)
{
    /// <summary>The delimiter.</summary>
    public char Delimiter { get; init; } = ',';

    /// <summary>True where lines that begin with '#' are comments: in Exchange files, and where the first line is one.</summary>
    public bool HasComments { get; init; }

    /// <summary>True where the names are WHP parameter names: <c>DEPTH</c> is then the sounding.</summary>
    public bool HasWhpNames { get; init; }

    /// <summary>True for WHP-Exchange, which ends with END_DATA.</summary>
    public bool IsExchange => Format is SampleFormat.ExchangeBottle or SampleFormat.ExchangeCtd;
}
