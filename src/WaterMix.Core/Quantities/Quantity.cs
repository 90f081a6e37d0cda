using System.Collections.Frozen;

namespace WaterMix.Core.Quantities;

/// <summary>What a quantity may be used for in a mixing fit.</summary>
public enum TracerUse
{
    /// <summary>A row of a fit: it mixes linearly (a process may change it on the way).</summary>
    Row,

    /// <summary>A row of a fit whose value is computed from its parent quantities (NO, PO, N*, PO4*).</summary>
    DerivedRow,

    /// <summary>Never a row: a place, or a quantity that does not mix linearly.</summary>
    Never,
}

/// <summary>What a column of numbers holds: an id, the one unit it is kept in, and the values that are possible.</summary>
/// <param name="Id">The id used in files, such as <c>practical_salinity</c>.</param>
/// <param name="Unit">The canonical unit, such as <c>umol/kg</c>; <c>1</c> where there is none.</param>
/// <param name="Name">The trade's name, for people.</param>
/// <param name="Use">Whether it may be a row of a fit.</param>
/// <param name="Lowest">The lowest possible value, in <paramref name="Unit"/>; a lower one is an error of the data, not an unusual sea.</param>
/// <param name="Highest">The highest possible value, likewise.</param>
public sealed record Quantity(string Id, string Unit, string Name, TracerUse Use, double Lowest, double Highest)
{
    /// <summary>Latitude, degrees north.</summary>
    public static readonly Quantity Latitude = Place("latitude", "degrees north", "latitude", -90, 90);

    /// <summary>Longitude, degrees east, kept in [-180, 180).</summary>
    public static readonly Quantity Longitude = Place("longitude", "degrees east", "longitude", -180, 180);

    /// <summary>Sea pressure, dbar (0 at the surface).</summary>
    public static readonly Quantity Pressure = Place("pressure", "dbar", "pressure", -10, 12_000);

    /// <summary>Depth of the sample, m, positive downwards.</summary>
    public static readonly Quantity Depth = Place("depth", "m", "depth", -10, 12_000);

    /// <summary>Depth of the sea floor (the sounding), m, positive downwards.</summary>
    public static readonly Quantity BottomDepth = Place("bottom_depth", "m", "bottom depth", -500, 12_000);

    /// <summary>In-situ temperature, ITS-90.</summary>
    public static readonly Quantity InSituTemperature = new("in_situ_temperature", "degC", "in-situ temperature", TracerUse.Never, -5, 50);

    /// <summary>Potential temperature referred to 0 dbar, ITS-90.</summary>
    public static readonly Quantity PotentialTemperature = Row("potential_temperature", "degC", "potential temperature", -5, 50);

    /// <summary>Conservative Temperature (TEOS-10).</summary>
    public static readonly Quantity ConservativeTemperature = Row("conservative_temperature", "degC", "Conservative Temperature", -5, 50);

    /// <summary>Practical Salinity (PSS-78).</summary>
    public static readonly Quantity PracticalSalinity = Row("practical_salinity", "1", "Practical Salinity", 0, 60);

    /// <summary>Absolute Salinity (TEOS-10).</summary>
    public static readonly Quantity AbsoluteSalinity = Row("absolute_salinity", "g/kg", "Absolute Salinity", 0, 60);

    /// <summary>Dissolved oxygen.</summary>
    public static readonly Quantity Oxygen = Row("oxygen", "umol/kg", "oxygen", -10, 1_000);

    /// <summary>Nitrate.</summary>
    public static readonly Quantity Nitrate = Row("nitrate", "umol/kg", "nitrate", -5, 1_000);

    /// <summary>Nitrite.</summary>
    public static readonly Quantity Nitrite = Row("nitrite", "umol/kg", "nitrite", -5, 1_000);

    /// <summary>Nitrate plus nitrite.</summary>
    public static readonly Quantity NitratePlusNitrite = Row("nitrate_plus_nitrite", "umol/kg", "nitrate plus nitrite", -5, 1_000);

    /// <summary>Ammonium.</summary>
    public static readonly Quantity Ammonium = Row("ammonium", "umol/kg", "ammonium", -5, 10_000);

    /// <summary>Phosphate.</summary>
    public static readonly Quantity Phosphate = Row("phosphate", "umol/kg", "phosphate", -1, 100);

    /// <summary>Silicate (silicic acid).</summary>
    public static readonly Quantity Silicate = Row("silicate", "umol/kg", "silicate", -5, 1_000);

    /// <summary>Dissolved inorganic carbon.</summary>
    public static readonly Quantity DissolvedInorganicCarbon = Row("dissolved_inorganic_carbon", "umol/kg", "dissolved inorganic carbon", 0, 20_000);

    /// <summary>Total alkalinity.</summary>
    public static readonly Quantity TotalAlkalinity = Row("total_alkalinity", "umol/kg", "total alkalinity", 0, 20_000);

    /// <summary>Oxygen isotope ratio of water, relative to VSMOW.</summary>
    public static readonly Quantity DeltaOxygen18 = Row("delta_oxygen_18", "permil", "delta oxygen-18", -100, 100);

