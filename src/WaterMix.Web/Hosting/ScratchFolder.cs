namespace WaterMix.Web.Hosting;

/// <summary>A folder for files that are needed for the length of a request.</summary>
/// <param name="path">The folder.</param>
internal sealed class ScratchFolder(string path) : IDisposable
{
    private int _count;

    /// <summary>A path for another file in it; the name says nothing.</summary>
    public string NextPath() => Path.Combine(path, $"{Interlocked.Increment(ref _count)}");

    /// <summary>Removes the folder and everything in it.</summary>
    public void Dispose() => Directory.Delete(path, recursive: true);
}
