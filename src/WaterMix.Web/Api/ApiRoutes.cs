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

    /// <summary>Adds a sentence to the answers that the framework makes by itself.</summary>
    public static void Explain(ProblemDetailsOptions options) => options.CustomizeProblemDetails = context =>
        context.ProblemDetails.Detail ??= context.HttpContext.Response.StatusCode switch
        {
            StatusCodes.Status404NotFound => "There is nothing at this address. /openapi/v1.json lists what there is.",
            StatusCodes.Status405MethodNotAllowed => "This address takes another method. /openapi/v1.json says which.",
            StatusCodes.Status415UnsupportedMediaType => "This address takes a multipart form (multipart/form-data). /openapi/v1.json says with which fields.",
            StatusCodes.Status400BadRequest => "A parameter is missing or not of its type. /openapi/v1.json lists them.",
            _ => "Something failed here; nothing was changed. Try again; if it fails again, the window in which WaterMix runs says more.",
        };
}
