using Microsoft.AspNetCore.Http.HttpResults;
using WaterMix.Formats.EndMemberSets;
using WaterMix.Formats.MixingModels;
using WaterMix.Workspace.Studies;

namespace WaterMix.Web.Api;

/// <summary>Studies to read.</summary>
internal static class StudyEndpoints
{
    /// <summary>Adds the endpoints.</summary>
    public static void MapStudies(this RouteGroupBuilder api)
    {
        RouteGroupBuilder studies = api.MapGroup("/studies").WithTags("Studies");
        studies.MapGet("/", ListAsync).WithName("studies").WithSummary("The studies, the last changed first");
        studies.MapGet("/{id:guid}", FindAsync).WithName("study").WithSummary("A study: its cruises and runs");
        studies.MapGet("/{id:guid}/model.json", ModelAsync).WithName("studyModel").WithSummary("The model being edited, its set inline; may be incomplete").Produces(200, contentType: "application/json");
        studies.MapGet("/{id:guid}/endmembers.json", EndMembersAsync).WithName("studyEndMembers").WithSummary("The end-member set being edited").Produces(200, contentType: "application/json");
    }

    /// <summary>The studies.</summary>
    /// <param name="studies">The studies.</param>
    /// <param name="search">Part of a name, without case.</param>
    public static async Task<Ok<StudySummary[]>> ListAsync(IStudies studies, string? search = null) => TypedResults.Ok((await studies.ListAsync(search)).ToArray());

    /// <summary>A study.</summary>
    public static async Task<Results<Ok<StudyView>, ProblemHttpResult>> FindAsync(Guid id, IStudies studies) =>
        await studies.FindAsync(id) is { } study ? TypedResults.Ok(StudyView.Of(study)) : Missing(id);

    /// <summary>The model being edited, as the command line reads it once it is complete.</summary>
    public static async Task<Results<FileContentHttpResult, ProblemHttpResult>> ModelAsync(Guid id, IStudies studies) =>
        await studies.FindAsync(id) is { } study
            ? TypedResults.File(MixingModelFile.Write(study.Draft with { EndMembersFile = null }), "application/json", "model.mixmodel.json")
            : Missing(id);

    /// <summary>The end-member set being edited.</summary>
    public static async Task<Results<FileContentHttpResult, ProblemHttpResult>> EndMembersAsync(Guid id, IStudies studies) =>
        await studies.FindAsync(id) is { } study
            ? TypedResults.File(EndMemberSetFile.Write(study.Draft.EndMembers), "application/json", "set.endmembers.json")
            : Missing(id);

    private static ProblemHttpResult Missing(Guid id) => Problems.NotFound($"There is no study {id}, or it was deleted. GET /api/studies lists those there are.");
}
