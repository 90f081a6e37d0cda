using WaterMix.Core.Mixing;
using WaterMix.Core.Samples;
using WaterMix.Formats.Reading;
using WaterMix.Workspace.Cruises;
using WaterMix.Workspace.Studies;

namespace WaterMix.Web.Tests.State.Mixing;

/// <summary>The invented cruise, kept.</summary>
internal sealed class OneCruise : ICruises
{
    public static Study Study { get; } = new(
        Guid.NewGuid(), "Study", InventedCruise.Model, 1, [new Cruise(Guid.NewGuid(), "Halcyon", "hash", InventedCruise.Samples.RowCount, Guid.NewGuid(), null!, null)], []);

    public Task<SampleTable> SamplesAsync(string samplesHash) => Task.FromResult(InventedCruise.Samples);

    public Task ReceiveAsync(Guid upload, string fileName, Stream content, CancellationToken cancellation) => throw new NotSupportedException();

    public Task<ImportTrial> TryAsync(Guid upload, ReadingOptions options, CancellationToken cancellation) => throw new NotSupportedException();

    public Task<(ImportTrial Trial, Cruise? Cruise)> KeepAsync(Guid study, Guid upload, string cruiseName, ReadingOptions options, IProgress<long>? progress, CancellationToken cancellation) =>
        throw new NotSupportedException();

    public Task RenameAsync(Guid cruise, string name) => throw new NotSupportedException();

    public Task RemoveAsync(Guid cruise) => throw new NotSupportedException();

    public Task RestoreAsync(Guid cruise) => throw new NotSupportedException();

    public Task SetMeasurementSdAsync(Guid cruise, IReadOnlyDictionary<string, MeasurementError>? measurementSd) => throw new NotSupportedException();

    public Task<IReadOnlyList<DuplicateSamples>> DuplicatesAsync(Guid study) => throw new NotSupportedException();
}
