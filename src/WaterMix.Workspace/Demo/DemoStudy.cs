using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;
using WaterMix.Core.Mixing;
using WaterMix.Formats.Json;
using WaterMix.Formats.MixingModels;
using WaterMix.Formats.Reading;
using WaterMix.Workspace.Cruises;
using WaterMix.Workspace.Runs;
using WaterMix.Workspace.Storage;
using WaterMix.Workspace.Studies;

namespace WaterMix.Workspace.Demo;

/// <summary>The study that a new data folder begins with: the invented cruise, its model, a run.</summary>
public static class DemoStudy
{
    /// <summary>The study's name.</summary>
    public const string Name = "Halcyon Basin (invented)";

    /// <summary>Makes the study where the data folder never had one; a person who deletes it is not given it again.</summary>
    /// <param name="services">The app's services; the run is worked on once the app has started.</param>
    /// <param name="cancellation">Stops the reading.</param>
    /// <returns>The study, or null where there was one before.</returns>
    public static async Task<Guid?> EnsureAsync(IServiceProvider services, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(services);
        WorkspaceDatabase database = services.GetRequiredService<WorkspaceDatabase>();
        if (await database.ReadAsync(context => context.Studies.AnyAsync(CancellationToken.None)))
        {
            return null;
        }

        IStudies studies = services.GetRequiredService<IStudies>();
        ICruises cruises = services.GetRequiredService<ICruises>();
        Guid upload = Guid.NewGuid();
        await using (Stream bottles = InventedOcean.Open("halcyon_hy1.csv"))
        {
            await cruises.ReceiveAsync(upload, "halcyon_hy1.csv", bottles, cancellation);
        }

        Guid study = await studies.CreateAsync(Name);
        await studies.SaveDraftAsync(study, Model(), 0);
        await cruises.KeepAsync(study, upload, "Halcyon, stations 1 to 36", new ReadingOptions(), null, cancellation);
        await services.GetRequiredService<IRuns>().StartAsync(study, "Two layers");
        return study;
    }

    private static MixingModel Model()
    {
        Reading<MixingModel> reading = MixingModelFile.Read(InventedOcean.Read("halcyon.mixmodel.json"), "halcyon.mixmodel.json", set => (InventedOcean.Read(set), set));
        return reading.Value ?? throw new InvalidDataException(string.Join("\n", reading.Findings));
    }
}
