using CsvHelper;

namespace WaterMix.Formats.Reading;

/// <summary>How every text file is opened: records of bounded length, a line break always ends one, physical lines counted.</summary>
internal static class CsvFiles
{
    /// <summary>The longest line, in bytes, that is read; a longer one is an error, so memory stays bounded.</summary>
    public const int LongestLine = 1 << 20;

    /// <summary>Opens a file for reading records; no record is a header to the parser.</summary>
    public static CsvReader Open(InputFile file, char delimiter, bool hasComments) =>
        CsvReader.Create(
            file.Open(),
            new CsvReaderOptions
            {
                Separator = delimiter,
                HasHeader = false,
                CommentPrefix = hasComments ? '#' : null,
                TrackLineNumbers = true,
                AllowLineBreaksInQuotes = false,
                MaxRecordSize = LongestLine,
            });
}
