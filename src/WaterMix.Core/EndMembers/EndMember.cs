namespace WaterMix.Core.EndMembers;

/// <summary>A source water type: the value and the spread of each tracer, and where the numbers come from.</summary>
/// <param name="Id">Matches <c>[A-Za-z0-9][A-Za-z0-9._-]{0,31}</c>; unique without case within a set and the processes of a model.</param>
/// <param name="Name">The name for people; may be empty.</param>
/// <param name="Values">Value by quantity id, in the quantity's canonical unit.</param>
/// <param name="Provenance">Where the numbers come from.</param>
public sealed record EndMember(string Id, string Name, IReadOnlyDictionary<string, double> Values, Provenance Provenance)
{
    /// <summary>Spread within the source (one standard deviation, >= 0) by quantity id: each parcel differs by it.</summary>
    public IReadOnlyDictionary<string, double> Sd { get; init; } = new Dictionary<string, double>();

    /// <summary>Standard error of the source's mean by quantity id, where it is given; shared by all samples.</summary>
    public IReadOnlyDictionary<string, double> MeanSd { get; init; } = new Dictionary<string, double>();

    /// <summary>Correlations of the spread between tracers, or null where none are given.</summary>
    public TracerMatrix? Correlations { get; init; }

    /// <summary>Number of independent determinations (cruises or years, never bottles), >= 1, or null where it is not given (then it counts as 1).</summary>
    public int? Observations { get; init; }

    /// <summary>The typical position, or null.</summary>
    public EndMemberPosition? Position { get; init; }
}

/// <summary>Where a source water is found; needed only to convert between the temperature and salinity pairs.</summary>
/// <param name="Latitude">Degrees north, -90 to 90.</param>
/// <param name="Longitude">Degrees east, -180 to 360.</param>
/// <param name="Pressure">Sea pressure, dbar, 0 to 12 000.</param>
public sealed record EndMemberPosition(double Latitude, double Longitude, double Pressure);

/// <summary>How an end-member's numbers came about.</summary>
public enum ProvenanceKind
{
    /// <summary>Typed in.</summary>
    Manual,

    /// <summary>Computed from samples.</summary>
    Samples,

    /// <summary>From a publication.</summary>
    Literature,

    /// <summary>From memory, not checked against a source.</summary>
    Remembered,

    /// <summary>Proposed by a method, not yet judged by a person.</summary>
    Proposal,
}

/// <summary>Where an end-member's numbers come from.</summary>
/// <param name="Kind">How they came about.</param>
/// <param name="Note">Free text; null where the file has none.</param>
/// <param name="Citation">The source; null where the file has none.</param>
public sealed record Provenance(ProvenanceKind Kind, string? Note = null, string? Citation = null);

/// <summary>A symmetric matrix over named tracers: a covariance or a correlation.</summary>
/// <param name="Tracers">Quantity ids, one per row and column.</param>
/// <param name="Matrix">Rows of the matrix, each as long as <paramref name="Tracers"/>.</param>
public sealed record TracerMatrix(IReadOnlyList<string> Tracers, IReadOnlyList<IReadOnlyList<double>> Matrix);
