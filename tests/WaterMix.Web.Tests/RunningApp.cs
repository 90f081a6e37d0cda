using Microsoft.AspNetCore.Hosting;
using Microsoft.AspNetCore.Mvc.Testing;
using Microsoft.AspNetCore.TestHost;
using Microsoft.Extensions.DependencyInjection;

namespace WaterMix.Web.Tests;

/// <summary>The whole app over a data folder of its own, without a network.</summary>
public sealed class RunningApp : WebApplicationFactory<Program>
{
    private readonly string _folder = Directory.CreateTempSubdirectory("watermix-web-").FullName;
    private readonly List<Action<IServiceCollection>> _replacements = [];
    private readonly Dictionary<string, string> _settings = [];

    /// <summary>The app's data folder.</summary>
    public string DataFolder => _folder;

    /// <summary>Uses a service of the test's in place of the app's.</summary>
    public RunningApp With<T>(T service)
        where T : class
    {
        _replacements.Add(services => services.AddSingleton(service));
        return this;
    }

    /// <summary>Starts the app with a setting.</summary>
    public RunningApp WithSetting(string name, string value)
    {
        _settings[name] = value;
        return this;
    }

    /// <inheritdoc/>
    protected override void ConfigureWebHost(IWebHostBuilder builder)
    {
        builder.UseSetting("WATERMIX_DATA", _folder);
        foreach ((string name, string value) in _settings)
        {
            builder.UseSetting(name, value);
        }

        builder.ConfigureTestServices(services => _replacements.ForEach(replace => replace(services)));
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
