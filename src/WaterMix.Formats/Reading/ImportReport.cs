using System.Globalization;
using System.Text;
using WaterMix.Core;

namespace WaterMix.Formats.Reading;

/// <summary>What the reader made of the files: formats, columns, units, conversions, flags, sources, problems.</summary>
/// <param name="Rows">Rows of data.</param>
/// <param name="Files">The files, in reading order.</param>
/// <param name="Identity">The identity columns present.</param>
/// <param name="Columns">The quantity columns, in the table's order.</param>
/// <param name="LeftOut">Header names that were not read.</param>
/// <param name="BottleFlags">Number of samples by bottle flag; empty where no file has them.</param>
/// <param name="Findings">Everything found, in order.</param>
public sealed record ImportReport(
    long Rows,
    IReadOnlyList<ImportedFile> Files,
    IReadOnlyList<string> Identity,
    IReadOnlyList<ImportedColumn> Columns,
    IReadOnlyList<string> LeftOut,
    IReadOnlyDictionary<int, long> BottleFlags,
    IReadOnlyList<Finding> Findings)
{
    private const int MostFilesListed = 20;

    /// <summary>The report as lines of text, for people.</summary>
    public string ToText()
    {
        var text = new StringBuilder();
        text.Append(CultureInfo.InvariantCulture, $"{Rows} samples from {Files.Count} {(Files.Count == 1 ? "file" : "files")}\n");
        foreach (ImportedFile file in Files.Take(MostFilesListed))
        {
            text.Append(CultureInfo.InvariantCulture, $"  {file.Name}: {file.Format}, {file.Rows} rows\n");
        }

        if (Files.Count > MostFilesListed)
        {
            text.Append(CultureInfo.InvariantCulture, $"  ... and {Files.Count - MostFilesListed} more\n");
        }

        text.Append(CultureInfo.InvariantCulture, $"identity: {(Identity.Count == 0 ? "none" : string.Join(", ", Identity))}\n");
        if (BottleFlags.Count > 0)
        {
            text.Append(CultureInfo.InvariantCulture, $"bottle flags: {Counts(BottleFlags)}\n");
        }

        text.Append("columns:\n");
        int width = Columns.Count == 0 ? 0 : Math.Min(30, Columns.Max(c => c.Id.Length));
        foreach (ImportedColumn column in Columns)
        {
            text.Append(CultureInfo.InvariantCulture, $"  {column.Id.PadRight(width)} [{column.Unit}] from {column.Source} ({column.MatchedBy}): {column.Values} values, {column.Missing} missing");
            if (column.Usable != column.Values)
            {
                text.Append(CultureInfo.InvariantCulture, $", {column.Usable} usable");
            }

            if (column.FromBottle > 0 && column.FromCtd > 0)
            {
                text.Append(CultureInfo.InvariantCulture, $"; {column.FromBottle} from the bottle, {column.FromCtd} from the CTD");
            }

            if (column.Voided > 0)
            {
                text.Append(CultureInfo.InvariantCulture, $"; {column.Voided} made void by the bottle");
            }

            text.Append(column.Flags.Count > 0 ? $"; flags {Counts(column.Flags)}" : "").Append(column.Conversion.Length > 0 ? $"; {column.Conversion}" : "").Append('\n');
        }

        if (LeftOut.Count > 0)
        {
            text.Append(CultureInfo.InvariantCulture, $"left out: {string.Join(", ", LeftOut)}\n");
        }

        foreach (Finding finding in Findings)
        {
            text.Append(finding).Append('\n');
        }

        return text.ToString();
    }

    private static string Counts(IReadOnlyDictionary<int, long> counts) =>
        string.Join(", ", counts.OrderBy(c => c.Key).Select(c => string.Create(CultureInfo.InvariantCulture, $"{c.Key}: {c.Value}")));
}
