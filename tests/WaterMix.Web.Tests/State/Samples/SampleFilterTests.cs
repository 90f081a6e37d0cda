using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Web.State.Samples;
using WaterMix.Workspace.Cruises;

namespace WaterMix.Web.Tests.State.Samples;

public sealed class SampleFilterTests
{
    private readonly Cruise _first = Tables.CruiseOf("first");
    private readonly Cruise _second = Tables.CruiseOf("second");

    private StudySamples Samples => Tables.Study(
        (_first, Tables.Table(["1", "1", "2"], Tables.Column(Quantity.Pressure, [10, 1000, 2000]), Tables.Column(Quantity.Oxygen, [200, 210, 220], [2, 3, 6]))),
        (_second, Tables.Table(["12", "A7"], Tables.Column(Quantity.Pressure, [1000, double.NaN]), Tables.Column(Quantity.Oxygen, [double.NaN, 5], [9, 4]))));

    [Fact]
    public void Rows_WithoutAnyChoice_AreAll() => Assert.Equal([0, 1, 2, 3, 4], new SampleFilter().Rows(Samples));

    [Fact]
    public void Rows_OfOneCruise_AreItsOwn() => Assert.Equal([3, 4], new SampleFilter { Cruises = [_second.Id] }.Rows(Samples));

    [Fact]
    public void Rows_OfAPressureRange_AreHalfOpenAndWithoutMissing() =>
        Assert.Equal([1, 3], new SampleFilter { Down = new ValueRange(1000, 2000) }.Rows(Samples));

    [Theory]
    [InlineData("1", new[] { 0, 1 })]
    [InlineData("1, a7", new[] { 0, 1, 4 })]
    [InlineData("2-20", new[] { 2, 3 })]
    [InlineData("20-2", new[] { 2, 3 })]
    [InlineData("99", new int[0])]
    public void Rows_OfStations_TakeNamesAndRanges(string stations, int[] rows) => Assert.Equal(rows, new SampleFilter { Stations = stations }.Rows(Samples));

    // Flag 3 and 4 hold values that are not accepted; 9 holds none.
    [Fact]
    public void Rows_OnlyFlagged_AreThoseWithAValueOfAnotherFlag() => Assert.Equal([1, 4], new SampleFilter { OnlyFlagged = true }.Rows(Samples));

    [Fact]
    public void Accepted_FlagsOfTheFilter_ReplaceTheModels()
    {
        AcceptedFlags accepted = new SampleFilter { Flags = [2, 3] }.Accepted(AcceptedFlags.Default);
        Assert.Equal([2, 3], accepted.WaterSample);
        Assert.Equal(AcceptedFlags.Default.Ctd, accepted.Ctd);
    }
}
