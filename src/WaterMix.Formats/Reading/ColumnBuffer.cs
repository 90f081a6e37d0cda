using WaterMix.Formats.Matching;

namespace WaterMix.Formats.Reading;

/// <summary>The rows of one original column while a block is read; missing until set.</summary>
internal sealed class ColumnBuffer
{
    private readonly bool _hasFlags;
    private readonly bool _hasOrigins;
    private readonly bool _hasBases;

    /// <summary>A buffer for a planned column.</summary>
    public ColumnBuffer(PlannedColumn plan)
    {
        _hasFlags = plan.Flag is not null;
        _hasOrigins = plan.Source is not null;
        _hasBases = plan.UnitColumn is not null;
    }

    /// <summary>Values in the canonical unit, before any division by density.</summary>
    public double[] Values = [];

    /// <summary>Flags, where the file has them; else empty.</summary>
    public byte[] Flags = [];

    /// <summary>Instruments, where the file says them row by row; else empty.</summary>
    public Core.Samples.ValueOrigin[] Origins = [];

    /// <summary>Densities still to divide by, where the unit stands row by row; else empty.</summary>
    public VolumeBasis[] Bases = [];

    /// <summary>Begins a block, or makes room for more of its rows.</summary>
    /// <param name="capacity">Number of rows.</param>
    /// <param name="isNew">True at the beginning of a block, whose arrays the table then owns.</param>
    public void Resize(int capacity, bool isNew)
    {
        if (isNew)
        {
            (Values, Flags, Origins, Bases) = ([], [], [], []);
        }

        Array.Resize(ref Values, capacity);
        Array.Resize(ref Flags, _hasFlags ? capacity : 0);
        Array.Resize(ref Origins, _hasOrigins ? capacity : 0);
        Array.Resize(ref Bases, _hasBases ? capacity : 0);
    }
}
