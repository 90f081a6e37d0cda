using Microsoft.Extensions.Configuration;
using WaterMix.Web.Hosting;

namespace WaterMix.Web.Tests.Hosting;

public sealed class ListeningAddressesTests
{
    [Fact]
    public void From_NothingSaid_IsLocalhost5080() => Assert.Equal(["http://localhost:5080"], ListeningAddresses.From(Configuration()));

    [Fact]
    public void From_Urls_AreTaken() =>
        Assert.Equal(["http://localhost:1", "http://127.0.0.1:2"], ListeningAddresses.From(Configuration(("urls", "http://localhost:1;http://127.0.0.1:2"))));

    // A container image sets the ports alone; the server then listens on every network.
    [Fact]
    public void From_PortsAlone_AreEveryNetwork() => Assert.Equal(["http://*:8080"], ListeningAddresses.From(Configuration(("http_ports", "8080"))));

    [Fact]
    public void From_EndpointsOfTheServer_ComeFirst() =>
        Assert.Equal(["http://0.0.0.0:7"], ListeningAddresses.From(Configuration(("urls", "http://localhost:1"), ("Kestrel:Endpoints:A:Url", "http://0.0.0.0:7"))));

    [Theory]
    [InlineData("http://localhost:5080", true)]
    [InlineData("https://127.0.0.1:5080", true)]
    [InlineData("http://[::1]:5080", true)]
    [InlineData("http://*:5080", false)]
    [InlineData("http://+:5080", false)]
    [InlineData("http://0.0.0.0:5080", false)]
    [InlineData("http://[::]:5080", false)]
    [InlineData("http://192.168.0.7:5080", false)]
    [InlineData("http://lab.example:5080", false)]
    [InlineData("http://unix:/run/watermix.sock", false)]
    public void IsLoopback_OfEachKind_SaysWhetherOthersReachIt(string address, bool expected) =>
        Assert.Equal(expected, ListeningAddresses.IsLoopback(address));

    [Fact]
    public void Check_OpenAddressWithoutTheSetting_Refuses()
    {
        StartException refusal = Assert.Throws<StartException>(() => ListeningAddresses.Check(["http://localhost:1", "http://0.0.0.0:5080"], Configuration()));

        Assert.Contains("http://0.0.0.0:5080", refusal.Message, StringComparison.Ordinal);
        Assert.Contains("WATERMIX_ANY_ADDRESS=true", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Check_OpenAddressWithTheSetting_Warns() =>
        Assert.Contains("without a login", ListeningAddresses.Check(["http://*:5080"], Configuration(("WATERMIX_ANY_ADDRESS", "true"))), StringComparison.Ordinal);

    [Fact]
    public void Check_Loopback_SaysNothing() => Assert.Null(ListeningAddresses.Check(["http://localhost:5080"], Configuration()));

    private static IConfiguration Configuration(params (string Name, string? Value)[] settings) =>
        new ConfigurationBuilder().AddInMemoryCollection(settings.ToDictionary(s => s.Name, s => s.Value)).Build();
}
