using WaterMix.Workspace.Storage;

namespace WaterMix.Web.Hosting;

/// <summary>What the window says in which the app was started.</summary>
internal static partial class StartMessages
{
    /// <summary>Says where to find the app and its data once it listens.</summary>
    /// <param name="app">The app, not yet started.</param>
    /// <param name="folder">The data folder.</param>
    /// <param name="warning">A warning about the address, or null.</param>
    public static void Announce(WebApplication app, DataFolder folder, string? warning) => app.Lifetime.ApplicationStarted.Register(() =>
    {
        string addresses = string.Join(", ", app.Urls);
        Ready(app.Logger, addresses, folder.Root);
        if (warning is not null)
        {
            Warn(app.Logger, warning);
        }
    });

    /// <summary>Says on the error stream why the app does not start.</summary>
    /// <param name="reason">Why, and what to do.</param>
    /// <returns>The exit status.</returns>
    public static int Refuse(string reason)
    {
        Console.Error.WriteLine($"WaterMix does not start: {reason}");
        return 1;
    }

    [LoggerMessage(Level = LogLevel.Information, Message = "WaterMix is ready at {Addresses}; its data is in {Folder}. Ctrl+C stops it.")]
    private static partial void Ready(ILogger logger, string addresses, string folder);

    [LoggerMessage(Level = LogLevel.Warning, Message = "{Warning}")]
    private static partial void Warn(ILogger logger, string warning);
}
