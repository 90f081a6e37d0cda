namespace WaterMix.Web.Hosting;

/// <summary>
/// Where the app listens. There is no login: whoever reaches the address can read and change every study. So it listens on this machine
/// only, unless <c>WATERMIX_ANY_ADDRESS=true</c> says otherwise.
/// </summary>
public static class ListeningAddresses
{
    /// <summary>Where the app listens unless told otherwise.</summary>
    public const string Default = "http://localhost:5080";

    /// <summary>The setting that permits other addresses than this machine's own.</summary>
    public const string AnyAddress = "WATERMIX_ANY_ADDRESS";

    /// <summary>The addresses that the configuration names, or the default.</summary>
    /// <param name="configuration">Environment, command line and settings files.</param>
    public static IReadOnlyList<string> From(IConfiguration configuration)
    {
        ArgumentNullException.ThrowIfNull(configuration);
        string[] endpoints = [.. configuration.GetSection("Kestrel:Endpoints").GetChildren().Select(e => e["Url"]).OfType<string>()];
        if (endpoints.Length > 0)
        {
            return endpoints;
        }

        string[] urls = Split(configuration["urls"]);
        if (urls.Length > 0)
        {
            return urls;
        }

        string[] ports = [.. Split(configuration["http_ports"]).Select(p => $"http://*:{p}"), .. Split(configuration["https_ports"]).Select(p => $"https://*:{p}")];
        return ports.Length > 0 ? ports : [Default];
    }

    /// <summary>Refuses addresses beyond this machine that were not permitted.</summary>
    /// <param name="addresses">The addresses.</param>
    /// <param name="configuration">Holds the permission.</param>
    /// <returns>A warning to show, or null.</returns>
    /// <exception cref="StartException">An address is not this machine's own and the setting is missing.</exception>
    public static string? Check(IReadOnlyList<string> addresses, IConfiguration configuration)
    {
        ArgumentNullException.ThrowIfNull(addresses);
        ArgumentNullException.ThrowIfNull(configuration);
        string[] open = [.. addresses.Where(a => !IsLoopback(a))];
        if (open.Length == 0)
        {
            return null;
        }

        string named = string.Join(", ", open);
        return configuration.GetValue(AnyAddress, false)
            ? $"Listening on {named} without a login: whoever can reach this address can read, change and delete every study. Keep it behind a gate of your own."
            : throw new StartException(
                $"WaterMix has no login, so it listens on this machine only; {named} can be reached from elsewhere. Use an address such as {Default}, or set {AnyAddress}=true if the network is yours.");
    }

    /// <summary>True where an address can be reached from this machine only.</summary>
    /// <param name="address">An address such as <c>http://localhost:5080</c>.</param>
    public static bool IsLoopback(string address)
    {
        ArgumentNullException.ThrowIfNull(address);

        // "http://*:80" and "http://+:80" are no addresses to Uri, and mean every network.
        return Uri.TryCreate(address, UriKind.Absolute, out Uri? uri) && LoopbackNames.Contains(uri.Host);
    }

    private static string[] Split(string? list) => list?.Split(';', StringSplitOptions.RemoveEmptyEntries | StringSplitOptions.TrimEntries) ?? [];
}
