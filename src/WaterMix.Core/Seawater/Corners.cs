namespace WaterMix.Core.Seawater;

/// <summary>Which corners of an atlas cell take part.</summary>
internal readonly record struct Corners(bool SouthWest, bool SouthEast, bool NorthEast, bool NorthWest)
{
    public static Corners All => new(true, true, true, true);
}
