using System.CommandLine;
using System.CommandLine.Invocation;
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
    ParseResult parse = root.Parse(args);
    var configuration = new InvocationConfiguration { EnableDefaultExceptionHandler = false };
    if (parse.Action is ParseErrorAction wrongUsage)
    {
        // The standard output is for results, and a pipe would take anything else for them.
        configuration.Output = configuration.Error;
        wrongUsage.ShowHelp = false;
        await parse.InvokeAsync(configuration);
        return Messages.WrongUsage(parse.CommandResult.Command);
    }

    int status = await parse.InvokeAsync(configuration);
    return status is ExitStatus.Done or ExitStatus.Stopped or ExitStatus.NotUsable ? status : Messages.Interrupted();
}
catch (OperationCanceledException)
{
    return Messages.Interrupted();
}
catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
{
    return Messages.NotPossible(fault);
}
catch (Exception fault)
{
    return Messages.ProgramFault(fault, args);
}
