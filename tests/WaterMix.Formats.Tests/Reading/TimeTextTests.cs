using WaterMix.Formats.Reading;

namespace WaterMix.Formats.Tests.Reading;

public class TimeTextTests
{
    [Theory]
    [InlineData("19930923", "2222", "1993-09-23T22:22:00Z")]
    [InlineData("19930924", "0013", "1993-09-24T00:13:00Z")]
    [InlineData("19930924", "  13", "1993-09-24T00:13:00Z")]
    [InlineData("19930924", " 930", "1993-09-24T09:30:00Z")]
    [InlineData("19931231", "2400", "1994-01-01T00:00:00Z")]
    [InlineData("1993-09-23", "22:22", "1993-09-23T22:22:00Z")]
    [InlineData("1993/09/23", "22:22:05", "1993-09-23T22:22:05Z")]
    [InlineData("19930923", "", "1993-09-23")]
    [InlineData("19930923", "-999", "1993-09-23")]
    [InlineData("", "2222", "")]
    [InlineData("-999", "-999", "")]
    [InlineData("1993-09-23T22:22Z", "", "1993-09-23T22:22:00Z")]
    [InlineData("1993-09-23 22:22:05", "", "1993-09-23T22:22:05Z")]
    [InlineData("1993-09-23T22:22:05.25Z", "", "1993-09-23T22:22:05.25Z")]
    [InlineData("1993-09-23T22:22:00+02:00", "", "1993-09-23T20:22:00Z")]
    public void Join_FormsInUse_GivesIso8601InUtc(string date, string time, string expected) =>
        Assert.Equal(expected, TimeText.Join(date, time));

    [Theory]
    [InlineData("23/09/1993", "")] // day or month first?
    [InlineData("09/10/93", "")]
    [InlineData("19931323", "")]
    [InlineData("19930923", "2275")]
    [InlineData("19930923", "noon")]
    [InlineData("12.5", "")]
    public void Join_AmbiguousOrImpossible_IsNotRead(string date, string time) =>
        Assert.Null(TimeText.Join(date, time));

    [Theory]
    [InlineData("1993-09-23")]
    [InlineData("1993-09-23T22:22:00Z")]
    [InlineData("1993-09-23T22:22:05.25Z")]
    public void Join_ItsOwnOutput_IsUnchanged(string text) => Assert.Equal(text, TimeText.Join(text, ""));
}
