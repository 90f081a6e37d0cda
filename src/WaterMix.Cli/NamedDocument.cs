using WaterMix.Core;
using WaterMix.Formats.Json;

namespace WaterMix.Cli;

/// <summary>JSON documents named on the command line.</summary>
internal static class NamedDocument
{
    /// <summary>Reads a document; an empty name is a finding like any other.</summary>
    /// <param name="path">The name that was given.</param>
    /// <param name="what">What it should be, such as "the mixing model".</param>
    /// <param name="read">Reads the file of that name.</param>
    public static Reading<T> Read<T>(string path, string what, Func<string, Reading<T>> read)
        where T : class =>
        path.Length > 0
            ? read(path)
            : new Reading<T>(null, [new Finding(Severity.Error, $"the name of {what}", "an empty name", "Name the file; in a script, look for a variable that was not set.")]);
}
