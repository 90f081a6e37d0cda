using WaterMix.Core.Quantities;

namespace WaterMix.Core.Samples;

/// <summary>One quantity of every sample: values in one unit, the flags beside them, and where they come from.</summary>
public sealed class SampleColumn
{
    private readonly double[] _values;
    private readonly byte[]? _flags;
    private readonly ValueOrigin[]? _origins;

    /// <summary>A column over arrays that it takes over: the caller must not write to them afterwards.</summary>
    /// <param name="quantity">What the values are; they are in its unit.</param>
    /// <param name="values">Length n, one value per sample; NaN is missing.</param>
    /// <param name="flags">Length n, WHP flags (0 none), or null where the column has no flags.</param>
    /// <param name="origins">Length n, where bottle and CTD values are merged, or null where all have <paramref name="origin"/>.</param>
    /// <param name="origin">Where every value comes from if <paramref name="origins"/> is null.</param>
    /// <exception cref="ArgumentException">The arrays differ in length.</exception>
    public SampleColumn(Quantity quantity, double[] values, byte[]? flags = null, ValueOrigin[]? origins = null, ValueOrigin origin = ValueOrigin.Bottle)
    {
        ArgumentNullException.ThrowIfNull(quantity);
        ArgumentNullException.ThrowIfNull(values);
        if ((flags is not null && flags.Length != values.Length) || (origins is not null && origins.Length != values.Length))
        {
            throw new ArgumentException(
                $"{quantity.Id}: values, flags and origins hold one entry per sample, but their lengths are {values.Length}, {flags?.Length ?? 0} and {origins?.Length ?? 0}.");
        }

        Quantity = quantity;
        _values = values;
        _flags = flags;
        _origins = origins;
        Origin = origin;
    }

    /// <summary>What the values are.</summary>
    public Quantity Quantity { get; }

    /// <summary>The column's id in files: the quantity's id, with a suffix where the table holds the quantity more than once (<c>practical_salinity_ctd</c>).</summary>
    public string Id => Quantity.Id + Suffix;

    /// <summary>What tells this column from the quantity's main one: empty, <c>_bottle</c> or <c>_ctd</c>.</summary>
    public string Suffix { get; init; } = "";

    /// <summary>The name of the column in the file it was read from, or how it was derived.</summary>
    public string Source { get; init; } = "";

    /// <summary>The conversion made on the way in, such as <c>T90 = T68 / 1.00024</c>; empty where there was none.</summary>
    public string Conversion { get; init; } = "";

    /// <summary>Number of samples.</summary>
    public int Length => _values.Length;

    /// <summary>The values, one per sample, NaN where missing.</summary>
    public ReadOnlySpan<double> Values => _values;

    /// <summary>The WHP flags, one per sample; empty where the column has none.</summary>
    public ReadOnlySpan<byte> Flags => _flags;

    /// <summary>True where the column has flags.</summary>
    public bool HasFlags => _flags is not null;

    /// <summary>Where the values come from if they all come from one instrument.</summary>
    public ValueOrigin Origin { get; }

    /// <summary>True where bottle and CTD values are merged in this column, each with its own origin.</summary>
    public bool IsMerged => _origins is not null;

    /// <summary>The flag of one sample's value; 0 where there is none.</summary>
    /// <param name="row">Index of the sample, from 0.</param>
    public byte FlagAt(int row) => _flags is null ? QualityFlags.NoFlag : _flags[row];

    /// <summary>The instrument that one sample's value came from.</summary>
    /// <param name="row">Index of the sample, from 0.</param>
    public ValueOrigin OriginAt(int row) => _origins is null ? Origin : _origins[row];

    /// <summary>The value of one sample if its flag is accepted, otherwise NaN.</summary>
    /// <param name="row">Index of the sample, from 0.</param>
    /// <param name="accepted">The flags that count as usable.</param>
    public double UsableAt(int row, AcceptedFlags accepted) =>
        accepted.Accepts(FlagAt(row), OriginAt(row)) ? _values[row] : double.NaN;
}
