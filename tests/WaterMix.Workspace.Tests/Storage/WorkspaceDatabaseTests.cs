using Microsoft.EntityFrameworkCore;
using WaterMix.Workspace.Storage;

namespace WaterMix.Workspace.Tests.Storage;

public class WorkspaceDatabaseTests
{
    [Fact]
    public void Migrations_MatchTheModel()
    {
        using WorkspaceDbContext context = new WorkspaceDbContextFactory().CreateDbContext([]);

        Assert.False(context.Database.HasPendingModelChanges(), "The tables changed: add a migration (see WorkspaceDbContextFactory).");
    }

    [Fact]
    public void Open_NewFolder_MakesTheTablesAndWritesAhead()
    {
        using var scratch = new Scratch();
        using DataFolder folder = DataFolder.Open(scratch.Folder);
        using var database = new WorkspaceDatabase(folder);
        using WorkspaceDbContext context = database.Open();

        Assert.Empty(context.Database.GetPendingMigrations());
        Assert.Equal("wal", context.Database.SqlQuery<string>($"PRAGMA journal_mode").AsEnumerable().Single());
    }

    [Fact]
    public void Open_MadeByANewerVersion_IsRefused()
    {
        using var scratch = new Scratch();
        using DataFolder folder = DataFolder.Open(scratch.Folder);
        using (var database = new WorkspaceDatabase(folder))
        using (WorkspaceDbContext context = database.Open())
        {
            context.Database.ExecuteSqlRaw("INSERT INTO \"__EFMigrationsHistory\" VALUES ('29990101000000_Later', '10.0.0')");
        }

        InvalidOperationException refusal = Assert.Throws<InvalidOperationException>(() => new WorkspaceDatabase(folder));

        Assert.Contains("newer WaterMix", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Write_Failing_ChangesNothing()
    {
        using var scratch = new Scratch();
        using DataFolder folder = DataFolder.Open(scratch.Folder);
        using var database = new WorkspaceDatabase(folder);

        await Assert.ThrowsAsync<InvalidOperationException>(() => database.WriteAsync<int>(async context =>
        {
            context.Studies.Add(new StudyRow { Name = "a", Draft = "{}" });
            await context.SaveChangesAsync(TestContext.Current.CancellationToken);
            throw new InvalidOperationException();
        }));

        Assert.Equal(0, await database.ReadAsync(context => context.Studies.CountAsync(TestContext.Current.CancellationToken)));
    }

    [Fact]
    public async Task Times_WithAnOffset_ComeBackAsTheSameInstant()
    {
        using var scratch = new Scratch();
        using DataFolder folder = DataFolder.Open(scratch.Folder);
        using var database = new WorkspaceDatabase(folder);
        var time = new DateTimeOffset(2026, 3, 1, 12, 30, 15, 123, TimeSpan.FromHours(5.5));

        await database.WriteAsync(context => Task.FromResult(context.Studies.Add(new StudyRow { Name = "a", Draft = "{}", Created = time })));

        Assert.Equal(time, await database.ReadAsync(context => context.Studies.Select(s => s.Created).SingleAsync(TestContext.Current.CancellationToken)));
    }
}
