namespace WaterMix.Formats.Reading;

/// <summary>One path for every way of naming a file, so that two names of the same file are seen to be one.</summary>
public static class RealPath
{
    /// <summary>Compares real paths as the system's file names are usually compared: without case on Windows and macOS.</summary>
    public static StringComparer Comparer { get; } =
        OperatingSystem.IsWindows() || OperatingSystem.IsMacOS() ? StringComparer.OrdinalIgnoreCase : StringComparer.Ordinal;

    /// <summary>The full path with symbolic links resolved, those of its folders too; one that cannot be followed stays as it is. Hard links are not seen through.</summary>
    /// <param name="path">A path, not empty; nothing need be there.</param>
    public static string Of(string path)
    {
        string full = Path.TrimEndingDirectorySeparator(Path.GetFullPath(path));
        if (Path.GetDirectoryName(full) is not { } folder)
        {
            return full;
        }

        string here = Path.Combine(Of(folder), Path.GetFileName(full));
        try
        {
            return File.ResolveLinkTarget(here, returnFinalTarget: true) is { } target ? Of(target.FullName) : here;
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            return here;
        }
    }
}
