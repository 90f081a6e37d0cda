using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;
using WaterMix.Web.State.EndMembers;
using WaterMix.Web.Tests.State.Mixing;

namespace WaterMix.Web.Tests.State.EndMembers;

public class SetEditsTests
{
    private readonly MixingModel _model = SmallModel.Make();

    [Fact]
    public void Add_ToALayeredModel_IsPermittedInEveryLayerUnderAFreeId()
    {
        MixingModel twice = SetEdits.Add(SetEdits.Add(_model));
        Assert.Equal(["A", "B", "source-1", "source-2"], twice.EndMembers.EndMembers.Select(e => e.Id));
        Assert.Equal(["A", "B", "source-1", "source-2"], twice.Layers[0].EndMembers);
    }

    [Fact]
    public void Remove_AnEndMember_LeavesTheLayersToo()
    {
        MixingModel without = SetEdits.Remove(_model, 0);
        Assert.Equal("B", Assert.Single(without.EndMembers.EndMembers).Id);
        Assert.Equal(["B"], without.Layers[0].EndMembers);
    }

    [Fact]
    public void WithId_AnotherId_IsFollowedByTheLayers()
    {
        MixingModel renamed = SetEdits.WithId(_model, 1, "MSW");
        Assert.Equal(["A", "MSW"], renamed.Layers[0].EndMembers);
        Assert.DoesNotContain(ModelCheck.Findings(renamed), f => f.Severity == WaterMix.Core.Severity.Error);
    }

    [Theory]
    [InlineData("a", "taken")]
    [InlineData("north deep", "no id of 1 to 32 characters")]
    [InlineData("sum", "other than sum")]
    [InlineData("", "no id")]
    [InlineData("B", null)]
    [InlineData("NDW-2", null)]
    public void ProblemOfId_AnId_IsJudgedAsTheContractDoes(string id, string? problem)
    {
        string? found = SetEdits.ProblemOfId(_model, 1, id);
        if (problem is null)
        {
            Assert.Null(found);
        }
        else
        {
            Assert.Contains(problem, found, StringComparison.Ordinal);
        }
    }

    [Fact]
    public void Move_BeyondTheEnds_StaysThere()
    {
        Assert.Equal(["B", "A"], SetEdits.Move(_model, 0, 5).EndMembers.EndMembers.Select(e => e.Id));
        Assert.Equal(["A", "B"], SetEdits.Move(_model, 0, -1).EndMembers.EndMembers.Select(e => e.Id));
    }

    [Fact]
    public void WithValue_Null_TakesTheValueOut()
    {
        Assert.DoesNotContain("oxygen", SetEdits.WithValue(_model, 0, "oxygen", null).EndMembers.EndMembers[0].Values.Keys);
        Assert.Equal(281, SetEdits.WithValue(_model, 0, "oxygen", 281).EndMembers.EndMembers[0].Values["oxygen"]);
        Assert.Equal(280, _model.EndMembers.EndMembers[0].Values["oxygen"]);
    }

    [Fact]
    public void Replace_AnotherSet_KeepsWhatTheLayersStillName()
    {
        EndMemberSet other = new("Other", 3, [SmallModel.Source("B", 1, 34, 300), SmallModel.Source("C", 5, 35, 250)]);
        Assert.Equal(["B"], SetEdits.Replace(_model, other).Layers[0].EndMembers);
        EndMemberSet foreign = new("Foreign", 1, [SmallModel.Source("X", 1, 34, 300)]);
        Assert.Equal(["X"], SetEdits.Replace(_model, foreign).Layers[0].EndMembers);
    }

    [Fact]
    public void Unmatched_ASetOfTheOtherPair_IsNoticedAndConversionMendsIt()
    {
        MixingModel placed = SetEdits.With(SetEdits.With(_model, 0, e => e with { Position = new(50, -30, 1500) }), 1, e => e with { Position = new(36, -8, 1000) });
        MixingModel wanting = placed with { Tracers = ["conservative_temperature", "absolute_salinity", "oxygen"] };
        Assert.Equal(["A", "B"], TracerPairs.Unmatched(wanting).Select(e => e.Id));
        Assert.Empty(TracerPairs.Unmatched(placed));
        EndMemberSet converted = TemperatureSalinityConversion.Convert(wanting.EndMembers, TracerPairs.Wanted(wanting)!.Value).Set!;
        Assert.Empty(TracerPairs.Unmatched(wanting with { EndMembers = converted }));
    }

    [Theory]
    [InlineData(ProvenanceKind.Manual, null, null, true)]
    [InlineData(ProvenanceKind.Manual, "invented", null, false)]
    [InlineData(ProvenanceKind.Literature, "table 2", null, true)]
    [InlineData(ProvenanceKind.Literature, null, "a paper", false)]
    [InlineData(ProvenanceKind.Proposal, "from the hull", null, true)]
    public void MissingProvenance_ByKind_AsksForWhatThatKindNeeds(ProvenanceKind kind, string? note, string? citation, bool isMissing)
    {
        EndMember endMember = _model.EndMembers.EndMembers[0] with { Provenance = new Provenance(kind, note, citation) };
        Assert.Equal(isMissing, SetColumns.MissingProvenance(endMember) is not null);
    }
}
