using CsCheck;
using WaterMix.Web.State.Samples;

namespace WaterMix.Web.Tests.State.Samples;

public sealed class SampleViewTests
{
    // Property: what an address says is what was put into it.
    [Fact]
    public void Parse_OfItsOwnQuery_GivesTheSameView()
    {
        Gen<double?> bound = Gen.OneOf(Gen.Const((double?)null), Gen.Double[-1e4, 1e4].Select(v => (double?)v));
        Gen.Select(bound, bound, Gen.Bool, Gen.Int[0, 1_000_000], Gen.OneOf(Gen.Const(""), Gen.Const("12, 20-35"), Gen.Const("A&B=#")), Gen.OneOf(Gen.Const(""), Gen.Const("oxygen"), Gen.Const("pressure")))
            .Sample((from, to, only, row, stations, colour) =>
            {
                var view = new SampleView
                {
                    Filter = new SampleFilter
                    {
                        Cruises = [Guid.NewGuid(), Guid.NewGuid()],
                        Stations = stations,
                        Down = new ValueRange(from, to),
                        DownQuantity = only ? "depth" : "pressure",
                        Density = new ValueRange(to, from),
                        DensityQuantity = "sigma2",
                        Flags = [2, 3],
                        OnlyFlagged = only,
                    },
                    Colour = colour,
                    X = "oxygen",
                    Profiles = ["oxygen", "silicate"],
                    Sample = row,
                    Report = Guid.NewGuid(),
                };
                SampleView read = SampleView.Parse(Address(view));
                Assert.Equal(view.Filter, read.Filter);
                Assert.Equal(view.Profiles, read.Profiles);
                Assert.Equal(view with { Filter = read.Filter, Profiles = read.Profiles }, read);
            });
    }

    [Fact]
    public void ToQuery_OfAViewAsItBegins_SaysNothing() => Assert.All(new SampleView().ToQuery(), part => Assert.Null(part.Value));

    [Theory]
    [InlineData("?down-from=abc&flags=99&sample=-3&report=x&cruise=1,2&density=speed")]
    [InlineData("?")]
    [InlineData("")]
    [InlineData("?sample=99999999999999&flags=2;;x")]
    public void Parse_GarbledAddress_GivesTheDefaults(string query)
    {
        SampleView view = SampleView.Parse("http://localhost/studies/1/samples" + query);
        Assert.Equal(new SampleView() with { Filter = view.Filter, Profiles = view.Profiles }, view);
        Assert.Equal(new SampleFilter(), view.Filter);
        Assert.Empty(view.Profiles);
    }

    private static string Address(SampleView view) =>
        "http://localhost/samples?" + string.Join('&', view.ToQuery().Where(p => p.Value is not null).Select(p => $"{p.Key}={Uri.EscapeDataString(p.Value!.ToString()!)}"));
}
