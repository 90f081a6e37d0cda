using Microsoft.AspNetCore.Http.HttpResults;
using Microsoft.AspNetCore.OpenApi;

namespace WaterMix.Web.Api;

/// <summary>The HTTP API under <c>/api</c>, over the same services as the pages.</summary>
internal static class ApiRoutes
{
    /// <summary>Adds every endpoint and the description at <c>/openapi/v1.json</c>.</summary>
    public static void MapApi(this IEndpointRouteBuilder routes)
    {
        RouteGroupBuilder api = routes.MapGroup("/api");
        api.MapSolve();
        api.MapInspect();
        api.MapStudies();
        api.MapRuns();
        api.MapColumns();
        api.MapExamples();
        api.Map("/{**rest}", NoSuchEndpoint).ExcludeFromDescription();
        routes.MapOpenApi("/openapi/{documentName}.json");
    }

    /// <summary>The head of the description.</summary>
    public static void Describe(OpenApiOptions options) => options.AddDocumentTransformer((document, _, _) =>
    {
        document.Info.Title = "WaterMix";
        document.Info.Version = "1";
        document.Info.Description = "Apportions sea water samples into source waters. Errors are problem details (RFC 9457); those about an input list every finding under \"findings\".";
        document.Servers = [];
        return Task.CompletedTask;
    });

    private static ProblemHttpResult NoSuchEndpoint(HttpContext context) =>
        TypedResults.Problem($"There is no {context.Request.Method} {context.Request.Path} here. /openapi/v1.json lists what there is.", statusCode: StatusCodes.Status404NotFound, title: "Not found");
}
