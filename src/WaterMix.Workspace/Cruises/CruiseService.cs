using Microsoft.EntityFrameworkCore;
using WaterMix.Core;
using WaterMix.Core.Mixing;
using WaterMix.Core.Samples;
using WaterMix.Formats.Reading;
using WaterMix.Workspace.Storage;

namespace WaterMix.Workspace.Cruises;

/// <summary>The cruises of the data folder.</summary>
internal sealed class CruiseService(WorkspaceDatabase database, Uploads uploads, SampleStore store, WorkspaceEvents events, TimeProvider clock) : ICruises
{
    private const int FirstRows = 50;

    /// <inheritdoc/>
    public Task ReceiveAsync(Guid upload, string fileName, Stream content, CancellationToken cancellation) =>
        uploads.ReceiveAsync(upload, fileName, content, cancellation);

    /// <inheritdoc/>
    public async Task<ImportTrial> TryAsync(Guid upload, ReadingOptions options, CancellationToken cancellation)
    {
        using OpenedSamples opened = await uploads.OpenAsync(upload, options);
        return await Task.Run(
            () =>
            {
                SampleTable? first = null;
                long rows = 0;
                foreach (SampleBlock block in opened.ReadBlocks(cancellation))
                {
                    first ??= SampleRows.Slice(block.Table, 0, Math.Min(FirstRows, block.Table.RowCount));
                    rows += block.Table.RowCount;
                }

                return Trial(opened, first, rows);
            },
            cancellation);
    }

    /// <inheritdoc/>
    public async Task<(ImportTrial Trial, Cruise? Cruise)> KeepAsync(Guid study, Guid upload, string cruiseName, ReadingOptions options, IProgress<long>? progress, CancellationToken cancellation)
    {
        string name = EntityName.Checked(cruiseName, "a cruise");
        await database.ReadAsync(context => context.Studies.LivingAsync(study));
        using OpenedSamples opened = await uploads.OpenAsync(upload, options);
        (string? key, long count) = await Task.Run(() => store.KeepAsync(opened, progress, cancellation), cancellation);
        if (key is null)
        {
            return (Trial(opened, null, count), null);
        }

        SampleTable samples = (await store.FindAsync(key)).Table;
        ImportTrial trial = Trial(opened, SampleRows.Slice(samples, 0, Math.Min(FirstRows, samples.RowCount)), count);
        CruiseRow row = await database.WriteAsync(async context =>
        {
            await context.TouchAsync(study, clock);
            int last = await context.Cruises.Where(c => c.StudyId == study).MaxAsync(c => (int?)c.Position) ?? -1;
            var added = new CruiseRow
            {
                Id = Guid.NewGuid(),
                StudyId = study,
                Position = last + 1,
                Name = name,
                SamplesHash = key,
                SampleCount = count,
                Upload = upload,
                Report = ImportReportJson.Write(trial.Report),
                Reading = StoredJson.Of(options),
            };
            context.Cruises.Add(added);
            return added;
        });
        events.Change(study);
        return (trial, StoredJson.Cruise(row));
    }

    /// <inheritdoc/>
    public async Task<SampleTable> SamplesAsync(string samplesHash) => (await store.FindAsync(samplesHash)).Table;

    /// <inheritdoc/>
    public Task RenameAsync(Guid cruise, string name)
    {
        string kept = EntityName.Checked(name, "a cruise");
        return ChangeAsync(cruise, row => row.Name = kept);
    }

    /// <inheritdoc/>
    public Task RemoveAsync(Guid cruise) => ChangeAsync(cruise, row => row.Removed ??= clock.GetUtcNow());

    /// <inheritdoc/>
    public Task RestoreAsync(Guid cruise) => ChangeAsync(cruise, row => row.Removed = null);

    /// <inheritdoc/>
    public Task SetMeasurementSdAsync(Guid cruise, IReadOnlyDictionary<string, MeasurementError>? measurementSd)
    {
        foreach ((string quantity, MeasurementError error) in measurementSd ?? new Dictionary<string, MeasurementError>())
        {
            if (!(error.Absolute > 0 && double.IsFinite(error.Absolute) && error.Relative >= 0 && double.IsFinite(error.Relative)))
            {
                throw new ArgumentException(
                    $"Expected a measurement error of {quantity} above 0 (and a relative part of 0 or more); found {error.Absolute.ToString(Invariant)} and {error.Relative.ToString(Invariant)}. Correct the numbers.",
                    nameof(measurementSd));
            }
        }

        return ChangeAsync(cruise, row => row.MeasurementSd = StoredJson.Of(measurementSd is { Count: > 0 } ? measurementSd : null));
    }

    /// <inheritdoc/>
    public async Task<IReadOnlyList<DuplicateSamples>> DuplicatesAsync(Guid study)
    {
        List<CruiseRow> rows = await database.ReadAsync(context => context.Cruises.AsNoTracking()
            .Where(c => c.StudyId == study && c.Removed == null).OrderBy(c => c.Position).ToListAsync());
        var cruises = new List<(Guid, SampleTable)>(rows.Count);
        foreach (CruiseRow row in rows)
        {
            cruises.Add((row.Id, await SamplesAsync(row.SamplesHash)));
        }

        return await Task.Run(() => Duplicates.Find(cruises));
    }

    private static IFormatProvider Invariant => System.Globalization.CultureInfo.InvariantCulture;

    private static ImportTrial Trial(OpenedSamples opened, SampleTable? first, long rows)
    {
        ImportReport report = opened.Report;
        if (rows == 0 && !opened.HasErrors)
        {
            report = report with
            {
                Findings = [.. report.Findings, new Finding(Severity.Error, "at least one row of data", "none in any file", "Upload files that hold samples.")],
            };
        }

        return new ImportTrial(report, opened.Match, opened.Headers, first);
    }

    private async Task ChangeAsync(Guid cruise, Action<CruiseRow> change)
    {
        Guid study = await database.WriteAsync(async context =>
        {
            CruiseRow row = await context.Cruises.FirstOrDefaultAsync(c => c.Id == cruise) ?? throw Missing.Of("cruise");
            change(row);
            await context.TouchAsync(row.StudyId, clock);
            return row.StudyId;
        });
        events.Change(study);
    }
}
