using WaterMix.Core.Samples;
using WaterMix.Web.State.Samples;

namespace WaterMix.Web.Tests.State.Samples;

public sealed class TypedTextTests
{
    [Theory]
    [InlineData("2, 6", new[] { 2, 6 })]
    [InlineData("6;2 2", new[] { 2, 6 })]
    public void Parse_FlagsAsTyped_AreSortedAndSingle(string text, int[] flags) => Assert.Equal(flags, FlagText.Parse(text));

    [Theory]
    [InlineData("")]
    [InlineData("0")]
    [InlineData("26")]
    [InlineData("2, x")]
    public void Parse_NoFlags_IsNull(string text) => Assert.Null(FlagText.Parse(text));

    // WhpExchange: water-sample flag 6 is the mean of replicates, CTD flag 6 interpolated, CTD flag 7 despiked, bottle flag 4 did not trip correctly.
    [Fact]
    public void Meaning_OfAFlag_DependsOnItsTable()
    {
        Assert.Equal("mean of replicates", FlagText.Meaning(6, ValueOrigin.Bottle));
        Assert.Equal("interpolated", FlagText.Meaning(6, ValueOrigin.Ctd));
        Assert.Equal("despiked", FlagText.Meaning(7, ValueOrigin.Ctd));
        Assert.Equal("did not trip correctly", FlagText.OfBottle(4));
    }

    [Theory]
    [InlineData("−1.5", -1.5)]
    [InlineData("1e3", 1000.0)]
    [InlineData(" ", null)]
    public void TryParse_ABound_TakesNumbersAndNothing(string text, double? expected)
    {
        Assert.True(ValueRange.TryParse(text, out double? bound));
        Assert.Equal(expected, bound);
    }

    [Theory]
    [InlineData("1,5")]
    [InlineData("deep")]
    [InlineData("NaN")]
    public void TryParse_NoNumber_IsRefused(string text) => Assert.False(ValueRange.TryParse(text, out _));
}
