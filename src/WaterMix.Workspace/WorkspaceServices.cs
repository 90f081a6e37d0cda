using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.DependencyInjection.Extensions;
using WaterMix.Workspace.Cruises;
using WaterMix.Workspace.Runs;
using WaterMix.Workspace.Storage;
using WaterMix.Workspace.Studies;

namespace WaterMix.Workspace;

/// <summary>Puts a workspace into an app's services.</summary>
public static class WorkspaceServices
{
    /// <summary>
    /// Adds <see cref="IStudies"/>, <see cref="ICruises"/>, <see cref="IRuns"/> and <see cref="LiveSolver"/> over one data folder. The folder is opened when the app starts; a folder in use ends
    /// the start with a <see cref="DataFolderInUseException"/>.
    /// </summary>
    /// <param name="services">The app's services, with logging.</param>
    /// <param name="dataFolderPath">The data folder; made where there is none.</param>
    /// <param name="options">Limits and times, or null for the defaults.</param>
    public static IServiceCollection AddWaterMixWorkspace(this IServiceCollection services, string dataFolderPath, WorkspaceOptions? options = null)
    {
        ArgumentNullException.ThrowIfNull(services);
        services.TryAddSingleton(TimeProvider.System);
        services.AddSingleton(options ?? new WorkspaceOptions());
        services.AddSingleton(_ => DataFolder.Open(dataFolderPath));
        services.AddSingleton<WorkspaceDatabase>();
        services.AddSingleton<WorkspaceEvents>();
        services.AddSingleton(provider => new ByteCache(provider.GetRequiredService<WorkspaceOptions>().CacheBytes));
        services.AddSingleton<Uploads>();
        services.AddSingleton<SampleStore>();
        services.AddSingleton<CruiseReadings>();
        services.AddSingleton<RunStore>();
        services.AddSingleton<SolverPool>();
        services.AddSingleton<RunWorker>();
        services.AddSingleton<IStudies, StudyService>();
        services.AddSingleton<ICruises, CruiseService>();
        services.AddSingleton<IRuns, RunService>();
        services.AddSingleton(provider => new LiveSolver(
            provider.GetRequiredService<WorkspaceDatabase>(),
            provider.GetRequiredService<CruiseReadings>(),
            provider.GetRequiredService<SampleStore>(),
            provider.GetRequiredService<SolverPool>(),
            provider.GetRequiredService<WorkspaceOptions>()));
        services.AddHostedService(provider => provider.GetRequiredService<RunWorker>());
        services.AddSingleton<Housekeeping>();
        services.AddHostedService(provider => provider.GetRequiredService<Housekeeping>());
        return services;
    }
}
