namespace WaterMix.Cli;

/// <summary>What the process returns.</summary>
internal static class ExitStatus
{
    /// <summary>Done.</summary>
    public const int Done = 0;

    /// <summary>Anything else that stopped the work: a wrong option, a full disk, an interruption.</summary>
    public const int Stopped = 1;

    /// <summary>The input is not usable; the findings say why.</summary>
    public const int NotUsable = 2;
}
