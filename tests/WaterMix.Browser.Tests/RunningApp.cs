using System.Diagnostics;
using System.Globalization;
using System.Net;
using System.Net.Sockets;

namespace WaterMix.Browser.Tests;

/// <summary>The app as its own process over a new data folder, on a free port of this machine.</summary>
public sealed class RunningApp : IAsyncDisposable
{
    private static readonly TimeSpan Patience = TimeSpan.FromSeconds(90);

    private readonly Process _process;
    private readonly string _folder;
    private readonly List<string> _said = [];

    private RunningApp(Process process, string folder, string address)
    {
        _process = process;
        _folder = folder;
        Address = address;
    }

    /// <summary>Its base address, with a slash at the end.</summary>
    public string Address { get; }

    /// <summary>Starts the app and waits until it answers.</summary>
    public static async Task<RunningApp> StartAsync()
    {
        string folder = Directory.CreateTempSubdirectory("watermix-browser-").FullName;
        string address = string.Create(CultureInfo.InvariantCulture, $"http://127.0.0.1:{FreePort()}/");
        var start = new ProcessStartInfo("dotnet", [WebAssembly(), "--urls", address])
        {
            RedirectStandardOutput = true,
            RedirectStandardError = true,
        };
        start.Environment["WATERMIX_DATA"] = folder;
        start.Environment["ASPNETCORE_ENVIRONMENT"] = "Production";
        var app = new RunningApp(Process.Start(start)!, folder, address);
        app._process.OutputDataReceived += app.Hear;
        app._process.ErrorDataReceived += app.Hear;
        app._process.BeginOutputReadLine();
        app._process.BeginErrorReadLine();
        await app.UntilReadyAsync();
        return app;
    }

    /// <inheritdoc/>
    public async ValueTask DisposeAsync()
    {
        if (!_process.HasExited)
        {
            _process.Kill(entireProcessTree: true);
            await _process.WaitForExitAsync();
        }

        _process.Dispose();
        Directory.Delete(_folder, recursive: true);
    }

    private async Task UntilReadyAsync()
    {
        using var client = new HttpClient { BaseAddress = new Uri(Address) };
        var waited = Stopwatch.StartNew();
        while (waited.Elapsed < Patience && !_process.HasExited)
        {
            try
            {
                using HttpResponseMessage answer = await client.GetAsync(new Uri("health", UriKind.Relative), TestContext.Current.CancellationToken);
                if (answer.IsSuccessStatusCode)
                {
                    return;
                }
            }
            catch (HttpRequestException)
            {
                // Not listening yet.
            }

            await Task.Delay(100, TestContext.Current.CancellationToken);
        }

        string said;
        lock (_said)
        {
            said = string.Join('\n', _said);
        }

        await DisposeAsync();
        throw new InvalidOperationException($"The app did not answer within {Patience.TotalSeconds} s. It said:\n{said}");
    }

    private void Hear(object sender, DataReceivedEventArgs e)
    {
        lock (_said)
        {
            _said.Add(e.Data ?? "");
        }
    }

    // Every project's output stands beside this one's, under the name of its configuration.
    private static string WebAssembly()
    {
        var own = new DirectoryInfo(AppContext.BaseDirectory);
        return Path.Combine(own.Parent!.Parent!.FullName, "WaterMix.Web", own.Name, "WaterMix.Web.dll");
    }

    private static int FreePort()
    {
        using var listener = new TcpListener(IPAddress.Loopback, 0);
        listener.Start();
        return ((IPEndPoint)listener.LocalEndpoint).Port;
    }
}
