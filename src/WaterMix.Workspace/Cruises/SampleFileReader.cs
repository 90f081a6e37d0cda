using WaterMix.Core.Samples;
using WaterMix.Workspace.Storage.Columns;

namespace WaterMix.Workspace.Cruises;

/// <summary>Reads samples that <see cref="SampleFileWriter"/> wrote: the same values, flags, origins and names, bit for bit.</summary>
internal static class SampleFileReader
{
    /// <summary>Reads a file whole.</summary>
    /// <param name="path">The file.</param>
    /// <exception cref="InvalidDataException">It is missing or damaged.</exception>
    public static async Task<KeptSamples> ReadAsync(string path)
    {
        await using ColumnFileReader file = await ColumnFileReader.OpenAsync(path, "The samples of a cruise");
        SampleFileHeader header = SampleFileHeader.Read(file.Description(SampleFileHeader.Kind));
        var identity = new List<IdentityColumn>(header.Identity.Count);
        string?[] names = header.Identity.Count == 0 ? [] : new string?[file.RowCount];
        foreach (string id in header.Identity)
        {
            await file.FillAsync(SampleFileHeader.IdentityName(id), names.AsMemory());
            identity.Add(Coded(id, names));
        }

        byte[]? bottleFlags = header.HasBottleFlags ? await file.NumbersAsync<byte>(SampleFileHeader.BottleFlags) : null;
        var columns = new List<SampleColumn>(header.Columns.Count);
        foreach (SampleFileHeader.Column column in header.Columns)
        {
            double[] values = await file.NumbersAsync<double>(column.Values);
            byte[]? flags = column.HasFlags ? await file.NumbersAsync<byte>(column.Flags) : null;
            ValueOrigin[]? origins = column.IsMerged ? Array.ConvertAll(await file.NumbersAsync<byte>(column.Origins), o => (ValueOrigin)o) : null;
            columns.Add(column.With(values, flags, origins));
        }

        return new KeptSamples(new SampleTable(file.RowCount, identity, columns, bottleFlags), header.Files, header.NamesFiles);
    }

    private static IdentityColumn Coded(string id, string?[] names)
    {
        var codes = new int[names.Length];
        var distinct = new List<string>();
        var codeOf = new Dictionary<string, int>(StringComparer.Ordinal);
        for (int i = 0; i < names.Length; i++)
        {
            if (names[i] is not { } name)
            {
                codes[i] = -1;
            }
            else if (i > 0 && name == names[i - 1])
            {
                codes[i] = codes[i - 1];
            }
            else if (!codeOf.TryGetValue(name, out codes[i]))
            {
                codes[i] = distinct.Count;
                codeOf.Add(name, codes[i]);
                distinct.Add(name);
            }
        }

        return new IdentityColumn(id, codes, [.. distinct]);
    }
}
