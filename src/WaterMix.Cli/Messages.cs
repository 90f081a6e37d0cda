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
