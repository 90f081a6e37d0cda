using System.Diagnostics;
using WaterMix.Workspace.Storage;

namespace WaterMix.Web.Tests.Hosting;

public sealed class StartTests : IDisposable
{
    private readonly string _folder = Directory.CreateTempSubdirectory("watermix-start-").FullName;

    [Fact]
    public async Task Start_OnADataFolderInUse_EndsWithOneSentence()
    {
        using DataFolder held = DataFolder.Open(_folder);

        (int status, string error) = await StartAsync("--WATERMIX_DATA", _folder, "--urls", "http://localhost:0");

        Assert.Equal(1, status);
        string line = Assert.Single(error.Split('\n', StringSplitOptions.RemoveEmptyEntries));
        Assert.Contains($"The data folder {_folder} is in use by another WaterMix", line, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Start_OnAnOpenAddress_EndsWithOneSentence()
    {
        (int status, string error) = await StartAsync("--WATERMIX_DATA", _folder, "--urls", "http://0.0.0.0:0");

        Assert.Equal(1, status);
        string line = Assert.Single(error.Split('\n', StringSplitOptions.RemoveEmptyEntries));
        Assert.Contains("can be reached from elsewhere", line, StringComparison.Ordinal);
    }

    public void Dispose() => Directory.Delete(_folder, recursive: true);

    private static async Task<(int Status, string Error)> StartAsync(params string[] arguments)
    {
        var start = new ProcessStartInfo("dotnet", [Path.Combine(AppContext.BaseDirectory, "WaterMix.Web.dll"), .. arguments])
        {
            RedirectStandardError = true,
            RedirectStandardOutput = true,
        };
        using Process process = Process.Start(start)!;
        using var limit = new CancellationTokenSource(TimeSpan.FromMinutes(1));
        try
        {
            string error = await process.StandardError.ReadToEndAsync(limit.Token);
            await process.WaitForExitAsync(limit.Token);
            return (process.ExitCode, error);
        }
        finally
        {
            if (!process.HasExited)
            {
                process.Kill();
            }
        }
    }
}
