namespace WaterMix.Core;

/// <summary>Places in a JSON document, <c>Rfc6901</c>: what <see cref="Finding.Path"/> holds.</summary>
public static class JsonPointer
{
    /// <summary>The pointer of a child: the parent's pointer, a slash, and the token with <c>~</c> as <c>~0</c> and <c>/</c> as <c>~1</c>.</summary>
    /// <param name="parent">The parent's pointer; empty for the whole document.</param>
    /// <param name="token">A key of the parent, or an index from 0 as text.</param>
    public static string Append(string parent, string token)
    {
        ArgumentNullException.ThrowIfNull(token);
        return parent + "/" + token.Replace("~", "~0", StringComparison.Ordinal).Replace("/", "~1", StringComparison.Ordinal);
    }

    /// <summary>The pointer of an item of a list.</summary>
    /// <param name="parent">The list's pointer.</param>
    /// <param name="index">The item's index, from 0.</param>
    public static string Append(string parent, int index) =>
        string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{parent}/{index}");

    /// <summary>True where <paramref name="path"/> is <paramref name="outer"/> or lies within it.</summary>
    /// <param name="path">A pointer.</param>
    /// <param name="outer">The pointer of a possible parent.</param>
    public static bool IsWithin(string path, string outer)
    {
        ArgumentNullException.ThrowIfNull(path);
        ArgumentNullException.ThrowIfNull(outer);
        return path.StartsWith(outer, StringComparison.Ordinal) && (path.Length == outer.Length || path[outer.Length] == '/');
    }
}
