using WaterMix.Core;

namespace WaterMix.Workspace.Runs;

/// <summary>What a model that is being edited makes of the samples, at this moment.</summary>
/// <param name="Errors">Why it cannot be solved; empty where it can.</param>
/// <param name="Cruises">The results, one per cruise in the study's order; empty where there are errors or no samples.</param>
public sealed record LiveResult(IReadOnlyList<Finding> Errors, IReadOnlyList<CruiseResult> Cruises);
