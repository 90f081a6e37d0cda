using System.Collections.Concurrent;
using Microsoft.EntityFrameworkCore;
using WaterMix.Core;
using WaterMix.Core.Mixing;
using WaterMix.Core.Samples;
using WaterMix.Workspace.Cruises;
using WaterMix.Workspace.Storage;

namespace WaterMix.Workspace.Runs;

/// <summary>
/// Solves every sample of a study while a model is being edited. Nothing is stored. Of one tab's requests only the latest counts: it ends
/// those before it. Live requests go before runs, and users take turns.
/// </summary>
public sealed class LiveSolver
{
    private readonly WorkspaceDatabase _database;
    private readonly CruiseReadings _readings;
    private readonly SampleStore _samples;
    private readonly SolverPool _pool;
    private readonly WorkspaceOptions _options;
    private readonly ConcurrentDictionary<Guid, CancellationTokenSource> _latest = new();

    internal LiveSolver(WorkspaceDatabase database, CruiseReadings readings, SampleStore samples, SolverPool pool, WorkspaceOptions options)
    {
        _database = database;
        _readings = readings;
        _samples = samples;
        _pool = pool;
        _options = options;
    }

    /// <summary>Solves a model over all samples of a study, now.</summary>
    /// <param name="study">The study.</param>
    /// <param name="tab">Who asks: one id for each open page.</param>
    /// <param name="draft">The model, its set inline; it need not be the saved one.</param>
    /// <param name="cancellation">Ends the request.</param>
    /// <returns>The results, or why there are none.</returns>
    /// <exception cref="OperationCanceledException">A later request of the same tab took its place, or it was cancelled.</exception>
    /// <exception cref="ArgumentException">There is no such study.</exception>
    public async Task<LiveResult> SolveAsync(Guid study, Guid tab, MixingModel draft, CancellationToken cancellation)
    {
        ArgumentNullException.ThrowIfNull(draft);
        using var own = CancellationTokenSource.CreateLinkedTokenSource(cancellation);
        TakeThePlaceOf(tab, own);
        try
        {
            return await SolveAsync(study, draft, own.Token);
        }
        finally
        {
            _latest.TryRemove(KeyValuePair.Create(tab, own));
        }
    }

    private void TakeThePlaceOf(Guid tab, CancellationTokenSource own)
    {
        CancellationTokenSource? before = null;
        _latest.AddOrUpdate(tab, own, (_, earlier) =>
        {
            before = earlier;
            return own;
        });
        try
        {
            before?.Cancel();
        }
        catch (ObjectDisposedException)
        {
            // The earlier request has just ended by itself.
        }
    }

    private async Task<LiveResult> SolveAsync(Guid study, MixingModel draft, CancellationToken cancellation)
    {
        Finding[] errors = [.. ModelCheck.Findings(draft).Where(f => f.Severity == Severity.Error)];
        if (errors.Length > 0)
        {
            return new LiveResult(errors, []);
        }

        StudyRow row = await _database.ReadAsync(context => context.Studies.AsNoTracking()
            .Include(s => s.Cruises.Where(c => c.Removed == null)).LivingAsync(study));
        var results = new List<CruiseResult>(row.Cruises.Count);
        foreach (CruiseRow cruise in row.Cruises.OrderBy(c => c.Position))
        {
            string key = await _readings.KeyAsync(cruise, draft.Prefer);
            SampleTable table = (await _samples.FindAsync(key)).Table;
            var model = PreparedModel.From(CruiseModel.For(draft, StoredJson.Errors(cruise.MeasurementSd)));
            results.Add(new CruiseResult(cruise.Id, cruise.Name, key, await SolveAsync(model, table, cancellation)));
        }

        return new LiveResult([], results);
    }

    private async Task<MixingResult> SolveAsync(PreparedModel model, SampleTable table, CancellationToken cancellation)
    {
        var whole = new MixingResult(model, table.RowCount, withProof: false);
        var options = new SolveOptions { Threads = _options.Threads, Cancellation = cancellation };
        for (int from = 0; from < table.RowCount; from += _options.ChunkRows)
        {
            int first = from;
            int count = Math.Min(_options.ChunkRows, table.RowCount - from);
            SolvedBlock solved = await _pool.DoAsync(
                isLive: true,
                () => MixingSolver.Solve(model, SampleRows.ForSolving(table, first, count), options),
                cancellation);
            ResultFile.Copy(solved.Result, 0, whole, first, count);
        }

        return whole;
    }
}
