namespace WaterMix.Core;

/// <summary>The known name that a misspelt one most resembles. It is for a message to suggest, never for a reader to use.</summary>
public static class NearestName
{
    /// <summary>
    /// The known name with the fewest single-character edits (insertions, deletions, substitutions, swaps of neighbours; letter case
    /// counts as no edit), or null where even that one differs by more than a third of its length.
    /// </summary>
    /// <param name="name">The name found.</param>
    /// <param name="known">The names that would be understood; of equally near ones the first is taken.</param>
    public static string? Of(string name, IEnumerable<string> known)
    {
        ArgumentNullException.ThrowIfNull(name);
        ArgumentNullException.ThrowIfNull(known);
        string? nearest = null;
        int fewest = int.MaxValue;
        foreach (string candidate in known)
        {
            int longest = Math.Max(name.Length, candidate.Length);
            int allowed = Math.Max(1, candidate.Length / 3);

            // The lengths alone already ask for this many edits.
            if (longest - Math.Min(name.Length, candidate.Length) > allowed)
            {
                continue;
            }

            int edits = Edits(name.ToUpperInvariant(), candidate.ToUpperInvariant());
            if (edits <= allowed && edits < fewest)
            {
                nearest = candidate;
                fewest = edits;
            }
        }

        return nearest;
    }

    /// <summary>A sentence that suggests the nearest known name, with a space after it; empty where none is near.</summary>
    /// <param name="name">The name found.</param>
    /// <param name="known">The names that would be understood.</param>
    public static string Suggestion(string name, IEnumerable<string> known) =>
        Of(name, known) is { } nearest ? $"Did you mean \"{nearest}\"? " : "";

    // Optimal string alignment: the usual edit table, with a swap of two neighbours as one edit.
    private static int Edits(string a, string b)
    {
        int[,] d = new int[a.Length + 1, b.Length + 1];
        for (int i = 0; i <= a.Length; i++)
        {
            d[i, 0] = i;
        }

        for (int j = 0; j <= b.Length; j++)
        {
            d[0, j] = j;
        }

        for (int i = 1; i <= a.Length; i++)
        {
            for (int j = 1; j <= b.Length; j++)
            {
                int substitution = d[i - 1, j - 1] + (a[i - 1] == b[j - 1] ? 0 : 1);
                d[i, j] = Math.Min(substitution, Math.Min(d[i - 1, j], d[i, j - 1]) + 1);
                if (i > 1 && j > 1 && a[i - 1] == b[j - 2] && a[i - 2] == b[j - 1])
                {
                    d[i, j] = Math.Min(d[i, j], d[i - 2, j - 2] + 1);
                }
            }
        }

        return d[a.Length, b.Length];
    }
}
