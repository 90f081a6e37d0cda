namespace WaterMix.Core.EndMembers;

/// <summary>Equality by content for the collections that records hold; .NET compares those by reference.</summary>
internal static class Structural
{
    /// <summary>True where both hold the same keys with equal values, in any order.</summary>
    public static bool Same<T>(IReadOnlyDictionary<string, T> a, IReadOnlyDictionary<string, T> b)
    {
        return a.Count == b.Count
            && a.All(pair => b.TryGetValue(pair.Key, out T? other) && EqualityComparer<T>.Default.Equals(pair.Value, other));
    }

    /// <summary>True where both are absent, or hold equal items in the same order.</summary>
    public static bool Same<T>(IReadOnlyList<T>? a, IReadOnlyList<T>? b) =>
        a is null || b is null ? a is null && b is null : a.SequenceEqual(b);

    /// <summary>A hash code over keys and values, whatever their order.</summary>
    public static int Hash<T>(IReadOnlyDictionary<string, T> items) =>
        items.Aggregate(items.Count, (hash, pair) => hash ^ HashCode.Combine(pair.Key, pair.Value));

    /// <summary>A hash code over items in their order.</summary>
    public static int Hash<T>(IReadOnlyList<T>? items)
    {
        var hash = new HashCode();
        foreach (T item in items ?? [])
        {
            hash.Add(item);
        }

        return hash.ToHashCode();
    }
}
