namespace WaterMix.Formats.Matching;

/// <summary>What a conversion needs to know beside the value itself.</summary>
public enum VolumeBasis
{
    /// <summary>Nothing: the source is not per volume, or the quantity is kept per volume.</summary>
    None,

    /// <summary>An amount per litre at the potential density of the sample: divided by 1 + sigma0 / 1000.</summary>
    PotentialDensity,

    /// <summary>An amount per litre at the laboratory's temperature: divided by the density of the sample there.</summary>
    LaboratoryDensity,
}

/// <summary>The way from a unit in a file to a quantity's canonical unit: value * multiply / divide + add, then by density where asked.</summary>
/// <param name="Multiply">Factor.</param>
/// <param name="Divide">Divisor; beside the factor so that 1.00024 and powers of ten divide exactly as written.</param>
/// <param name="Add">Added last.</param>
/// <param name="Basis">The density that the result is still to be divided by.</param>
/// <param name="Text">The conversion for people, such as <c>T90 = T68 / 1.00024</c>; empty where nothing is done.</param>
public readonly record struct UnitConversion(double Multiply, double Divide, double Add, VolumeBasis Basis, string Text)
{
    /// <summary>The unit is the canonical one.</summary>
    public static UnitConversion Identity { get; } = new(1, 1, 0, VolumeBasis.None, "");

    /// <summary>True where the number is kept as it stands, bit for bit (a density may still divide it).</summary>
    public bool KeepsNumber => Multiply == 1 && Divide == 1 && Add == 0;

    /// <summary>The value in the canonical unit, before any division by density.</summary>
    /// <param name="value">A value in the file's unit.</param>
    public double Apply(double value) => KeepsNumber ? value : (value * Multiply / Divide) + Add;
}
