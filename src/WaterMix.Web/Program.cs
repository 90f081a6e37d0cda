using WaterMix.Web.Hosting;

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

    using DataFolder folder = DataFolder.Claim(DataFolder.Locate(builder.Configuration));
    await using WebApplication app = WebHost.Build(builder, folder);
    StartMessages.Announce(app, folder, warning);
    await app.RunAsync();
    return 0;
}
catch (StartException refusal)
{
    Console.Error.WriteLine($"WaterMix does not start: {refusal.Message}");
    return 1;
}
catch (IOException fault) when (fault.InnerException is Microsoft.AspNetCore.Connections.AddressInUseException)
{
    Console.Error.WriteLine($"WaterMix does not start: {fault.Message.TrimEnd('.')}. Stop the program that uses the address, or name another with --urls http://localhost:5081.");
    return 1;
}

/// <summary>The entry point, named for the tests that start the app.</summary>
public partial class Program;
