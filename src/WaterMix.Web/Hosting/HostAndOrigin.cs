using Microsoft.Net.Http.Headers;

namespace WaterMix.Web.Hosting;

/// <summary>
/// Refuses requests that were meant for another name than this machine's own, or that a page from elsewhere sends. Without it, a page
/// anywhere could let its own name point at this machine (DNS rebinding) and read the studies through the person's browser.
/// </summary>
/// <param name="next">The rest of the pipeline.</param>
/// <param name="configuration">May name further hosts in <c>WATERMIX_HOSTS</c>, with semicolons between.</param>
public sealed class HostAndOrigin(RequestDelegate next, IConfiguration configuration)
{
    /// <summary>The setting that names further hosts.</summary>
    public const string FurtherHosts = "WATERMIX_HOSTS";

    private readonly HashSet<string> _further = new(
        configuration[FurtherHosts]?.Split(';', StringSplitOptions.RemoveEmptyEntries | StringSplitOptions.TrimEntries) ?? [],
        StringComparer.OrdinalIgnoreCase);

    /// <summary>Passes the request on, or answers it with a sentence.</summary>
    /// <param name="context">The request.</param>
    public Task InvokeAsync(HttpContext context)
    {
        ArgumentNullException.ThrowIfNull(context);
        if (!IsAccepted(context.Request.Host.Host))
        {
            return RefuseAsync(
                context,
                StatusCodes.Status400BadRequest,
                $"WaterMix answers to this machine's own names only, such as {ListeningAddresses.Default}; the request names another host. Use such an address, or name the host in {FurtherHosts}.");
        }

        foreach (string? origin in context.Request.Headers[HeaderNames.Origin])
        {
            if (!Uri.TryCreate(origin, UriKind.Absolute, out Uri? from) || from.Scheme is not ("http" or "https") || !IsAccepted(from.Host))
            {
                return RefuseAsync(
                    context,
                    StatusCodes.Status403Forbidden,
                    $"WaterMix takes requests from its own pages only; this one comes from a page elsewhere. Open {ListeningAddresses.Default} itself.");
            }
        }

        return next(context);
    }

    private bool IsAccepted(string host) => LoopbackNames.Contains(host) || _further.Contains(host);

    private static Task RefuseAsync(HttpContext context, int status, string sentence)
    {
        context.Response.StatusCode = status;
        context.Response.ContentType = "text/plain; charset=utf-8";
        return context.Response.WriteAsync(sentence + "\n");
    }
}
