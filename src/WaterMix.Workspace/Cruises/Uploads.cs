using System.Buffers;
using System.Globalization;
using Microsoft.EntityFrameworkCore;
using WaterMix.Formats.Matching;
using WaterMix.Formats.Reading;
using WaterMix.Workspace.Storage;

namespace WaterMix.Workspace.Cruises;

/// <summary>Uploaded files, kept as they came: a folder for each upload, its files under their numbers.</summary>
internal sealed class Uploads(DataFolder folder, WorkspaceDatabase database, WorkspaceOptions options, TimeProvider clock)
{
    /// <summary>Takes one file; see <see cref="ICruises.ReceiveAsync"/>.</summary>
    public async Task ReceiveAsync(Guid upload, string fileName, Stream content, CancellationToken cancellation)
    {
        ArgumentNullException.ThrowIfNull(content);
        string name = UploadName.Harmless(fileName);
        List<UploadFileRow> before = await FilesAsync(upload);
        RefuseMoreFiles(before.Count);
        await using NewFile file = NewFile.In(FolderOf(upload));
        await CopyAsync(content, file.Stream, options.MostUploadBytes - before.Sum(f => f.Bytes), name, cancellation);
        long bytes = file.Stream.Length;
        await file.CloseAsync();
        await database.WriteAsync(async context =>
        {
            // Several files of one upload may arrive at once: only here is it known how many there are.
            List<UploadFileRow> others = await context.UploadFiles.AsNoTracking().Where(f => f.UploadId == upload).ToListAsync(CancellationToken.None);
            RefuseMoreFiles(others.Count);
            RefuseMoreBytes(others.Sum(f => f.Bytes) + bytes, name);
            var row = new UploadFileRow
            {
                UploadId = upload,
                Number = others.Count == 0 ? 1 : others.Max(f => f.Number) + 1,
                Name = UploadName.Distinct(name, [.. others.Select(f => f.Name)]),
                Bytes = bytes,
                Received = clock.GetUtcNow(),
            };
            context.UploadFiles.Add(row);
            File.Move(file.Path, PathOf(row), overwrite: true);
            return row.Number;
        });
    }

    /// <summary>Opens an upload's files for reading.</summary>
    /// <exception cref="ArgumentException">There is no such upload.</exception>
    public async Task<OpenedSamples> OpenAsync(Guid upload, ReadingOptions reading)
    {
        List<UploadFileRow> files = await FilesAsync(upload);
        if (files.Count == 0)
        {
            throw new ArgumentException("Expected an upload with at least one file; this one has none, or was cleared away. Upload the files again.", nameof(upload));
        }

        // A guess that a person looked at, corrected or not, counts as said.
        ColumnMatchFile? said = reading.Match is null ? null : reading.Match with { Columns = [.. reading.Match.Columns.Select(c => c with { By = MatchedBy.MatchFile })] };
        return SampleReader.OpenStored([.. files.Select(f => new StoredFile(PathOf(f), f.Name))], reading with { Match = said });
    }

    /// <summary>The folder of an upload's files.</summary>
    public string FolderOf(Guid upload) => Path.Combine(folder.Uploads, upload.ToString("N"));

    private Task<List<UploadFileRow>> FilesAsync(Guid upload) => database.ReadAsync(context =>
        context.UploadFiles.AsNoTracking().Where(f => f.UploadId == upload).OrderBy(f => f.Number).ToListAsync());

    private string PathOf(UploadFileRow file) => Path.Combine(FolderOf(file.UploadId), file.Number.ToString("D5", CultureInfo.InvariantCulture));

    private async Task CopyAsync(Stream from, Stream to, long most, string name, CancellationToken cancellation)
    {
        byte[] buffer = ArrayPool<byte>.Shared.Rent(1 << 17);
        try
        {
            long total = 0;
            int read;
            while ((read = await from.ReadAsync(buffer, cancellation)) > 0)
            {
                total += read;
                if (total > most)
                {
                    RefuseMoreBytes(options.MostUploadBytes + 1, name);
                }

                await to.WriteAsync(buffer.AsMemory(0, read), cancellation);
            }
        }
        finally
        {
            ArrayPool<byte>.Shared.Return(buffer);
        }
    }

    private void RefuseMoreFiles(int present)
    {
        if (present >= options.MostUploadFiles)
        {
            throw new ArgumentException(string.Create(CultureInfo.InvariantCulture, $"Expected at most {options.MostUploadFiles} files in one upload; found more. Pack the casts into a zip file, or upload them as several cruises."));
        }
    }

    private void RefuseMoreBytes(long bytes, string name)
    {
        if (bytes > options.MostUploadBytes)
        {
            throw new ArgumentException(string.Create(CultureInfo.InvariantCulture, $"Expected at most {Size(options.MostUploadBytes)} in one upload; with {name} there are more. Upload fewer files at a time, or as several cruises."));
        }
    }

    private static string Size(long bytes) => bytes >= 1 << 20
        ? string.Create(CultureInfo.InvariantCulture, $"{bytes / (double)(1 << 20):0.#} MB")
        : string.Create(CultureInfo.InvariantCulture, $"{bytes} bytes");
}
