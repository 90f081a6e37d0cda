using System.Diagnostics;
using WaterMix.Testing;

namespace WaterMix.Cli.Tests;

/// <summary>The command, run as a user runs it: a process of its own, with its exit status and both streams.</summary>
internal sealed record CommandRun(int ExitCode, string Output, string Error)
{
    public static CommandRun Of(params string[] arguments) => Of(StartInfo(arguments));

    /// <summary>In a folder.</summary>
    public static CommandRun In(string folder, params string[] arguments)
    {
        ProcessStartInfo start = StartInfo(arguments);
        start.WorkingDirectory = folder;
        return Of(start);
    }

    /// <summary>With bytes on the standard input, which is a pipe.</summary>
    public static CommandRun WithInput(byte[] input, params string[] arguments)
    {
        ProcessStartInfo start = StartInfo(arguments);
        start.RedirectStandardInput = true;
        return Of(start, process =>
        {
            using Stream standard = process.StandardInput.BaseStream;
            standard.Write(input);
        });
    }

    /// <summary>With a variable of the environment set.</summary>
    public static CommandRun WithVariable(string name, string value, params string[] arguments)
    {
        ProcessStartInfo start = StartInfo(arguments);
        start.Environment[name] = value;
        return Of(start);
    }

    /// <summary>Interrupted as by Ctrl-C, once it is so far as the test says.</summary>
    /// <param name="isTime">Asked again and again whether it is time to interrupt.</param>
    /// <param name="arguments">The arguments.</param>
    public static CommandRun Interrupted(Func<bool> isTime, params string[] arguments)
    {
        // A shell that runs the tests in the background lets them ignore the signal, and so would the command.
        ProcessStartInfo start = StartInfo(arguments);
        start.FileName = "env";
        start.ArgumentList.Insert(0, "dotnet");
        start.ArgumentList.Insert(0, "--default-signal=INT");
        start.RedirectStandardInput = true;
        return Of(start, process =>
        {
            while (!process.HasExited && !isTime())
            {
                Thread.Sleep(20);
            }

            using var kill = Process.Start("kill", ["-INT", $"{process.Id}"]);
            kill.WaitForExit();
            if (!process.WaitForExit(TimeSpan.FromSeconds(60)))
            {
                process.Kill();
            }
        });
    }

    /// <summary>Asserts that the command line was refused: status 1, an explanation on the error stream, no stack trace, nothing else.</summary>
    public void AssertRefused()
    {
        Assert.True(ExitCode == 1, $"exit status {ExitCode}: {Error}");
        Assert.Contains("--help' shows the usage", Error, StringComparison.Ordinal);
        Assert.DoesNotContain("   at ", Error, StringComparison.Ordinal);
        Assert.Empty(Output);
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
        Assert.DoesNotContain("(Parameter", Error, StringComparison.Ordinal);
        Assert.DoesNotMatch(@"[^.]\.\. ", Error);
        Assert.Empty(Output);
        Assert.False(File.Exists(outputPath));
        Assert.Empty(Directory.GetFiles(Path.GetDirectoryName(outputPath)!, "*.unfinished"));
    }

    private static ProcessStartInfo StartInfo(string[] arguments) =>
        new("dotnet", [Path.Combine(AppContext.BaseDirectory, "watermix.dll"), .. arguments])
        {
            RedirectStandardOutput = true,
            RedirectStandardError = true,
            WorkingDirectory = TestData.Root,
        };

    private static CommandRun Of(ProcessStartInfo start, Action<Process>? meanwhile = null)
    {
        using Process process = Process.Start(start)!;
        Task<string> error = process.StandardError.ReadToEndAsync();
        Task<string> output = process.StandardOutput.ReadToEndAsync();
        meanwhile?.Invoke(process);
        process.WaitForExit();
        return new CommandRun(process.ExitCode, output.Result, error.Result);
    }
}
