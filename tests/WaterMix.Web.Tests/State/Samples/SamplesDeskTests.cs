using WaterMix.Web.State.Samples;
using WaterMix.Workspace.Cruises;

namespace WaterMix.Web.Tests.State.Samples;

public sealed class SamplesDeskTests
{
    [Fact]
    public async Task Open_StudyWithoutSamples_HasNoFigures()
    {
        await using TestWorkspace workspace = await TestWorkspace.OpenAsync();
        Guid study = await workspace.Studies.CreateAsync("Empty");
        using var desk = new SamplesDesk(workspace.Studies, workspace.Cruises, workspace.Runs);
        await desk.OpenAsync(study, new SampleView());
        Assert.True(desk.IsRead);
        Assert.NotNull(desk.Study);
        Assert.Null(desk.Figures);
        Assert.Equal(["0 samples", "0 cruises"], desk.Status);
    }

    [Fact]
    public async Task Open_NoSuchStudy_IsSaidSo()
    {
        await using TestWorkspace workspace = await TestWorkspace.OpenAsync();
        using var desk = new SamplesDesk(workspace.Studies, workspace.Cruises, workspace.Runs);
        await desk.OpenAsync(Guid.NewGuid(), new SampleView());
        Assert.True(desk.IsRead);
        Assert.Null(desk.Study);
    }

    [Fact]
    public async Task Show_AnotherAxis_MakesOnlyThatFigureAnew()
    {
        await using TestWorkspace workspace = await TestWorkspace.OpenAsync();
        using SamplesDesk desk = await WithHalcyonAsync(workspace);
        SampleFigures before = desk.Figures!;
        await desk.ShowAsync(desk.View with { X = "oxygen" });
        Assert.NotSame(before.Property, desk.Figures!.Property);
        Assert.Same(before.Section, desk.Figures.Section);
        Assert.Same(before.Stations, desk.Figures.Stations);
        Assert.Same(before.Profiles, desk.Figures.Profiles);
        Assert.Same(before.Difference, desk.Figures.Difference);
        Assert.Equal("oxygen", desk.Figures.Property.XId);
    }

    [Fact]
    public async Task Show_ASample_OpensItsCard()
    {
        await using TestWorkspace workspace = await TestWorkspace.OpenAsync();
        using SamplesDesk desk = await WithHalcyonAsync(workspace);
        await desk.ShowAsync(desk.View with { Sample = 5 });
        Assert.Contains("Station 1", desk.Card!.Name, StringComparison.Ordinal);
        await desk.ShowAsync(desk.View with { Sample = 1_000_000 });
        Assert.Null(desk.Card);
    }

    [Fact]
    public async Task Show_OtherFlags_CountsOtherValuesAsMissing()
    {
        await using TestWorkspace workspace = await TestWorkspace.OpenAsync();
        using SamplesDesk desk = await WithHalcyonAsync(workspace);
        int strict = desk.Samples!.Columns.Values("phosphate").Count(double.IsFinite);
        await desk.ShowAsync(desk.View with { Filter = new SampleFilter { Flags = [2, 3, 4, 6] } });
        Assert.True(desk.Samples.Columns.Values("phosphate").Count(double.IsFinite) > strict);
        Assert.Contains("water-sample flags 2, 3, 4, 6; CTD flags 2, 6, 7", desk.Status);
    }

    [Fact]
    public async Task Show_SeveralAtOnce_EndsWithTheLast()
    {
        await using TestWorkspace workspace = await TestWorkspace.OpenAsync();
        using SamplesDesk desk = await WithHalcyonAsync(workspace);
        await Task.WhenAll(new[] { 100.0, 500, 1000, 2000, 3000 }.Select(p => desk.ShowAsync(desk.View with { Filter = new SampleFilter { Down = new ValueRange(p, null) } })));
        double[] pressure = desk.Samples!.Columns.Values("pressure");
        Assert.Equal(pressure.Count(p => p >= 3000), desk.Figures!.Rows.Length);
        Assert.Null(desk.Work);
    }

    [Fact]
    public async Task Open_InventedOcean_HasItsOwnLandAndBothInstruments()
    {
        await using TestWorkspace workspace = await TestWorkspace.OpenAsync();
        using SamplesDesk desk = await WithHalcyonAsync(workspace);
        Assert.NotNull(desk.Samples!.Land);
        Assert.Contains("practical_salinity", desk.Samples.WithBothInstruments);
        Assert.Contains(desk.Samples.Quantities, q => q is { Id: "sigma0", IsDerived: true });
        Assert.Contains(desk.Figures!.Facts, f => f.Label == "Stations" && f.Value == "36");
    }

    [Fact]
    public async Task Keep_AnImport_PutsItIntoTheStudy()
    {
        await using TestWorkspace workspace = await TestWorkspace.OpenAsync();
        using SamplesDesk desk = await WithHalcyonAsync(workspace);
        Guid upload = await workspace.UploadAsync("halcyon_hy1.csv", TestWorkspace.Halcyon);
        await desk.ShowAsync(desk.View with { Upload = upload });
        Cruise? kept = await desk.KeepAsync();
        await desk.OpenAsync(desk.Study!.Id, desk.View with { Upload = null });
        Assert.Equal(2, desk.List.Cruises.Count);
        Assert.Contains(desk.List.Cruises, c => c.Id == kept!.Id);
        Assert.Single(desk.List.Duplicates);
    }

    private static async Task<SamplesDesk> WithHalcyonAsync(TestWorkspace workspace)
    {
        Guid study = await workspace.Studies.CreateAsync("Study");
        await workspace.KeepHalcyonAsync(study, "Halcyon");
        var desk = new SamplesDesk(workspace.Studies, workspace.Cruises, workspace.Runs);
        await desk.OpenAsync(study, new SampleView());
        return desk;
    }
}
