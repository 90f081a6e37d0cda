using WaterMix.Web.State.Figures;
using WaterMix.Web.State.Results;

namespace WaterMix.Web.Tests.State.Results;

public class ResultsMakerTests
{
    private readonly ResultsMaker _maker = new(TwoLayers.Results());

    [Fact]
    public void Make_FirstView_HasAPanelForEachSourceAndAllSamples()
    {
        ResultsShown shown = _maker.Make(new ResultsView());

        Assert.Equal(["A", "B", "C"], shown.Panels.Select(p => p.Id));
        Assert.Equal("A", shown.Enlarged);
        Assert.Equal("°N", _maker.Make(new ResultsView { Along = SectionAlong.Latitude }).Section!.XAxis.Unit);
        Assert.Equal(8, shown.Table.Lines.Count);
        Assert.Equal(["8 samples", "6 solved", "1 too few tracers", "1 outside the layers", "model 3f2a9c0d", "set v2"], shown.StatusLine);
    }

    // A figure sends again whatever is another object, so what stays the same must be the same object.
    [Fact]
    public void Make_OnlySortAndSelectionChange_KeepsTheFiguresObjects()
    {
        ResultsShown before = _maker.Make(new ResultsView());
        ResultsShown after = _maker.Make(new ResultsView { Sort = "fraction_B", Sample = 2 });

        Assert.Same(before.Section, after.Section);
        Assert.Same(before.Panels, after.Panels);
        Assert.Same(before.Layers, after.Layers);
        Assert.Equal([6, 0, 4, 2, 1, 5, 3, 7], after.Table.Lines.Select(l => l.Row));
        Assert.Equal("Station S2, sample 3, 1500 dbar", after.Card!.Name);
    }

    [Fact]
    public void Make_Filter_GoesThroughFigureSummariesAndTable()
    {
        ResultsShown shown = _maker.Make(new ResultsView { Filter = new RowFilter { Layer = "deep" } });

        Assert.Equal([2, 3, 6], shown.Section!.Rows);
        Assert.Equal([double.NaN, double.NaN, double.NaN], ((StrengthColour)shown.Panels[0].Colour).Fractions);
        Assert.Equal([0.4, double.NaN, 0.8], ((StrengthColour)shown.Panels[2].Colour).Fractions);
        Assert.Equal("deep", shown.Layers[0].Layer);
        Assert.Equal(3, shown.Table.RowCount);
        Assert.Equal("3 of 8 samples shown", shown.StatusLine[0]);
        Assert.Equal("3 of 8 samples are shown: in layer deep.", FilterWords.Of(shown));
    }

    [Fact]
    public void Make_Profiles_TakeTheSelectedSamplesStationUnlessAnotherIsNamed()
    {
        var view = new ResultsView { Figure = ResultsFigure.Profiles, Sample = 5 };

        Assert.Equal("station S10", _maker.Make(view).Profile!.Station.Label);
        Assert.Equal("station S2", _maker.Make(view with { Sample = null }).Profile!.Station.Label);
        StationProfile named = _maker.Make(view with { Station = "0/S2" }).Profile!;
        Assert.Equal("station S2", named.Station.Label);
        ProfileSeries fitted = named.Series.Single(s => s.Id == "fitted_potential_temperature");
        Assert.Equal(8 - 0.02, fitted.Values[0], 12);
        Assert.True(double.IsNaN(fitted.Values[3]), "What was not fitted has no fitted value.");
    }

    [Fact]
    public void Make_Properties_StandOnTheFirstTwoTracersUnlessOthersAreNamed()
    {
        ResultsShown first = _maker.Make(new ResultsView { Figure = ResultsFigure.Properties });
        ResultsShown named = _maker.Make(new ResultsView { Figure = ResultsFigure.Properties, X = "potential_temperature", Y = "practical_salinity", Colour = "layer", Filter = new RowFilter { Layer = "upper" } });

        Assert.Equal(("practical_salinity", "potential_temperature", "A"), (first.Property!.XId, first.Property.YId, first.Property.ColourId));
        Assert.Equal(("potential_temperature", "practical_salinity", "layer"), (named.Property!.XId, named.Property.YId, named.Property.ColourId));
        Assert.Equal([true, true, false], named.Property.Sources.Select(s => s.Permitted));
    }

    [Theory]
    [InlineData(1, "1–8 of 8 samples")]
    [InlineData(12, "1–8 of 8 samples")]
    public void Make_PageBeyondTheLast_IsTheLast(int page, string words) => Assert.Equal(words, _maker.Make(new ResultsView { Page = page }).Table.Words);

    [Fact]
    public void Make_SampleThatIsNotThere_ShowsNoCard() => Assert.Null(_maker.Make(new ResultsView { Sample = 8 }).Card);

    [Theory]
    [InlineData(ResultsColumns.Residuals, "station sample pressure residual_potential_temperature residual_practical_salinity residual_mass misfit")]
    [InlineData(ResultsColumns.Fractions, "station sample pressure layer status fraction_A fraction_B fraction_C fraction_sum")]
    [InlineData(ResultsColumns.Fit, "station sample pressure layer status tracers residual_mass misfit chi2 dof p_value note")]
    public void Make_Columns_AreThoseOfTheChoice(ResultsColumns choice, string ids) =>
        Assert.Equal(ids, string.Join(' ', _maker.Make(new ResultsView { Columns = choice }).Table.Columns.Select(c => c.Id)));

    [Fact]
    public void Make_Cells_HaveFixedDecimalsTrueMinusAndADashWhereMissing()
    {
        TablePage table = _maker.Make(new ResultsView { Columns = ResultsColumns.Residuals }).Table;
        int temperature = table.Columns.ToList().FindIndex(c => c.Id == "residual_potential_temperature");

        Assert.Equal(["0.0200", "−0.0200", "0.0400", "–", "0.0600", "−0.0200", "0.0000", "–"], table.Lines.Select(l => l.Cells[temperature]));
    }
}
