using System.Globalization;
using System.Text;
using CsvHelper;
using WaterMix.Core;
using WaterMix.Formats.Reading;

namespace WaterMix.Formats.WhpExchange;

/// <summary>The header of a WHP-Exchange file: stamp, comments, for a CTD cast the values that hold for the cast, then names and units.</summary>
internal static class ExchangeHeader
{
    /// <summary>Reads the header; null where it ends too early.</summary>
    public static FileHeader? Read(InputFile file, CsvReader csv, bool isCtd, FindingList findings)
    {
        csv.Read();
        var constants = new List<SourceColumn>();
        if (!csv.Read() || (isCtd && !Constants(file, csv, constants, findings)))
        {
            findings.Add(Truncated(file, csv));
            return null;
        }

        long line = csv.LineNumber;
        if (!FieldText.IsText(csv.RawRecord))
        {
            findings.Add(new Finding(Severity.Error, "UTF-8 text", "other bytes in the header line", "Save the file as UTF-8.") { File = file.Name, Line = line });
            return null;
        }

        List<string> names = HeaderReader.Fields(csv);
        if (!csv.Read())
        {
            findings.Add(Truncated(file, csv));
            return null;
        }

        List<string> units = HeaderReader.Fields(csv);
        long lastLine = csv.LineNumber;
        if (units.Count > 0 && units[0] != "END_DATA" && units.Any(u => double.TryParse(u, CultureInfo.InvariantCulture, out _)))
        {
            findings.Add(new Finding(Severity.Warning, "a line of units below the names", "data", "Units were taken to be the canonical ones.") { File = file.Name, Line = lastLine });
            units = [];
            lastLine = line;
        }
        else if (units.Count > 0 && units[0] == "END_DATA")
        {
            units = [];
            lastLine = line;
        }

        List<SourceColumn> columns = HeaderReader.Columns(file, names, units, line, findings);
        return new FileHeader(file, isCtd ? SampleFormat.ExchangeCtd : SampleFormat.ExchangeBottle, [.. constants, .. columns], names.Count, lastLine)
        {
            HasComments = true,
            HasWhpNames = true,
        };
    }

    // NUMBER_HEADERS = n counts itself, so n - 1 lines 'NAME = value' follow. On return the reader stands on the line of names.
    private static bool Constants(InputFile file, CsvReader csv, List<SourceColumn> constants, FindingList findings)
    {
        long declared = -1;
        long seen = 0;
        do
        {
            string text = FieldText.ToText(csv.RawRecord);
            int equals = text.IndexOf('=', StringComparison.Ordinal);
            if (equals < 0)
            {
                if (declared >= 0 && seen != declared)
                {
                    findings.Add(new Finding(Severity.Warning, $"{declared} header lines (NUMBER_HEADERS)", $"{seen}", "The lines that are there were read.") { File = file.Name, Line = csv.LineNumber });
                }

                return true;
            }

            seen++;
            string name = text[..equals].TrimEnd();
            string value = text[(equals + 1)..].TrimStart();
            if (name == "NUMBER_HEADERS")
            {
                declared = long.TryParse(value, CultureInfo.InvariantCulture, out long n) ? n : -1;
            }
            else
            {
                constants.Add(new SourceColumn(-1, name, name, "") { Constant = Encoding.UTF8.GetBytes(value) });
            }
        }
        while (csv.Read());
        return false;
    }

    private static Finding Truncated(InputFile file, CsvReader csv) =>
        new(Severity.Error, "column names, units and data", "the end of the file in the header", "Fetch the file again: it is cut off.") { File = file.Name, Line = csv.LineNumber };
}
