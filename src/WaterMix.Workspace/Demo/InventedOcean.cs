namespace WaterMix.Workspace.Demo;

/// <summary>The files of <c>sample-data</c>, carried in the program: an invented cruise, its sources, its models, its coast.</summary>
public static class InventedOcean
{
    private const string Prefix = "sample-data/";

    /// <summary>The files' names, with <c>/</c> between parts, in ordinal order.</summary>
    public static IReadOnlyList<string> Names { get; } =
        [.. typeof(InventedOcean).Assembly.GetManifestResourceNames().Where(n => n.StartsWith(Prefix, StringComparison.Ordinal)).Select(n => n[Prefix.Length..].Replace('\\', '/')).Order(StringComparer.Ordinal)];

    /// <summary>Opens one file; the caller disposes the stream.</summary>
    /// <param name="name">One of <see cref="Names"/>.</param>
    /// <exception cref="ArgumentException">There is no such file.</exception>
    public static Stream Open(string name) =>
        typeof(InventedOcean).Assembly.GetManifestResourceStream(Prefix + name)
        ?? throw new ArgumentException($"Expected one of {string.Join(", ", Names)}; found {name}.", nameof(name));

    /// <summary>The bytes of one file.</summary>
    /// <param name="name">One of <see cref="Names"/>.</param>
    /// <exception cref="ArgumentException">There is no such file.</exception>
    public static byte[] Read(string name)
    {
        using Stream stream = Open(name);
        using var bytes = new MemoryStream();
        stream.CopyTo(bytes);
        return bytes.ToArray();
    }
}
