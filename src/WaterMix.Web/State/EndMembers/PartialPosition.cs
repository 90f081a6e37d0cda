using WaterMix.Core.EndMembers;
using WaterMix.Web.State.Mixing;

namespace WaterMix.Web.State.EndMembers;

/// <summary>A position while it is being typed: a set holds whole ones only.</summary>
/// <param name="Latitude">Degrees north, or null.</param>
/// <param name="Longitude">Degrees east, or null.</param>
/// <param name="Pressure">dbar, or null.</param>
public sealed record PartialPosition(double? Latitude, double? Longitude, double? Pressure)
{
    /// <summary>True where something is given and something is missing.</summary>
    public bool IsPartial => Missing.Count is 1 or 2;

    /// <summary>The position; null where anything is missing.</summary>
    public EndMemberPosition? Whole => Latitude is { } north && Longitude is { } east && Pressure is { } dbar ? new EndMemberPosition(north, east, dbar) : null;

    /// <summary>What is missing, in words.</summary>
    public IReadOnlyList<string> Missing => [.. PositionField.All.Where(f => f.Of(this) is null).Select(f => f.Heading.ToLowerInvariant())];

    /// <summary>A position that a set holds.</summary>
    /// <param name="position">The position, or null.</param>
    public static PartialPosition Of(EndMemberPosition? position) => new(position?.Latitude, position?.Longitude, position?.Pressure);
}

/// <summary>One of the three numbers of a position.</summary>
/// <param name="Heading">Its name.</param>
/// <param name="Rule">Which numbers are possible.</param>
/// <param name="Of">Reads it.</param>
/// <param name="With">Changes it.</param>
public sealed record PositionField(string Heading, NumberRule Rule, Func<PartialPosition, double?> Of, Func<PartialPosition, double?, PartialPosition> With)
{
    /// <summary>Latitude, longitude, pressure.</summary>
    public static IReadOnlyList<PositionField> All { get; } =
    [
        new("Latitude", new NumberRule("latitude", -90, 90) { Unit = "\u00b0N", MayBeEmpty = true }, p => p.Latitude, (p, v) => p with { Latitude = v }),
        new("Longitude", new NumberRule("longitude", -180, 360) { Unit = "\u00b0E", MayBeEmpty = true }, p => p.Longitude, (p, v) => p with { Longitude = v }),
        new("Pressure", new NumberRule("pressure", 0, 12_000) { Unit = "dbar", MayBeEmpty = true }, p => p.Pressure, (p, v) => p with { Pressure = v }),
    ];
}
