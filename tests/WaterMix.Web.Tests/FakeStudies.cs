using WaterMix.Core.Mixing;
using WaterMix.Workspace.Studies;

namespace WaterMix.Web.Tests;

/// <summary>Studies in memory.</summary>
internal sealed class FakeStudies : IStudies
{
    private readonly List<StudySummary> _all = [];
    private readonly HashSet<Guid> _deleted = [];

    public event Action<Guid>? Changed;

    public Guid Add(string name, long samples = 0, int runs = 0)
    {
        DateTimeOffset time = new(2026, 3, 14, 9, 5, 0, TimeSpan.Zero);
        _all.Add(new StudySummary(Guid.NewGuid(), name, time, time, samples > 0 ? 1 : 0, samples, runs));
        return _all[^1].Id;
    }

    public Task<IReadOnlyList<StudySummary>> ListAsync(string? search = null) => Task.FromResult<IReadOnlyList<StudySummary>>(
        [.. _all.Where(s => !_deleted.Contains(s.Id) && s.Name.Contains(search ?? "", StringComparison.OrdinalIgnoreCase))]);

    public Task<Study?> FindAsync(Guid id) => throw new NotSupportedException();

    public Task<Guid> CreateAsync(string name) => Task.FromResult(Tell(Add(name)));

    public Task RenameAsync(Guid id, string name)
    {
        int index = _all.FindIndex(s => s.Id == id);
        _all[index] = _all[index] with { Name = name };
        return Task.FromResult(Tell(id));
    }

    public Task<Guid> DuplicateAsync(Guid id, string name) => CreateAsync(name);

    public Task DeleteAsync(Guid id)
    {
        _deleted.Add(id);
        return Task.FromResult(Tell(id));
    }

    public Task RestoreAsync(Guid id)
    {
        _deleted.Remove(id);
        return Task.FromResult(Tell(id));
    }

    public Task<long?> SaveDraftAsync(Guid id, MixingModel draft, long expectedRevision) => throw new NotSupportedException();

    private Guid Tell(Guid id)
    {
        Changed?.Invoke(id);
        return id;
    }
}
