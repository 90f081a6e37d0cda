using WaterMix.Workspace.Runs;

namespace WaterMix.Workspace.Tests.Runs;

public class SolverPoolTests
{
    [Fact]
    public async Task Do_LiveRequestsThatCameLater_GoBeforeRuns()
    {
        var pool = new SolverPool();
        using var gate = new ManualResetEventSlim();
        var order = new List<string>();
        Task<int> Piece(string name, bool isLive) => pool.DoAsync(isLive, () => { order.Add(name); return 0; }, TestContext.Current.CancellationToken);

        Task<int> first = pool.DoAsync(isLive: false, () => { gate.Wait(TestContext.Current.CancellationToken); return 0; }, TestContext.Current.CancellationToken);
        Task<int>[] rest = [Piece("run 1", false), Piece("run 2", false), Piece("live 1", true), Piece("live 2", true)];
        gate.Set();
        await first;
        await Task.WhenAll(rest);

        Assert.Equal(["live 1", "live 2", "run 1", "run 2"], order);
    }

    [Fact]
    public async Task Do_AfterAFaultOrACancellation_GoesOn()
    {
        var pool = new SolverPool();
        using var cancelled = new CancellationTokenSource();
        using var gate = new ManualResetEventSlim();
        Task<int> first = pool.DoAsync<int>(isLive: true, () => { gate.Wait(TestContext.Current.CancellationToken); throw new InvalidDataException(); }, TestContext.Current.CancellationToken);
        Task<int> given = pool.DoAsync(isLive: true, () => 1, cancelled.Token);
        Task<int> last = pool.DoAsync(isLive: true, () => 2, TestContext.Current.CancellationToken);

        await cancelled.CancelAsync();
        gate.Set();

        await Assert.ThrowsAsync<InvalidDataException>(() => first);
        await Assert.ThrowsAnyAsync<OperationCanceledException>(() => given);
        Assert.Equal(2, await last);
    }
}
