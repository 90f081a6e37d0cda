namespace WaterMix.Formats.Matching;

/// <summary>The nearest known name to one that is not known.</summary>
internal static class Spelling
{
    /// <summary>A known name at most one letter in four away (insertions, deletions, exchanges, neighbours swapped), or null. A suggestion, never a guess.</summary>
    /// <param name="name">The name as written, lower case.</param>
    /// <param name="known">The names that are known.</param>
    public static string? Nearest(string name, IEnumerable<string> known)
    {
        if (name.Length < 4)
        {
            return null;
        }

        string? nearest = null;
        int least = Math.Min(2, name.Length / 4) + 1;
        foreach (string candidate in known)
        {
            if (candidate.Length >= 4 && Math.Abs(candidate.Length - name.Length) < least)
            {
                int distance = Distance(name, candidate);
                if (distance < least && distance > 0)
                {
                    (nearest, least) = (candidate, distance);
                }
            }
        }

        return nearest;
    }

    private static int Distance(string a, string b)
    {
        int[] before = new int[b.Length + 1];
        int[] previous = [.. Enumerable.Range(0, b.Length + 1)];
        for (int i = 1; i <= a.Length; i++)
        {
            int[] current = new int[b.Length + 1];
            current[0] = i;
            for (int j = 1; j <= b.Length; j++)
            {
                int exchange = previous[j - 1] + (a[i - 1] == b[j - 1] ? 0 : 1);
                current[j] = Math.Min(exchange, Math.Min(previous[j], current[j - 1]) + 1);
                if (i > 1 && j > 1 && a[i - 1] == b[j - 2] && a[i - 2] == b[j - 1])
                {
                    current[j] = Math.Min(current[j], before[j - 2] + 1);
                }
            }

            (before, previous) = (previous, current);
        }

        return previous[b.Length];
    }
}
