using Microsoft.Win32.SafeHandles;

namespace WaterMix.Formats.Reading;

/// <summary>
/// What came through a pipe, kept so that it can be read from its beginning more than once: in a temporary file that loses its name as
/// soon as it is made, so that nothing of it is left however the process ends.
/// </summary>
internal sealed class SpooledInput : IDisposable
{
    private readonly FileStream _file;

    /// <summary>Reads a stream to its end.</summary>
    /// <param name="source">The stream.</param>
    /// <param name="cancellation">Ends the waiting for more bytes at once.</param>
    /// <exception cref="OperationCanceledException">The work was cancelled.</exception>
    public SpooledInput(Stream source, CancellationToken cancellation)
    {
        string path = Path.Combine(Path.GetTempPath(), $"watermix-{Path.GetRandomFileName()}");
        _file = new FileStream(path, FileMode.CreateNew, FileAccess.ReadWrite, FileShare.Delete);
        try
        {
            File.Delete(path);

            // A read from a pipe cannot be called off, but it can be left behind.
            source.CopyToAsync(_file, cancellation).WaitAsync(cancellation).GetAwaiter().GetResult();
            _file.Flush();
        }
        catch
        {
            _file.Dispose();
            throw;
        }
    }

    /// <summary>The bytes from their beginning; a stream of this file's handle, which closing it leaves open.</summary>
    public Stream Open() =>
        new FileStream(new SafeFileHandle(_file.SafeFileHandle.DangerousGetHandle(), ownsHandle: false), FileAccess.Read) { Position = 0 };

    /// <inheritdoc/>
    public void Dispose() => _file.Dispose();
}
