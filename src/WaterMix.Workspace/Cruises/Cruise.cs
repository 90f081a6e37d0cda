using WaterMix.Core.Mixing;
using WaterMix.Formats.Reading;

namespace WaterMix.Workspace.Cruises;

/// <summary>The samples of one import, kept apart from other cruises'.</summary>
/// <param name="Id">The cruise.</param>
/// <param name="Name">Its name.</param>
/// <param name="SamplesHash">The key to <see cref="ICruises.SamplesAsync"/>: SHA-256 of the samples, with 16 more digits where other samples have the same values but other names, origins or files.</param>
/// <param name="SampleCount">Number of samples.</param>
/// <param name="Upload">The upload it was read from.</param>
/// <param name="Report">The import report.</param>
/// <param name="MeasurementSd">Measurement errors of its own, or null for the model's.</param>
public sealed record Cruise(
    Guid Id,
    string Name,
    string SamplesHash,
    long SampleCount,
    Guid Upload,
    ImportReport Report,
    IReadOnlyDictionary<string, MeasurementError>? MeasurementSd)
{
    /// <summary>The options it was read with, to begin from when it is read again.</summary>
    public ReadingOptions Reading { get; init; } = new();
}
