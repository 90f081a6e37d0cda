using Microsoft.AspNetCore.Http.HttpResults;
using WaterMix.Core;

namespace WaterMix.Web.Api;

/// <summary>The API's errors as problem details (RFC 9457), each with a sentence that says what to do.</summary>
internal static class Problems
{
    /// <summary>An input that is not usable: 422, with all findings.</summary>
    public static ProblemHttpResult NotUsable(IEnumerable<Finding> findings)
    {
        Finding[] all = [.. findings];
        string errors = string.Join(" ", all.Where(f => f.Severity == Severity.Error).Select(f => f.ToString()).Take(3));
        return TypedResults.Problem(
            errors,
            statusCode: StatusCodes.Status422UnprocessableEntity,
            title: "The input is not usable",
            extensions: new Dictionary<string, object?> { ["findings"] = all.Select(FindingView.Of).ToArray() });
    }

    /// <summary>A request that cannot be understood: 400.</summary>
    public static ProblemHttpResult BadRequest(string sentence) => TypedResults.Problem(sentence, statusCode: StatusCodes.Status400BadRequest, title: "The request is not usable");

    /// <summary>Something that is not there: 404.</summary>
    public static ProblemHttpResult NotFound(string sentence) => TypedResults.Problem(sentence, statusCode: StatusCodes.Status404NotFound, title: "Not found");

    /// <summary>A body that is too large: 413.</summary>
    public static ProblemHttpResult TooLarge(long mostBytes) => TypedResults.Problem(
        $"The files are larger than {mostBytes >> 20} MB together. Send fewer, or pack them into a zip file.", statusCode: StatusCodes.Status413PayloadTooLarge, title: "The request is too large");
}
