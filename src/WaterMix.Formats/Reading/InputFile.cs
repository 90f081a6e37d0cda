namespace WaterMix.Formats.Reading;

/// <summary>A file, or an entry of a zip file, that can be opened from its beginning more than once.</summary>
/// <param name="Name">
/// The name in reports and in the <c>file</c> column: the file's name, or its path as given where another given file has the same name
/// or the input is a pipe; of a zip entry, the archive's name, a slash, the entry's path in it. A label only: nothing is ever written to such a path.
/// </param>
/// <param name="Open">Opens the bytes; the caller disposes the stream.</param>
public sealed record InputFile(string Name, Func<Stream> Open)
{
    /// <summary>True for an entry of a zip file, which results name even where it is the only one.</summary>
    public bool IsZipEntry { get; init; }
}
