namespace WaterMix.SampleData;

/// <summary>What a random number is drawn for. The numbers of one purpose never change when another is added.</summary>
public enum Purpose
{
    /// <summary>Where a bottle is closed.</summary>
    Pressure,

    /// <summary>Roughness of the sea floor.</summary>
    SeaFloor,

    /// <summary>Roughness of the coast.</summary>
    Coast,

    /// <summary>Whether a value gets a flag other than good.</summary>
    Flag,

    /// <summary>How far a flagged value is off.</summary>
    Fault,

    /// <summary>Error of measurement.</summary>
    Measurement,

    /// <summary>Error of the CTD's own values.</summary>
    CtdMeasurement,

    /// <summary>How a parcel differs from the typical water of its source; the purposes of the further sources follow.</summary>
    SourceSpread,
}

/// <summary>Random numbers by key instead of by order: the same seed, purpose and place always give the same number.</summary>
/// <param name="seed">The seed of the whole ocean.</param>
public sealed class Noise(ulong seed)
{
    /// <summary>Uniform in (0, 1).</summary>
    /// <param name="purpose">What it is for; a source's index may be added.</param>
    /// <param name="where">First part of the place, such as the station.</param>
    /// <param name="which">Second part, such as the bottle.</param>
    /// <param name="what">Third part, such as the tracer.</param>
    public double Uniform(Purpose purpose, int where, int which, int what)
    {
        SplitMix64 generator = At(purpose, where, which, what);
        return Fraction(generator.Next());
    }

    /// <summary>Normal with mean 0 and standard deviation 1, <c>BoxMuller1958</c>.</summary>
    /// <inheritdoc cref="Uniform"/>
    public double Normal(Purpose purpose, int where, int which, int what)
    {
        SplitMix64 generator = At(purpose, where, which, what);
        double radius = Math.Sqrt(-2 * Math.Log(Fraction(generator.Next())));
        return radius * Math.Cos(2 * Math.PI * Fraction(generator.Next()));
    }

    private SplitMix64 At(Purpose purpose, int where, int which, int what)
    {
        ulong key = seed;
        foreach (int part in (ReadOnlySpan<int>)[(int)purpose, where, which, what])
        {
            key = new SplitMix64(key + (ulong)part).Next();
        }

        return new SplitMix64(key);
    }

    /// <summary>The upper 53 bits as a number in (0, 1), 0 excluded so that it has a logarithm.</summary>
    private static double Fraction(ulong bits) => ((bits >> 11) + 0.5) / (1UL << 53);
}
