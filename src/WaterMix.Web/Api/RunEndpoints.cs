using Microsoft.AspNetCore.Http.HttpResults;
using WaterMix.Formats.MixingModels;
using WaterMix.Workspace.Runs;

namespace WaterMix.Web.Api;

/// <summary>Runs to read.</summary>
internal static class RunEndpoints
{
    /// <summary>Adds the endpoints.</summary>
    public static void MapRuns(this RouteGroupBuilder api)
    {
        RouteGroupBuilder runs = api.MapGroup("/runs").WithTags("Runs");
        runs.MapGet("/{id:guid}", FindAsync).WithName("run").WithSummary("A run and how far it is");
        runs.MapGet("/{id:guid}/results.csv", ResultsAsync).WithName("runResults").WithSummary("The results, as the command line would write them")
            .Produces(200, contentType: "text/csv").ProducesProblem(404).ProducesProblem(409);
        runs.MapGet("/{id:guid}/model.json", ModelAsync).WithName("runModel").WithSummary("The run's model, its set inline").Produces(200, contentType: "application/json");
    }

    /// <summary>A run.</summary>
    public static async Task<Results<Ok<RunView>, ProblemHttpResult>> FindAsync(Guid id, IRuns runs) =>
        await runs.FindAsync(id) is { } run ? TypedResults.Ok(RunView.Of(run)) : Missing(id);

    /// <summary>The results of a finished run.</summary>
    public static async Task<IResult> ResultsAsync(Guid id, IRuns runs) => await runs.FindAsync(id) switch
    {
        null => Missing(id),
        { State: RunState.Finished } => TypedResults.Stream(output => runs.WriteCsvAsync(id, output, CancellationToken.None), "text/csv; charset=utf-8", "results.csv"),
        { } run => NotFinished(run),
    };

    /// <summary>The model of a run, which the command line turns into the same results.</summary>
    public static async Task<Results<FileContentHttpResult, ProblemHttpResult>> ModelAsync(Guid id, IRuns runs) =>
        await runs.FindAsync(id) is { } run
            ? TypedResults.File(MixingModelFile.Write(run.Model with { EndMembersFile = null }), "application/json", "model.mixmodel.json")
            : Missing(id);

    /// <summary>The answer about a run that is not there.</summary>
    public static ProblemHttpResult Missing(Guid id) => Problems.NotFound($"There is no run {id}. GET /api/studies/{{id}} lists the runs of a study.");

    /// <summary>The answer about a run that has no results yet, or never will.</summary>
    public static ProblemHttpResult NotFinished(Run run) => TypedResults.Problem(
        run.State is RunState.Waiting or RunState.Running
            ? $"The run is {RunView.NameOf(run.State)}: {run.Done} of {run.Total} samples are solved. Ask again when it has finished."
            : $"The run was {RunView.NameOf(run.State)} and has no results. {run.Problem ?? "Start another."}",
        statusCode: StatusCodes.Status409Conflict,
        title: "The run has no results");
}
