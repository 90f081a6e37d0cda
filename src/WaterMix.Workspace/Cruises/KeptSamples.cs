using WaterMix.Core.Samples;

namespace WaterMix.Workspace.Cruises;

/// <summary>The samples of a cruise and the files they came from.</summary>
/// <param name="Table">The samples.</param>
/// <param name="Files">The files' rows, in order; every sample is in one.</param>
/// <param name="HasSeveralFiles">True where more than one file was read, even if the others had no rows: results then name the file of each row.</param>
public sealed record KeptSamples(SampleTable Table, IReadOnlyList<FileRows> Files, bool HasSeveralFiles);
