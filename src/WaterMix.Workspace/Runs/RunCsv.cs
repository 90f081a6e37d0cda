using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Formats.Reading;
using WaterMix.Formats.Results;
using WaterMix.Workspace.Cruises;

namespace WaterMix.Workspace.Runs;

/// <summary>Writes the results of a run as CSV by the contract (<c>docs/results.md</c>), the cruises one after the other.</summary>
internal static class RunCsv
{
    private static readonly Quantity[] Places = [Quantity.Latitude, Quantity.Longitude, Quantity.Pressure];

    /// <summary>Writes the results of all cruises.</summary>
    /// <param name="model">The run's model.</param>
    /// <param name="cruises">Samples and results, in order.</param>
    /// <param name="output">Where the text goes; written asynchronously only, and it stays open.</param>
    /// <param name="cancellation">Stops the writing.</param>
    public static async Task WriteAsync(MixingModel model, IReadOnlyList<(KeptSamples Samples, MixingResult Result)> cruises, Stream output, CancellationToken cancellation)
    {
        string[] identity = [.. IdentityColumn.Ids.Where(id => cruises.Any(c => c.Samples.Table.Identity.Any(i => i.Id == id)))];
        bool namesFiles = cruises.Count > 1 || cruises[0].Samples.NamesFiles;
        using var text = new MemoryStream();
        using (var csv = new ResultCsvWriter(text, PreparedModel.From(model), namesFiles, withProof: false))
        {
            long before = 0;
            foreach ((KeptSamples samples, MixingResult result) in cruises)
            {
                foreach (FileRows rows in samples.Files.SelectMany(Pieces))
                {
                    SampleTable table = Part(samples.Table, identity, rows);
                    csv.Write(new SampleBlock(table, rows.File, before + rows.First + 1, rows.FirstFileRow), ResultFile.Slice(result, rows.First, rows.Count));
                    await PassOnAsync(text, output, cancellation);
                }

                before += samples.Table.RowCount;
            }
        }

        await PassOnAsync(text, output, cancellation);
    }

    private static IEnumerable<FileRows> Pieces(FileRows rows)
    {
        for (int done = 0; done < rows.Count; done += SampleBlock.MostRows)
        {
            yield return rows with { First = rows.First + done, FirstFileRow = rows.FirstFileRow + done, Count = Math.Min(SampleBlock.MostRows, rows.Count - done) };
        }
    }

    // The places and the identity columns of all cruises; a cruise that lacks one has it empty.
    private static SampleTable Part(SampleTable table, string[] identity, FileRows rows)
    {
        IEnumerable<IdentityColumn> names = identity.Select(id => table.Identity.FirstOrDefault(i => i.Id == id) is { } column
            ? SampleRows.Slice(column, rows.First, rows.Count)
            : new IdentityColumn(id, [.. Enumerable.Repeat(-1, rows.Count)], []));
        IEnumerable<SampleColumn> places = Places.Select(table.Find).OfType<SampleColumn>().Select(c => SampleRows.Slice(c, rows.First, rows.Count));
        return new SampleTable(rows.Count, [.. names], [.. places]);
    }

    private static async Task PassOnAsync(MemoryStream text, Stream output, CancellationToken cancellation)
    {
        await output.WriteAsync(text.GetBuffer().AsMemory(0, (int)text.Length), cancellation);
        text.SetLength(0);
    }
}
