using Microsoft.AspNetCore.Connections;
using WaterMix.Web.Hosting;
using WaterMix.Workspace.Demo;
using WaterMix.Workspace.Storage;

// A published app finds its files beside it, wherever it is started from.
WebApplicationBuilder builder = WebApplication.CreateBuilder(new WebApplicationOptions
{
    Args = args,
    ContentRootPath = Directory.Exists(Path.Combine(AppContext.BaseDirectory, "wwwroot")) ? AppContext.BaseDirectory : null,
});

try
{
    IReadOnlyList<string> addresses = ListeningAddresses.From(builder.Configuration);
    string? warning = ListeningAddresses.Check(addresses, builder.Configuration);
    if (addresses is [ListeningAddresses.Default])
    {
        builder.WebHost.UseUrls(ListeningAddresses.Default);
    }

    await using WebApplication app = WebHost.Build(builder);
    DataFolder folder = app.Services.GetRequiredService<DataFolder>();
    await DemoStudy.EnsureAsync(app.Services);
    StartMessages.Announce(app, folder, warning);
    await app.RunAsync();
    return 0;
}
catch (OperationCanceledException)
{
    return 0; // Stopped before it listened.
}
catch (IOException fault) when (fault.InnerException is AddressInUseException)
{
    return StartMessages.Refuse($"{fault.Message.TrimEnd('.')}. Stop the program that uses the address, or name another with --urls http://localhost:5081.");
}
catch (Exception fault) when (fault is StartException or IOException or InvalidOperationException { Source: "WaterMix.Workspace" })
{
    return StartMessages.Refuse(fault.Message);
}

/// <summary>The entry point, named for the tests that start the app.</summary>
public partial class Program;
