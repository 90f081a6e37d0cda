using System.Collections.Concurrent;
using System.Data.Common;
using System.Globalization;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.Hosting;
using Microsoft.Extensions.Logging;
using WaterMix.Core.Mixing;
using WaterMix.Workspace.Cruises;
using WaterMix.Workspace.Storage;

namespace WaterMix.Workspace.Runs;

/// <summary>
/// Works on the runs that are not done, a chunk of each in turn. What is done stands in the tables and on the disk, so after a restart the
/// work goes on where it was and ends with the same bytes.
/// </summary>
internal sealed partial class RunWorker(WorkspaceDatabase database, SampleStore samples, RunStore store, SolverPool pool, WorkspaceEvents events, WorkspaceOptions options, ILogger<RunWorker> log)
    : BackgroundService
{
    private static readonly TimeSpan Pause = TimeSpan.FromSeconds(5);

    private readonly SemaphoreSlim _wake = new(0);
    private readonly ConcurrentDictionary<Guid, ActiveRun> _active = new();

    /// <summary>Says that there may be a new run.</summary>
    public void Wake() => _wake.Release();

    /// <summary>Ends the work on a run that the tables show as cancelled.</summary>
    public void Cancel(Guid run)
    {
        try
        {
            _active.GetValueOrDefault(run)?.Cancellation.Cancel();
        }
        catch (ObjectDisposedException)
        {
            // The run has just ended by itself.
        }
    }

    /// <inheritdoc/>
    public override void Dispose()
    {
        _wake.Dispose();
        foreach (ActiveRun run in _active.Values)
        {
            run.Dispose();
        }

        base.Dispose();
    }

    /// <inheritdoc/>
    protected override async Task ExecuteAsync(CancellationToken stoppingToken)
    {
        while (!stoppingToken.IsCancellationRequested)
        {
            try
            {
                await TakeNewRunsAsync(stoppingToken);
                if (_active.IsEmpty)
                {
                    await _wake.WaitAsync(stoppingToken);
                    continue;
                }

                foreach (ActiveRun run in _active.Values.OrderBy(r => r.Row.Started))
                {
                    await StepAsync(run, stoppingToken);
                }
            }
            catch (Exception fault) when (fault is DbException or DbUpdateException or IOException)
            {
                // A full disk, say: not even the failure could be written down.
                StorageFailed(fault);
                await Task.Delay(Pause, stoppingToken);
            }
        }
    }

    private async Task TakeNewRunsAsync(CancellationToken stopping)
    {
        Guid[] known = [.. _active.Keys];
        List<RunRow> rows = await database.ReadAsync(context => context.Runs.AsNoTracking().AsSplitQuery()
            .Include(r => r.Cruises)
            .Include(r => r.Chunks)
            .Where(r => (r.State == RunState.Waiting || r.State == RunState.Running) && !known.Contains(r.Id))
            .ToListAsync(CancellationToken.None));
        foreach (RunRow row in rows)
        {
            _active[row.Id] = new ActiveRun(row, stopping);
        }
    }

    private async Task StepAsync(ActiveRun run, CancellationToken stopping)
    {
        try
        {
            if (run.Left.TryPeek(out ChunkRow? chunk))
            {
                await SolveAsync(run, chunk);
                run.Left.Dequeue();
            }
            else
            {
                await FinishAsync(run);
                Drop(run);
            }
        }
        catch (OperationCanceledException) when (run.Cancellation.IsCancellationRequested)
        {
            if (!stopping.IsCancellationRequested)
            {
                Drop(run);
                store.ClearChunks(run.Row.Folder);
            }
        }
#pragma warning disable CA1031 // Whatever goes wrong with one run is that run's end, not the worker's.
        catch (Exception fault)
#pragma warning restore CA1031
        {
            RunFailed(fault, run.Row.Id);
            await FailAsync(run, fault is InvalidDataException ? fault.Message : $"Something went wrong that should not have: {fault.Message} Start the run again; if it fails again, report it with the server's log.");
            Drop(run);
        }
    }

    private void Drop(ActiveRun run)
    {
        _active.TryRemove(run.Row.Id, out _);
        run.Dispose();
    }

    private async Task SolveAsync(ActiveRun run, ChunkRow chunk)
    {
        KeptSamples kept = await samples.FindAsync(run.CruiseAt(chunk.Cruise).SamplesHash);
        PreparedModel model = run.ModelFor(chunk.Cruise);
        CancellationToken cancellation = run.Cancellation.Token;
        SolvedBlock solved = await pool.DoAsync(
            isLive: false,
            () => MixingSolver.Solve(
                model,
                SampleRows.ForSolving(kept.Table, chunk.FirstRow, chunk.RowCount),
                new SolveOptions { Threads = options.Threads, Cancellation = cancellation }),
            cancellation);
        await ResultFile.WriteAsync(store.ChunkPath(run.Row.Folder, chunk.Number), solved.Result);
        cancellation.ThrowIfCancellationRequested();
        int counted = await database.WriteAsync(async context =>
        {
            string usable = string.Join(' ', solved.UsableCounts.Select(c => c.ToString(CultureInfo.InvariantCulture)));
            await context.Chunks.Where(c => c.RunId == chunk.RunId && c.Number == chunk.Number)
                .ExecuteUpdateAsync(set => set.SetProperty(c => c.IsDone, true).SetProperty(c => c.Usable, usable), CancellationToken.None);
            return await AtWork(context, run).ExecuteUpdateAsync(
                set => set.SetProperty(r => r.State, RunState.Running).SetProperty(r => r.Done, r => r.Done + chunk.RowCount),
                CancellationToken.None);
        });
        if (counted == 0)
        {
            // Cancelled just before it was taken in hand.
            await run.Cancellation.CancelAsync();
        }

        cancellation.ThrowIfCancellationRequested();
        events.Progress(run.Row.Id);
    }

    private async Task FinishAsync(ActiveRun run)
    {
        if (await NothingUsableAsync(run) is { } problem)
        {
            await FailAsync(run, problem);
            return;
        }

        long[] statuses = new long[Enum.GetValues<SolveStatus>().Length];
        foreach (RunCruiseRow cruise in run.Row.Cruises.OrderBy(c => c.Position))
        {
            var whole = new MixingResult(run.ModelFor(cruise.Position), (int)cruise.SampleCount, withProof: false);
            foreach (ChunkRow chunk in run.Row.Chunks.Where(c => c.Cruise == cruise.Position))
            {
                run.Cancellation.Token.ThrowIfCancellationRequested();
                await ResultFile.ReadAsync(store.ChunkPath(run.Row.Folder, chunk.Number), whole, chunk.FirstRow);
            }

            await ResultFile.WriteAsync(store.ResultPath(run.Row.Folder, cruise.Position), whole);
            foreach (SolveStatus status in whole.Status)
            {
                statuses[(int)status]++;
            }
        }

        string counted = StoredJson.Of(Enum.GetValues<SolveStatus>().Where(s => statuses[(int)s] > 0).ToDictionary(s => s, s => statuses[(int)s]));
        await EndAsync(run, set => set.SetProperty(r => r.State, RunState.Finished).SetProperty(r => r.Statuses, counted));
    }

    private async Task<string?> NothingUsableAsync(ActiveRun run)
    {
        List<string> counts = await database.ReadAsync(context => context.Chunks
            .Where(c => c.RunId == run.Row.Id).Select(c => c.Usable).ToListAsync(CancellationToken.None));
        IReadOnlyList<string> parents = run.ModelFor(0).ParentIds;
        string[] unusable = [.. parents.Where((_, k) => counts.TrueForAll(c => c.Split(' ')[k] == "0"))];
        return unusable.Length == 0 ? null
            : $"No sample has a usable value of {string.Join(", ", unusable)}, which the model fits. Look at the flags in the import report and at the flags that the model accepts, or take it out of the tracers.";
    }

    private Task FailAsync(ActiveRun run, string problem) =>
        EndAsync(run, set => set.SetProperty(r => r.State, RunState.Failed).SetProperty(r => r.Problem, problem));

    private async Task EndAsync(ActiveRun run, Action<Microsoft.EntityFrameworkCore.Query.UpdateSettersBuilder<RunRow>> end)
    {
        await database.WriteAsync(async context =>
        {
            int ended = await AtWork(context, run).ExecuteUpdateAsync(end, CancellationToken.None);
            return ended + await context.Chunks.Where(c => c.RunId == run.Row.Id).ExecuteDeleteAsync(CancellationToken.None);
        });
        store.ClearChunks(run.Row.Folder);
        events.Progress(run.Row.Id);
        events.Change(run.Row.StudyId);
    }

    // A run that was cancelled meanwhile stays cancelled.
    private static IQueryable<RunRow> AtWork(WorkspaceDbContext context, ActiveRun run) =>
        context.Runs.Where(r => r.Id == run.Row.Id && (r.State == RunState.Waiting || r.State == RunState.Running));

    [LoggerMessage(Level = LogLevel.Error, Message = "The data folder cannot be read or written; it is tried again in five seconds.")]
    private partial void StorageFailed(Exception fault);

    [LoggerMessage(Level = LogLevel.Error, Message = "Run {Run} failed.")]
    private partial void RunFailed(Exception fault, Guid run);
}
