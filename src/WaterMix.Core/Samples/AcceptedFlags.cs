namespace WaterMix.Core.Samples;

/// <summary>Which quality flags count as usable: one list for water samples, one for CTD values.</summary>
/// <param name="waterSample">WHP water-sample flags, each 0 to 9.</param>
/// <param name="ctd">WHP CTD flags, each 0 to 9.</param>
public sealed class AcceptedFlags(IReadOnlyCollection<int> waterSample, IReadOnlyCollection<int> ctd)
{
    private readonly ushort _waterSampleBits = Bits(waterSample);
    private readonly ushort _ctdBits = Bits(ctd);

    /// <summary>Good (2) and mean of replicates (6) for water samples; good (2), interpolated (6), despiked (7) for CTD values.</summary>
    public static AcceptedFlags Default { get; } = new([2, 6], [2, 6, 7]);

    /// <summary>The accepted water-sample flags.</summary>
    public IReadOnlyCollection<int> WaterSample { get; } = waterSample;

    /// <summary>The accepted CTD flags.</summary>
    public IReadOnlyCollection<int> Ctd { get; } = ctd;

    /// <summary>True where a value with this flag is usable. A value without a flag always is.</summary>
    /// <param name="flag">The WHP flag, 0 where the file gives none.</param>
    /// <param name="origin">Which table the flag is read in; anything but the CTD is a water sample.</param>
    public bool Accepts(byte flag, ValueOrigin origin) =>
        flag == QualityFlags.NoFlag
        || (((origin == ValueOrigin.Ctd ? _ctdBits : _waterSampleBits) >> flag) & 1) != 0;

    private static ushort Bits(IReadOnlyCollection<int> flags)
    {
        int bits = 0;
        foreach (int flag in flags)
        {
            ArgumentOutOfRangeException.ThrowIfLessThan(flag, 0);
            ArgumentOutOfRangeException.ThrowIfGreaterThan(flag, 9);
            bits |= 1 << flag;
        }

        return (ushort)bits;
    }
}
