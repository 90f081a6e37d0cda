namespace WaterMix.Workspace.Storage;

/// <summary>A file that appears whole or not at all: written beside its place and moved into it at the end.</summary>
internal sealed class NewFile : IAsyncDisposable
{
    /// <summary>How the name of a file ends that is still being written.</summary>
    public const string Unfinished = ".unfinished";

    private NewFile(string folder)
    {
        Directory.CreateDirectory(folder);
        Path = System.IO.Path.Combine(folder, Guid.NewGuid().ToString("N") + Unfinished);
        Stream = new FileStream(Path, FileMode.CreateNew, FileAccess.ReadWrite, FileShare.None, 1 << 16, FileOptions.Asynchronous);
    }

    /// <summary>Where the bytes go.</summary>
    public FileStream Stream { get; }

    /// <summary>Where the file stands until it is moved.</summary>
    public string Path { get; }

    /// <summary>Begins a file.</summary>
    /// <param name="folder">The folder that it will stand in.</param>
    public static NewFile In(string folder) => new(folder);

    /// <summary>Ends the writing: the bytes are on the disk.</summary>
    public async Task CloseAsync()
    {
        await Stream.FlushAsync();
        Stream.Flush(flushToDisk: true);
        await Stream.DisposeAsync();
    }

    /// <summary>Ends the writing and moves the file into place, over a file of that name.</summary>
    /// <param name="path">The place, in the same folder.</param>
    public async Task MoveToAsync(string path)
    {
        await CloseAsync();
        File.Move(Path, path, overwrite: true);
    }

    /// <summary>Removes what was not moved into place.</summary>
    public async ValueTask DisposeAsync()
    {
        await Stream.DisposeAsync();
        File.Delete(Path);
    }
}
