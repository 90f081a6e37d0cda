using Microsoft.AspNetCore.Http.HttpResults;
using WaterMix.Core;
using WaterMix.Formats.Reading;
using WaterMix.Web.Hosting;
using WaterMix.Workspace;

namespace WaterMix.Web.Api;

/// <summary><c>POST /api/inspect</c>: what the reader makes of sample files; nothing is kept.</summary>
internal static class InspectEndpoint
{
    /// <summary>Adds the endpoint.</summary>
    public static void MapInspect(this RouteGroupBuilder api) => api.MapPost("/inspect", InspectAsync)
        .WithName("inspect")
        .WithTags("Solving")
        .WithSummary("Says what the reader makes of sample files")
        .WithDescription("A multipart form: \"samples\" (one or more files), \"columns\" (a column match; optional). The answer is the import report, also where it holds errors.")
        .Accepts<InspectForm>("multipart/form-data")
        .Produces<ImportReport>()
        .ProducesProblem(StatusCodes.Status400BadRequest)
        .ProducesProblem(StatusCodes.Status413PayloadTooLarge)
        .ProducesProblem(StatusCodes.Status422UnprocessableEntity);

    /// <summary>Reads the samples of the form.</summary>
    /// <param name="context">The request.</param>
    /// <param name="scratch">Where files stand meanwhile.</param>
    /// <param name="limits">The largest request.</param>
    /// <param name="acceptFlags">Water-sample flags with which a bottle value is used where bottle and CTD values are merged; 2,6 unless given.</param>
    /// <param name="laboratoryTemperature">Temperature at which nutrients per litre were measured, degC; 20 unless given.</param>
    public static Task<IResult> InspectAsync(HttpContext context, ScratchFolders scratch, WorkspaceOptions limits, string? acceptFlags = null, double? laboratoryTemperature = null) =>
        FormRequest.AnswerAsync(context, scratch, limits, ["samples", ReadingQuery.Columns], form => Task.Run<IResult>(() =>
        {
            var findings = new List<Finding>();
            if (form["samples"].Count == 0)
            {
                return Problems.BadRequest("Expected at least one file in the field \"samples\".");
            }

            return ReadingQuery.Read(acceptFlags, laboratoryTemperature, form, findings) is { } options
                ? Inspect(form["samples"], options, context.RequestAborted)
                : Problems.NotUsable(findings);
        }));

    private static ContentHttpResult Inspect(IReadOnlyList<StoredFile> files, ReadingOptions options, CancellationToken cancellation)
    {
        using OpenedSamples samples = SampleReader.OpenStored(files, options);
        foreach (SampleBlock _ in samples.ReadBlocks(cancellation))
        {
            // The report counts as the rows pass.
        }

        return TypedResults.Text(ImportReportJson.Write(samples.Report), "application/json");
    }
}
