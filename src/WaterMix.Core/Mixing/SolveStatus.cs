namespace WaterMix.Core.Mixing;

/// <summary>What became of a sample. The first that applies, in this order.</summary>
public enum SolveStatus : byte
{
    /// <summary>An impossible value in a used column; named in the note.</summary>
    BadInput,

    /// <summary>No layer takes the sample.</summary>
    OutsideLayers,

    /// <summary>Fewer usable tracers than unknowns: fractions are empty.</summary>
    TooFewTracers,

    /// <summary>Enough tracers, but the end-members and processes are numerically dependent: the answer on the maximal independent set.</summary>
    NotUnique,

    /// <summary>The iteration did not settle; the last answer is given.</summary>
    NotConverged,

    /// <summary>Solved.</summary>
    Solved,
}

/// <summary>The names of the statuses in files.</summary>
public static class SolveStatusNames
{
    /// <summary>The contract's name of a status.</summary>
    /// <param name="status">The status.</param>
    public static string Name(this SolveStatus status) => status switch
    {
        SolveStatus.BadInput => "bad-input",
        SolveStatus.OutsideLayers => "outside-layers",
        SolveStatus.TooFewTracers => "too-few-tracers",
        SolveStatus.NotUnique => "not-unique",
        SolveStatus.NotConverged => "not-converged",
        _ => "solved",
    };
}
