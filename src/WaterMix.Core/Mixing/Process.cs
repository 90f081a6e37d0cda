namespace WaterMix.Core.Mixing;

/// <summary>A biogeochemical column of the fit; its amount is solved with the fractions.</summary>
/// <param name="Id">As an end-member's id, unique together with those.</param>
/// <param name="Per">The quantity id that the amount counts; its own ratio is 1. Need not be a tracer of the fit.</param>
/// <param name="Ratios">Change seen in the sample per 1 of <paramref name="Per"/>, by quantity id.</param>
public sealed record Process(string Id, string Per, IReadOnlyDictionary<string, double> Ratios)
{
    /// <summary>The sign that the amount may have.</summary>
    public ProcessSign Sign { get; init; } = ProcessSign.NonNegative;

    /// <summary>Where the process acts: all conditions hold. Empty: everywhere.</summary>
    public IReadOnlyList<Condition> Where { get; init; } = [];
}
