namespace WaterMix.Core.Samples;

/// <summary>The WHP quality flags that matter here, <c>WhpExchange</c>. 0 means that the file gives no flag.</summary>
public static class QualityFlags
{
    /// <summary>The file gives no flag for this value.</summary>
    public const byte NoFlag = 0;

    /// <summary>Good, in all three tables (water sample, CTD, bottle).</summary>
    public const byte Good = 2;

    /// <summary>Questionable measurement; for a bottle: leaking.</summary>
    public const byte Questionable = 3;

    /// <summary>Bad measurement; for a bottle: did not trip correctly.</summary>
    public const byte Bad = 4;

    /// <summary>Not reported.</summary>
    public const byte NotReported = 5;

    /// <summary>Water sample: mean of replicates. CTD: interpolated over more than 2 dbar.</summary>
    public const byte MeanOrInterpolated = 6;

    /// <summary>CTD: despiked. Water sample: a chromatograph's peak measured by hand.</summary>
    public const byte Despiked = 7;

    /// <summary>Not sampled.</summary>
    public const byte NotSampled = 9;

    /// <summary>
    /// How bad a flag is, for "a derived value carries the worst flag of its inputs": 0 no flag, 1 good, then
    /// despiked or peak by hand, mean or interpolated, uncalibrated, questionable, bad, not reported, not sampled.
    /// </summary>
    /// <param name="flag">A WHP flag, 0 to 9.</param>
    public static int Rank(byte flag) => flag switch
    {
        NoFlag => 0,
        Good => 1,
        MeanOrInterpolated => 2,
        Despiked => 3,
        8 => 4,
        1 => 5,
        Questionable => 6,
        Bad => 7,
        NotReported => 8,
        _ => 9,
    };
}
