using WaterMix.Core.Mixing;
using WaterMix.Web.State.Samples;
using WaterMix.Workspace.Cruises;

namespace WaterMix.Web.Tests.State.Samples;

public sealed class CruiseListTests
{
    [Fact]
    public async Task TakeOut_ThenUndo_BringsTheCruiseBack()
    {
        await using TestWorkspace workspace = await TestWorkspace.OpenAsync();
        (Guid study, CruiseList list) = await WithCruisesAsync(workspace, "A", "B");
        await list.TakeOutAsync(list.Lines[0]);
        Assert.Equal("B", Assert.Single((await workspace.Studies.FindAsync(study))!.Cruises).Name);
        CruiseUndo undo = Assert.Single(list.Undo);
        Assert.Contains("“A”", undo.Text, StringComparison.Ordinal);
        await list.UndoAsync(undo);
        Assert.Equal(["A", "B"], (await workspace.Studies.FindAsync(study))!.Cruises.Select(c => c.Name));
        Assert.Empty(list.Undo);
    }

    [Fact]
    public async Task Rename_EmptyName_IsRefusedWithASentence()
    {
        await using TestWorkspace workspace = await TestWorkspace.OpenAsync();
        (Guid study, CruiseList list) = await WithCruisesAsync(workspace, "A");
        list.BeginRename(list.Lines[0].Id);
        Assert.False(await list.RenameAsync("  "));
        Assert.StartsWith("A cruise needs a name.", list.Problem, StringComparison.Ordinal);
        Assert.True(await list.RenameAsync(" Better "));
        Assert.Equal("Better", (await workspace.Studies.FindAsync(study))!.Cruises.Single().Name);
    }

    [Fact]
    public async Task FindDuplicates_TheSameFileTwice_SaysHowManyInASentence()
    {
        await using TestWorkspace workspace = await TestWorkspace.OpenAsync();
        (Guid study, CruiseList list) = await WithCruisesAsync(workspace, "A", "B");
        await list.FindDuplicatesAsync(study);
        string sentence = Assert.Single(list.Duplicates);
        Assert.StartsWith("“A” and “B” share 8", sentence, StringComparison.Ordinal);
        Assert.Contains("Take one of the two cruises out", sentence, StringComparison.Ordinal);
    }

    [Fact]
    public async Task SaveErrors_TypedNumbers_ArriveAsMeasurementErrors()
    {
        await using TestWorkspace workspace = await TestWorkspace.OpenAsync();
        (Guid study, CruiseList list) = await WithCruisesAsync(workspace, "A");
        list.BeginErrors(list.Lines[0].Id, new Dictionary<string, MeasurementError> { ["oxygen"] = new(0.5, 0.005) });
        MeasurementErrorLine oxygen = list.Errors!.Lines.Single(l => l.Id == "oxygen");
        Assert.Equal("0.5 and 0.5 %", oxygen.OfModel.Replace("0.500", "0.5", StringComparison.Ordinal));
        oxygen.Absolute = "1,5";
        Assert.False(await list.SaveErrorsAsync());
        Assert.NotNull(oxygen.Problem);
        (oxygen.Absolute, oxygen.PerCent) = ("0", "1");
        Assert.False(await list.SaveErrorsAsync());
        (oxygen.Absolute, oxygen.PerCent) = ("1.5", "0.7");
        Assert.True(await list.SaveErrorsAsync());
        Cruise saved = (await workspace.Studies.FindAsync(study))!.Cruises.Single();
        Assert.Equal(new MeasurementError(1.5, 0.007), saved.MeasurementSd!["oxygen"]);
        list.Show([saved]);
        Assert.Equal("its own for 1 tracer", list.Lines[0].Errors);
    }

    private static async Task<(Guid Study, CruiseList List)> WithCruisesAsync(TestWorkspace workspace, params string[] names)
    {
        Guid study = await workspace.Studies.CreateAsync("Study");
        foreach (string name in names)
        {
            await workspace.KeepHalcyonAsync(study, name);
        }

        var list = new CruiseList(workspace.Cruises);
        list.Show((await workspace.Studies.FindAsync(study))!.Cruises);
        return (study, list);
    }
}
