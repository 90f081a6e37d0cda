using WaterMix.Core.Samples;

namespace WaterMix.Formats.Results;

/// <summary>The samples beside a block of results, and where they stand in the input.</summary>
/// <param name="Samples">The samples as read.</param>
/// <param name="File">The file's name.</param>
/// <param name="FirstRow">Running number of the first sample over all files, 1-based.</param>
/// <param name="FirstFileRow">Number of the first sample in its file, 1-based.</param>
public sealed record ResultBlock(SampleTable Samples, string File, long FirstRow, long FirstFileRow);
