using System.Runtime.CompilerServices;
using Microsoft.AspNetCore.WebUtilities;
using Microsoft.Net.Http.Headers;

namespace WaterMix.Web.Hosting;

/// <summary>The parts of a multipart body, as they arrive.</summary>
internal static class MultipartFiles
{
    private const int LongestBoundary = 200;

    /// <summary>The parts that are files: the field's name, the file's name without any folders, and the bytes, to be read before the next part.</summary>
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
            if (section.GetContentDispositionHeader() is { } disposition && disposition.IsFileDisposition())
            {
                string given = HeaderUtilities.RemoveQuotes(disposition.FileNameStar.HasValue ? disposition.FileNameStar : disposition.FileName).Value ?? "";
                string field = HeaderUtilities.RemoveQuotes(disposition.Name).Value ?? "";
                yield return new MultipartFile(field, given[(given.LastIndexOfAny(['/', '\\']) + 1)..], section.Body);
            }
        }
    }
}

/// <summary>A file in a multipart body.</summary>
/// <param name="Field">The form field's name.</param>
/// <param name="Name">The file's name, without folders.</param>
/// <param name="Content">The bytes, readable until the next part is asked for.</param>
internal sealed record MultipartFile(string Field, string Name, Stream Content);
