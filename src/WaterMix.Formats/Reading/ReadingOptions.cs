using WaterMix.Core.Samples;
using WaterMix.Formats.Matching;

namespace WaterMix.Formats.Reading;

/// <summary>What is said about the reading of sample files; every part has a default.</summary>
public sealed record ReadingOptions
{
    /// <summary>The flags with which a bottle or CTD value may become the merged value.</summary>
    public AcceptedFlags AcceptedFlags { get; init; } = AcceptedFlags.Default;

    /// <summary>Which instrument comes first where salinity or oxygen has both: <see cref="ValueOrigin.Bottle"/> or <see cref="ValueOrigin.Ctd"/>.</summary>
    public ValueOrigin Prefer { get; init; } = ValueOrigin.Bottle;

    /// <summary>The temperature at which nutrients per litre were measured, degC.</summary>
    public double LaboratoryTemperature { get; init; } = 20;

    /// <summary>A saved or corrected column match, or null to guess from names and units.</summary>
    public ColumnMatchFile? Match { get; init; }

    /// <summary>
    /// Ids of the quantities that the caller cannot do without, the inputs of derived ones included: an ambiguous column or an
    /// unknown unit of one of them is an error. Null: everything is looked at, and such a column is kept under its own name with a warning.
    /// </summary>
    public IReadOnlySet<string>? NeededQuantities { get; init; }

    /// <summary>Ends the opening early, where it waits for what comes through a pipe.</summary>
    public CancellationToken Cancellation { get; init; }
}
