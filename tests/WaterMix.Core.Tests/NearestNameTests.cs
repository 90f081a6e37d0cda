namespace WaterMix.Core.Tests;

public class NearestNameTests
{
    private static readonly string[] Known = ["oxygen", "nitrate", "nitrite", "phosphate", "no", "po"];

    [Theory]
    [InlineData("oxigen", "oxygen")]
    [InlineData("OXYGEN", "oxygen")]
    [InlineData("nitrat", "nitrate")]
    [InlineData("phospahte", "phosphate")]
    [InlineData("on", "no")]
    [InlineData("salinity", null)]
    [InlineData("", null)]
    [InlineData("oxygen_in_the_water", null)]
    public void Of_Misspelt_GivesTheNearestOrNone(string name, string? expected) => Assert.Equal(expected, NearestName.Of(name, Known));
}
