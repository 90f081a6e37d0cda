using WaterMix.Core.Samples;

namespace WaterMix.Core.Seawater;

/// <summary>A table with derived columns, and what is worth knowing about them.</summary>
/// <param name="Table">The samples with the derived columns added; a derived column takes the place of the file's own of the same id.</param>
/// <param name="Notes">
/// What stood in for what, and why values are missing; each once, with the number of samples in <see cref="Finding.Count"/>. The
/// texts hold no numbers, so that the notes of a long file's blocks can be folded by adding their counts.
/// </param>
public sealed record DerivedSamples(SampleTable Table, IReadOnlyList<Finding> Notes);
