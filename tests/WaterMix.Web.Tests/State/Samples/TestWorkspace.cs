using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.Hosting;
using WaterMix.Testing;
using WaterMix.Workspace;
using WaterMix.Workspace.Cruises;
using WaterMix.Workspace.Runs;
using WaterMix.Workspace.Studies;

namespace WaterMix.Web.Tests.State.Samples;

/// <summary>The real services over a data folder that goes away with the test.</summary>
internal sealed class TestWorkspace : IAsyncDisposable
{
    private readonly IHost _host;
    private readonly string _folder;

    private TestWorkspace(IHost host, string folder) => (_host, _folder) = (host, folder);

    public IStudies Studies => _host.Services.GetRequiredService<IStudies>();

    public ICruises Cruises => _host.Services.GetRequiredService<ICruises>();

    public IRuns Runs => _host.Services.GetRequiredService<IRuns>();

    public static async Task<TestWorkspace> OpenAsync()
    {
        string folder = Directory.CreateTempSubdirectory("watermix-samples-").FullName;
        HostApplicationBuilder builder = Host.CreateEmptyApplicationBuilder(new HostApplicationBuilderSettings());
        builder.Services.AddLogging();
        builder.Services.AddWaterMixWorkspace(folder);
        IHost host = builder.Build();
        await host.StartAsync();
        return new TestWorkspace(host, folder);
    }

    /// <summary>A file of the invented ocean.</summary>
    public static byte[] Halcyon => File.ReadAllBytes(Path.Combine(TestData.Root, "sample-data", "halcyon_hy1.csv"));

    /// <summary>Uploads one file.</summary>
    public async Task<Guid> UploadAsync(string name, byte[] bytes)
    {
        Guid upload = Guid.NewGuid();
        await Cruises.ReceiveAsync(upload, name, new MemoryStream(bytes), TestContext.Current.CancellationToken);
        return upload;
    }

    /// <summary>Keeps the invented cruise in a study.</summary>
    public async Task<Cruise> KeepHalcyonAsync(Guid study, string name)
    {
        Guid upload = await UploadAsync("halcyon_hy1.csv", Halcyon);
        return (await Cruises.KeepAsync(study, upload, name, new(), null, TestContext.Current.CancellationToken)).Cruise!;
    }

    public async ValueTask DisposeAsync()
    {
        await _host.StopAsync();
        _host.Dispose();
        Directory.Delete(_folder, recursive: true);
    }
}
