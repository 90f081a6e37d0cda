namespace WaterMix.Core.EndMembers;

/// <summary>Where a source water is found; needed only to convert between the temperature and salinity pairs.</summary>
/// <param name="Latitude">Degrees north, -90 to 90.</param>
/// <param name="Longitude">Degrees east, -180 to 360.</param>
/// <param name="Pressure">Sea pressure, dbar, 0 to 12 000.</param>
public sealed record EndMemberPosition(double Latitude, double Longitude, double Pressure);
