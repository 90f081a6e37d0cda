using WaterMix.Core;

namespace WaterMix.Formats.Reading;

/// <summary>Reads sample files: WHP-Exchange bottle and CTD files, zip files of them, tidy CSV and any other CSV by matching its columns.</summary>
public static class SampleReader
{
    /// <summary>Opens files: reads their headers, settles the columns, and hands out what then reads the rows.</summary>
    /// <param name="paths">The files, in any order; they are read in ordinal order of their names. What cannot be read twice (a pipe) is kept in a temporary file.</param>
    /// <param name="options">What the person says about them.</param>
    /// <returns>The opened samples; <see cref="OpenedSamples.HasErrors"/> says whether they are usable so far.</returns>
    /// <exception cref="OperationCanceledException">The work was cancelled (<see cref="ReadingOptions.Cancellation"/>).</exception>
    public static OpenedSamples Open(IReadOnlyList<string> paths, ReadingOptions options)
    {
        ArgumentNullException.ThrowIfNull(paths);
        ArgumentNullException.ThrowIfNull(options);
        var findings = new FindingList();
        InputFiles inputs = InputFiles.Find(paths, findings, options.Cancellation);
        return Open(inputs.Files, options, new SeawaterPerKilogram(), findings, inputs);
    }

    /// <summary>Opens files that people know by another name than they stand under; zip files are unpacked as they are read.</summary>
    /// <param name="files">The files, in any order; they are read in ordinal order of their names.</param>
    /// <param name="options">What the person says about them.</param>
    public static OpenedSamples OpenStored(IReadOnlyList<StoredFile> files, ReadingOptions options)
    {
        ArgumentNullException.ThrowIfNull(files);
        ArgumentNullException.ThrowIfNull(options);
        var findings = new FindingList();
        InputFiles inputs = InputFiles.Find(files, findings, options.Cancellation);
        return Open(inputs.Files, options, new SeawaterPerKilogram(), findings, inputs);
    }

    /// <summary>Opens files that stand somewhere else than on a path, such as in memory.</summary>
    /// <param name="files">The files, in the order of their rows.</param>
    /// <param name="options">What the person says about them.</param>
    public static OpenedSamples Open(IReadOnlyList<InputFile> files, ReadingOptions options)
    {
        ArgumentNullException.ThrowIfNull(files);
        ArgumentNullException.ThrowIfNull(options);
        return Open(files, options, new SeawaterPerKilogram(), new FindingList(), null);
    }

    /// <summary>Opens files with a given source of densities.</summary>
    internal static OpenedSamples Open(IReadOnlyList<InputFile> files, ReadingOptions options, IPerKilogram perKilogram, FindingList findings, IDisposable? inputs)
    {
        var plans = new List<FilePlan>(files.Count);
        foreach (InputFile file in files)
        {
            if (HeaderReader.Read(file, options.Match, findings) is { } header && new FilePlanner(header, options, findings).Plan() is { } plan)
            {
                plans.Add(plan);
            }
        }

        var present = plans.SelectMany(p => p.Header.Columns).Select(c => c.Name).ToHashSet(StringComparer.Ordinal);
        foreach (string column in (options.Match?.Columns ?? []).Select(m => m.Column).Where(c => plans.Count > 0 && !present.Contains(c)))
        {
            findings.Add(new Finding(Severity.Error, $"the column '{column}' that the match file names", "no such column in any file", "Correct the match file.") { Column = column });
        }

        return new OpenedSamples(plans, TableSchema.Union(plans, options.NeededQuantities, findings), options, perKilogram, findings, inputs);
    }
}
