using System.Text.Json;
using WaterMix.Core.Samples;

namespace WaterMix.Workspace.Cruises;

/// <summary>What a column file of samples says of its columns beside their values.</summary>
/// <param name="Identity">Ids of the identity columns, in order.</param>
/// <param name="Columns">The quantity columns, in order.</param>
/// <param name="HasBottleFlags">True where there is a column of bottle flags.</param>
/// <param name="Files">The files' rows.</param>
/// <param name="NamesFiles">True where results name the file of each row.</param>
internal sealed record SampleFileHeader(
    IReadOnlyList<string> Identity,
    IReadOnlyList<SampleFileHeader.Column> Columns,
    bool HasBottleFlags,
    IReadOnlyList<FileRows> Files,
    bool NamesFiles)
{
    /// <summary>The name under which a file keeps its header.</summary>
    public const string Kind = "watermix/samples/1";

    /// <summary>The name of the column of bottle flags in the file.</summary>
    public const string BottleFlags = "bottle_flag";

    /// <summary>The header of a table, without its files.</summary>
    public static SampleFileHeader Of(SampleTable table) => new(
        [.. table.Identity.Select(c => c.Id)],
        [.. table.Columns.Select(Column.Of)],
        table.HasBottleFlags,
        [],
        false);

    /// <summary>Reads what <see cref="Write"/> wrote.</summary>
    public static SampleFileHeader Read(string json) => JsonSerializer.Deserialize<SampleFileHeader>(json)!;

    /// <summary>The header as JSON.</summary>
    public string Write() => JsonSerializer.Serialize(this);

    /// <summary>The name of an identity column in the file.</summary>
    public static string IdentityName(string id) => "identity:" + id;

    /// <summary>A quantity column.</summary>
    /// <param name="Quantity">The quantity's id.</param>
    /// <param name="Unit">Its unit.</param>
    /// <param name="Suffix">The column's suffix.</param>
    /// <param name="Source">Where it was read from.</param>
    /// <param name="Conversion">The conversion made.</param>
    /// <param name="Origin">The instrument of all values, where they have no origins of their own.</param>
    /// <param name="HasFlags">True where there is a column of flags.</param>
    /// <param name="IsMerged">True where there is a column of origins.</param>
    internal sealed record Column(string Quantity, string Unit, string Suffix, string Source, string Conversion, ValueOrigin Origin, bool HasFlags, bool IsMerged)
    {
        /// <summary>The name of the values in the file.</summary>
        public string Values => "values:" + Quantity + Suffix;

        /// <summary>The name of the flags in the file.</summary>
        public string Flags => "flags:" + Quantity + Suffix;

        /// <summary>The name of the origins in the file.</summary>
        public string Origins => "origins:" + Quantity + Suffix;

        /// <summary>The header of a column.</summary>
        public static Column Of(SampleColumn column) =>
            new(column.Quantity.Id, column.Quantity.Unit, column.Suffix, column.Source, column.Conversion, column.Origin, column.HasFlags, column.IsMerged);

        /// <summary>The column over arrays that it takes over.</summary>
        public SampleColumn With(double[] values, byte[]? flags, ValueOrigin[]? origins) =>
            new(Core.Quantities.Quantity.Find(Quantity) ?? Core.Quantities.Quantity.Further(Quantity, Unit), values, flags, origins, Origin)
            {
                Suffix = Suffix,
                Source = Source,
                Conversion = Conversion,
            };
    }
}
