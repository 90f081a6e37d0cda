using Microsoft.AspNetCore.Http.Features;
using WaterMix.Formats.Reading;
using WaterMix.Web.Hosting;

namespace WaterMix.Web.Api;

/// <summary>The parts of a multipart request, on disk for as long as it is answered.</summary>
internal sealed class ReceivedForm : IDisposable
{
    private readonly ScratchFolder _folder;
    private readonly List<(string Field, StoredFile File)> _parts = [];

    private ReceivedForm(ScratchFolder folder) => _folder = folder;

    /// <summary>Receives a request's parts.</summary>
    /// <param name="context">The request; nothing of its body has been read.</param>
    /// <param name="scratch">Where the parts go.</param>
    /// <param name="mostBytes">Most bytes of all parts together.</param>
    /// <param name="fields">The fields that may occur.</param>
    /// <exception cref="InvalidDataException">The body is no multipart form, breaks off, or has a field that is not expected.</exception>
    /// <exception cref="BadHttpRequestException">The body is too large.</exception>
    public static async Task<ReceivedForm> ReceiveAsync(HttpContext context, ScratchFolders scratch, long mostBytes, params string[] fields)
    {
        if (context.Features.Get<IHttpMaxRequestBodySizeFeature>() is { IsReadOnly: false } size)
        {
            size.MaxRequestBodySize = mostBytes;
        }

        if (context.Request.ContentLength > mostBytes)
        {
            throw new BadHttpRequestException("The body is too large.", StatusCodes.Status413PayloadTooLarge);
        }

        var form = new ReceivedForm(scratch.Make());
        try
        {
            await foreach (MultipartFile part in MultipartFiles.ReadAsync(context.Request, context.RequestAborted))
            {
                if (!fields.Contains(part.Field))
                {
                    throw new InvalidDataException($"expected the fields {string.Join(", ", fields)}; found '{part.Field}'");
                }

                string path = form._folder.NextPath();
                await using (FileStream file = new(path, FileMode.CreateNew, FileAccess.Write))
                {
                    await part.Content.CopyToAsync(file, context.RequestAborted);
                }

                form._parts.Add((part.Field, new StoredFile(path, part.Name.Length == 0 ? part.Field : part.Name)));
            }

            return form;
        }
        catch
        {
            form.Dispose();
            throw;
        }
    }

    /// <summary>The parts of a field, in the order in which they came.</summary>
    public IReadOnlyList<StoredFile> this[string field] => [.. _parts.Where(p => p.Field == field).Select(p => p.File)];

    /// <summary>A path for a file that the answer needs.</summary>
    public string NextPath() => _folder.NextPath();

    /// <inheritdoc/>
    public void Dispose() => _folder.Dispose();
}
