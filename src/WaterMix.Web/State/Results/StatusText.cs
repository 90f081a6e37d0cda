using WaterMix.Core.Mixing;

namespace WaterMix.Web.State.Results;

/// <summary>The statuses in a few words, for tables and lists.</summary>
public static class StatusText
{
    /// <summary>A status such as <c>too few tracers</c>.</summary>
    /// <param name="status">The status.</param>
    public static string Of(SolveStatus status) => status switch
    {
        SolveStatus.BadInput => "impossible value",
        SolveStatus.OutsideLayers => "outside the layers",
        SolveStatus.TooFewTracers => "too few tracers",
        SolveStatus.NotUnique => "not unique",
        SolveStatus.NotConverged => "not settled",
        _ => "solved",
    };
}
