using System.CommandLine;
using System.Diagnostics;
using System.Globalization;
using WaterMix.Core;
using WaterMix.Core.Mixing;
using WaterMix.Formats.Json;
using WaterMix.Formats.MixingModels;
using WaterMix.Formats.Reading;
using WaterMix.Formats.Results;

namespace WaterMix.Cli;

/// <summary><c>watermix solve SAMPLES... --model MODEL.json [--out RESULT.csv]</c>: apportions every sample.</summary>
internal static class SolveCommand
{
    /// <summary>The command.</summary>
    public static Command Create()
    {
        var reading = new ReadingArguments();
        var model = new Option<string>("--model") { Description = "The mixing model.", HelpName = "MODEL.json", Required = true };
        Option<string?> output = OutputOption.Table(required: false);
        var threads = new Option<int>("--threads") { Description = "Most threads at work; the result does not depend on it. Default: one per processor.", HelpName = "N", DefaultValueFactory = _ => Environment.ProcessorCount };
        threads.Validators.Add(result =>
        {
            if (result.Tokens.Count > 0 && (!int.TryParse(result.Tokens[0].Value, NumberStyles.None, CultureInfo.InvariantCulture, out int n) || n < 1))
            {
                result.AddError($"--threads: expected a whole number of 1 or more; found '{result.Tokens[0].Value}'.");
            }
        });
        var proof = new Option<bool>("--proof") { Description = "Add kkt_violation: how far each answer is from the optimality conditions, recomputed from the whitened rows." };
        var command = new Command("solve", "Apportions every sample into the model's end-members, corrected for its processes.") { model, output, threads, proof };
        reading.AddTo(command);
        OutputOption.MustNotBeRead(command, output, [model, .. reading.Files]);
        command.SetAction((parse, cancellation) => Task.Run(() => Run(
            reading.Samples(parse),
            findings => reading.Options(parse, findings),
            parse.GetRequiredValue(model),
            parse.GetValue(output),
            new SolveOptions { Threads = parse.GetValue(threads), WithProof = parse.GetValue(proof), Cancellation = cancellation })));
        return command;
    }

    private static int Run(string[] paths, Func<List<Finding>, ReadingOptions?> readOptions, string modelPath, string? outputPath, SolveOptions options)
    {
        var clock = Stopwatch.StartNew();
        var findings = new List<Finding>();
        Reading<MixingModel> reading = NamedDocument.Read(modelPath, "the mixing model", MixingModelFile.Read);
        findings.AddRange(reading.Findings);
        ReadingOptions? readingOptions = readOptions(findings);
        PreparedModel? model = reading.Value is null ? null : PreparedModel.From(reading.Value);
        if (model is not null && readingOptions is not null)
        {
            readingOptions = readingOptions with { NeededQuantities = model.InputIds, Prefer = model.Model.Prefer };
        }

        using OpenedSamples samples = SampleReader.Open(paths, (readingOptions ?? new ReadingOptions()) with { Cancellation = options.Cancellation });
        if (model is null || readingOptions is null || samples.HasErrors)
        {
            return Messages.NotUsable([.. findings, .. samples.Findings]);
        }

        IReadOnlyList<Finding> missing = StreamedSolve.MissingTracers(samples, model);
        if (missing.Count > 0)
        {
            return Messages.NotUsable([.. findings, .. samples.Findings, .. missing]);
        }

        using var output = new OutputFile(outputPath);
        SolveSummary summary = output.Write(stream => StreamedSolve.Run(samples, model, options, stream, new SampleProgress("solved")));
        findings.AddRange(summary.Findings);
        if (summary.HasErrors)
        {
            return Messages.NotUsable(findings);
        }

        output.Finish();
        Messages.Print(findings);
        Console.Error.WriteLine(Summary(summary, model, outputPath, clock.Elapsed, options.WithProof));
        return ExitStatus.Done;
    }

    private static string Summary(SolveSummary summary, PreparedModel model, string? outputPath, TimeSpan elapsed, bool withProof)
    {
        string statuses = string.Join(", ", summary.Statuses.OrderByDescending(s => s.Key).Select(s => $"{Messages.Count(s.Value)} {s.Key.Name()}"));
        string proof = withProof ? string.Create(CultureInfo.InvariantCulture, $"; largest optimality violation {summary.LargestKktViolation:0.0e+0}") : "";
        return string.Create(
            CultureInfo.InvariantCulture,
            $"watermix: {Messages.Count(summary.Rows)} samples in {elapsed.TotalSeconds:0.0} s: {statuses}{proof}; model {ContentHash.OfModel(model.Model)[..8]}, samples {summary.SamplesHash[..8]}{(outputPath is null ? "" : $"; {outputPath}")}");
    }
}
