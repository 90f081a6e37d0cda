namespace WaterMix.Web.Tests;

/// <summary>The whole app with a limit of 1 MB for uploads.</summary>
public sealed class SmallUploadsApp : IAsyncLifetime
{
    /// <summary>The app.</summary>
    public RunningApp App { get; } = new RunningApp().WithSetting("WATERMIX_UPLOAD_LIMIT_MB", "1");

    /// <inheritdoc/>
    public ValueTask InitializeAsync() => App.InitializeAsync();

    /// <inheritdoc/>
    public ValueTask DisposeAsync() => App.DisposeAsync();
}
