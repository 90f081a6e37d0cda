using WaterMix.Core.Mixing;
using WaterMix.Core.Samples;
using WaterMix.Formats.Reading;
using WaterMix.Workspace.Cruises;
using WaterMix.Workspace.Runs;
using WaterMix.Workspace.Studies;

namespace WaterMix.Web.Tests.State.Results;

/// <summary>A workspace in memory with one study, whose runs have the results of <see cref="TwoLayers"/>.</summary>
internal sealed class OneStudy(params Run[] runs) : IStudies, ICruises, IRuns
{
    public static readonly Guid Id = new("99999999-0000-4000-8000-000000000009");

    public event Action<Guid>? Changed;

    public event Action<Guid>? Progressed;

    public List<Run> Runs { get; } = [.. runs];

    public List<Guid> Cancelled { get; } = [];

    /// <summary>Each reading of results waits for this.</summary>
    public Task Gate { get; set; } = Task.CompletedTask;

    public int Readings { get; private set; }

    public Exception? Fault { get; set; }

    public void Advance(Run run)
    {
        Runs[Runs.FindIndex(r => r.Id == run.Id)] = run;
        Progressed?.Invoke(run.Id);
    }

    Task<Study?> IStudies.FindAsync(Guid id) => Task.FromResult(id == Id ? new Study(Id, "Study", TwoLayers.Model, 1, [], [.. Runs]) : null);

    Task<Run?> IRuns.FindAsync(Guid run) => Task.FromResult(Runs.FirstOrDefault(r => r.Id == run));

    public async Task<IReadOnlyList<CruiseResult>> ResultsAsync(Guid run)
    {
        Readings++;
        await Gate;
        return Fault is null ? [new CruiseResult(Guid.NewGuid(), "Cruise 1", "hash", TwoLayers.Filled())] : throw Fault;
    }

    public Task<SampleTable> SamplesAsync(string samplesHash) => Task.FromResult(TwoLayers.Samples());

    public Task CancelAsync(Guid run)
    {
        Cancelled.Add(run);
        return Task.CompletedTask;
    }

    Task IRuns.RenameAsync(Guid run, string name)
    {
        Runs[Runs.FindIndex(r => r.Id == run)] = Runs.First(r => r.Id == run) with { Name = name };
        Changed?.Invoke(Id);
        return Task.CompletedTask;
    }

    Task<IReadOnlyList<StudySummary>> IStudies.ListAsync(string? search) => throw new NotSupportedException();

    Task<Guid> IStudies.CreateAsync(string name) => throw new NotSupportedException();

    Task IStudies.RenameAsync(Guid id, string name) => throw new NotSupportedException();

    Task<Guid> IStudies.DuplicateAsync(Guid id, string name) => throw new NotSupportedException();

    Task IStudies.DeleteAsync(Guid id) => throw new NotSupportedException();

    Task IStudies.RestoreAsync(Guid id) => throw new NotSupportedException();

    Task<long?> IStudies.SaveDraftAsync(Guid id, MixingModel draft, long expectedRevision) => throw new NotSupportedException();

    Task ICruises.ReceiveAsync(Guid upload, string fileName, Stream content, CancellationToken cancellation) => throw new NotSupportedException();

    Task<ImportTrial> ICruises.TryAsync(Guid upload, ReadingOptions options, CancellationToken cancellation) => throw new NotSupportedException();

    Task<(ImportTrial Trial, Cruise? Cruise)> ICruises.KeepAsync(Guid study, Guid upload, string cruiseName, ReadingOptions options, IProgress<long>? progress, CancellationToken cancellation) =>
        throw new NotSupportedException();

    Task ICruises.RenameAsync(Guid cruise, string name) => throw new NotSupportedException();

    Task ICruises.RemoveAsync(Guid cruise) => throw new NotSupportedException();

    Task ICruises.RestoreAsync(Guid cruise) => throw new NotSupportedException();

    Task ICruises.SetMeasurementSdAsync(Guid cruise, IReadOnlyDictionary<string, MeasurementError>? measurementSd) => throw new NotSupportedException();

    Task<IReadOnlyList<DuplicateSamples>> ICruises.DuplicatesAsync(Guid study) => throw new NotSupportedException();

    Task<Guid> IRuns.StartAsync(Guid study, string name) => throw new NotSupportedException();

    Task IRuns.WriteCsvAsync(Guid run, Stream output, CancellationToken cancellation) => throw new NotSupportedException();
}
