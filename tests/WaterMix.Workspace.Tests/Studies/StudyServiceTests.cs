using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;
using WaterMix.Formats.MixingModels;
using WaterMix.Workspace.Studies;

namespace WaterMix.Workspace.Tests.Studies;

public class StudyServiceTests
{
    [Fact]
    public async Task Create_ThenReopen_IsThereWithAnEmptyDraft()
    {
        using var scratch = new Scratch();
        Guid id;
        await using (OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder))
        {
            id = await workspace.Studies.CreateAsync("  Basin  ");
        }

        await using OpenWorkspace again = await OpenWorkspace.AtAsync(scratch.Folder);
        Study? study = await again.Studies.FindAsync(id);

        Assert.Equal("Basin", study!.Name);
        Assert.Empty(study.Draft.EndMembers.EndMembers);
        Assert.NotEmpty(ModelCheck.Findings(study.Draft));
        Assert.Equal("Basin", Assert.Single(await again.Studies.ListAsync("ASI")).Name);
        Assert.Empty(await again.Studies.ListAsync("x"));
    }

    [Theory]
    [InlineData("")]
    [InlineData("   ")]
    public async Task Create_WithoutAName_SaysSo(string name)
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);

        ArgumentException refusal = await Assert.ThrowsAsync<ArgumentException>(() => workspace.Studies.CreateAsync(name));
        await Assert.ThrowsAsync<ArgumentException>(() => workspace.Studies.CreateAsync(new string('a', 201)));

        Assert.StartsWith("Expected a name for a study", refusal.Message, StringComparison.Ordinal);
        Assert.Empty(await workspace.Studies.ListAsync());
    }

    [Fact]
    public async Task List_AnyLetters_AreFoundWithoutCase()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        await workspace.Studies.CreateAsync("Ålesund 100%_a");

        Assert.Single(await workspace.Studies.ListAsync("ålesund"));
        Assert.Single(await workspace.Studies.ListAsync("100%_"));
        Assert.Empty(await workspace.Studies.ListAsync("100_%"));
    }

    [Fact]
    public async Task SaveDraft_FromAnOldRevision_WritesNothing()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Guid id = await workspace.Studies.CreateAsync("a");
        MixingModel halcyon = Halcyon.Model;

        long? first = await workspace.Studies.SaveDraftAsync(id, halcyon, 0);
        long? second = await workspace.Studies.SaveDraftAsync(id, halcyon with { Name = "other tab" }, 0);

        Assert.Equal(1, first);
        Assert.Null(second);
        Study study = (await workspace.Studies.FindAsync(id))!;
        Assert.Equal((1, halcyon with { EndMembersFile = null }), (study.Revision, study.Draft));
    }

    [Fact]
    public async Task SaveDraft_FromManyTabsAtOnce_TakesEachRevisionOnce()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Guid id = await workspace.Studies.CreateAsync("a");

        long?[] revisions = await Task.WhenAll(Enumerable.Range(0, 20).Select(_ => workspace.Studies.SaveDraftAsync(id, Halcyon.Model, 0)));

        Assert.Equal([1L], revisions.OfType<long>());
    }

    [Fact]
    public async Task SaveDraft_WithANumberThatIsNone_IsRefusedAndNothingChanges()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Guid id = await workspace.Studies.CreateAsync("a");
        EndMember broken = Halcyon.Model.EndMembers.EndMembers[0] with { Values = new Dictionary<string, double> { ["oxygen"] = double.NaN } };

        await Assert.ThrowsAsync<ArgumentException>(() => workspace.Studies.SaveDraftAsync(id, Halcyon.Model with { EndMembers = new EndMemberSet("s", 1, [broken]) }, 0));

        Assert.Equal(0, (await workspace.Studies.FindAsync(id))!.Revision);
    }

    [Fact]
    public async Task SaveDraft_Incomplete_ComesBackAsItWas()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Guid id = await workspace.Studies.CreateAsync("a");
        var draft = new MixingModel(
            "",
            new EndMemberSet("", 1, [new EndMember("", "unnamed", new Dictionary<string, double> { ["oxygen"] = 1e300 }, new Provenance(ProvenanceKind.Manual))]),
            ["oxygen", "oxygen", "unheard_of"],
            new WeightedRows(new Dictionary<string, double>()),
            new MassConservation(-1))
        {
            Processes = [new Process("", "", new Dictionary<string, double>())],
            Layers = [new Layer("", ["absent"], [new Condition("nothing", null, null)])],
            AcceptFlags = [],
        };

        await workspace.Studies.SaveDraftAsync(id, draft, 0);

        Assert.Equal(draft, (await workspace.Studies.FindAsync(id))!.Draft);
    }

    [Fact]
    public async Task Delete_ThenRestore_BringsEverythingBack()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Guid id = await workspace.Studies.CreateAsync("a");
        await workspace.KeepAsync(id, "cruise", ("halcyon_hy1.csv", OpenWorkspace.Sample("halcyon_hy1.csv")));

        await workspace.Studies.DeleteAsync(id);
        Assert.Null(await workspace.Studies.FindAsync(id));
        Assert.Empty(await workspace.Studies.ListAsync());
        await Assert.ThrowsAsync<ArgumentException>(() => workspace.Studies.SaveDraftAsync(id, Halcyon.Model, 0));

        await workspace.Studies.RestoreAsync(id);
        Assert.Single((await workspace.Studies.FindAsync(id))!.Cruises);
    }

    [Fact]
    public async Task Duplicate_ThenChangeTheCopy_LeavesTheOriginal()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        Guid id = await workspace.Studies.CreateAsync("a");
        await workspace.KeepAsync(id, "cruise", ("halcyon_hy1.csv", OpenWorkspace.Sample("halcyon_hy1.csv")));
        await workspace.Studies.SaveDraftAsync(id, Halcyon.Model, 0);

        Guid copy = await workspace.Studies.DuplicateAsync(id, "b");
        Study copied = (await workspace.Studies.FindAsync(copy))!;
        await workspace.Cruises.RemoveAsync(copied.Cruises[0].Id);

        Study original = (await workspace.Studies.FindAsync(id))!;
        Assert.Equal(original.Draft, copied.Draft);
        Assert.Equal(original.Cruises[0].SamplesHash, copied.Cruises[0].SamplesHash);
        Assert.Single(original.Cruises);
        Assert.Empty((await workspace.Studies.FindAsync(copy))!.Cruises);
    }

    [Fact]
    public async Task Changed_IsRaisedForEachChange_AndAFailingListenerHarmsNobody()
    {
        using var scratch = new Scratch();
        await using OpenWorkspace workspace = await OpenWorkspace.AtAsync(scratch.Folder);
        var changed = new List<Guid>();
        workspace.Studies.Changed += _ => throw new InvalidOperationException();
        workspace.Studies.Changed += changed.Add;

        Guid id = await workspace.Studies.CreateAsync("a");
        await workspace.Studies.RenameAsync(id, "b");
        await workspace.Studies.SaveDraftAsync(id, Halcyon.Model, 7);

        Assert.Equal([id, id], changed);
    }

    [Fact]
    public void ReadDraft_WhatWriteWrote_ReadsBackAndFaultsOfShapeAreErrors()
    {
        Assert.Equal(Halcyon.Model, MixingModelFile.ReadDraft(MixingModelFile.Write(Halcyon.Model), "m").Value);
        Assert.Null(MixingModelFile.ReadDraft("{ \"schema\": \"watermix/mixing-model/1\", \"tracers\": 3 }"u8, "m").Value);
    }
}
