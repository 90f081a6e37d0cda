using System.Globalization;
using System.Text;

namespace WaterMix.Core;

/// <summary>How much a <see cref="Finding"/> weighs.</summary>
public enum Severity
{
    /// <summary>Something worth knowing; nothing is wrong.</summary>
    Note,

    /// <summary>The work goes on, but a value or a row is affected.</summary>
    Warning,

    /// <summary>The input is not usable until this is mended.</summary>
    Error,
}

/// <summary>One thing found in an input: where, what was expected, what was found, and what to do.</summary>
/// <param name="Severity">How much it weighs.</param>
/// <param name="Expected">What the reader or the check needed, as a phrase.</param>
/// <param name="Found">What stands there instead, as a phrase.</param>
/// <param name="Remedy">The next step for the person who owns the input, as a sentence.</param>
public sealed record Finding(Severity Severity, string Expected, string Found, string Remedy)
{
    /// <summary>The file's name as it was given, or null where there is no file.</summary>
    public string? File { get; init; }

    /// <summary>The physical line in the file, 1-based, or null.</summary>
    public long? Line { get; init; }

    /// <summary>The column's name, or its 1-based number where it has no name, or null.</summary>
    public string? Column { get; init; }

    /// <summary>The place in a JSON document as an RFC 6901 pointer, or null.</summary>
    public string? Path { get; init; }

    /// <summary>How often the same thing was found, where several were folded into this one (the place is then the first's).</summary>
    public long Count { get; init; } = 1;

    /// <summary>The finding as one line of text: place, expected, found, remedy.</summary>
    public override string ToString()
    {
        var text = new StringBuilder();
        text.Append(Severity switch { Severity.Error => "error", Severity.Warning => "warning", _ => "note" });
        string place = Place();
        if (place.Length > 0)
        {
            text.Append(": ").Append(place);
        }

        text.Append(": expected ").Append(Expected).Append("; found ").Append(Found);
        if (Count > 1)
        {
            text.Append(CultureInfo.InvariantCulture, $" ({Count} times, first here)");
        }

        return text.Append(". ").Append(Remedy).ToString();
    }

    private string Place()
    {
        var parts = new List<string>();
        if (File is not null)
        {
            parts.Add(File);
        }

        if (Line is not null)
        {
            parts.Add(string.Create(CultureInfo.InvariantCulture, $"line {Line}"));
        }

        if (Column is not null)
        {
            parts.Add($"column {Column}");
        }

        if (Path is not null)
        {
            parts.Add(Path.Length == 0 ? "the whole document" : Path);
        }

        return string.Join(", ", parts);
    }
}
