namespace WaterMix.Core.Samples;

/// <summary>A column of names (cruise, station, cast, ...), kept as codes into the distinct names, so that a million rows need no million strings.</summary>
public sealed class IdentityColumn
{
    private readonly int[] _codes;
    private readonly string[] _names;

    /// <summary>A column over arrays that it takes over.</summary>
    /// <param name="id">The column's id in files, one of <see cref="Ids"/>, or <c>file</c>.</param>
    /// <param name="codes">Length n: for each sample an index into <paramref name="names"/>, or -1 where the file gives nothing.</param>
    /// <param name="names">The distinct names.</param>
    public IdentityColumn(string id, int[] codes, string[] names)
    {
        Id = id;
        _codes = codes;
        _names = names;
    }

    /// <summary>The identity columns of the tidy table, in their order.</summary>
    public static IReadOnlyList<string> Ids { get; } = ["expocode", "section", "station", "cast", "sample", "time"];

    /// <summary>The column's id in files.</summary>
    public string Id { get; }

    /// <summary>Number of samples.</summary>
    public int Length => _codes.Length;

    /// <summary>The name for one sample, as text; empty where the file gives nothing.</summary>
    /// <param name="row">Index of the sample, from 0.</param>
    public string this[int row] => _codes[row] < 0 ? "" : _names[_codes[row]];
}
