using System.CommandLine;
using WaterMix.Core;
using WaterMix.Formats.Reading;

namespace WaterMix.Cli;

/// <summary><c>watermix inspect SAMPLES... [--json]</c>: what the reader makes of files.</summary>
internal static class InspectCommand
{
    /// <summary>The command.</summary>
    public static Command Create()
    {
        var reading = new ReadingArguments();
        var json = new Option<bool>("--json") { Description = "The report as JSON." };
        Option<string?> save = OutputOption.Create("--save-columns", "Write the column match as it was guessed, to correct and to give to --columns.", "MATCH.json", required: false);
        var command = new Command("inspect", "Says what the reader makes of files: format, columns, units, conversions, flags, problems.") { json, save };
        reading.AddTo(command);
        OutputOption.MustNotBeRead(command, save, reading.Files);
        command.SetAction((parse, cancellation) => Task.Run(() => Run(
            reading.Samples(parse), findings => reading.Options(parse, findings), parse.GetValue(json), parse.GetValue(save), cancellation)));
        return command;
    }

    private static int Run(string[] paths, Func<List<Finding>, ReadingOptions?> readOptions, bool json, string? save, CancellationToken cancellation)
    {
        var findings = new List<Finding>();
        if (readOptions(findings) is not { } options)
        {
            return Messages.NotUsable(findings);
        }

        using OpenedSamples samples = SampleReader.Open(paths, options with { Cancellation = cancellation });
        var progress = new SampleProgress("read");
        foreach (SampleBlock block in samples.ReadBlocks(cancellation))
        {
            progress.Report(block.FirstRow + block.Table.RowCount - 1);
        }

        if (save is not null)
        {
            using var output = new OutputFile(save);
            output.WriteBytes(samples.Match.Write());
            output.Finish();
        }

        Console.Out.Write(json ? ImportReportJson.Write(samples.Report) : samples.Report.ToText());

        return samples.HasErrors ? ExitStatus.NotUsable : ExitStatus.Done;
    }
}
