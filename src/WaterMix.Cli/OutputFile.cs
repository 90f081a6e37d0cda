namespace WaterMix.Cli;

/// <summary>
/// An output that appears whole or not at all: written beside its name and moved into place at the end. Without a name it goes to the
/// standard output at the end, so that an input found unusable half-way prints nothing.
/// </summary>
internal sealed class OutputFile : IDisposable
{
    private readonly string? _path;
    private readonly string _unfinished;
    private readonly FileStream _stream;

    /// <summary>Opens an output.</summary>
    /// <param name="path">The file's name, or null for the standard output.</param>
    /// <exception cref="IOException">The file cannot be made there; the message names the path as it was given.</exception>
    public OutputFile(string? path)
    {
        _path = path;
        string folder = path is null ? Path.GetTempPath() : Path.GetDirectoryName(Path.GetFullPath(path))!;
        _unfinished = Path.Combine(folder, $".{(path is null ? "watermix" : Path.GetFileName(path))}.{Path.GetRandomFileName()}.unfinished");

        // The writers buffer; a stream that did too would fail once more on a full disk when it is closed, before the file is removed.
        _stream = Naming(() => new FileStream(_unfinished, FileMode.CreateNew, FileAccess.ReadWrite, FileShare.Delete, bufferSize: 0));
        if (path is null)
        {
            // Its name is not needed; without one nothing is left of it however the process ends.
            File.Delete(_unfinished);
        }
    }

    /// <summary>Writes the output.</summary>
    /// <param name="write">Writes to the stream, which stays open, and returns what is wanted of it.</param>
    /// <exception cref="IOException">The file cannot be written; the message names the path as it was given.</exception>
    public T Write<T>(Func<Stream, T> write) => Naming(() => write(_stream));

    /// <summary>Writes the output, which is these bytes.</summary>
    /// <param name="bytes">The bytes.</param>
    /// <exception cref="IOException">The file cannot be written; the message names the path as it was given.</exception>
    public void WriteBytes(byte[] bytes) => Naming(() =>
    {
        _stream.Write(bytes);
        return true;
    });

    /// <summary>Moves the output into place, over a file of that name, or copies it to the standard output.</summary>
    /// <exception cref="IOException">The file cannot be put there; the message names the path as it was given.</exception>
    public void Finish() => Naming(() =>
    {
        _stream.Flush();
        if (_path is null)
        {
            _stream.Position = 0;
            using Stream standard = Console.OpenStandardOutput();
            _stream.CopyTo(standard);
        }
        else
        {
            _stream.Dispose();
            File.Move(_unfinished, _path, overwrite: true);
        }

        return true;
    });

    /// <summary>Removes what was not moved into place.</summary>
    public void Dispose()
    {
        _stream.Dispose();
        File.Delete(_unfinished);
    }

    // The unfinished file is nobody's concern: what the system says of it is said of the file that was asked for.
    private T Naming<T>(Func<T> work)
    {
        try
        {
            return work();
        }
        catch (Exception fault) when (_path is not null && fault is IOException or UnauthorizedAccessException && fault.Message.Contains(_unfinished, StringComparison.Ordinal))
        {
            throw new IOException(fault.Message.Replace(_unfinished, _path, StringComparison.Ordinal), fault);
        }
    }
}
