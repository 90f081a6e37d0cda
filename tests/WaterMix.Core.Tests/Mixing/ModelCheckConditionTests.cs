using WaterMix.Core.Mixing;

namespace WaterMix.Core.Tests.Mixing;

public class ModelCheckConditionTests
{
    // The contract: atLeast <= value < lessThan; a missing value is in no range; a longitude range whose start exceeds its end wraps round.
    [Theory]
    [InlineData("pressure", 10.0, 20.0, 10.0, true)]
    [InlineData("pressure", 10.0, 20.0, 20.0, false)]
    [InlineData("pressure", 10.0, null, 1e4, true)]
    [InlineData("pressure", null, 20.0, -5.0, true)]
    [InlineData("pressure", 10.0, 20.0, double.NaN, false)]
    [InlineData("pressure", 20.0, 10.0, 25.0, false)]
    [InlineData("longitude", 170.0, -170.0, 175.0, true)]
    [InlineData("longitude", 170.0, -170.0, -175.0, true)]
    [InlineData("longitude", 170.0, -170.0, 170.0, true)]
    [InlineData("longitude", 170.0, -170.0, -170.0, false)]
    [InlineData("longitude", 170.0, -170.0, 0.0, false)]
    [InlineData("longitude", 350.0, 10.0, -5.0, true)]
    [InlineData("longitude", 350.0, 10.0, 5.0, true)]
    [InlineData("longitude", 350.0, 10.0, 10.0, false)]
    [InlineData("longitude", 350.0, 10.0, -20.0, false)]
    [InlineData("longitude", 200.0, 300.0, -100.0, true)]
    [InlineData("longitude", 200.0, 300.0, -160.0, true)]
    [InlineData("longitude", 200.0, 300.0, -60.0, false)]
    [InlineData("longitude", 200.0, 300.0, 100.0, false)]
    [InlineData("longitude", 0.0, 360.0, -90.0, true)]
    [InlineData("longitude", -180.0, 180.0, -180.0, true)]
    [InlineData("longitude", -30.0, -10.0, -20.0, true)]
    public void Holds_HalfOpenRanges(string quantity, double? atLeast, double? lessThan, double value, bool holds) =>
        Assert.Equal(holds, new Condition(quantity, atLeast, lessThan).Holds(value));
}
