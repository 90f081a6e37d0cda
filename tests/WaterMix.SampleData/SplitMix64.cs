namespace WaterMix.SampleData;

/// <summary>
/// A generator of 64-bit numbers that will give the same sequence for ever: ten lines of our own, since the sequence of
/// <see cref="Random"/> for a seed may change between versions of .NET. <c>SplitMix64</c>.
/// </summary>
/// <param name="seed">Any number.</param>
public struct SplitMix64(ulong seed)
{
    private ulong _state = seed;

    /// <summary>The next number of the sequence, every value equally likely.</summary>
    public ulong Next()
    {
        _state += 0x9E3779B97F4A7C15;
        ulong z = _state;
        z = (z ^ (z >> 30)) * 0xBF58476D1CE4E5B9;
        z = (z ^ (z >> 27)) * 0x94D049BB133111EB;
        return z ^ (z >> 31);
    }
}
