using WaterMix.Web.State;

namespace WaterMix.Web.Tests.State;

public sealed class StudiesListTests
{
    private readonly FakeStudies _studies = new();
    private readonly StudiesList _list;

    public StudiesListTests() => _list = new StudiesList(_studies, new UtcClock());

    [Fact]
    public async Task Read_Studies_InWords()
    {
        _studies.Add("Halcyon", samples: 28_410, runs: 1);
        await _list.ReadAsync(null);

        StudyLine line = Assert.Single(_list.Lines);
        Assert.Equal(("Halcyon", "28\u00a0410", "samples", "1", "run", "14 Mar 2026, 09:05"), (line.Name, line.Samples, line.SamplesWord, line.Runs, line.RunsWord, line.Changed));
        Assert.Equal(["1 study"], _list.Status);
    }

    [Theory]
    [InlineData("")]
    [InlineData("   ")]
    public async Task Create_WithoutAName_SaysWhatToDo(string name)
    {
        Assert.Null(await _list.CreateAsync(name));
        Assert.Contains("needs a name", _list.Problem, StringComparison.Ordinal);
        Assert.Empty(_list.Lines);
    }

    [Fact]
    public async Task Create_NameTooLong_SaysHowManyFit()
    {
        Assert.Null(await _list.CreateAsync(new string('x', 201)));
        Assert.Contains("201 characters; 200 fit", _list.Problem, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Create_NameWithSpacesAround_IsTrimmed()
    {
        Assert.NotNull(await _list.CreateAsync("  New  "));
        Assert.Equal("New", Assert.Single(_list.Lines).Name);
    }

    [Fact]
    public async Task Rename_EmptyName_KeepsTheFormOpen()
    {
        Guid id = _studies.Add("Old");
        _list.BeginRename(id);

        Assert.False(await _list.RenameAsync(" "));
        Assert.Equal(id, _list.Renaming);
        Assert.True(await _list.RenameAsync("New"));
        Assert.Null(_list.Renaming);
        Assert.Equal("New", Assert.Single(_list.Lines).Name);
    }

    [Fact]
    public async Task Duplicate_Twice_FindsFreeNames()
    {
        _studies.Add("Halcyon");
        await _list.ReadAsync(null);
        StudyLine line = _list.Lines[0];

        await _list.DuplicateAsync(line);
        await _list.DuplicateAsync(line);

        Assert.Equal(["Halcyon", "Halcyon, copy", "Halcyon, copy 2"], _list.Lines.Select(l => l.Name));
    }

    [Fact]
    public async Task Duplicate_LongestName_StaysWithinTheLimit()
    {
        _studies.Add(new string('x', 200));
        await _list.ReadAsync(null);

        await _list.DuplicateAsync(_list.Lines[0]);

        Assert.InRange(_list.Lines[1].Name.Length, 1, 200);
        Assert.EndsWith(", copy", _list.Lines[1].Name, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Delete_ThenRestore_BringsTheStudyBack()
    {
        _studies.Add("Halcyon");
        await _list.ReadAsync(null);
        StudyLine line = _list.Lines[0];

        await _list.DeleteAsync(line);
        Assert.Empty(_list.Lines);
        Assert.Equal([line], _list.Deleted);

        await _list.RestoreAsync(line);
        Assert.Equal("Halcyon", Assert.Single(_list.Lines).Name);
        Assert.Empty(_list.Deleted);
    }

    [Fact]
    public async Task Read_Search_NarrowsAndSaysSo()
    {
        _studies.Add("Halcyon");
        _studies.Add("Lantern");
        await _list.ReadAsync(" lant ");

        Assert.Equal("Lantern", Assert.Single(_list.Lines).Name);
        Assert.Equal(["1 study", "with \u201clant\u201d in the name"], _list.Status);
    }
}
