namespace WaterMix.Core.Mixing;

/// <summary>The factors of the derived tracers.</summary>
public sealed record DerivedTracerFactors
{
    /// <summary>NO = O2 + this * NO3. Default 170/16, <c>AndersonSarmiento1994</c>.</summary>
    public double NoOxygenPerNitrate { get; init; } = 170.0 / 16.0;

    /// <summary>PO = O2 + this * PO4. Default 170, <c>AndersonSarmiento1994</c>.</summary>
    public double PoOxygenPerPhosphate { get; init; } = 170;

    /// <summary>N* = NO3 - this * PO4 + offset. Default 16.</summary>
    public double NStarNitratePerPhosphate { get; init; } = 16;

    /// <summary>The offset of N*, umol/kg. Default 2.9, <c>GruberSarmiento1997</c>.</summary>
    public double NStarOffset { get; init; } = 2.9;

    /// <summary>PO4* = PO4 + O2 / this + offset. Default 175, <c>Broecker1998</c>.</summary>
    public double Po4StarOxygenPerPhosphate { get; init; } = 175;

    /// <summary>The offset of PO4*, umol/kg. Default -1.95, <c>Broecker1998</c>.</summary>
    public double Po4StarOffset { get; init; } = -1.95;
}
