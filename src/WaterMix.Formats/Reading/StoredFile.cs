namespace WaterMix.Formats.Reading;

/// <summary>A file on disk that people know by another name, such as a file of an upload.</summary>
/// <param name="Path">Where it stands.</param>
/// <param name="Name">The name in reports, in the <c>file</c> column and for the order of the rows.</param>
public sealed record StoredFile(string Path, string Name);
