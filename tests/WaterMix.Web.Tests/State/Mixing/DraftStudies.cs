using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;
using WaterMix.Workspace.Runs;
using WaterMix.Workspace.Studies;

namespace WaterMix.Web.Tests.State.Mixing;

/// <summary>One study whose draft can be saved, as the storage does it: a revision that another tab has passed writes nothing.</summary>
internal sealed class DraftStudies(MixingModel draft) : IStudies
{
    public event Action<Guid>? Changed;

    public Study Stored { get; private set; } = new(Guid.NewGuid(), "Study", draft, 4, [], []);

    /// <summary>What saving throws instead of saving; null: nothing.</summary>
    public Exception? Fault { get; set; }

    public void Run(MixingModel model) => Stored = Stored with
    {
        Runs = [new Run(Guid.NewGuid(), "Run 1", DateTimeOffset.UnixEpoch, RunState.Finished, 1, 1, model, "hash", new Dictionary<SolveStatus, long>(), null)],
    };

    public void Keep(Run run) => Stored = Stored with { Runs = [run] };

    public Task<long?> SaveDraftAsync(Guid id, MixingModel saved, long expectedRevision)
    {
        if (Fault is not null)
        {
            throw Fault;
        }

        if (expectedRevision != Stored.Revision)
        {
            return Task.FromResult<long?>(null);
        }

        Stored = Stored with { Draft = saved, Revision = Stored.Revision + 1 };
        Changed?.Invoke(id);
        return Task.FromResult<long?>(Stored.Revision);
    }

    public Task<Study?> FindAsync(Guid id) => Task.FromResult(id == Stored.Id ? Stored : null);

    public Task<IReadOnlyList<StudySummary>> ListAsync(string? search = null) => throw new NotSupportedException();

    public Task<Guid> CreateAsync(string name) => throw new NotSupportedException();

    public Task RenameAsync(Guid id, string name) => throw new NotSupportedException();

    public Task<Guid> DuplicateAsync(Guid id, string name) => throw new NotSupportedException();

    public Task DeleteAsync(Guid id) => throw new NotSupportedException();

    public Task RestoreAsync(Guid id) => throw new NotSupportedException();
}

/// <summary>A small model: two sources, three tracers, respiration, one layer.</summary>
internal static class SmallModel
{
    public static EndMember Source(string id, double theta, double salinity, double oxygen, double sd = 0.1) => new(
        id,
        "",
        new Dictionary<string, double> { ["potential_temperature"] = theta, ["practical_salinity"] = salinity, ["oxygen"] = oxygen },
        new Provenance(ProvenanceKind.Manual, "invented"))
    {
        Sd = new Dictionary<string, double> { ["potential_temperature"] = sd, ["practical_salinity"] = sd / 10, ["oxygen"] = sd * 20 },
    };

    public static MixingModel Make() => new(
        "Small",
        new EndMemberSet("Two sources", 1, [Source("A", 2, 34.9, 280), Source("B", 12, 36.2, 200)]),
        ["potential_temperature", "practical_salinity", "oxygen"],
        new GeneralisedLeastSquares
        {
            MeasurementSd = new Dictionary<string, MeasurementError> { ["potential_temperature"] = new(0.002), ["practical_salinity"] = new(0.002), ["oxygen"] = new(1) },
        },
        MassConservation.Exact)
    {
        Layers = [new Layer("interior", ["A", "B"], [new Condition("pressure", 150, null)])],
    };
}
