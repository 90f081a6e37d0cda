using WaterMix.Core;
using WaterMix.Core.Mixing;
using WaterMix.Formats.Json;
using WaterMix.Formats.MixingModels;
using WaterMix.Formats.Reading;
using WaterMix.Formats.Results;
using WaterMix.Web.Hosting;
using WaterMix.Workspace;

namespace WaterMix.Web.Api;

/// <summary><c>POST /api/solve</c>: samples and a model in, results out; nothing is kept.</summary>
internal static class SolveEndpoint
{
    // One request at a time: each uses every processor already.
    private static readonly SemaphoreSlim Turn = new(1);

    /// <summary>Adds the endpoint.</summary>
    public static void MapSolve(this RouteGroupBuilder api) => api.MapPost("/solve", SolveAsync)
        .WithName("solve")
        .WithTags("Solving")
        .WithSummary("Apportions every sample into the model's end-members")
        .WithDescription(
            "A multipart form: \"samples\" (one or more files: WHP-Exchange, zip files of casts, CSV), \"model\" (a mixing model), \"endMembers\" (the set that the model names by its file, "
            + "unless the set is in the model), \"columns\" (a column match; optional). The answer is what the command line would write.")
        .Accepts<SolveForm>("multipart/form-data")
        .Produces<string>(StatusCodes.Status200OK, "text/csv")
        .ProducesProblem(StatusCodes.Status400BadRequest)
        .ProducesProblem(StatusCodes.Status413PayloadTooLarge)
        .ProducesProblem(StatusCodes.Status422UnprocessableEntity);

    /// <summary>Solves the samples of the form.</summary>
    /// <param name="context">The request.</param>
    /// <param name="scratch">Where files stand meanwhile.</param>
    /// <param name="limits">The largest request.</param>
    /// <param name="acceptFlags">Water-sample flags with which a bottle value is used where bottle and CTD values are merged; 2,6 unless given.</param>
    /// <param name="laboratoryTemperature">Temperature at which nutrients per litre were measured, degC; 20 unless given.</param>
    /// <param name="proof">True to add kkt_violation.</param>
    public static Task<IResult> SolveAsync(
        HttpContext context, ScratchFolders scratch, WorkspaceOptions limits, string? acceptFlags = null, double? laboratoryTemperature = null, bool proof = false) =>
        FormRequest.AnswerAsync(context, scratch, limits, ["samples", "model", "endMembers", ReadingQuery.Columns], async form =>
        {
            if (form["samples"].Count == 0 || form["model"].Count != 1)
            {
                return Problems.BadRequest("Expected at least one file in the field \"samples\" and one in \"model\".");
            }

            await Turn.WaitAsync(context.RequestAborted);
            try
            {
                return await Task.Run(() => Solve(form, acceptFlags, laboratoryTemperature, new SolveOptions { WithProof = proof, Cancellation = context.RequestAborted }));
            }
            finally
            {
                Turn.Release();
            }
        });

    private static IResult Solve(ReceivedForm form, string? acceptFlags, double? laboratoryTemperature, SolveOptions options)
    {
        var findings = new List<Finding>();
        StoredFile modelFile = form["model"][0];
        Reading<MixingModel> reading = MixingModelFile.Read(File.ReadAllBytes(modelFile.Path), modelFile.Name, name => OpenSet(form, name));
        findings.AddRange(reading.Findings);
        ReadingOptions? readingOptions = ReadingQuery.Read(acceptFlags, laboratoryTemperature, form, findings);
        PreparedModel? model = reading.Value is null ? null : PreparedModel.From(reading.Value);
        if (model is not null && readingOptions is not null)
        {
            readingOptions = readingOptions with { NeededQuantities = model.InputIds, Prefer = model.Model.Prefer };
        }

        using OpenedSamples samples = SampleReader.OpenStored(form["samples"], readingOptions ?? new ReadingOptions());
        if (model is null || readingOptions is null || samples.HasErrors)
        {
            return Problems.NotUsable([.. findings, .. samples.Findings]);
        }

        IReadOnlyList<Finding> missing = StreamedSolve.MissingTracers(samples, model);
        if (missing.Count > 0)
        {
            return Problems.NotUsable([.. findings, .. samples.Findings, .. missing]);
        }

        string path = form.NextPath();
        using (FileStream output = new(path, FileMode.CreateNew))
        {
            SolveSummary summary = StreamedSolve.Run(samples, model, options, output, progress: null);
            if (summary.HasErrors)
            {
                return Problems.NotUsable([.. findings, .. summary.Findings]);
            }
        }

        return TypedResults.PhysicalFile(path, "text/csv; charset=utf-8", "results.csv");
    }

    /// <summary>The set that a model names, among the files of the form; a single one is taken whatever its name.</summary>
    private static (byte[] Utf8, string FileName) OpenSet(ReceivedForm form, string name)
    {
        IReadOnlyList<StoredFile> sets = form["endMembers"];
        StoredFile? file = sets.Count == 1 ? sets[0] : sets.FirstOrDefault(f => f.Name == name[(name.LastIndexOf('/') + 1)..]);
        return file is not null
            ? (File.ReadAllBytes(file.Path), file.Name)
            : throw new FileNotFoundException($"the form has no file '{name}' in the field \"endMembers\"");
    }
}
