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

    private readonly List<IDisposable> _held = [];

    /// <summary>The files to read, in the order of their rows.</summary>
    public List<InputFile> Files { get; } = [];

    /// <summary>Finds the files; what cannot be opened becomes a finding.</summary>
    /// <param name="paths">Paths of files.</param>
    /// <param name="findings">Where problems go.</param>
    /// <param name="cancellation">Ends the waiting for what comes through a pipe.</param>
    /// <exception cref="OperationCanceledException">The work was cancelled.</exception>
    public static InputFiles Find(IReadOnlyList<string> paths, FindingList findings, CancellationToken cancellation)
    {
        var namesakes = paths.GroupBy(Path.GetFileName, StringComparer.Ordinal).Where(g => g.Count() > 1).SelectMany(g => g).ToHashSet(StringComparer.Ordinal);
        StoredFile[] files = [.. paths.OrderBy(Path.GetFileName, StringComparer.Ordinal).ThenBy(p => p, StringComparer.Ordinal)
            .Select(path => new StoredFile(path, namesakes.Contains(path) ? path : Path.GetFileName(path)))];
        return Find(files, path => path, findings, cancellation);
    }

    /// <summary>Finds files that people know by another name than they stand under; messages keep to that name.</summary>
    /// <param name="stored">The files, in any order.</param>
    /// <param name="findings">Where problems go.</param>
    /// <param name="cancellation">Ends the waiting for what comes through a pipe.</param>
    public static InputFiles Find(IReadOnlyList<StoredFile> stored, FindingList findings, CancellationToken cancellation)
    {
        var names = stored.ToDictionary(f => f.Path, f => f.Name, StringComparer.Ordinal);
        StoredFile[] files = [.. stored.OrderBy(f => f.Name, StringComparer.Ordinal).ThenBy(f => f.Path, StringComparer.Ordinal)];
        return Find(files, path => names[path], findings, cancellation);
    }

    private static InputFiles Find(StoredFile[] files, Func<string, string> shown, FindingList findings, CancellationToken cancellation)
    {
        var inputs = new InputFiles();
        try
        {
            var before = new HashSet<string>(RealPath.Comparer);
            foreach ((string path, string name) in files)
            {
                if (path.Length == 0)
                {
                    findings.Add(new Finding(Severity.Error, "the name of a sample file", "an empty name", "Name the file; in a script, look for a variable that was not set."));
                    continue;
                }

                if (!before.Add(RealPath.Of(path)))
                {
                    findings.Add(new Finding(Severity.Warning, "every file once", "a file that was already given", "Its rows are counted twice; leave out one of the two.") { File = shown(path) });
                }

                inputs.Add(path, name, shown(path), findings, cancellation);
            }
        }
        catch
        {
            inputs.Dispose();
            throw;
        }

        return inputs;
    }

    /// <inheritdoc/>
    public void Dispose()
    {
        foreach (IDisposable held in Enumerable.Reverse(_held))
        {
            held.Dispose();
        }
    }

    private void Add(string path, string name, string shown, FindingList findings, CancellationToken cancellation)
    {
        try
        {
            if (Directory.Exists(path))
            {
                findings.Add(new Finding(Severity.Error, "a file", "a folder", "Name the files in it.") { File = shown });
                return;
            }

            Func<Stream> open = () => File.OpenRead(path);
            if (Spooled(path, cancellation) is { } spooled)
            {
                _held.Add(spooled);
                open = spooled.Open;
                name = shown;
            }

            if (IsZip(open))
            {
                AddArchive(open, name, findings);
            }
            else
            {
                Files.Add(new InputFile(name, open));
            }
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            findings.Add(UnreadableFile.Of(e, "a file that can be opened", "Check the path and the permissions.", shown));
        }
        catch (InvalidDataException e)
        {
            findings.Add(UnreadableFile.Of(e, "a whole zip file", "Fetch or pack the archive again.", name));
        }
    }

    // A file is read more than once, header first; a pipe gives its bytes only once.
    private static SpooledInput? Spooled(string path, CancellationToken cancellation)
    {
        using FileStream stream = File.OpenRead(path);
        return stream.CanSeek ? null : new SpooledInput(stream, cancellation);
    }

    private static bool IsZip(Func<Stream> open)
    {
        using Stream stream = open();
        Span<byte> magic = stackalloc byte[4];
        return stream.ReadAtLeast(magic, 4, throwOnEndOfStream: false) == 4
            && magic[..2].SequenceEqual("PK"u8)
            && ((magic[2] == 3 && magic[3] == 4) || (magic[2] == 5 && magic[3] == 6));
    }

    // An entry's path as a label: steps that lead nowhere or upwards are no part of it.
    private static string Inside(string path) => string.Join('/', path.Split('/', '\\').Where(step => step is not ("" or "." or "..")));

    private void AddArchive(Func<Stream> open, string name, FindingList findings)
    {
        var archive = new ZipArchive(open(), ZipArchiveMode.Read);
        _held.Add(archive);
        if (archive.Entries.Count > MostEntries)
        {
            findings.Add(new Finding(Severity.Error, $"at most {MostEntries} entries in a zip file", $"{archive.Entries.Count}", "Pack the casts into several archives.") { File = name });
            return;
        }

        long total = 0;
        int passed = 0;
        int tabular = 0;
        var labels = new HashSet<string>(StringComparer.Ordinal);
        foreach (ZipArchiveEntry entry in archive.Entries.Where(e => e.Name.Length > 0).OrderBy(e => e.Name, StringComparer.Ordinal).ThenBy(e => e.FullName, StringComparer.Ordinal))
        {
            if (!entry.Name.EndsWith(".csv", StringComparison.OrdinalIgnoreCase) || entry.Name.StartsWith('.'))
            {
                passed++;
                continue;
            }

            tabular++;
            string label = $"{name}/{Inside(entry.FullName)}";
            if (!labels.Add(label))
            {
                findings.Add(new Finding(Severity.Warning, "every entry of a zip file once", "a second entry of this name", "The rows of both are read; pack the archive again if one is an older copy.") { File = label });
            }

            total += entry.Length;
            if (entry.Length > 1 << 20 && entry.Length / Math.Max(1, entry.CompressedLength) > MostRatio)
            {
                findings.Add(new Finding(
                    Severity.Error,
                    $"entries packed at most {MostRatio} to 1",
                    string.Create(CultureInfo.InvariantCulture, $"an entry of {entry.CompressedLength} bytes that unpacks to {entry.Length}"),
                    "Unpack the archive yourself if you trust it, and name the files.")
                { File = label });
                continue;
            }

            Files.Add(new InputFile(label, () => new BoundedStream(entry.Open(), entry.Length)) { IsZipEntry = true });
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
