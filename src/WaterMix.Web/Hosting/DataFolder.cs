namespace WaterMix.Web.Hosting;

/// <summary>The folder that holds everything a person keeps, claimed by one process at a time.</summary>
/// <remarks>The claim is a lock that the operating system drops when the process ends, however it ends.</remarks>
public sealed class DataFolder : IDisposable
{
    private readonly FileStream _claim;

    private DataFolder(string path, FileStream claim)
    {
        FullPath = path;
        _claim = claim;
    }

    /// <summary>The folder.</summary>
    public string FullPath { get; }

    /// <summary>The folder that the configuration names by <c>WATERMIX_DATA</c>, otherwise the platform's folder for a user's data.</summary>
    /// <param name="configuration">Environment, command line and settings files.</param>
    public static string Locate(IConfiguration configuration)
    {
        ArgumentNullException.ThrowIfNull(configuration);
        string? named = configuration["WATERMIX_DATA"];
        string path = string.IsNullOrWhiteSpace(named)
            ? Path.Combine(Environment.GetFolderPath(Environment.SpecialFolder.LocalApplicationData, Environment.SpecialFolderOption.DoNotVerify), "WaterMix")
            : named;
        return Path.GetFullPath(path);
    }

    /// <summary>Makes the folder where it is missing and claims it.</summary>
    /// <param name="path">The folder.</param>
    /// <exception cref="StartException">Another process has it, or it cannot be written to.</exception>
    public static DataFolder Claim(string path)
    {
        try
        {
            Directory.CreateDirectory(path);
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            throw NotWritable(path, fault);
        }

        string claim = Path.Combine(path, "in-use.lock");
        try
        {
            return new DataFolder(path, new FileStream(claim, FileMode.OpenOrCreate, FileAccess.ReadWrite, FileShare.None));
        }
        catch (IOException)
        {
            throw new StartException($"Another WaterMix is already using the data folder {path}: use that one, stop it, or name another folder with WATERMIX_DATA.");
        }
        catch (UnauthorizedAccessException fault)
        {
            throw NotWritable(path, fault);
        }
    }

    /// <summary>Lets other processes claim the folder.</summary>
    public void Dispose() => _claim.Dispose();

    private static StartException NotWritable(string path, Exception fault) =>
        new($"The data folder {path} cannot be written to ({fault.Message.TrimEnd('.')}): mend its permissions or name another folder with WATERMIX_DATA.");
}
