using CsvHelper;
using WaterMix.Core;
using WaterMix.Formats.Matching;
using WaterMix.Formats.WhpExchange;

namespace WaterMix.Formats.Reading;

/// <summary>The opening pass over one file: what kind it is and which columns it has.</summary>
internal static class HeaderReader
{
    private const int HeadLength = 64 << 10;

    private static readonly char[] Delimiters = [',', ';', '\t', '|'];

    /// <summary>Reads the header, or returns null where findings say why the file is not usable.</summary>
    public static FileHeader? Read(InputFile file, ColumnMatchFile? match, FindingList findings)
    {
        try
        {
            byte[] head = Head(file);
            if (Refuse(head) is { } refusal)
            {
                findings.Add(refusal with { File = file.Name });
                return null;
            }

            ReadOnlySpan<byte> text = head.AsSpan().StartsWith((ReadOnlySpan<byte>)[0xEF, 0xBB, 0xBF]) ? head.AsSpan(3) : head;
            bool isBottle = text.StartsWith("BOTTLE,"u8);
            bool isCtd = text.StartsWith("CTD,"u8);
            bool hasComments = isBottle || isCtd || text.StartsWith("#"u8);
            char delimiter = isBottle || isCtd ? ',' : match?.Delimiter ?? ',';
            using CsvReader csv = CsvFiles.Open(file, delimiter, hasComments);
            return isBottle || isCtd
                ? ExchangeHeader.Read(file, csv, isCtd, findings)
                : Plain(file, csv, delimiter, match?.Delimiter is not null, hasComments, findings);
        }
        catch (CsvFormatException e)
        {
            findings.Add(TooLong(file.Name, e.LineNumber));
            return null;
        }
        catch (Exception e) when (e is IOException or InvalidDataException or UnauthorizedAccessException)
        {
            findings.Add(UnreadableFile.Of(e, "a file that can be read", "Check the file, its permissions, or fetch it again.", file.Name));
            return null;
        }
    }

    /// <summary>The finding for a line beyond <see cref="CsvFiles.LongestLine"/>.</summary>
    public static Finding TooLong(string file, long line) =>
        new(Severity.Error, $"lines of at most {CsvFiles.LongestLine} bytes", "a longer one", "Check that the file is a table with one sample a line.") { File = file, Line = line };

    /// <summary>The names and units of one or two header records as columns, and the repeated names as findings.</summary>
    public static List<SourceColumn> Columns(InputFile file, IReadOnlyList<string> names, IReadOnlyList<string> units, long line, FindingList findings)
    {
        var columns = new List<SourceColumn>(names.Count);
        var first = new Dictionary<string, int>(StringComparer.Ordinal);
        for (int i = 0; i < names.Count; i++)
        {
            SourceColumn column = SourceColumn.Parse(i, names[i], i < units.Count ? units[i] : "");
            if (column.Name.Length == 0)
            {
                continue;
            }

            if (first.TryAdd(column.Name, i))
            {
                columns.Add(column);
            }
            else
            {
                findings.Add(new Finding(Severity.Error, "every header name once", $"'{column.Name}' as column {first[column.Name] + 1} and column {i + 1}", "Rename or delete one of the two.")
                { File = file.Name, Line = line, Column = column.Name });
            }
        }

        return columns;
    }

    /// <summary>The fields of a record as text, trimmed, without empty ones at the end.</summary>
    public static List<string> Fields(CsvReader csv)
    {
        var fields = new List<string>(csv.FieldCount);
        for (int i = 0; i < csv.FieldCount; i++)
        {
            fields.Add(FieldText.ToText(csv.GetSpan(i)));
        }

        while (fields.Count > 0 && fields[^1].Length == 0)
        {
            fields.RemoveAt(fields.Count - 1);
        }

        return fields;
    }

    private static byte[] Head(InputFile file)
    {
        using Stream stream = file.Open();
        byte[] head = new byte[HeadLength];
        int length = stream.ReadAtLeast(head, HeadLength, throwOnEndOfStream: false);
        return head[..length];
    }

