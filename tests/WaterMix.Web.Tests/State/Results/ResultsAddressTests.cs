using WaterMix.Core.Mixing;
using WaterMix.Web.State.Figures;
using WaterMix.Web.State.Results;

namespace WaterMix.Web.Tests.State.Results;

public class ResultsAddressTests
{
    private static readonly Guid Study = new("11111111-2222-4333-8444-555555555555");

    // Property: what an address is written from is read back from it.
    [Fact]
    public void Read_AddressOfAFullView_GivesTheViewBack()
    {
        var view = new ResultsView
        {
            Run = TwoLayers.RunId,
            Figure = ResultsFigure.Residuals,
            Along = SectionAlong.Latitude,
            Against = SectionAgainst.Sigma2,
            Enlarged = "practical_salinity",
            Station = "0/S 2&3",
            X = "oxygen",
            Y = "nitrate",
            Colour = "misfit",
            Filter = new RowFilter
            {
                Status = SolveStatus.NotUnique,
                Layer = "über all",
                Cruise = 2,
                Conditions = [new RowCondition("fraction_A", 0.1, null), new RowCondition("pressure", null, 1500.25)],
            },
            Columns = ResultsColumns.Fit,
            Sort = "chi2",
            Descending = true,
            Page = 7,
            Sample = 0,
        };

        Assert.Equal(view, ResultsAddress.Read("http://localhost/" + ResultsAddress.Of(Study, view)));
    }

    [Fact]
    public void Of_ViewAsItIsAtFirst_HasNoQuery() =>
        Assert.Equal($"studies/{Study}/results", ResultsAddress.Of(Study, new ResultsView()));

    [Theory]
    [InlineData("?figure=nonsense&along=3d&page=-4&sample=0&status=fine&run=none&cruise=x&where=abc&where=a:1..b&where=pressure:..&sort=")]
    [InlineData("")]
    [InlineData("?page=99999999999999999999&sample=1e3&figure=17")]
    public void Read_WhatIsNotUnderstood_IsAsItIsAtFirst(string query) =>
        Assert.Equal(new ResultsView(), ResultsAddress.Read("http://localhost/studies/x/results" + query));

    [Fact]
    public void SortBy_SameColumnThreeTimes_GoesUpDownAndBackToTheOrderOfTheSamples()
    {
        ResultsView up = new ResultsView { Page = 4 }.SortBy("chi2");
        ResultsView down = up.SortBy("chi2");

        Assert.Equal(("chi2", false, 1), (up.Sort, up.Descending, up.Page));
        Assert.Equal(("chi2", true), (down.Sort, down.Descending));
        Assert.Null(down.SortBy("chi2").Sort);
    }
}
