using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;
using WaterMix.Web.State.EndMembers;
using WaterMix.Web.State.Figures;
using WaterMix.Web.State.Mixing;
using WaterMix.Web.Tests.State.Mixing;

namespace WaterMix.Web.Tests.State.EndMembers;

public class EndMembersDeskTests
{
    [Fact]
    public async Task Look_TheSameAgain_KeepsThePointsThatTheBrowserHas()
    {
        EndMembersDesk desk = await DeskAsync();
        MixingModel model = InventedCruise.Model;
        desk.Look(model, null, null, null, null);
        PointLayer points = desk.Points;
        desk.Look(SetEdits.WithValue(model, 0, "oxygen", 200), null, null, null, null);
        Assert.Same(points, desk.Points);
        desk.Look(model, "oxygen", null, null, null);
        Assert.NotSame(points, desk.Points);
    }

    [Fact]
    public async Task Look_ALayer_ShowsItsSamplesAndPermitsItsSources()
    {
        EndMembersDesk desk = await DeskAsync();
        MixingModel model = InventedCruise.Model;
        desk.Look(model, null, null, "deep", null);
        Assert.Equal(LayerCensus.Of(model, desk.Columns).Layers[1].Samples, desk.Looked);
        Assert.Equal(model.Layers[1].EndMembers, desk.Sources.Where(s => s.Permitted).Select(s => s.Id));
        desk.Look(model, null, null, "no such layer", null);
        Assert.Null(desk.LayerId);
    }

    [Fact]
    public async Task Move_ASource_ChangesTheSharesWhileItMovesAndNotTheModel()
    {
        EndMembersDesk desk = await DeskAsync();
        MixingModel model = InventedCruise.Model;
        desk.Look(model, null, null, null, null);
        double before = desk.Shares.OutsideAny;
        desk.Move(new MarkMove("sources", "HTW", 35.2, 9, Released: false));
        Assert.True(desk.Shares.OutsideAny > before);
        Assert.Equal(9, desk.Shown.EndMembers.EndMembers[0].Values["potential_temperature"]);
        desk.Look(model, null, null, null, null);
        Assert.Equal(before, desk.Shares.OutsideAny);
    }

    [Fact]
    public async Task Moved_AlongOneAxis_LeavesTheOtherValueToItsLastDigit()
    {
        EndMembersDesk desk = await DeskAsync();
        MixingModel model = SetEdits.WithValue(InventedCruise.Model, 0, "potential_temperature", 15.524414729720636);
        desk.Look(model, null, null, null, null);
        EndMember moved = desk.Moved(model, new MarkMove("sources", "HTW", 35.61234567, 15.524414729720636, true)).EndMembers.EndMembers[0];
        Assert.Equal(15.524414729720636, moved.Values["potential_temperature"]);
        Assert.Equal(35.612, moved.Values["practical_salinity"], 1e-9);
    }

    [Fact]
    public async Task CanMove_AnAxisThatIsComputedFromOthers_IsFalse()
    {
        EndMembersDesk desk = await DeskAsync();
        MixingModel model = ModelEdits.AddTracer(ModelEdits.RemoveTracer(InventedCruise.Model, "nitrate"), "no");
        desk.Look(model, "no", null, null, null);
        Assert.Equal("no", desk.X);
        Assert.False(desk.CanMove);
        Assert.Equal(model, desk.Moved(model, new MarkMove("sources", "HTW", 1, 1, true)));
    }

    private static async Task<EndMembersDesk> DeskAsync()
    {
        var samples = new StudySamples(new OneCruise());
        await samples.ReadAsync(OneCruise.Study);
        return new EndMembersDesk(samples);
    }
}
