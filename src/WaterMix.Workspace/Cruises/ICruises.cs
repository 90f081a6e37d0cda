using WaterMix.Core.Mixing;
using WaterMix.Core.Samples;
using WaterMix.Formats.Matching;
using WaterMix.Formats.Reading;

namespace WaterMix.Workspace.Cruises;

/// <summary>The samples of studies: uploading, reading, keeping. Sample columns are immutable once kept.</summary>
public interface ICruises
{
    /// <summary>Takes one file of an upload into a waiting place; the stream is read to its end.</summary>
    /// <param name="upload">The upload that the file belongs to; a new id starts one.</param>
    /// <param name="fileName">The name that the browser gave; only its last part is used, and only for reports.</param>
    /// <param name="content">The bytes.</param>
    /// <param name="cancellation">Stops it; the half file is removed.</param>
    /// <exception cref="ArgumentException">The file is too large or the name impossible; the message says so.</exception>
    Task ReceiveAsync(Guid upload, string fileName, Stream content, CancellationToken cancellation);

    /// <summary>Reads an upload without keeping it: the report, the match as guessed, and the first rows, to confirm or correct.</summary>
    Task<ImportTrial> TryAsync(Guid upload, ReadingOptions options, CancellationToken cancellation);

    /// <summary>Reads an upload and keeps it as a cruise of a study. The upload stays, so that a cruise can be read again with other options.</summary>
    /// <returns>The trial it came from and the cruise; the cruise is null where the trial has an error, and nothing was kept.</returns>
    Task<(ImportTrial Trial, Cruise? Cruise)> KeepAsync(Guid study, Guid upload, string cruiseName, ReadingOptions options, IProgress<long>? progress, CancellationToken cancellation);

    /// <summary>The samples of a cruise, from one cache shared by all pages.</summary>
    Task<SampleTable> SamplesAsync(string samplesHash);

    /// <summary>Renames a cruise.</summary>
    Task RenameAsync(Guid cruise, string name);

    /// <summary>Takes a cruise out of its study; <see cref="RestoreAsync"/> undoes it.</summary>
    Task RemoveAsync(Guid cruise);

    /// <summary>Undoes <see cref="RemoveAsync"/>.</summary>
    Task RestoreAsync(Guid cruise);

    /// <summary>Gives a cruise measurement errors of its own; null: the model's.</summary>
    Task SetMeasurementSdAsync(Guid cruise, IReadOnlyDictionary<string, MeasurementError>? measurementSd);

    /// <summary>Pairs of cruises that hold the same samples (position, pressure and salinity alike), with how many.</summary>
    Task<IReadOnlyList<DuplicateSamples>> DuplicatesAsync(Guid study);
}

/// <summary>What reading an upload would give.</summary>
/// <param name="Report">The import report.</param>
/// <param name="Match">The column match as it was guessed or given.</param>
/// <param name="Headers">The header names of the first file, in order.</param>
/// <param name="FirstRows">The first rows of the table (at most 50), or null where there are none.</param>
public sealed record ImportTrial(ImportReport Report, ColumnMatchFile Match, IReadOnlyList<string> Headers, SampleTable? FirstRows)
{
    /// <summary>True where the files are not usable.</summary>
    public bool HasErrors => Report.Findings.Any(f => f.Severity == Core.Severity.Error);
}

/// <summary>Samples that two cruises share.</summary>
/// <param name="First">One cruise.</param>
/// <param name="Second">The other (or the same, where a cruise holds samples twice).</param>
/// <param name="Count">Number of samples.</param>
public sealed record DuplicateSamples(Guid First, Guid Second, long Count);
