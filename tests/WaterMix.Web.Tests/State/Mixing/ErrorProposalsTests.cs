using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Web.State.Figures;
using WaterMix.Web.State.Mixing;

namespace WaterMix.Web.Tests.State.Mixing;

public class ErrorProposalsTests
{
    // Differences 1, 2, 3, 4, 100: their median is 3 whatever the last one is; 1.4826 * 3 / sqrt 2 (median absolute deviation of a normal
    // distribution: standard normal quantile of 3/4 is 0.67449, any handbook table).
    [Fact]
    public void FromReplicates_OneWildPair_ProposesFromTheMedian()
    {
        double[] pressures = [500, 500, 1000, 1000.5, 1500, 1500, 2000, 2000, 2500, 2500, 3000];
        double[] oxygen = [200, 201, 200, 202, 200, 203, 200, 204, 200, 300, 200];
        ErrorProposal proposal = ErrorProposals.FromReplicates(Columns(pressures, oxygen), "oxygen", All(pressures))!;
        Assert.Equal(5, proposal.Pairs);
        Assert.Equal(3, proposal.MedianAbsolute, 1e-12);
        Assert.Equal(3 / 0.67449 / Math.Sqrt(2), proposal.Sd, 1e-4);
    }

    [Fact]
    public void FromReplicates_NeighboursFurtherApart_AreNoPairs()
    {
        double[] pressures = [.. Enumerable.Range(0, 20).Select(i => 100.0 + (2 * i))];
        Assert.Null(ErrorProposals.FromReplicates(Columns(pressures, [.. pressures]), "oxygen", All(pressures)));
    }

    [Fact]
    public void FromReplicates_RowsThatDoNotCount_AreLeftOut()
    {
        double[] pressures = [1, 1, 2.5, 2.5, 5, 5, 8, 8, 12, 12];
        bool[] counts = All(pressures);
        Assert.NotNull(ErrorProposals.FromReplicates(Columns(pressures, [.. pressures]), "oxygen", counts));
        counts[0] = false;
        Assert.Null(ErrorProposals.FromReplicates(Columns(pressures, [.. pressures]), "oxygen", counts));
    }

    [Fact]
    public void FromBottleAndCtd_AConstantOffset_IsToldApartFromTheScatter()
    {
        double[] bottle = [35.01, 35.02, 35.00, 35.03, 34.99];
        double[] ctd = [35, 35, 35, 35, 35];
        ErrorProposal proposal = ErrorProposals.FromBottleAndCtd(Both(bottle, ctd), "practical_salinity", All(bottle))!;
        Assert.Equal(0.01, proposal.Offset, 1e-9);
        Assert.Equal(0.01, proposal.MedianAbsolute, 1e-9);
        Assert.Equal(0.01 / 0.67449, proposal.Sd, 1e-6);
        Assert.Contains("5 samples with both", ProposalText.BottleAndCtd(proposal, ""), StringComparison.Ordinal);
    }

    [Fact]
    public void Rounded_AnError_HasTwoDigits() => Assert.Equal(0.0021, ProposalText.Rounded(new ErrorProposal("practical_salinity", 0.002136, 40, 35, 0, 0.0014)));

    private static bool[] All(double[] like) => Array.ConvertAll(like, _ => true);

    private static FigureColumns Columns(double[] pressures, double[] oxygen)
    {
        int[] codes = new int[pressures.Length];
        var table = new SampleTable(
            pressures.Length,
            [new IdentityColumn("station", codes, ["1"]), new IdentityColumn("cast", codes, ["1"])],
            [new SampleColumn(Quantity.Pressure, pressures), new SampleColumn(Quantity.Oxygen, oxygen)]);
        return new FigureColumns([new FigureCruise("Cruise", table, null)]);
    }

    private static FigureColumns Both(double[] bottle, double[] ctd)
    {
        var table = new SampleTable(
            bottle.Length,
            [],
            [
                new SampleColumn(Quantity.PracticalSalinity, bottle) { Suffix = "_bottle" },
                new SampleColumn(Quantity.PracticalSalinity, ctd, origin: ValueOrigin.Ctd) { Suffix = "_ctd" },
            ]);
        return new FigureColumns([new FigureCruise("Cruise", table, null)]);
    }
}
