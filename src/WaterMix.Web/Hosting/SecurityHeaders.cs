namespace WaterMix.Web.Hosting;

/// <summary>The headers that every answer carries, errors and static files included.</summary>
/// <param name="next">The rest of the pipeline.</param>
public sealed class SecurityHeaders(RequestDelegate next)
{
    /// <summary>
    /// Everything from this server, nothing inline, no eval. Style elements too come from files only; style attributes are allowed because
    /// the component library sets widths and positions by them: a page with one grid of it needs 63 (an attribute cannot run script or load anything: images and fonts from
    /// elsewhere are refused all the same). <c>blob:</c> and <c>data:</c> images are figures made in the page, for saving.
    /// </summary>
    public const string ContentSecurityPolicy =
        "default-src 'none'; script-src 'self'; style-src 'self'; style-src-elem 'self'; style-src-attr 'unsafe-inline'; img-src 'self' data: blob:; "
        + "font-src 'self'; connect-src 'self'; manifest-src 'self'; form-action 'self'; base-uri 'self'; frame-ancestors 'none'";

    /// <summary>Sets the headers and passes the request on.</summary>
    /// <param name="context">The request.</param>
    public Task InvokeAsync(HttpContext context)
    {
        ArgumentNullException.ThrowIfNull(context);

        // At the start of the answer, because the error page clears what was set before it.
        context.Response.OnStarting(static state =>
        {
            IHeaderDictionary headers = ((HttpContext)state).Response.Headers;
            headers.ContentSecurityPolicy = ContentSecurityPolicy;
            headers.XContentTypeOptions = "nosniff";
            headers.XFrameOptions = "DENY";
            headers["Referrer-Policy"] = "same-origin";
            headers["Cross-Origin-Opener-Policy"] = "same-origin";
            headers["Cross-Origin-Resource-Policy"] = "same-origin";
            headers["Permissions-Policy"] = "camera=(), microphone=(), geolocation=(), payment=(), usb=()";
            return Task.CompletedTask;
        }, context);
        return next(context);
    }
}
