using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.Hosting;
using WaterMix.Testing;
using WaterMix.Workspace.Cruises;
using WaterMix.Workspace.Runs;
using WaterMix.Workspace.Studies;

namespace WaterMix.Workspace.Tests;

/// <summary>A workspace as an app has it: services over a data folder, background work included.</summary>
internal sealed class OpenWorkspace : IAsyncDisposable
{
    private readonly IHost _host;

    private OpenWorkspace(IHost host)
    {
        _host = host;
    }

    public IStudies Studies => Get<IStudies>();

    public ICruises Cruises => Get<ICruises>();

    public IRuns Runs => Get<IRuns>();

    public static async Task<OpenWorkspace> AtAsync(string folder, WorkspaceOptions? options = null, TimeProvider? clock = null)
    {
        HostApplicationBuilder builder = Host.CreateEmptyApplicationBuilder(new HostApplicationBuilderSettings());
        if (clock is not null)
        {
            builder.Services.AddSingleton(clock);
        }

        builder.Services.AddLogging();
        builder.Services.AddWaterMixWorkspace(folder, options);
        IHost host = builder.Build();
        await host.StartAsync();
        return new OpenWorkspace(host);
    }

    public T Get<T>()
        where T : notnull => _host.Services.GetRequiredService<T>();

    /// <summary>The text of a file of the invented ocean.</summary>
    public static byte[] Sample(string name) => File.ReadAllBytes(Path.Combine(TestData.Root, "sample-data", name));

    /// <summary>Uploads files and gives the upload's id.</summary>
    public async Task<Guid> UploadAsync(params (string Name, byte[] Bytes)[] files)
    {
        Guid upload = Guid.NewGuid();
        foreach ((string name, byte[] bytes) in files)
        {
            await Cruises.ReceiveAsync(upload, name, new MemoryStream(bytes), TestContext.Current.CancellationToken);
        }

        return upload;
    }

    /// <summary>Uploads files and keeps them as a cruise.</summary>
    public async Task<Cruise> KeepAsync(Guid study, string cruiseName, params (string Name, byte[] Bytes)[] files)
    {
        (ImportTrial trial, Cruise? cruise) = await Cruises.KeepAsync(
            study, await UploadAsync(files), cruiseName, new Formats.Reading.ReadingOptions(), null, TestContext.Current.CancellationToken);
        Assert.True(cruise is not null, string.Join("\n", trial.Report.Findings));
        return cruise;
    }

    /// <summary>Waits until a run has ended, and gives it.</summary>
    public async Task<Run> EndOfAsync(Guid run)
    {
        while (true)
        {
            Run found = (await Runs.FindAsync(run))!;
            if (found.State is not (RunState.Waiting or RunState.Running))
            {
                return found;
            }

            await Task.Delay(5, TestContext.Current.CancellationToken);
        }
    }

    /// <summary>The results of a run as CSV.</summary>
    public async Task<byte[]> CsvAsync(Guid run)
    {
        using var stream = new MemoryStream();
        await Runs.WriteCsvAsync(run, stream, TestContext.Current.CancellationToken);
        return stream.ToArray();
    }

    public async ValueTask DisposeAsync()
    {
        await _host.StopAsync();
        await ((IAsyncDisposable)_host).DisposeAsync();
    }
}
