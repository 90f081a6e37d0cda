using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.Hosting;
using Microsoft.Extensions.Logging;

namespace WaterMix.Workspace.Storage;

/// <summary>Once a day, and at the start: what was deleted long ago goes for good, and files that nothing refers to any more.</summary>
internal sealed partial class Housekeeping(DataFolder folder, WorkspaceDatabase database, WorkspaceOptions options, TimeProvider clock, ILogger<Housekeeping> log)
    : BackgroundService
{
    // A file is written before the row that names it, so a young one may only seem to be nobody's.
    private static readonly TimeSpan Young = TimeSpan.FromDays(1);

    /// <summary>Clears once.</summary>
    public async Task ClearAsync()
    {
        DateTimeOffset now = clock.GetUtcNow();
        Guid[] unused = await database.WriteAsync(async context =>
        {
            DateTimeOffset deletedBefore = now - options.KeepDeleted;
            await context.Studies.Where(s => s.Deleted != null && s.Deleted < deletedBefore).ExecuteDeleteAsync();
            await context.Cruises.Where(c => c.Removed != null && c.Removed < deletedBefore).ExecuteDeleteAsync();
            DateTimeOffset receivedBefore = now - options.KeepUnusedUploads;
            Guid[] uploads = await context.UploadFiles
                .GroupBy(f => f.UploadId)
                .Where(g => g.Max(f => f.Received) < receivedBefore && !context.Cruises.Any(c => c.Upload == g.Key))
                .Select(g => g.Key)
                .ToArrayAsync();
            await context.UploadFiles.Where(f => uploads.Contains(f.UploadId)).ExecuteDeleteAsync();
            return uploads;
        });
        if (unused.Length > 0)
        {
            UploadsCleared(unused.Length);
        }

        await using WorkspaceDbContext tables = database.Open();
        HashSet<string> samples =
        [
            .. await tables.Cruises.Select(c => c.SamplesHash).ToListAsync(),
            .. await tables.Cruises.Where(c => c.OtherSamplesHash != null).Select(c => c.OtherSamplesHash!).ToListAsync(),
            .. await tables.RunCruises.Select(c => c.SamplesHash).ToListAsync(),
        ];
        HashSet<string> runs = [.. (await tables.Runs.Select(r => r.Folder).ToListAsync()).Select(id => id.ToString("N"))];
        HashSet<string> uploadsInUse = [.. (await tables.UploadFiles.Select(f => f.UploadId).Distinct().ToListAsync()).Select(id => id.ToString("N"))];
        Clear(new DirectoryInfo(folder.Samples).EnumerateFiles(), file => samples.Contains(Path.GetFileNameWithoutExtension(file.Name)), now);
        Clear(new DirectoryInfo(folder.Runs).EnumerateDirectories(), run => runs.Contains(run.Name), now);
        Clear(new DirectoryInfo(folder.Uploads).EnumerateDirectories(), upload => uploadsInUse.Contains(upload.Name), now);
    }

    /// <inheritdoc/>
    protected override async Task ExecuteAsync(CancellationToken stoppingToken)
    {
        using var daily = new PeriodicTimer(TimeSpan.FromDays(1), clock);
        do
        {
            try
            {
                await ClearAsync();
            }
            catch (Exception fault) when (fault is IOException or UnauthorizedAccessException or DbUpdateException)
            {
                ClearingFailed(fault);
            }
        }
        while (await daily.WaitForNextTickAsync(stoppingToken));
    }

    private static void Clear<T>(IEnumerable<T> entries, Func<T, bool> isUsed, DateTimeOffset now)
        where T : FileSystemInfo
    {
        foreach (T entry in entries.Where(e => !isUsed(e) && e.LastWriteTimeUtc < now - Young).ToList())
        {
            if (entry is DirectoryInfo directory)
            {
                directory.Delete(recursive: true);
            }
            else
            {
                entry.Delete();
            }
        }
    }

    [LoggerMessage(Level = LogLevel.Information, Message = "{Count} uploads that no cruise was read from were cleared.")]
    private partial void UploadsCleared(int count);

    [LoggerMessage(Level = LogLevel.Warning, Message = "Clearing the data folder failed; it is tried again tomorrow.")]
    private partial void ClearingFailed(Exception fault);
}
