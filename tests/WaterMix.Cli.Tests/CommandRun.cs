using System.Diagnostics;
using WaterMix.Testing;

namespace WaterMix.Cli.Tests;

/// <summary>The command, run as a user runs it: a process of its own, with its exit status and both streams.</summary>
internal sealed record CommandRun(int ExitCode, string Output, string Error)
{
    public static CommandRun Of(params string[] arguments)
    {
        string command = Path.Combine(AppContext.BaseDirectory, "watermix.dll");
        using var process = Process.Start(new ProcessStartInfo("dotnet", [command, .. arguments])
        {
            RedirectStandardOutput = true,
            RedirectStandardError = true,
            WorkingDirectory = TestData.Root,
        })!;
        Task<string> error = process.StandardError.ReadToEndAsync();
        string output = process.StandardOutput.ReadToEnd();
        process.WaitForExit();
        return new CommandRun(process.ExitCode, output, error.Result);
    }

    /// <summary>Asserts that the input was refused as the contract says: findings, status 2, no stack trace, nothing written.</summary>
    public void AssertNotUsable(string outputPath)
    {
        Assert.True(ExitCode == 2, $"exit status {ExitCode}: {Error}");
        Assert.Contains("error: ", Error, StringComparison.Ordinal);
        Assert.Contains("expected ", Error, StringComparison.Ordinal);
        Assert.Contains("; found ", Error, StringComparison.Ordinal);
        Assert.Contains("nothing was written", Error, StringComparison.Ordinal);
        Assert.DoesNotContain("   at ", Error, StringComparison.Ordinal);
        Assert.Empty(Output);
        Assert.False(File.Exists(outputPath));
        Assert.Empty(Directory.GetFiles(Path.GetDirectoryName(outputPath)!, "*.unfinished"));
    }
}
