using Microsoft.Data.Sqlite;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Storage;

namespace WaterMix.Workspace.Storage;

/// <summary>The database of the data folder, brought up to date when it is opened. Any number read; one at a time writes.</summary>
internal sealed class WorkspaceDatabase : IDisposable
{
    private readonly DbContextOptions<WorkspaceDbContext> _options;
    private readonly SemaphoreSlim _writing = new(1);

    /// <summary>Opens the database and applies the migrations that it lacks.</summary>
    /// <param name="folder">The data folder.</param>
    /// <exception cref="InvalidOperationException">A newer WaterMix made it.</exception>
    public WorkspaceDatabase(DataFolder folder)
    {
        string connection = new SqliteConnectionStringBuilder { DataSource = folder.Database }.ToString();
        _options = new DbContextOptionsBuilder<WorkspaceDbContext>().UseSqlite(connection).Options;
        using WorkspaceDbContext context = Open();
        string[] unknown = File.Exists(folder.Database) ? [.. context.Database.GetAppliedMigrations().Except(context.Database.GetMigrations())] : [];
        if (unknown.Length > 0)
        {
            throw new InvalidOperationException($"The data folder {folder.Root} was made by a newer WaterMix ({unknown[0]}). Run that version, or set WATERMIX_DATA to another folder.");
        }

        context.Database.Migrate();
        context.Database.ExecuteSqlRaw("PRAGMA journal_mode = WAL;");
    }

    /// <summary>A context of one's own; the caller disposes it.</summary>
    public WorkspaceDbContext Open() => new(_options);

    /// <summary>Reads.</summary>
    public async Task<T> ReadAsync<T>(Func<WorkspaceDbContext, Task<T>> read)
    {
        await using WorkspaceDbContext context = Open();
        return await read(context);
    }

    /// <summary>Writes, all of it or nothing; what was changed in the context is saved at the end.</summary>
    public async Task<T> WriteAsync<T>(Func<WorkspaceDbContext, Task<T>> write)
    {
        await _writing.WaitAsync();
        try
        {
            await using WorkspaceDbContext context = Open();
            await using IDbContextTransaction transaction = await context.Database.BeginTransactionAsync();
            T result = await write(context);
            await context.SaveChangesAsync();
            await transaction.CommitAsync();
            return result;
        }
        finally
        {
            _writing.Release();
        }
    }

    /// <summary>Closes every connection, so that the folder can be given back.</summary>
    public void Dispose()
    {
        using WorkspaceDbContext context = Open();
        SqliteConnection.ClearPool((SqliteConnection)context.Database.GetDbConnection());
        _writing.Dispose();
    }
}
