using System.CommandLine;
using WaterMix.Cli;

var root = new RootCommand("Apportions sea water samples into source waters: water-mass mixing analysis (optimum multiparameter).")
{
    SolveCommand.Create(),
    InspectCommand.Create(),
    ConvertCommand.Create(),
    ConvertSetCommand.Create(),
};

try
{
    var configuration = new InvocationConfiguration { EnableDefaultExceptionHandler = false };
    return await root.Parse(args).InvokeAsync(configuration);
}
catch (OperationCanceledException)
{
    Console.Error.WriteLine("watermix: interrupted; nothing was written.");
    return ExitStatus.Stopped;
}
catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
{
    Console.Error.WriteLine($"watermix: {fault.Message} Nothing was written; check the name, the folder and the free space, then run it again.");
    return ExitStatus.Stopped;
}
