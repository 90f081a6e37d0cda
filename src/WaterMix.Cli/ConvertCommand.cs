using System.CommandLine;
using WaterMix.Core;
using WaterMix.Core.Quantities;
using WaterMix.Core.Seawater;
using WaterMix.Formats.Csv;
using WaterMix.Formats.Reading;

namespace WaterMix.Cli;

/// <summary><c>watermix convert SAMPLES... --out FILE</c>: samples to a tidy table in canonical quantities.</summary>
internal static class ConvertCommand
{
    /// <summary>The command.</summary>
    public static Command Create()
    {
        var reading = new ReadingArguments();
        Option<string?> output = OutputOption.Table(required: true);
        var derive = new Option<string[]>("--derive")
        {
            Description = "Quantities to derive and add, such as potential_temperature,sigma0.",
            HelpName = "IDS",
            CustomParser = result =>
            {
                string[] ids = [.. result.Tokens.SelectMany(t => t.Value.Split(',', StringSplitOptions.TrimEntries | StringSplitOptions.RemoveEmptyEntries))];
                foreach (string id in ids.Where(id => !SampleDerivation.CanDerive(id)))
                {
                    result.AddError($"--derive: expected ids of quantities that can be derived ({string.Join(", ", Quantity.All.Select(q => q.Id).Where(SampleDerivation.CanDerive))}); found '{id}'.");
                }

                return ids;
            },
            DefaultValueFactory = _ => [],
        };
        var command = new Command("convert", "Writes samples as a tidy table in canonical quantities and units.") { output, derive };
        reading.AddTo(command);
        OutputOption.MustNotBeRead(command, output, reading.Files);
        command.SetAction((parse, cancellation) => Task.Run(() => Run(
            reading.Samples(parse), findings => reading.Options(parse, findings), parse.GetRequiredValue(output)!, parse.GetRequiredValue(derive), cancellation)));
        return command;
    }

    private static int Run(string[] paths, Func<List<Finding>, ReadingOptions?> readOptions, string outputPath, string[] derive, CancellationToken cancellation)
    {
        var findings = new List<Finding>();
        if (readOptions(findings) is not { } options)
        {
            return Messages.NotUsable(findings);
        }

        using OpenedSamples samples = SampleReader.Open(paths, options with { Cancellation = cancellation });
        if (samples.HasErrors)
        {
            return Messages.NotUsable(samples.Findings);
        }

        using var output = new OutputFile(outputPath);
        var progress = new SampleProgress("converted");
        long rows = output.Write(stream =>
        {
            long written = 0;
            using var csv = new TidyCsvWriter(stream);
            foreach (SampleBlock block in samples.ReadBlocks(cancellation))
            {
                DerivedSamples derived = SampleDerivation.Derive(block.Table, derive);
                findings.AddFolded(derived.Notes);
                csv.Write(derived.Table);
                written += derived.Table.RowCount;
                progress.Report(written);
            }

            return written;
        });

        if (samples.HasErrors)
        {
            return Messages.NotUsable(samples.Findings);
        }

        output.Finish();
        Messages.Print([.. samples.Findings, .. findings]);
        Console.Error.WriteLine($"watermix: {Messages.Count(rows)} samples converted; {outputPath}");
        return ExitStatus.Done;
    }
}
