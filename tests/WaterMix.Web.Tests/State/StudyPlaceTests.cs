using WaterMix.Web.State;

namespace WaterMix.Web.Tests.State;

public sealed class StudyPlaceTests
{
    private const string Id = "0c8c21e5-9aa2-4af0-962d-c3fc9e497ecf";

    [Theory]
    [InlineData("studies/" + Id + "/results?run=1", "results")]
    [InlineData("/studies/" + Id + "/end-members#top", "end-members")]
    [InlineData("studies/" + Id, "")]
    public void Of_AddressInAStudy_IsItsPlace(string path, string page) =>
        Assert.Equal(new StudyPlace(Guid.Parse(Id), page), StudyPlace.Of(path));

    [Theory]
    [InlineData("")]
    [InlineData("?search=x")]
    [InlineData("studies")]
    [InlineData("studies/x/results")]
    [InlineData("library/" + Id)]
    public void Of_AddressOutside_IsNowhere(string path) => Assert.Null(StudyPlace.Of(path));

    [Fact]
    public void Existing_Pages_StandInTheOrderOfTheWork()
    {
        string[] order = ["samples", "end-members", "mixing", "results", "cruise"];
        string[] existing = [.. StudyPage.Existing.Select(p => p.Slug)];

        Assert.Equal(order.Where(existing.Contains), existing);
        Assert.All(StudyPage.Existing, page => Assert.Equal($"studies/{Id}/{page.Slug}", page.AddressIn(Guid.Parse(Id))));
    }
}