    /// <summary>CFC-11.</summary>
    public static readonly Quantity Cfc11 = Row("cfc11", "pmol/kg", "CFC-11", -1, 1_000);

    /// <summary>CFC-12.</summary>
    public static readonly Quantity Cfc12 = Row("cfc12", "pmol/kg", "CFC-12", -1, 1_000);

    /// <summary>Sulfur hexafluoride.</summary>
    public static readonly Quantity SulfurHexafluoride = Row("sulfur_hexafluoride", "fmol/kg", "sulfur hexafluoride", -1, 10_000);

    /// <summary>Potential density anomaly referred to 0 dbar (TEOS-10).</summary>
    public static readonly Quantity Sigma0 = Density("sigma0", "sigma-0");

    /// <summary>Potential density anomaly referred to 1,000 dbar (TEOS-10).</summary>
    public static readonly Quantity Sigma1 = Density("sigma1", "sigma-1");

    /// <summary>Potential density anomaly referred to 2,000 dbar (TEOS-10).</summary>
    public static readonly Quantity Sigma2 = Density("sigma2", "sigma-2");

    /// <summary>Potential density anomaly referred to 3,000 dbar (TEOS-10).</summary>
    public static readonly Quantity Sigma3 = Density("sigma3", "sigma-3");

    /// <summary>Potential density anomaly referred to 4,000 dbar (TEOS-10).</summary>
    public static readonly Quantity Sigma4 = Density("sigma4", "sigma-4");

    /// <summary>Neutral density, as read; never computed here.</summary>
    public static readonly Quantity NeutralDensity = Density("neutral_density", "neutral density");

    /// <summary>Apparent oxygen utilisation: saturation at the sample's salinity and potential temperature less the observed oxygen.</summary>
    public static readonly Quantity ApparentOxygenUtilisation = new("apparent_oxygen_utilisation", "umol/kg", "apparent oxygen utilisation", TracerUse.Never, -1_000, 1_000);

    /// <summary>NO = O2 + f NO3, <c>Broecker1974</c>.</summary>
    public static readonly Quantity No = Derived("no", "NO");

    /// <summary>PO = O2 + f PO4, <c>Broecker1974</c>.</summary>
    public static readonly Quantity Po = Derived("po", "PO");

    /// <summary>N* = NO3 - f PO4 + offset, <c>GruberSarmiento1997</c>.</summary>
    public static readonly Quantity NStar = Derived("n_star", "N*");

    /// <summary>PO4* = PO4 + O2 / f + offset, <c>Broecker1998</c>.</summary>
    public static readonly Quantity Po4Star = Derived("po4_star", "PO4*");

    /// <summary>Every quantity that has an id of its own, in the order of the contract.</summary>
    public static readonly IReadOnlyList<Quantity> All =
    [
        Latitude, Longitude, Pressure, Depth, BottomDepth,
        InSituTemperature, PotentialTemperature, ConservativeTemperature, PracticalSalinity, AbsoluteSalinity,
        Oxygen, Nitrate, Nitrite, NitratePlusNitrite, Ammonium, Phosphate, Silicate,
        DissolvedInorganicCarbon, TotalAlkalinity, DeltaOxygen18, Cfc11, Cfc12, SulfurHexafluoride,
        Sigma0, Sigma1, Sigma2, Sigma3, Sigma4, NeutralDensity,
        ApparentOxygenUtilisation, No, Po, NStar, Po4Star,
    ];

    private static readonly FrozenDictionary<string, Quantity> ById = All.ToFrozenDictionary(q => q.Id, StringComparer.Ordinal);

    /// <summary>The quantity with this id, or null where the contract has none.</summary>
    /// <param name="id">An id such as <c>oxygen</c>; ids are lower case.</param>
    public static Quantity? Find(string id) => ById.GetValueOrDefault(id);

    /// <summary>A further tracer, named by the user, in the unit that the user gives; any finite value is possible.</summary>
    /// <param name="id">The user's name for it.</param>
    /// <param name="unit">The unit as given; empty where none is known.</param>
    public static Quantity Further(string id, string unit) =>
        new(id, unit, id, TracerUse.Row, double.MinValue, double.MaxValue);

    /// <summary>The quantity with this id, or a further tracer of that name without a unit.</summary>
    /// <param name="id">An id of the contract or the user's own.</param>
    public static Quantity FindOrFurther(string id) => Find(id) ?? Further(id, "");

    /// <summary>True where a value can occur in nature; NaN counts as possible (it is missing).</summary>
    /// <param name="value">A value in <see cref="Unit"/>.</param>
    public bool IsPossible(double value) => !(value < Lowest) && !(value > Highest);

    private static Quantity Place(string id, string unit, string name, double lowest, double highest) =>
        new(id, unit, name, TracerUse.Never, lowest, highest);

    private static Quantity Row(string id, string unit, string name, double lowest, double highest) =>
        new(id, unit, name, TracerUse.Row, lowest, highest);

    private static Quantity Density(string id, string name) => new(id, "kg/m3", name, TracerUse.Never, -50, 100);

    private static Quantity Derived(string id, string name) =>
        new(id, "umol/kg", name, TracerUse.DerivedRow, double.MinValue, double.MaxValue);
}
