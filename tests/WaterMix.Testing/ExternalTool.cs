using System.ComponentModel;
using System.Diagnostics;
using Xunit;

namespace WaterMix.Testing;

/// <summary>Runs a reference library's script, or skips the running test with a clear message where that library is not installed.</summary>
public static class ExternalTool
{
    /// <summary>The lines that the script prints.</summary>
    /// <param name="probe">A command that succeeds only where the library is installed.</param>
    /// <param name="command">The command and its arguments.</param>
    /// <param name="package">What to install, for the message.</param>
    public static IReadOnlyList<string> Lines(string[] probe, string[] command, string package)
    {
        Assert.SkipUnless(Run(probe).ExitCode == 0, $"{package} is not installed here, so its slice is not run again; tests/run installs it where apt and root are at hand.");
        (int exitCode, string output, string error) = Run(command);
        Assert.True(exitCode == 0, $"{string.Join(' ', command)} ended with {exitCode}: {error}");
        return output.Split('\n', StringSplitOptions.RemoveEmptyEntries);
    }

    private static (int ExitCode, string Output, string Error) Run(string[] command)
    {
        try
        {
            using var process = Process.Start(new ProcessStartInfo(command[0], command[1..])
            {
                RedirectStandardOutput = true,
                RedirectStandardError = true,
            })!;
            Task<string> error = process.StandardError.ReadToEndAsync();
            string output = process.StandardOutput.ReadToEnd();
            process.WaitForExit();
            return (process.ExitCode, output, error.Result);
        }
        catch (Win32Exception)
        {
            return (-1, "", $"{command[0]} is not here");
        }
    }
}
