using System.Globalization;
using System.Text;

namespace WaterMix.Workspace.Cruises;

/// <summary>The name of an uploaded file, for people only: files stand under numbers.</summary>
internal static class UploadName
{
    private const int MostCharacters = 120;

    /// <summary>The last part of what the browser gave, without control and formatting characters.</summary>
    /// <param name="given">The name as given; may hold a path of any system.</param>
    /// <exception cref="ArgumentException">Nothing is left of it.</exception>
    public static string Harmless(string given)
    {
        ArgumentNullException.ThrowIfNull(given);
        string last = given[(given.LastIndexOfAny(['/', '\\']) + 1)..];
        var kept = new StringBuilder(last.Length);
        foreach (Rune rune in last.EnumerateRunes())
        {
            UnicodeCategory category = Rune.GetUnicodeCategory(rune);
            if (category is not (UnicodeCategory.Control or UnicodeCategory.Format or UnicodeCategory.LineSeparator or UnicodeCategory.ParagraphSeparator or UnicodeCategory.PrivateUse)
                && rune != Rune.ReplacementChar)
            {
                kept.Append(rune);
            }
        }

        string name = kept.ToString().Trim();
        if (name.Length == 0 || name.All(c => c == '.'))
        {
            throw new ArgumentException("Expected a file with a name; the name given is empty. Rename the file and upload it again.", nameof(given));
        }

        return name.Length <= MostCharacters ? name : Shortened(name);
    }

    /// <summary>The name, with a number where another file of the upload has it already.</summary>
    public static string Distinct(string name, IReadOnlyCollection<string> taken)
    {
        string candidate = name;
        for (int n = 2; taken.Contains(candidate); n++)
        {
            string extension = Path.GetExtension(name);
            candidate = string.Create(CultureInfo.InvariantCulture, $"{name[..^extension.Length]} ({n}){extension}");
        }

        return candidate;
    }

    // The end of a name tells more than its middle: the extension is there.
    private static string Shortened(string name)
    {
        int first = MostCharacters - 20;
        int last = name.Length - 16;
        return string.Concat(
            name.AsSpan(0, char.IsHighSurrogate(name[first - 1]) ? first - 1 : first),
            "~",
            name.AsSpan(char.IsLowSurrogate(name[last]) ? last + 1 : last));
    }
}
