namespace WaterMix.Web.Hosting;

/// <summary>Where the folder is that holds everything a person keeps.</summary>
public static class DataFolderPath
{
    /// <summary>The setting that names the folder.</summary>
    public const string Setting = "WATERMIX_DATA";

    /// <summary>The folder that the configuration names, otherwise one in the platform's place for a user's data.</summary>
    /// <param name="configuration">Environment, command line and settings files.</param>
    /// <returns>A full path; the folder need not exist.</returns>
    public static string From(IConfiguration configuration)
    {
        ArgumentNullException.ThrowIfNull(configuration);
        string? named = configuration[Setting];
        return Path.GetFullPath(string.IsNullOrWhiteSpace(named)
            ? Path.Combine(Environment.GetFolderPath(Environment.SpecialFolder.LocalApplicationData, Environment.SpecialFolderOption.DoNotVerify), "WaterMix")
            : named);
    }
}
