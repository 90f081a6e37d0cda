namespace WaterMix.Formats.Reading;

/// <summary>A file, or an entry of a zip file, that can be opened from its beginning more than once.</summary>
/// <param name="Name">The name in reports and in the <c>file</c> column; of a zip entry, the archive's name, a slash, the entry's name without its folders.</param>
/// <param name="Open">Opens the bytes; the caller disposes the stream.</param>
public sealed record InputFile(string Name, Func<Stream> Open);
