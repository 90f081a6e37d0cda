namespace WaterMix.Workspace;

/// <summary>Names that people give to studies, cruises and runs.</summary>
internal static class EntityName
{
    /// <summary>Most characters of a name.</summary>
    public const int MostCharacters = 200;

    /// <summary>The name without spaces around it.</summary>
    /// <param name="name">What was typed.</param>
    /// <param name="what">What it names, such as "a study".</param>
    /// <exception cref="ArgumentException">It is empty or too long.</exception>
    public static string Checked(string name, string what)
    {
        string trimmed = (name ?? "").Trim();
        return trimmed.Length switch
        {
            0 => throw new ArgumentException($"Expected a name for {what}; found none. Type one.", nameof(name)),
            > MostCharacters => throw new ArgumentException($"Expected a name of at most {MostCharacters} characters; found {trimmed.Length}. Shorten it.", nameof(name)),
            _ => trimmed,
        };
    }
}
