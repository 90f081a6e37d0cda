using WaterMix.Workspace.Runs;

namespace WaterMix.Web.Tests;

/// <summary>Runs that a test laid out.</summary>
internal sealed class FakeRuns : IRuns
{
    public event Action<Guid>? Progressed;

    public Dictionary<Guid, (Run Run, IReadOnlyList<CruiseResult> Results)> All { get; } = [];

    public Task<Guid> StartAsync(Guid study, string name) => throw new NotSupportedException();

    public Task CancelAsync(Guid run) => throw new NotSupportedException();

    public Task<Run?> FindAsync(Guid run) => Task.FromResult(All.TryGetValue(run, out (Run Run, IReadOnlyList<CruiseResult>) found) ? found.Run : null);

    public Task<IReadOnlyList<CruiseResult>> ResultsAsync(Guid run) => Task.FromResult(All[run].Results);

    public Task RenameAsync(Guid run, string name)
    {
        Progressed?.Invoke(run);
        return Task.CompletedTask;
    }

    public async Task WriteCsvAsync(Guid run, Stream output, CancellationToken cancellation) => await output.WriteAsync("row\n1\n"u8.ToArray(), cancellation);
}
