namespace WaterMix.Web.Tests;

/// <summary>A clock whose people live at Greenwich, so that shown times do not depend on the machine.</summary>
internal sealed class UtcClock : TimeProvider
{
    public override TimeZoneInfo LocalTimeZone => TimeZoneInfo.Utc;
}
