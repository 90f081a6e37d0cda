namespace WaterMix.Cli;

/// <summary>
/// An output that appears whole or not at all: written beside its name and moved into place at the end. Without a name it goes to the
/// standard output at the end, so that an input found unusable half-way prints nothing.
/// </summary>
internal sealed class OutputFile : IDisposable
{
    private readonly string? _path;
    private readonly string _unfinished;

    /// <summary>Opens an output.</summary>
    /// <param name="path">The file's name, or null for the standard output.</param>
    public OutputFile(string? path)
    {
        _path = path;
        string folder = path is null ? Path.GetTempPath() : Path.GetDirectoryName(Path.GetFullPath(path))!;
        _unfinished = Path.Combine(folder, $".{(path is null ? "watermix" : Path.GetFileName(path))}.{Path.GetRandomFileName()}.unfinished");
        Stream = new FileStream(_unfinished, FileMode.CreateNew, FileAccess.ReadWrite, FileShare.None, 1 << 16);
    }

    /// <summary>Where the bytes go.</summary>
    public FileStream Stream { get; }

    /// <summary>Moves the output into place, over a file of that name, or copies it to the standard output.</summary>
    public void Finish()
    {
        Stream.Flush();
        if (_path is null)
        {
            Stream.Position = 0;
            using Stream standard = Console.OpenStandardOutput();
            Stream.CopyTo(standard);
        }
        else
        {
            Stream.Dispose();
            File.Move(_unfinished, _path, overwrite: true);
        }
    }

    /// <summary>Removes what was not moved into place.</summary>
    public void Dispose()
    {
        Stream.Dispose();
        File.Delete(_unfinished);
    }
}