    private static Finding? Refuse(ReadOnlySpan<byte> head)
    {
        const string Expected = "a WHP-Exchange or CSV text file in UTF-8";
        if (head.IsEmpty || head.Trim(" \t\r\n"u8).IsEmpty)
        {
            return new Finding(Severity.Error, "sample data", "an empty file", "Check that the file was written or fetched completely.");
        }

        if (head.StartsWith((ReadOnlySpan<byte>)[0xFF, 0xFE]) || head.StartsWith((ReadOnlySpan<byte>)[0xFE, 0xFF]))
        {
            return new Finding(Severity.Error, Expected, "UTF-16 text", "Save it as UTF-8.");
        }

        string? binary = head.StartsWith("CDF"u8) ? "a NetCDF file"
            : head.StartsWith((ReadOnlySpan<byte>)[0x89, (byte)'H', (byte)'D', (byte)'F']) ? "an HDF5 or NetCDF-4 file"
            : head.StartsWith("PAR1"u8) ? "a Parquet file"
            : head.StartsWith("%PDF"u8) ? "a PDF document"
            : head.Contains((byte)0) ? "a binary file (it holds NUL bytes)"
            : null;
        return binary is null ? null : new Finding(Severity.Error, Expected, binary, "Export the samples as WHP-Exchange or CSV.");
    }

    private static FileHeader? Plain(InputFile file, CsvReader csv, char delimiter, bool declared, bool hasComments, FindingList findings)
    {
        List<string> names;
        do
        {
            if (!csv.Read())
            {
                findings.Add(new Finding(Severity.Error, "a header line", "only comments or empty lines", "Begin the table with a line of column names.") { File = file.Name });
                return null;
            }

            names = Fields(csv);
        }
        while (names.Count == 0);

        long line = csv.LineNumber;
        if (!FieldText.IsText(csv.RawRecord))
        {
            findings.Add(new Finding(Severity.Error, "UTF-8 text", "other bytes in the header line", "Save the file as UTF-8.") { File = file.Name, Line = line });
            return null;
        }

        if (!declared && OtherDelimiter(csv.RawRecord) is { } other)
        {
            string shown = other == '\t' ? "tab" : $"'{other}'";
            findings.Add(new Finding(Severity.Error, "columns delimited by commas", $"{shown} as the delimiter", $"Declare it in a match file (--columns, \"delimiter\": \"{(other == '\t' ? "\\t" : other)}\", and \"decimalMark\": \",\" if the numbers have decimal commas), or save with commas.")
            { File = file.Name, Line = line });
            return null;
        }

        int fieldCount = names.Count;
        List<string> units = [];
        long lastLine = line;
        if (csv.Read() && IsUnitLine(Fields(csv)))
        {
            units = Fields(csv);
            lastLine = csv.LineNumber;
        }

        List<SourceColumn> columns = Columns(file, names, units, line, findings);
        return new FileHeader(file, SampleFormat.Csv, columns, fieldCount, line, lastLine)
        {
            Delimiter = delimiter,
            HasComments = hasComments,
            HasWhpNames = columns.Any(c => ExchangeNames.IsTelltale(c.BaseName)),
        };
    }

    private static char? OtherDelimiter(ReadOnlySpan<byte> line)
    {
        char most = ',';
        int count = line.Count((byte)',');
        foreach (char c in Delimiters)
        {
            if (line.Count((byte)c) > count)
            {
                (most, count) = (c, line.Count((byte)c));
            }
        }

        return most == ',' ? null : most;
    }

    // A unit line has units only, and at least two of them; a row of samples has numbers.
    private static bool IsUnitLine(List<string> fields) =>
        fields.Count(Units.IsUnit) >= 2 && !fields.Any(f => double.TryParse(f, System.Globalization.CultureInfo.InvariantCulture, out _));
}
