namespace WaterMix.Workspace.Runs;

/// <summary>
/// The one place where samples are solved: a piece of work at a time has all processors. Live requests go before runs; within each, first
/// come first served, so that those who ask for their next piece only after the last take turns.
/// </summary>
internal sealed class SolverPool
{
    private readonly Lock _lock = new();
    private readonly Queue<TaskCompletionSource> _live = [];
    private readonly Queue<TaskCompletionSource> _jobs = [];
    private bool _isBusy;

    /// <summary>Does a piece of work when its turn comes.</summary>
    /// <typeparam name="T">What it gives.</typeparam>
    /// <param name="isLive">True where somebody is waiting for it with the pointer in hand.</param>
    /// <param name="work">The work: 50 ms or so.</param>
    /// <param name="cancellation">Gives the turn up.</param>
    public async Task<T> DoAsync<T>(bool isLive, Func<T> work, CancellationToken cancellation)
    {
        await EnterAsync(isLive ? _live : _jobs, cancellation);
        try
        {
            return await Task.Run(work, cancellation);
        }
        finally
        {
            Leave();
        }
    }

    private async Task EnterAsync(Queue<TaskCompletionSource> queue, CancellationToken cancellation)
    {
        cancellation.ThrowIfCancellationRequested();
        TaskCompletionSource turn;
        lock (_lock)
        {
            if (!_isBusy)
            {
                _isBusy = true;
                return;
            }

            turn = new TaskCompletionSource(TaskCreationOptions.RunContinuationsAsynchronously);
            queue.Enqueue(turn);
        }

        await using CancellationTokenRegistration giveUp = cancellation.Register(() => turn.TrySetCanceled(cancellation));
        await turn.Task;
    }

    private void Leave()
    {
        lock (_lock)
        {
            while (_live.TryDequeue(out TaskCompletionSource? next) || _jobs.TryDequeue(out next))
            {
                if (next.TrySetResult())
                {
                    return;
                }
            }

            _isBusy = false;
        }
    }
}
