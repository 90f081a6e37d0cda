namespace WaterMix.Core.Mixing;

/// <summary>The results of a table of samples, and what was noted on the way.</summary>
/// <param name="Result">One entry per sample, in input order.</param>
/// <param name="Notes">What the derivation of quantities noted.</param>
/// <param name="UsableCounts">For each parent quantity of the model's tracers, the number of samples with a usable value.</param>
public sealed record SolvedBlock(MixingResult Result, IReadOnlyList<Finding> Notes, IReadOnlyList<long> UsableCounts);
