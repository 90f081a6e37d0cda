using System.Globalization;
using System.IO.Compression;
using WaterMix.Core;

namespace WaterMix.Formats.Reading;

/// <summary>The files behind the paths that were given: in ordinal name order, zip files unpacked as they are read, within limits.</summary>
internal sealed class InputFiles : IDisposable
{
    /// <summary>An archive with more entries than this is refused.</summary>
    public const int MostEntries = 50_000;

    /// <summary>An archive that unpacks to more bytes than this is refused.</summary>
    public const long MostBytes = 16L << 30;

    /// <summary>Text packs 5 to 30 to 1, padded zeros up to about 100 to 1; beyond this an entry is taken for a bomb.</summary>
    public const int MostRatio = 250;

    private readonly List<ZipArchive> _archives = [];

    /// <summary>The files to read, in the order of their rows.</summary>
    public List<InputFile> Files { get; } = [];

    /// <summary>Finds the files; what cannot be opened becomes a finding.</summary>
    /// <param name="paths">Paths of files.</param>
    /// <param name="findings">Where problems go.</param>
    public static InputFiles Find(IReadOnlyList<string> paths, FindingList findings) =>
        Find([.. paths.Select(path => (path, Path.GetFileName(path), path))], findings);

    /// <summary>Finds files that people know by another name than they stand under.</summary>
    /// <param name="files">The files.</param>
    /// <param name="findings">Where problems go.</param>
    public static InputFiles Find(IReadOnlyList<StoredFile> files, FindingList findings) =>
        Find([.. files.Select(file => (file.Path, file.Name, file.Name))], findings);

    private static InputFiles Find(IReadOnlyList<(string Path, string Name, string Shown)> files, FindingList findings)
    {
        var inputs = new InputFiles();
        foreach ((string path, string name, string shown) in files.OrderBy(f => f.Name, StringComparer.Ordinal).ThenBy(f => f.Path, StringComparer.Ordinal))
        {
            try
            {
                if (Directory.Exists(path))
                {
                    findings.Add(new Finding(Severity.Error, "a file", "a folder", "Name the files in it.") { File = shown });
                }
                else if (IsZip(path))
                {
                    inputs.AddArchive(path, name, findings);
                }
                else
                {
                    inputs.Files.Add(new InputFile(name, () => File.OpenRead(path)));
                }
            }
            catch (Exception e) when (e is IOException or UnauthorizedAccessException)
            {
                findings.Add(new Finding(Severity.Error, "a file that can be opened", e.Message, "Check the path and the permissions.") { File = shown });
            }
            catch (InvalidDataException e)
            {
                findings.Add(new Finding(Severity.Error, "a whole zip file", e.Message, "Fetch or pack the archive again.") { File = name });
            }
        }

        return inputs;
    }

    /// <inheritdoc/>
    public void Dispose()
    {
        foreach (ZipArchive archive in _archives)
        {
            archive.Dispose();
        }
    }

    private static bool IsZip(string path)
    {
        using FileStream stream = File.OpenRead(path);
        Span<byte> magic = stackalloc byte[4];
        return stream.ReadAtLeast(magic, 4, throwOnEndOfStream: false) == 4
            && magic[..2].SequenceEqual("PK"u8)
            && ((magic[2] == 3 && magic[3] == 4) || (magic[2] == 5 && magic[3] == 6));
    }

    private void AddArchive(string path, string name, FindingList findings)
    {
        var archive = new ZipArchive(File.OpenRead(path), ZipArchiveMode.Read);
        _archives.Add(archive);
        if (archive.Entries.Count > MostEntries)
        {
            findings.Add(new Finding(Severity.Error, $"at most {MostEntries} entries in a zip file", $"{archive.Entries.Count}", "Pack the casts into several archives.") { File = name });
            return;
        }

        long total = 0;
        int passed = 0;
        int tabular = 0;
        foreach (ZipArchiveEntry entry in archive.Entries.Where(e => e.Name.Length > 0).OrderBy(e => e.Name, StringComparer.Ordinal).ThenBy(e => e.FullName, StringComparer.Ordinal))
        {
            if (!entry.Name.EndsWith(".csv", StringComparison.OrdinalIgnoreCase) || entry.Name.StartsWith('.'))
            {
                passed++;
                continue;
            }

            tabular++;
            total += entry.Length;
            if (entry.Length > 1 << 20 && entry.Length / Math.Max(1, entry.CompressedLength) > MostRatio)
            {
                findings.Add(new Finding(
                    Severity.Error,
                    $"entries packed at most {MostRatio} to 1",
                    string.Create(CultureInfo.InvariantCulture, $"an entry of {entry.CompressedLength} bytes that unpacks to {entry.Length}"),
                    "Unpack the archive yourself if you trust it, and name the files.")
                { File = $"{name}/{entry.Name}" });
                continue;
            }

            Files.Add(new InputFile($"{name}/{entry.Name}", () => new BoundedStream(entry.Open(), entry.Length)));
        }

        if (total > MostBytes)
        {
            findings.Add(new Finding(Severity.Error, $"at most {MostBytes >> 30} GB in a zip file", $"{total >> 30} GB", "Pack the casts into several archives.") { File = name });
            Files.Clear();
        }
        else if (tabular == 0)
        {
            findings.Add(new Finding(Severity.Error, "sample files (.csv) in the zip file", $"none among {archive.Entries.Count} entries", "Pack the .csv files of the casts.") { File = name });
        }
        else if (passed > 0)
        {
            findings.Add(new Finding(Severity.Note, "only .csv files in the zip file", "other entries", "They were passed over.") { File = name, Count = passed });
        }
    }
}
