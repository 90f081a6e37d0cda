using Microsoft.AspNetCore.Antiforgery;
using Microsoft.AspNetCore.Http.Features;
using Microsoft.AspNetCore.Http.HttpResults;
using Microsoft.Extensions.Options;
using WaterMix.Workspace;
using WaterMix.Workspace.Cruises;

namespace WaterMix.Web.Hosting;

/// <summary>
/// Receives sample files in a stream, beside the page's connection. The antiforgery token comes in a header, so that it is checked before a
/// byte of the body is read; a file never stands in memory.
/// </summary>
internal static class UploadEndpoints
{
    // What a form wraps around each file.
    private const long FormOverhead = 1 << 20;

    /// <summary>Adds the endpoints.</summary>
    public static void MapUploads(this IEndpointRouteBuilder routes)
    {
        RouteGroupBuilder uploads = routes.MapGroup("/uploads").ExcludeFromDescription();
        uploads.MapGet("/token", Token);
        uploads.MapPost("/{upload:guid}", ReceiveAsync).DisableAntiforgery(); // Checked by hand, before the body.
    }

    /// <summary>The token that the next upload shows, and the header to show it in. The cookie beside it keeps other sites from using one.</summary>
    public static JsonHttpResult<UploadToken> Token(HttpContext context, IAntiforgery antiforgery)
    {
        AntiforgeryTokenSet tokens = antiforgery.GetAndStoreTokens(context);
        return TypedResults.Json(new UploadToken(tokens.HeaderName!, tokens.RequestToken!));
    }

    /// <summary>Receives the files of a multipart body, one after another.</summary>
    public static async Task<Results<NoContent, ProblemHttpResult>> ReceiveAsync(
        Guid upload, HttpContext context, IAntiforgery antiforgery, ICruises cruises, WorkspaceOptions limits)
    {
        AntiforgeryOptions options = context.RequestServices.GetRequiredService<IOptions<AntiforgeryOptions>>().Value;
        if (!context.Request.Headers.ContainsKey(options.HeaderName!) || !await antiforgery.IsRequestValidAsync(context))
        {
            return Problem(StatusCodes.Status400BadRequest, "The upload does not come from a page of this WaterMix, or the page has grown old. Load the page again and add the files once more.");
        }

        long limit = limits.MostUploadBytes + FormOverhead;
        string tooLarge = $"The files are larger than {limits.MostUploadBytes >> 20} MB. Pack them into a zip file, send them as several cruises, or raise {WebHost.UploadLimit} where WaterMix is started.";
        if (context.Features.Get<IHttpMaxRequestBodySizeFeature>() is { IsReadOnly: false } size)
        {
            size.MaxRequestBodySize = limit;
        }

        if (context.Request.ContentLength > limit)
        {
            return Problem(StatusCodes.Status413PayloadTooLarge, tooLarge);
        }

        try
        {
            int received = await ReceivePartsAsync(upload, context.Request, cruises, context.RequestAborted);
            return received > 0
                ? TypedResults.NoContent()
                : Problem(StatusCodes.Status400BadRequest, "The upload holds no file. Choose one or more files and add them again.");
        }
        catch (BadHttpRequestException fault) when (fault.StatusCode == StatusCodes.Status413PayloadTooLarge)
        {
            return Problem(StatusCodes.Status413PayloadTooLarge, tooLarge);
        }
        catch (ArgumentException fault)
        {
            return Problem(StatusCodes.Status400BadRequest, fault.Message);
        }
        catch (Exception fault) when (fault is InvalidDataException or IOException)
        {
            return Problem(StatusCodes.Status400BadRequest, $"The upload broke off or is not whole ({fault.Message.TrimEnd('.')}). Add the file again.");
        }
    }

    private static async Task<int> ReceivePartsAsync(Guid upload, HttpRequest request, ICruises cruises, CancellationToken cancellation)
    {
        int received = 0;
        await foreach (MultipartFile file in MultipartFiles.ReadAsync(request, cancellation))
        {
            if (file.Name.Length == 0)
            {
                continue;
            }

            await cruises.ReceiveAsync(upload, file.Name, file.Content, cancellation);
            received++;
        }

        return received;
    }

    private static ProblemHttpResult Problem(int status, string sentence) => TypedResults.Problem(sentence, statusCode: status, title: "The upload was not taken");
}
