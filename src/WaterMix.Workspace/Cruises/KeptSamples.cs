using WaterMix.Core.Samples;

namespace WaterMix.Workspace.Cruises;

/// <summary>The samples of a cruise and the files they came from.</summary>
/// <param name="Table">The samples.</param>
/// <param name="Files">The files' rows, in order; every sample is in one.</param>
/// <param name="NamesFiles">True where results name the file of each row: several files were read, even if the others had no rows, or a zip.</param>
public sealed record KeptSamples(SampleTable Table, IReadOnlyList<FileRows> Files, bool NamesFiles);
