using WaterMix.Core;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Formats.Matching;
using WaterMix.Formats.Reading;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Samples;

/// <summary>An import report in words, ready to show: what was read, from what, what was changed on the way, and what needs a look.</summary>
public sealed class ReportText
{
    private static readonly string[] Merging = ["practical_salinity", "oxygen"];

    /// <summary>The words of a report.</summary>
    /// <param name="report">The report.</param>
    public ReportText(ImportReport report)
    {
        ArgumentNullException.ThrowIfNull(report);
        Report = report;
        Files = [.. report.Files.Select(f => new ReportFile(f.Name, FormatName(f.Format), PlainText.Count(f.Rows)))];
        Columns = [.. report.Columns.Select(Column)];
        Errors = [.. report.Findings.Where(f => f.Severity == Severity.Error).Select(Point)];
        Warnings = [.. report.Findings.Where(f => f.Severity == Severity.Warning).Select(Point)];
        Notes = [.. report.Findings.Where(f => f.Severity == Severity.Note).Select(Point)];
        Summary = SummaryOf(report);
        Sources = [.. Merging.Select(SourceSentence).OfType<string>()];
        Conversions = [.. report.Columns.Where(c => c.Conversion.Length > 0 && !IsOriginal(c.Id)).Select(c => $"{NameOf(c.Id)}: {c.Conversion}")];
        BottleFlags = report.BottleFlags.Count == 0 ? "" : "Bottle flags: " + string.Join(", ", report.BottleFlags.OrderBy(f => f.Key).Select(f => $"{PlainText.Count(f.Value)} with flag {f.Key} ({FlagText.OfBottle(f.Key)})")) + ".";
        LeftOut = report.LeftOut.Count == 0 ? "" : $"Not used: {string.Join(", ", report.LeftOut)}.";
    }

    /// <summary>The report itself.</summary>
    public ImportReport Report { get; }

    /// <summary>The whole in a sentence or two.</summary>
    public string Summary { get; }

    /// <summary>The files and what kind they are.</summary>
    public IReadOnlyList<ReportFile> Files { get; }

    /// <summary>The columns.</summary>
    public IReadOnlyList<ReportColumn> Columns { get; }

    /// <summary>What keeps the files from being used.</summary>
    public IReadOnlyList<ReportPoint> Errors { get; }

    /// <summary>What touches values or rows.</summary>
    public IReadOnlyList<ReportPoint> Warnings { get; }

    /// <summary>What is worth knowing.</summary>
    public IReadOnlyList<ReportPoint> Notes { get; }

    /// <summary>Where salinity and oxygen come from, a sentence each.</summary>
    public IReadOnlyList<string> Sources { get; }

    /// <summary>The conversions, one to a quantity.</summary>
    public IReadOnlyList<string> Conversions { get; }

    /// <summary>How many bottles have which flag, or empty.</summary>
    public string BottleFlags { get; }

    /// <summary>The header names that were not used, or empty.</summary>
    public string LeftOut { get; }

    private static string FormatName(string format) => format switch
    {
        "exchange-bottle" => "WHP-Exchange bottle file",
        "exchange-ctd" => "WHP-Exchange CTD cast",
        _ => "table of delimited text (CSV)",
    };

    private static bool IsOriginal(string id) => id.EndsWith(Origins.BottleSuffix, StringComparison.Ordinal) || id.EndsWith(Origins.CtdSuffix, StringComparison.Ordinal);

    private static string NameOf(string id)
    {
        string stem = IsOriginal(id) ? id[..id.LastIndexOf('_')] : id;
        string instrument = id.EndsWith(Origins.CtdSuffix, StringComparison.Ordinal) ? ", CTD" : IsOriginal(id) ? ", bottle" : "";
        return FigureText.Sentence(Quantity.FindOrFurther(stem).Name) + instrument;
    }

    private static string SummaryOf(ImportReport report)
    {
        int errors = report.Findings.Count(f => f.Severity == Severity.Error);
        int warnings = report.Findings.Count(f => f.Severity == Severity.Warning);
        string read = report.Rows == 0
            ? "No sample was read."
            : $"{PlainText.Count(report.Rows, "sample was", "samples were")} read from {PlainText.Count(report.Files.Count, "file")}, with {PlainText.Count(report.Columns.Count(c => !IsOriginal(c.Id)), "quantity", "quantities")}.";
        return (errors, warnings) switch
        {
            ( > 0, _) => $"{read} {PlainText.Count(errors, "point keeps", "points keep")} the files from being used.",
            (0, > 0) => $"{read} {PlainText.Count(warnings, "point asks", "points ask")} for a look.",
            _ => $"{read} Nothing asks for a look.",
        };
    }

