using Microsoft.EntityFrameworkCore;
using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;
using WaterMix.Workspace.Runs;
using WaterMix.Workspace.Storage;

namespace WaterMix.Workspace.Studies;

/// <summary>The studies of the data folder.</summary>
internal sealed class StudyService(WorkspaceDatabase database, WorkspaceEvents events, TimeProvider clock) : IStudies
{
    /// <inheritdoc/>
    public event Action<Guid>? Changed
    {
        add => events.StudyChanged += value;
        remove => events.StudyChanged -= value;
    }

    /// <inheritdoc/>
    public async Task<IReadOnlyList<StudySummary>> ListAsync(string? search = null)
    {
        List<StudySummary> all = await database.ReadAsync(context => context.Studies.AsNoTracking()
            .Where(s => s.Deleted == null)
            .OrderByDescending(s => s.LastChange)
            .ThenBy(s => s.Id)
            .Select(s => new StudySummary(
                s.Id,
                s.Name,
                s.Created,
                s.LastChange,
                s.Cruises.Count(c => c.Removed == null),
                s.Cruises.Where(c => c.Removed == null).Sum(c => c.SampleCount),
                s.Runs.Count))
            .ToListAsync());

        // Not in the database: SQLite ignores the case of A to Z only.
        string wanted = (search ?? "").Trim();
        return wanted.Length == 0 ? all : [.. all.Where(s => s.Name.Contains(wanted, StringComparison.InvariantCultureIgnoreCase))];
    }

    /// <inheritdoc/>
    public async Task<Study?> FindAsync(Guid id)
    {
        StudyRow? row = await database.ReadAsync(context => context.Studies.AsNoTracking().AsSplitQuery()
            .Include(s => s.Cruises.Where(c => c.Removed == null))
            .Include(s => s.Runs)
            .FirstOrDefaultAsync(s => s.Id == id && s.Deleted == null));
        return row is null ? null : new Study(
            row.Id,
            row.Name,
            StoredJson.Model(row.Draft),
            row.Revision,
            [.. row.Cruises.OrderBy(c => c.Position).Select(StoredJson.Cruise)],
            [.. row.Runs.OrderByDescending(r => r.Started).Select(StoredJson.Run)]);
    }

    /// <inheritdoc/>
    public async Task<Guid> CreateAsync(string name)
    {
        string kept = EntityName.Checked(name, "a study");
        var draft = new MixingModel(kept, new EndMemberSet(kept, 1, []), [], new GeneralisedLeastSquares(), MassConservation.Exact);
        Guid id = await database.WriteAsync(context => Task.FromResult(Add(context, kept, StoredJson.Of(draft)).Id));
        events.Change(id);
        return id;
    }

    /// <inheritdoc/>
    public Task RenameAsync(Guid id, string name)
    {
        string kept = EntityName.Checked(name, "a study");
        return ChangeAsync(id, row => row.Name = kept);
    }

    /// <inheritdoc/>
    public async Task<Guid> DuplicateAsync(Guid id, string name)
    {
        string kept = EntityName.Checked(name, "a study");
        Guid copy = await database.WriteAsync(async context =>
        {
            StudyRow original = await context.Studies.AsNoTracking().AsSplitQuery()
                .Include(s => s.Cruises.Where(c => c.Removed == null))
                .Include(s => s.Runs).ThenInclude(r => r.Cruises)
                .LivingAsync(id);
            StudyRow row = Add(context, kept, original.Draft);
            Dictionary<Guid, Guid> newIds = original.Cruises.ToDictionary(c => c.Id, _ => Guid.NewGuid());
            row.Cruises = [.. original.Cruises.Select(c => CopyOf(c, newIds[c.Id]))];

            // A run at work belongs to its study; what has ended can be shown in both.
            row.Runs = [.. original.Runs.Where(r => r.State is not (RunState.Waiting or RunState.Running)).Select(r => CopyOf(r, newIds))];
            return row.Id;
        });
        events.Change(copy);
        return copy;
    }

    /// <inheritdoc/>
    public Task DeleteAsync(Guid id) => ChangeAsync(id, row => row.Deleted ??= clock.GetUtcNow());

    /// <inheritdoc/>
    public Task RestoreAsync(Guid id) => ChangeAsync(id, row => row.Deleted = null);

    /// <inheritdoc/>
    public async Task<long?> SaveDraftAsync(Guid id, MixingModel draft, long expectedRevision)
    {
        ArgumentNullException.ThrowIfNull(draft);
        string json = StoredJson.Of(draft);
        long? revision = await database.WriteAsync(async context =>
        {
            StudyRow row = await context.Studies.LivingAsync(id);
            if (row.Revision != expectedRevision)
            {
                return (long?)null;
            }

            row.Draft = json;
            row.LastChange = clock.GetUtcNow();
            return ++row.Revision;
        });
        if (revision is not null)
        {
            events.Change(id);
        }

        return revision;
    }

    private StudyRow Add(WorkspaceDbContext context, string name, string draft)
    {
        DateTimeOffset now = clock.GetUtcNow();
        var row = new StudyRow { Id = Guid.NewGuid(), Name = name, Created = now, LastChange = now, Draft = draft };
        context.Studies.Add(row);
        return row;
    }

    private static CruiseRow CopyOf(CruiseRow cruise, Guid id) => new()
    {
        Id = id,
        Position = cruise.Position,
        Name = cruise.Name,
        SamplesHash = cruise.SamplesHash,
        SampleCount = cruise.SampleCount,
        Upload = cruise.Upload,
        Report = cruise.Report,
        Reading = cruise.Reading,
        MeasurementSd = cruise.MeasurementSd,
    };

    private static RunRow CopyOf(RunRow run, Dictionary<Guid, Guid> newIds) => new()
    {
        Id = Guid.NewGuid(),
        Name = run.Name,
        Started = run.Started,
        State = run.State,
        Done = run.Done,
        Total = run.Total,
        Model = run.Model,
        ModelHash = run.ModelHash,
        Statuses = run.Statuses,
        Problem = run.Problem,
        Folder = run.Folder,
        Cruises = [.. run.Cruises.Select(c => new RunCruiseRow
        {
            Position = c.Position,
            CruiseId = newIds.GetValueOrDefault(c.CruiseId, c.CruiseId),
            Name = c.Name,
            SamplesHash = c.SamplesHash,
            SampleCount = c.SampleCount,
            MeasurementSd = c.MeasurementSd,
        })],
    };

    private async Task ChangeAsync(Guid id, Action<StudyRow> change)
    {
        await database.WriteAsync(async context =>
        {
            StudyRow row = await context.Studies.FirstOrDefaultAsync(s => s.Id == id) ?? throw Missing.Of("study");
            change(row);
            row.LastChange = clock.GetUtcNow();
            return id;
        });
        events.Change(id);
    }
}
