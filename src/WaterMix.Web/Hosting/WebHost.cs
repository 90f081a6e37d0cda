using Microsoft.AspNetCore.DataProtection;
using Radzen;
using WaterMix.Web.Components;

namespace WaterMix.Web.Hosting;

/// <summary>Puts the app together.</summary>
internal static class WebHost
{
    /// <summary>Builds the app over a data folder.</summary>
    /// <param name="builder">With the command line and the environment.</param>
    /// <param name="folder">The folder, claimed by this process.</param>
    public static WebApplication Build(WebApplicationBuilder builder, DataFolder folder)
    {
        builder.WebHost.UseStaticWebAssets();
        builder.WebHost.ConfigureKestrel(kestrel => kestrel.AddServerHeader = false);
        AddServices(builder.Services, folder);
        WebApplication app = builder.Build();
        UsePipeline(app);
        return app;
    }

    private static void AddServices(IServiceCollection services, DataFolder folder)
    {
        services.AddRazorComponents().AddInteractiveServerComponents(circuits =>
        {
            // A laptop's lid is closed for longer than the three minutes of the default.
            circuits.DisconnectedCircuitRetentionPeriod = TimeSpan.FromMinutes(30);
        }).AddHubOptions(hub => hub.MaximumReceiveMessageSize = 512 << 10); // A lasso's corners, at most; samples never come this way.
        services.AddRadzenComponents();
        services.AddProblemDetails();
        services.AddHealthChecks();

        // In the data folder, so that tokens stay good when WaterMix is started anew.
        services.AddDataProtection().SetApplicationName("WaterMix").PersistKeysToFileSystem(Directory.CreateDirectory(Path.Combine(folder.FullPath, "keys")));
        services.AddAntiforgery(antiforgery =>
        {
            antiforgery.HeaderName = "X-WaterMix-Token";
            antiforgery.Cookie.Name = "watermix-token";
        });
        services.AddSingleton(TimeProvider.System);
    }

    private static void UsePipeline(WebApplication app)
    {
        app.UseMiddleware<SecurityHeaders>();
        app.UseMiddleware<HostAndOrigin>();
        app.UseExceptionHandler("/error", createScopeForErrors: true);
        app.UseStatusCodePagesWithReExecute("/not-found", createScopeForStatusCodePages: true);
        app.UseAntiforgery();
        app.MapStaticAssets();
        app.MapHealthChecks("/health");
        app.MapUploads();
        app.MapRazorComponents<App>().AddInteractiveServerRenderMode(options => options.ContentSecurityFrameAncestorsPolicy = null); // Ours has it.
    }
}
