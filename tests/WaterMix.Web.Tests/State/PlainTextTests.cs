using WaterMix.Web.State;

namespace WaterMix.Web.Tests.State;

public sealed class PlainTextTests
{
    [Theory]
    [InlineData(0, "0 samples")]
    [InlineData(1, "1 sample")]
    [InlineData(2841, "2\u00a0841 samples")]
    [InlineData(1_000_000, "1\u00a0000\u00a0000 samples")]
    public void Count_OfThings_AgreesInNumber(long count, string expected) => Assert.Equal(expected, PlainText.Count(count, "sample"));

    [Theory]
    [InlineData(-1.256, 2, "\u22121.26")]
    [InlineData(12345.6, 1, "12\u00a0345.6")]
    [InlineData(double.NaN, 2, "\u2013")]
    public void Number_ForPeople_HasATrueMinusSign(double value, int decimals, string expected) => Assert.Equal(expected, PlainText.Number(value, decimals));

    [Fact]
    public void Time_InAZone_IsThatZones() => Assert.Equal(
        "1 Dec 2026, 01:30",
        PlainText.Time(new DateTimeOffset(2026, 11, 30, 23, 30, 0, TimeSpan.Zero), TimeZoneInfo.CreateCustomTimeZone("ahead", TimeSpan.FromHours(2), "ahead", "ahead")));
}
