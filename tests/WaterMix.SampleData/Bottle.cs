namespace WaterMix.SampleData;

/// <summary>A value as the file gives it.</summary>
/// <param name="Value">In the column's unit; NaN where there is none.</param>
/// <param name="Flag">The WHP flag of a water sample or of a CTD value.</param>
public readonly record struct Measured(double Value, int Flag)
{
    /// <summary>Nothing was sampled.</summary>
    public static readonly Measured Missing = new(double.NaN, 9);
}

/// <summary>The measured columns of a bottle file that carry a flag, in the file's order.</summary>
public enum Column
{
    /// <summary>CTD salinity.</summary>
    Ctdsal,

    /// <summary>Bottle salinity.</summary>
    Salnty,

    /// <summary>CTD oxygen.</summary>
    Ctdoxy,

    /// <summary>Bottle oxygen.</summary>
    Oxygen,

    /// <summary>Silicate.</summary>
    Silcat,

    /// <summary>Nitrate.</summary>
    Nitrat,

    /// <summary>Phosphate.</summary>
    Phspht,
}

/// <summary>One bottle: where it was closed, the water there, and what was measured.</summary>
/// <param name="Station">Its station.</param>
/// <param name="Cast">Its cast, from 1.</param>
/// <param name="Sample">Its number within the cast, from 1 at the deepest.</param>
/// <param name="Pressure">Where it was closed, or should have been, dbar.</param>
/// <param name="Water">The water at that pressure, to the digits of the truth file.</param>
/// <param name="Parcel">Value of each tracer there without errors of measurement: the mixture and the spread within its sources.</param>
/// <param name="Temperature">Measured in-situ temperature, degC (ITS-90).</param>
public sealed record Bottle(Station Station, int Cast, int Sample, double Pressure, Water Water, double[] Parcel, double Temperature)
{
    /// <summary>The WHP flag of the bottle itself.</summary>
    public int Flag { get; set; } = 2;

    /// <summary>The measured values, one per <see cref="Column"/>.</summary>
    public Measured[] Values { get; } = new Measured[Enum.GetValues<Column>().Length];

    /// <summary>The measured value of a column.</summary>
    /// <param name="column">The column.</param>
    public Measured this[Column column]
    {
        get => Values[(int)column];
        set => Values[(int)column] = value;
    }

    /// <summary>Index of the tracer that a column measures.</summary>
    /// <param name="column">The column.</param>
    public static int TracerOf(Column column) => column switch
    {
        Column.Ctdsal or Column.Salnty => 1,
        Column.Ctdoxy or Column.Oxygen => 2,
        Column.Nitrat => 3,
        Column.Phspht => 4,
        _ => 5,
    };

    /// <summary>True for a CTD's value, which stays when the bottle fails.</summary>
    /// <param name="column">The column.</param>
    public static bool IsCtd(Column column) => column is Column.Ctdsal or Column.Ctdoxy;
}
