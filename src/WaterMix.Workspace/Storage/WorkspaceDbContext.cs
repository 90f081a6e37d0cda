using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Storage.ValueConversion;

namespace WaterMix.Workspace.Storage;

/// <summary>The tables: metadata only. Samples and results are column files that these rows name.</summary>
internal sealed class WorkspaceDbContext(DbContextOptions<WorkspaceDbContext> options) : DbContext(options)
{
    public DbSet<StudyRow> Studies => Set<StudyRow>();

    public DbSet<CruiseRow> Cruises => Set<CruiseRow>();

    public DbSet<RunRow> Runs => Set<RunRow>();

    public DbSet<RunCruiseRow> RunCruises => Set<RunCruiseRow>();

    public DbSet<ChunkRow> Chunks => Set<ChunkRow>();

    public DbSet<UploadFileRow> UploadFiles => Set<UploadFileRow>();

    protected override void ConfigureConventions(ModelConfigurationBuilder configurationBuilder) =>
        configurationBuilder.Properties<DateTimeOffset>().HaveConversion<UtcConverter>();

    protected override void OnModelCreating(ModelBuilder modelBuilder)
    {
        modelBuilder.Entity<StudyRow>().ToTable("studies");
        modelBuilder.Entity<StudyRow>().Property(s => s.Name).HasMaxLength(200);
        modelBuilder.Entity<StudyRow>().HasMany(s => s.Cruises).WithOne().HasForeignKey(c => c.StudyId);
        modelBuilder.Entity<StudyRow>().HasMany(s => s.Runs).WithOne().HasForeignKey(r => r.StudyId);

        modelBuilder.Entity<CruiseRow>().ToTable("cruises");
        modelBuilder.Entity<CruiseRow>().Property(c => c.Name).HasMaxLength(200);

        modelBuilder.Entity<RunRow>().ToTable("runs");
        modelBuilder.Entity<RunRow>().Property(r => r.Name).HasMaxLength(200);
        modelBuilder.Entity<RunRow>().Property(r => r.State).HasConversion<string>().HasMaxLength(20);
        modelBuilder.Entity<RunRow>().HasIndex(r => r.State);
        modelBuilder.Entity<RunRow>().HasMany(r => r.Cruises).WithOne().HasForeignKey(c => c.RunId);
        modelBuilder.Entity<RunRow>().HasMany(r => r.Chunks).WithOne().HasForeignKey(c => c.RunId);

        modelBuilder.Entity<RunCruiseRow>().ToTable("run_cruises").HasKey(c => new { c.RunId, c.Position });
        modelBuilder.Entity<ChunkRow>().ToTable("chunks").HasKey(c => new { c.RunId, c.Number });
        modelBuilder.Entity<UploadFileRow>().ToTable("upload_files").HasKey(f => new { f.UploadId, f.Number });
    }

    // SQLite has no type with an offset: times are kept as UTC, which sorts as text.
    private sealed class UtcConverter() : ValueConverter<DateTimeOffset, DateTime>(
        time => time.UtcDateTime,
        time => new DateTimeOffset(DateTime.SpecifyKind(time, DateTimeKind.Utc)));
}
