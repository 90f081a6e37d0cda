using Microsoft.EntityFrameworkCore;
using WaterMix.Core.Samples;
using WaterMix.Formats.Reading;
using WaterMix.Workspace.Storage;

namespace WaterMix.Workspace.Cruises;

/// <summary>The samples of a cruise as a model wants them: with the bottle's or the CTD's values preferred.</summary>
internal sealed class CruiseReadings(WorkspaceDatabase database, Uploads uploads, SampleStore store)
{
    /// <summary>
    /// The samples with one instrument preferred. Where a cruise was read with the other and holds both, its upload is read once more and
    /// those samples are kept beside the first.
    /// </summary>
    /// <param name="cruise">The cruise.</param>
    /// <param name="prefer">The instrument that the model prefers.</param>
    /// <returns>The key of the samples.</returns>
    /// <exception cref="ArgumentException">The upload is gone; the message says what to do.</exception>
    public async Task<string> KeyAsync(CruiseRow cruise, ValueOrigin prefer)
    {
        ReadingOptions options = StoredJson.Reading(cruise.Reading);
        if (options.Prefer == prefer)
        {
            return cruise.SamplesHash;
        }

        if (cruise.OtherSamplesHash is { } other)
        {
            return other;
        }

        using OpenedSamples opened = await uploads.OpenAsync(cruise.Upload, options with { Prefer = prefer });
        string key = await Task.Run(async () => (await store.KeepAsync(opened, null, CancellationToken.None)).Key)
            ?? throw new InvalidDataException($"The files of the cruise {cruise.Name} cannot be read again with the other instrument preferred. Upload them again.");
        await database.WriteAsync(context => context.Cruises.Where(c => c.Id == cruise.Id)
            .ExecuteUpdateAsync(set => set.SetProperty(c => c.OtherSamplesHash, key)));
        return key;
    }
}
