using Microsoft.AspNetCore.Hosting;
using Microsoft.AspNetCore.Mvc.Testing;

namespace WaterMix.Web.Tests;

/// <summary>The whole app over a data folder of its own, without a network.</summary>
public sealed class RunningApp : WebApplicationFactory<Program>, IAsyncLifetime
{
    private readonly string _folder = Directory.CreateTempSubdirectory("watermix-web-").FullName;
    private readonly Dictionary<string, string> _settings = [];

    /// <summary>The app's data folder.</summary>
    public string DataFolder => _folder;

    /// <summary>Starts the app with a setting.</summary>
    public RunningApp WithSetting(string name, string value)
    {
        _settings[name] = value;
        return this;
    }

    /// <summary>Starts the app before tests run side by side.</summary>
    public ValueTask InitializeAsync()
    {
        StartServer();
        return ValueTask.CompletedTask;
    }

    /// <inheritdoc/>
    protected override void ConfigureWebHost(IWebHostBuilder builder)
    {
        builder.UseEnvironment("Production"); // What people run.
        builder.UseSetting("WATERMIX_DATA", _folder);
        foreach ((string name, string value) in _settings)
        {
            builder.UseSetting(name, value);
        }
    }

    /// <inheritdoc/>
    protected override void Dispose(bool disposing)
    {
        base.Dispose(disposing);
        if (disposing && Directory.Exists(_folder))
        {
            Directory.Delete(_folder, recursive: true);
        }
    }
}
