using WaterMix.Core;

namespace WaterMix.Formats.Json;

/// <summary>Reads a JSON document from disk; a file that cannot be opened is a finding like any other.</summary>
public static class JsonFile
{
    /// <summary>Reads a document.</summary>
    /// <param name="path">The file; its name in findings.</param>
    /// <param name="what">What it should be, such as "the mixing model".</param>
    /// <param name="read">Makes the document of the file's bytes and its name.</param>
    public static Reading<T> Read<T>(string path, string what, Func<byte[], string, Reading<T>> read)
        where T : class
    {
        ArgumentNullException.ThrowIfNull(path);
        ArgumentNullException.ThrowIfNull(read);
        byte[] bytes;
        try
        {
            bytes = File.ReadAllBytes(path);
        }
        catch (Exception fault) when (IsUnreadable(fault))
        {
            return new Reading<T>(null, [Unreadable(fault, what) with { File = path }]);
        }

        return read(bytes, path);
    }

    /// <summary>True where an exception says that a file cannot be opened.</summary>
    internal static bool IsUnreadable(Exception fault) => fault is IOException or UnauthorizedAccessException or ArgumentException;

    /// <summary>The finding for such an exception.</summary>
    internal static Finding Unreadable(Exception fault, string what) =>
        new(Severity.Error, $"{what} as a file that can be read", fault.Message.TrimEnd('.'), "Check the name and the folder, and that you may read the file.");
}
