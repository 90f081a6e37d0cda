using System.Runtime.CompilerServices;
using Microsoft.AspNetCore.WebUtilities;
using Microsoft.Net.Http.Headers;

namespace WaterMix.Web.Hosting;

/// <summary>The parts of a multipart body, as they arrive.</summary>
internal static class MultipartFiles
{
    private const int LongestBoundary = 200;

    /// <summary>The parts: the field's name, the file's name without any folders (empty where it is no file), and the bytes.</summary>
    /// <param name="request">The request; nothing of its body has been read.</param>
    /// <param name="cancellation">Stops the reading.</param>
    /// <exception cref="InvalidDataException">The body is no multipart form, or breaks off.</exception>
    public static async IAsyncEnumerable<MultipartFile> ReadAsync(HttpRequest request, [EnumeratorCancellation] CancellationToken cancellation)
    {
        if (!MediaTypeHeaderValue.TryParse(request.ContentType, out MediaTypeHeaderValue? type) || !type.MediaType.Equals("multipart/form-data", StringComparison.OrdinalIgnoreCase))
        {
            throw new InvalidDataException($"expected multipart/form-data; found {(string.IsNullOrEmpty(request.ContentType) ? "no content type" : request.ContentType)}");
        }

        string? boundary = HeaderUtilities.RemoveQuotes(type.Boundary).Value;
        if (string.IsNullOrEmpty(boundary) || boundary.Length > LongestBoundary)
        {
            throw new InvalidDataException($"expected a multipart boundary of 1 to {LongestBoundary} characters; found {boundary?.Length ?? 0}");
        }

        var reader = new MultipartReader(boundary, request.Body);
        while (await reader.ReadNextSectionAsync(cancellation) is { } section)
        {
            if (section.GetContentDispositionHeader() is { } disposition && (disposition.IsFileDisposition() || disposition.IsFormDisposition()))
            {
                string given = HeaderUtilities.RemoveQuotes(disposition.FileNameStar.HasValue ? disposition.FileNameStar : disposition.FileName).Value ?? "";
                string field = HeaderUtilities.RemoveQuotes(disposition.Name).Value ?? "";
                yield return new MultipartFile(field, given[(given.LastIndexOfAny(['/', '\\']) + 1)..], section.Body);
            }
        }
    }
}
