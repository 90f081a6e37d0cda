using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Web.State.Figures;
using WaterMix.Web.State.Samples;

namespace WaterMix.Web.Tests.State.Samples;

public sealed class InstrumentDifferenceTests
{
    // By hand: the differences 2, 4, 4, 4, 5, 5, 7, 9 have mean 5 and sum of squared deviations 32, so a variance of 32 / 7.
    [Fact]
    public void Of_KnownDifferences_GivesMeanAndStandardDeviation()
    {
        StudySamples samples = Samples([2, 4, 4, 4, 5, 5, 7, 9]);
        InstrumentDifference difference = InstrumentDifference.Of(samples, "oxygen", [.. Enumerable.Range(0, 8)]);
        Assert.Equal(8, difference.Count);
        Assert.Equal(5, difference.Mean, 12);
        Assert.Equal(Math.Sqrt(32.0 / 7), difference.Sd, 12);
        Assert.Contains("In 8 pairs the bottle reads 5.0 µmol/kg more than the CTD on average; the standard deviation is 2.1 µmol/kg", difference.Words, StringComparison.Ordinal);
    }

    [Fact]
    public void Of_OneStrayPair_KeepsThePlotOnTheOthersAndSaysSo()
    {
        double[] differences = [.. Enumerable.Range(0, 50).Select(i => 0.001 * (i % 5)), -5];
        InstrumentDifference difference = InstrumentDifference.Of(Samples(differences), "oxygen", [.. Enumerable.Range(0, 51)]);
        Assert.True(difference.X.Range!.Value.From > -0.1);
        Assert.Contains("1 pair stands outside the plot", difference.Words, StringComparison.Ordinal);
    }

    [Fact]
    public void Of_ValuesWithoutAcceptedFlag_AreNotPaired()
    {
        StudySamples samples = Samples([1, 2, 3], [2, 3, 2]);
        InstrumentDifference difference = InstrumentDifference.Of(samples, "oxygen", [0, 1, 2]);
        Assert.Equal(2, difference.Count);
        Assert.Equal([0, 2], difference.Layers.OfType<PointLayer>().Single().Rows!);
    }

    [Fact]
    public void QuantityOf_WithoutBothInstruments_IsNull() =>
        Assert.Null(InstrumentDifference.QuantityOf(Tables.Study((Tables.CruiseOf("a"), Tables.Table(["1"], Tables.Column(Quantity.Oxygen, [1])))), "oxygen"));

    private static StudySamples Samples(double[] differences, byte[]? flags = null)
    {
        int n = differences.Length;
        double[] ctd = [.. Enumerable.Repeat(200.0, n)];
        double[] bottle = [.. differences.Select(d => 200 + d)];
        return Tables.Study((Tables.CruiseOf("a"), Tables.Table(
            [.. Enumerable.Repeat("1", n)],
            Tables.Column(Quantity.Pressure, [.. Enumerable.Range(0, n).Select(i => 10.0 * i)]),
            Tables.Column(Quantity.Oxygen, bottle, flags),
            Tables.Column(Quantity.Oxygen, bottle, flags, "_bottle"),
            Tables.Column(Quantity.Oxygen, ctd, null, "_ctd", ValueOrigin.Ctd))));
    }
}