    private static ReportColumn Column(ImportedColumn column)
    {
        ValueOrigin origin = (column.FromBottle, column.FromCtd) switch
        {
            ( > 0, 0) => ValueOrigin.Bottle,
            (0, > 0) => ValueOrigin.Ctd,
            _ => ValueOrigin.None,
        };
        string flags = string.Join("; ", column.Flags.OrderBy(f => f.Key).Select(f => $"{f.Key} {FlagText.Meaning(f.Key, origin)}: {PlainText.Count(f.Value)}"));
        if (column.Voided > 0)
        {
            flags += (flags.Length > 0 ? "; " : "") + $"{PlainText.Count(column.Voided)} made void by the bottle";
        }

        return new ReportColumn(
            NameOf(column.Id), FigureText.Unit(column.Unit), column.Source, Matched(column.MatchedBy), column.Conversion.Length > 0 ? column.Conversion : "none",
            PlainText.Count(column.Values), PlainText.Count(column.Missing), PlainText.Count(column.Usable), flags.Length > 0 ? flags : "none");
    }

    private static string Matched(string by) => by switch
    {
        "match-file" => "as you said",
        "id" => "by its id",
        "whp-name" => "by its WHP name",
        "name" => "by name and unit",
        _ => "name not known: kept under its own",
    };

    // The report speaks to the command line too; here the same is done on the page.
    private static ReportPoint Point(Finding finding)
    {
        string remedy = finding.Remedy
            .Replace("a match file (--columns, \"flag\")", "the columns below", StringComparison.Ordinal)
            .Replace("a match file (--columns)", "the columns below", StringComparison.Ordinal)
            .Replace("A match file (--columns)", "The columns below", StringComparison.Ordinal)
            .Replace("Write the columns below that says which it is", "Say under the columns below which it is", StringComparison.Ordinal);
        if (remedy.Contains("--", StringComparison.Ordinal) || remedy.Contains("\"decimalMark\"", StringComparison.Ordinal))
        {
            remedy = "Choose the delimiter and the decimal mark under “How the files are written”, then read again.";
        }

        List<string> place = [];
        if (finding.File is not null)
        {
            place.Add(finding.File);
        }

        if (finding.Line is { } line)
        {
            place.Add($"line {PlainText.Count(line)}");
        }

        if (finding.Column is not null)
        {
            place.Add($"column {finding.Column}");
        }

        return new ReportPoint(string.Join(", ", place), FigureText.Sentence(finding.Found), finding.Expected, remedy, finding.Count > 1 ? $"{PlainText.Count(finding.Count)} times, first here" : "");
    }

    private string? SourceSentence(string id)
    {
        ImportedColumn? main = Report.Columns.FirstOrDefault(c => c.Id == id);
        ImportedColumn? bottle = Report.Columns.FirstOrDefault(c => c.Id == id + Origins.BottleSuffix);
        ImportedColumn? ctd = Report.Columns.FirstOrDefault(c => c.Id == id + Origins.CtdSuffix);
        string name = FigureText.Sentence(Quantity.FindOrFurther(id).Name);
        return main switch
        {
            null => $"{name}: no column holds it.",
            _ when bottle is not null && ctd is not null => $"{name}: {PlainText.Count(main.FromBottle)} values from the bottle ({bottle.Source}), {PlainText.Count(main.FromCtd)} from the CTD ({ctd.Source}); both columns are kept.",
            _ => $"{name}: {PlainText.Count(main.Values)} values from the {(main.FromCtd > main.FromBottle ? "CTD" : "bottle")} ({main.Source}).",
        };
    }
}

/// <summary>A file of a report, in words.</summary>
/// <param name="Name">Its name.</param>
/// <param name="Format">What kind it is.</param>
/// <param name="Rows">Rows of data.</param>
public sealed record ReportFile(string Name, string Format, string Rows);

/// <summary>A column of a report, in words.</summary>
/// <param name="Name">What it holds.</param>
/// <param name="Unit">Its unit; may be empty.</param>
/// <param name="Source">The header names it was read from.</param>
/// <param name="Matched">How it was matched.</param>
/// <param name="Conversion">The conversion made.</param>
/// <param name="Values">Samples with a value.</param>
/// <param name="Missing">Samples without.</param>
/// <param name="Usable">Samples whose value has an accepted flag.</param>
/// <param name="Flags">Number of samples by flag.</param>
public sealed record ReportColumn(string Name, string Unit, string Source, string Matched, string Conversion, string Values, string Missing, string Usable, string Flags);

/// <summary>Something found in a file.</summary>
/// <param name="Place">Where.</param>
/// <param name="Found">What stands there.</param>
/// <param name="Expected">What was expected.</param>
/// <param name="Remedy">What to do.</param>
/// <param name="Times">How often, or empty for once.</param>
public sealed record ReportPoint(string Place, string Found, string Expected, string Remedy, string Times);
