using System.Security.Cryptography;
using System.Text.RegularExpressions;
using WaterMix.Core.Samples;
using WaterMix.Formats.Reading;
using WaterMix.Workspace.Storage;

namespace WaterMix.Workspace.Cruises;

/// <summary>The samples of all cruises, each kept once under the hash of its samples, and one cache of them for everybody.</summary>
internal sealed partial class SampleStore(DataFolder folder, ByteCache cache)
{
    /// <summary>The samples under a key.</summary>
    /// <param name="key">A cruise's <see cref="Cruise.SamplesHash"/>.</param>
    /// <exception cref="ArgumentException">It is no such key.</exception>
    /// <exception cref="InvalidDataException">The file is missing or damaged.</exception>
    public Task<KeptSamples> FindAsync(string key) =>
        cache.GetAsync("samples " + key, () => SampleFileReader.ReadAsync(PathOf(key)), samples => Bytes(samples.Table));

    /// <summary>Reads opened files to their end and keeps the samples, unless the files turn out not to be usable.</summary>
    /// <param name="opened">The files.</param>
    /// <param name="progress">Told the number of samples after each block, or null.</param>
    /// <param name="cancellation">Stops it; nothing is kept.</param>
    /// <returns>The key and the number of samples; the key is null where nothing was kept.</returns>
    public async Task<(string? Key, long Count)> KeepAsync(OpenedSamples opened, IProgress<long>? progress, CancellationToken cancellation)
    {
        if (opened.HasErrors)
        {
            // Nothing will be kept; the reading goes on for the sake of the report.
            return (null, opened.ReadBlocks(cancellation).Sum(b => (long)b.Table.RowCount));
        }

        await using NewFile file = NewFile.In(folder.Samples);
        await using SampleFileWriter writer = await SampleFileWriter.CreateAsync(file.Stream, opened.Schema);
        foreach (SampleBlock block in opened.ReadBlocks(cancellation))
        {
            await writer.AddAsync(block);
            progress?.Report(writer.RowCount);
        }

        if (opened.HasErrors || writer.RowCount == 0)
        {
            return (null, writer.RowCount);
        }

        string hash = await writer.FinishAsync(opened.NamesFiles);
        await file.CloseAsync();
        return (await PlaceAsync(file, hash), writer.RowCount);
    }

    /// <summary>The key's file.</summary>
    public string PathOf(string key) =>
        KeyPattern().IsMatch(key) ? Path.Combine(folder.Samples, key + ".parquet") : throw new ArgumentException("Expected the hash of a cruise's samples, 64 hexadecimal digits.", nameof(key));

    // The hash covers values and flags. Samples that differ only in names, origins or files get a key of their own.
    private async Task<string> PlaceAsync(NewFile file, string hash)
    {
        string own = await HashOfFileAsync(file.Path);
        if (File.Exists(PathOf(hash)) && own != await HashOfFileAsync(PathOf(hash)))
        {
            hash = $"{hash}-{own[..16]}";
        }

        // Over the same bytes where they are there already: the file is then young, and is not cleared away before a row names it.
        File.Move(file.Path, PathOf(hash), overwrite: true);
        return hash;
    }

    private static async Task<string> HashOfFileAsync(string path)
    {
        await using FileStream stream = File.OpenRead(path);
        return Convert.ToHexStringLower(await SHA256.HashDataAsync(stream));
    }

    private static long Bytes(SampleTable table) =>
        (long)table.RowCount * ((4 * table.Identity.Count) + 1 + table.Columns.Sum(c => 8 + (c.HasFlags ? 1 : 0) + (c.IsMerged ? 1 : 0)));

    [GeneratedRegex(@"\A[0-9a-f]{64}(-[0-9a-f]{16})?\z")]
    private static partial Regex KeyPattern();
}
