using Microsoft.AspNetCore.DataProtection;
using Radzen;
using WaterMix.Web.Api;
using WaterMix.Web.Components;
using WaterMix.Workspace;

namespace WaterMix.Web.Hosting;

/// <summary>Puts the app together.</summary>
internal static class WebHost
{
    /// <summary>The setting that changes the largest upload, in MB.</summary>
    public const string UploadLimit = "WATERMIX_UPLOAD_LIMIT_MB";

    /// <summary>Builds the app; nothing listens and no folder is touched yet.</summary>
    /// <param name="builder">With the command line and the environment.</param>
    public static WebApplication Build(WebApplicationBuilder builder)
    {
        builder.WebHost.UseStaticWebAssets();
        builder.Logging.AddFilter("Microsoft", LogLevel.Warning);
        builder.Logging.AddFilter("Microsoft.Extensions.Hosting", LogLevel.None); // Why a start failed is said in one sentence.

        // It warns that keys are not encrypted: they lie beside the studies, which are not either.
        builder.Logging.AddFilter("Microsoft.AspNetCore.DataProtection", LogLevel.Error);
        builder.WebHost.ConfigureKestrel(kestrel => kestrel.AddServerHeader = false);
        AddServices(builder.Services, builder.Configuration);
        WebApplication app = builder.Build();
        UsePipeline(app);
        return app;
    }

    private static void AddServices(IServiceCollection services, IConfiguration configuration)
    {
        string dataFolder = DataFolderPath.From(configuration);
        var limits = new WorkspaceOptions();
        services.AddWaterMixWorkspace(dataFolder, limits with { MostUploadBytes = configuration.GetValue(UploadLimit, limits.MostUploadBytes >> 20) << 20 });
        services.AddRazorComponents().AddInteractiveServerComponents(circuits =>
        {
            // A laptop's lid is closed for longer than the three minutes of the default.
            circuits.DisconnectedCircuitRetentionPeriod = TimeSpan.FromMinutes(30);
        }).AddHubOptions(hub => hub.MaximumReceiveMessageSize = 512 << 10); // A lasso's corners, at most; samples never come this way.
        services.AddRadzenComponents();
        services.AddScoped<WaterMix.Web.State.Mixing.DraftEditors>();
        services.AddProblemDetails(ApiRoutes.Explain);
        services.Configure<RouteHandlerOptions>(routes => routes.ThrowOnBadRequest = false); // A bad request is an answer, in every environment.
        services.AddOpenApi(ApiRoutes.Describe);
        services.AddSingleton<ScratchFolders>();
        services.AddHealthChecks();

        // In the data folder, so that tokens stay good when WaterMix is started anew.
        services.AddDataProtection().SetApplicationName("WaterMix").PersistKeysToFileSystem(new DirectoryInfo(Path.Combine(dataFolder, "keys")));
        services.AddAntiforgery(antiforgery =>
        {
            antiforgery.HeaderName = "X-WaterMix-Token";
            antiforgery.Cookie.Name = "watermix-token";
        });
    }

    private static void UsePipeline(WebApplication app)
    {
        app.UseMiddleware<SecurityHeaders>();
        app.UseMiddleware<HostAndOrigin>();
        app.UseWhen(IsForPrograms, branch => branch.UseExceptionHandler().UseStatusCodePages());
        app.UseWhen(context => !IsForPrograms(context), branch => branch
            .UseExceptionHandler("/error", createScopeForErrors: true)
            .UseStatusCodePagesWithReExecute("/not-found", createScopeForStatusCodePages: true));
        app.UseRouting();
        app.UseAntiforgery();
        app.MapStaticAssets();
        app.MapHealthChecks("/health");
        app.MapUploads();
        app.MapApi();
        app.MapRazorComponents<App>().AddInteractiveServerRenderMode(options => options.ContentSecurityFrameAncestorsPolicy = null); // Ours has it.
    }

    /// <summary>True where a program reads the answer: problem details there, pages elsewhere.</summary>
    private static bool IsForPrograms(HttpContext context) => context.Request.Path.StartsWithSegments("/api") || context.Request.Path.StartsWithSegments("/uploads");
}
