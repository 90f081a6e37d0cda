using System.CommandLine;
using System.Diagnostics;
using System.Globalization;
using WaterMix.Core;

namespace WaterMix.Cli;

/// <summary>What the commands say on the error stream, where it stays out of the way of results.</summary>
internal static class Messages
{
    /// <summary>Prints findings, one per line.</summary>
    public static void Print(IEnumerable<Finding> findings)
    {
        foreach (Finding finding in findings)
        {
            Console.Error.WriteLine(finding.ToString());
        }
    }

    /// <summary>Prints findings of an input that is not usable, and says so.</summary>
    public static int NotUsable(IEnumerable<Finding> findings)
    {
        Finding[] all = [.. findings];
        Print(all);
        int errors = all.Count(f => f.Severity == Severity.Error);
        Console.Error.WriteLine(string.Create(
            CultureInfo.InvariantCulture, $"watermix: the input is not usable ({errors} {(errors == 1 ? "error" : "errors")}); nothing was written."));
        return ExitStatus.NotUsable;
    }

    /// <summary>Ends what the parser said of a wrong command line with where to look.</summary>
    /// <param name="command">The command that was meant.</param>
    public static int WrongUsage(Command command)
    {
        Console.Error.WriteLine($"watermix: nothing was done; 'watermix {(command is RootCommand ? "" : command.Name + " ")}--help' shows the usage.");
        return ExitStatus.Stopped;
    }

    /// <summary>Says that the work was interrupted.</summary>
    public static int Interrupted()
    {
        Console.Error.WriteLine("watermix: interrupted; nothing was written.");
        return ExitStatus.Stopped;
    }

    /// <summary>Says what the system refused.</summary>
    public static int NotPossible(Exception fault)
    {
        Console.Error.WriteLine($"watermix: {fault.Message.TrimEnd('.')}. Nothing was written; check the name, the folder and the free space, then run it again.");
        return ExitStatus.Stopped;
    }

    /// <summary>Owns up to what nobody foresaw, in one sentence that can be reported.</summary>
    /// <param name="fault">What was thrown.</param>
    /// <param name="arguments">The command line.</param>
    public static int ProgramFault(Exception fault, string[] arguments)
    {
        string command = string.Join(' ', arguments.Select(a => a.Length == 0 || a.Any(char.IsWhiteSpace) ? $"\"{a}\"" : a));
        string message = string.Join(' ', fault.Message.Split(['\r', '\n'], StringSplitOptions.RemoveEmptyEntries)).TrimEnd('.');
        Console.Error.WriteLine($"watermix: stopped by a fault of the program, and nothing was written; please report this command and this message to whoever maintains the program: watermix {command}: {fault.GetType().Name}: {message}.");
        return ExitStatus.Stopped;
    }

    /// <summary>True where an error is among the findings.</summary>
    public static bool HasError(this IEnumerable<Finding> findings) => findings.Any(f => f.Severity == Severity.Error);

    /// <summary>A count with thousands apart, as in running text.</summary>
    public static string Count(long count) => count.ToString("N0", CultureInfo.InvariantCulture);
}

/// <summary>Says now and then how many samples are done.</summary>
/// <param name="verb">What is done with them, such as "solved".</param>
internal sealed class SampleProgress(string verb) : IProgress<long>
{
    private static readonly TimeSpan Pause = TimeSpan.FromSeconds(1);

    private readonly Stopwatch _sinceLast = Stopwatch.StartNew();

    /// <inheritdoc/>
    public void Report(long value)
    {
        if (_sinceLast.Elapsed >= Pause)
        {
            _sinceLast.Restart();
            Console.Error.WriteLine($"watermix: {Messages.Count(value)} samples {verb}");
        }
    }
}
