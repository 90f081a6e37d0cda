namespace WaterMix.Workspace.Storage;

/// <summary>
/// The one folder that holds everything: the database, the column files, the uploads. While it is open no other process can open it;
/// the operating system gives the lock back however the process ends.
/// </summary>
public sealed class DataFolder : IDisposable
{
    private const int WouldBlockOnLinux = 11;
    private const int WouldBlockOnMac = 35;
    private const int SharingViolationOnWindows = unchecked((int)0x80070020);

    private readonly FileStream _lock;

    private DataFolder(string path, FileStream opened)
    {
        Root = path;
        _lock = opened;
    }

    /// <summary>The folder's full path.</summary>
    public string Root { get; }

    /// <summary>The database's file: metadata only.</summary>
    internal string Database => Path.Combine(Root, "watermix.db");

    /// <summary>Column files of samples.</summary>
    internal string Samples => Path.Combine(Root, "samples");

    /// <summary>Column files of results, a folder for each run.</summary>
    internal string Runs => Path.Combine(Root, "runs");

    /// <summary>Files as they were uploaded, a folder for each upload.</summary>
    internal string Uploads => Path.Combine(Root, "uploads");

    /// <summary>Opens a folder, making it where there is none.</summary>
    /// <param name="path">The folder.</param>
    /// <exception cref="DataFolderInUseException">Another process has it open.</exception>
    /// <exception cref="IOException">It cannot be made or written; the message says what to do.</exception>
    public static DataFolder Open(string path)
    {
        ArgumentException.ThrowIfNullOrWhiteSpace(path);
        string root = Path.GetFullPath(path);
        try
        {
            Directory.CreateDirectory(root);
            var opened = new FileStream(Path.Combine(root, "lock"), FileMode.OpenOrCreate, FileAccess.ReadWrite, FileShare.None);
            var folder = new DataFolder(root, opened);
            folder.Prepare();
            return folder;
        }
        catch (IOException fault) when (fault.HResult is WouldBlockOnLinux or WouldBlockOnMac or SharingViolationOnWindows)
        {
            throw new DataFolderInUseException(root, fault);
        }
        catch (Exception fault) when (fault is UnauthorizedAccessException or IOException)
        {
            throw new IOException($"The data folder {root} cannot be made or written: {fault.Message.TrimEnd('.')}. Give a folder that you may write, with WATERMIX_DATA.", fault);
        }
    }

    /// <summary>Gives the lock back.</summary>
    public void Dispose() => _lock.Dispose();

    private void Prepare()
    {
        foreach (string folder in (string[])[Samples, Runs, Uploads])
        {
            Directory.CreateDirectory(folder);

            // Nobody else writes here, so whatever is unfinished was left by a process that ended.
            foreach (string file in Directory.EnumerateFiles(folder, "*" + NewFile.Unfinished, SearchOption.AllDirectories))
            {
                File.Delete(file);
            }
        }
    }
}
