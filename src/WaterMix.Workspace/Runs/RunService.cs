using Microsoft.EntityFrameworkCore;
using WaterMix.Core;
using WaterMix.Core.Mixing;
using WaterMix.Core.Samples;
using WaterMix.Core.Seawater;
using WaterMix.Formats.Json;
using WaterMix.Workspace.Cruises;
using WaterMix.Workspace.Storage;

namespace WaterMix.Workspace.Runs;

/// <summary>The runs of the data folder.</summary>
internal sealed class RunService(WorkspaceDatabase database, CruiseReadings readings, SampleStore samples, RunStore store, RunWorker worker, WorkspaceEvents events, WorkspaceOptions options, TimeProvider clock)
    : IRuns
{
    /// <inheritdoc/>
    public event Action<Guid>? Progressed
    {
        add => events.RunProgressed += value;
        remove => events.RunProgressed -= value;
    }

    /// <inheritdoc/>
    public async Task<Guid> StartAsync(Guid study, string name)
    {
        string kept = EntityName.Checked(name, "a run");
        StudyRow row = await database.ReadAsync(context => context.Studies.AsNoTracking()
            .Include(s => s.Cruises.Where(c => c.Removed == null)).LivingAsync(study));
        MixingModel model = StoredJson.Model(row.Draft);
        Finding[] errors = [.. ModelCheck.Findings(model).Where(f => f.Severity == Severity.Error)];
        if (errors.Length > 0)
        {
            string more = errors.Length > 1 ? $" (and {errors.Length - 1} more)" : "";
            throw new InvalidOperationException($"The model cannot be solved yet: {errors[0]}{more}");
        }

        if (row.Cruises.Count == 0)
        {
            throw new InvalidOperationException("There are no samples in this study. Upload a cruise first.");
        }

        List<RunCruiseRow> cruises = await CruisesAsync(row, model);
        await RefuseMissingTracersAsync(cruises, model);
        var run = new RunRow
        {
            Id = Guid.NewGuid(),
            StudyId = study,
            Name = kept,
            Started = clock.GetUtcNow(),
            State = RunState.Waiting,
            Total = cruises.Sum(c => c.SampleCount),
            Model = row.Draft,
            ModelHash = ContentHash.OfModel(model),
            Folder = Guid.NewGuid(),
            Cruises = cruises,
            Chunks = [.. Chunks(cruises).Select((c, i) => new ChunkRow { Number = i, Cruise = c.Cruise, FirstRow = c.First, RowCount = c.Count })],
        };
        await database.WriteAsync(async context =>
        {
            context.Runs.Add(run);
            await context.TouchAsync(study, clock);
            return run.Id;
        });
        worker.Wake();
        events.Change(study);
        return run.Id;
    }

    /// <inheritdoc/>
    public async Task CancelAsync(Guid run)
    {
        Guid? study = await database.WriteAsync(async context =>
        {
            RunRow row = await FindRowAsync(context.Runs, run);
            if (row.State is not (RunState.Waiting or RunState.Running))
            {
                return (Guid?)null;
            }

            row.State = RunState.Cancelled;
            await context.Chunks.Where(c => c.RunId == run).ExecuteDeleteAsync();
            return row.StudyId;
        });
        worker.Cancel(run);
        if (study is { } changed)
        {
            events.Progress(run);
            events.Change(changed);
        }
    }

    /// <inheritdoc/>
    public async Task<Run?> FindAsync(Guid run)
    {
        RunRow? row = await database.ReadAsync(context => context.Runs.AsNoTracking().FirstOrDefaultAsync(r => r.Id == run));
        return row is null ? null : StoredJson.Run(row);
    }

    /// <inheritdoc/>
    public async Task<IReadOnlyList<CruiseResult>> ResultsAsync(Guid run)
    {
        RunRow row = await FinishedAsync(run);
        MixingModel model = StoredJson.Model(row.Model);
        var results = new List<CruiseResult>(row.Cruises.Count);
        foreach (RunCruiseRow cruise in row.Cruises.OrderBy(c => c.Position))
        {
            results.Add(new CruiseResult(cruise.CruiseId, cruise.Name, cruise.SamplesHash, await store.FindAsync(row.Folder, cruise, model)));
        }

        return results;
    }

    /// <inheritdoc/>
    public async Task RenameAsync(Guid run, string name)
    {
        string kept = EntityName.Checked(name, "a run");
        Guid study = await database.WriteAsync(async context =>
        {
            RunRow row = await FindRowAsync(context.Runs, run);
            row.Name = kept;
            await context.TouchAsync(row.StudyId, clock);
            return row.StudyId;
        });
        events.Change(study);
    }

    /// <inheritdoc/>
    public async Task WriteCsvAsync(Guid run, Stream output, CancellationToken cancellation)
    {
        RunRow row = await FinishedAsync(run);
        MixingModel model = StoredJson.Model(row.Model);
        var cruises = new List<(KeptSamples, MixingResult)>(row.Cruises.Count);
        foreach (RunCruiseRow cruise in row.Cruises.OrderBy(c => c.Position))
        {
            cruises.Add((await samples.FindAsync(cruise.SamplesHash), await store.FindAsync(row.Folder, cruise, model)));
        }

        await RunCsv.WriteAsync(model, cruises, output, cancellation);
    }

    private async Task<List<RunCruiseRow>> CruisesAsync(StudyRow study, MixingModel model)
    {
        var cruises = new List<RunCruiseRow>(study.Cruises.Count);
        foreach (CruiseRow cruise in study.Cruises.OrderBy(c => c.Position))
        {
            if (CruiseModel.Contradiction(model, cruise.Name, StoredJson.Errors(cruise.MeasurementSd)) is { } contradiction)
            {
                throw new InvalidOperationException(contradiction);
            }

            cruises.Add(new RunCruiseRow
            {
                Position = cruises.Count,
                CruiseId = cruise.Id,
                Name = cruise.Name,
                SamplesHash = await readings.KeyAsync(cruise, model.Prefer),
                SampleCount = cruise.SampleCount,
                MeasurementSd = cruise.MeasurementSd,
            });
        }

        return cruises;
    }

    private async Task RefuseMissingTracersAsync(IReadOnlyList<RunCruiseRow> cruises, MixingModel model)
    {
        var prepared = PreparedModel.From(model);
        var missing = new HashSet<string>(prepared.ParentIds, StringComparer.Ordinal);
        foreach (RunCruiseRow cruise in cruises)
        {
            SampleTable table = (await samples.FindAsync(cruise.SamplesHash)).Table;
            SampleTable derived = SampleDerivation.Derive(SampleRows.Slice(table, 0, 0), prepared.QuantityIds).Table;
            missing.RemoveWhere(id => derived.Find(id) is not null);
        }

        if (missing.Count > 0)
        {
            throw new InvalidOperationException($"No cruise has a column of {string.Join(", ", missing.Order(StringComparer.Ordinal))}, which the model fits. Match a column to it on the Samples page, or take it out of the model's tracers.");
        }
    }

    private IEnumerable<(int Cruise, int First, int Count)> Chunks(IEnumerable<RunCruiseRow> cruises) => cruises.SelectMany(cruise =>
        Enumerable.Range(0, (int)((cruise.SampleCount + options.ChunkRows - 1) / options.ChunkRows))
            .Select(k => k * options.ChunkRows)
            .Select(first => (cruise.Position, first, Math.Min(options.ChunkRows, (int)cruise.SampleCount - first))));

    private async Task<RunRow> FinishedAsync(Guid run)
    {
        RunRow row = await database.ReadAsync(context => FindRowAsync(context.Runs.AsNoTracking().Include(r => r.Cruises), run));
        return row.State == RunState.Finished ? row
            : throw new InvalidOperationException($"The run {row.Name} has no results: it is {row.State.ToString().ToLowerInvariant()}. Choose a run that has finished, or start one.");
    }

    private static async Task<RunRow> FindRowAsync(IQueryable<RunRow> runs, Guid run) =>
        await runs.FirstOrDefaultAsync(r => r.Id == run) ?? throw Missing.Of("run");
}
