using CsvHelper;
using WaterMix.Core;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;

namespace WaterMix.Formats.Reading;

/// <summary>What is said about rows and cells: repeated ones are counted, the first gives the place.</summary>
internal sealed partial class FileReader
{
    private void NotText(CsvReader csv)
    {
        int bad = 0;
        while (bad < csv.FieldCount - 1 && FieldText.IsText(csv.GetSpan(bad)))
        {
            bad++;
        }

        string column = _plan.Header.Columns.FirstOrDefault(c => c.Index == bad)?.Name ?? $"{bad + 1}";
        string found = csv.GetSpan(bad).Contains((byte)0) ? "a NUL byte" : "bytes that are not UTF-8";
        long line = csv.LineNumber;
        _findings.Fold("encoding " + _file, null, () => new Finding(Severity.Error, "UTF-8 text", found, "Save the file as UTF-8.") { File = _file, Line = line, Column = column });
    }

    private ValueOrigin BadOrigin(CsvReader csv, SourceColumn column)
    {
        string found = FieldText.Quote(FieldOf(csv, column));
        long line = csv.LineNumber;
        _findings.Fold("source", column.Name, () => new Finding(Severity.Warning, "'bottle' or 'ctd'", found, "The flag of the value is read as a water sample's.") { File = _file, Line = line, Column = column.Name });
        return ValueOrigin.None;
    }

    private void BadCell(CsvReader csv, SourceColumn column, ReadOnlySpan<byte> field)
    {
        foreach (byte[] text in _missing.Texts)
        {
            if (field.SequenceEqual(text))
            {
                return;
            }
        }

        bool isComma = _decimalMark == (byte)'.' && IsDecimalComma(field);
        string kind = isComma ? "decimal comma" : field[0] is (byte)'<' or (byte)'>' ? "limit" : "text";
        string found = FieldText.Quote(field);
        long line = csv.LineNumber;
        _findings.Fold(kind, column.Name, () => new Finding(Severity.Warning, "a number", found, "It counts as missing. Leave the cell empty, or declare the text as missing in a match file (--columns).") { File = _file, Line = line, Column = column.Name });
    }

    private static bool IsDecimalComma(ReadOnlySpan<byte> field) =>
        field.Count((byte)',') == 1 && field.Length <= 32 && NumberText.TryParse(field, (byte)',', out _);

    private void BadUnit(CsvReader csv, SourceColumn column, Quantity quantity, ReadOnlySpan<byte> unit)
    {
        string found = FieldText.Quote(unit);
        long line = csv.LineNumber;
        _findings.Fold("unit", column.Name, () => new Finding(Severity.Warning, $"a unit of {quantity.Id}", found, "The value counts as missing. Mend the unit.") { File = _file, Line = line, Column = column.Name });
    }

    private void Impossible(CsvReader csv, PlannedColumn plan, double value)
    {
        long line = csv.LineNumber;
        _findings.Fold(
            "impossible",
            plan.Column.Name,
            () => new Finding(Severity.Warning, FormattableString.Invariant($"{plan.Quantity.Id} from {plan.Quantity.Lowest} to {plan.Quantity.Highest} {plan.Quantity.Unit}"), FormattableString.Invariant($"{value}"), "The row will not be solved where this is used. Mend the value, its unit, or declare it as missing.")
            { File = _file, Line = line, Column = plan.Column.Name });
    }

    private void Close()
    {
        if (_plan.Header.IsExchange && !_sawEnd)
        {
            _findings.Add(new Finding(Severity.Error, "END_DATA as the last line of a WHP-Exchange file", "the end of the file", "Fetch the file again: it is cut off.") { File = _file });
        }

        if (Rows == 0)
        {
            _findings.Add(new Finding(Severity.Error, "rows of data", "none that can be read", "Check that the file was written completely.") { File = _file });
        }

        foreach (ColumnTarget target in _targets)
        {
            string column = target.Plan.Column.Name;
            bool used = _options.NeededQuantities?.Contains(target.Plan.Quantity.Id) != false;
            if (target.Numbers == 0 && used && _findings.CountOf("decimal comma", column) > 0)
            {
                _findings.Replace("decimal comma", column, f => f with
                {
                    Severity = Severity.Error,
                    Expected = "numbers with decimal points",
                    Remedy = "Declare \"decimalMark\": \",\" in a match file (--columns), or save with decimal points.",
                });
            }
        }

        _builder.Close();
    }
}
