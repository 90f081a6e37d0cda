using WaterMix.Web.Hosting;
using WaterMix.Workspace;

namespace WaterMix.Web.Api;

/// <summary>Answers a request that brings a multipart form.</summary>
internal static class FormRequest
{
    /// <summary>Receives the form, answers, and clears the form away once the answer was sent.</summary>
    /// <param name="context">The request.</param>
    /// <param name="scratch">Where files stand meanwhile.</param>
    /// <param name="limits">The largest request.</param>
    /// <param name="fields">The fields that may occur.</param>
    /// <param name="answer">Makes the answer of the form.</param>
    public static async Task<IResult> AnswerAsync(HttpContext context, ScratchFolders scratch, WorkspaceOptions limits, string[] fields, Func<ReceivedForm, Task<IResult>> answer)
    {
        try
        {
            ReceivedForm form = await ReceivedForm.ReceiveAsync(context, scratch, limits.MostUploadBytes, fields);
            context.Response.RegisterForDispose(form);
            return await answer(form);
        }
        catch (BadHttpRequestException fault) when (fault.StatusCode == StatusCodes.Status413PayloadTooLarge)
        {
            return Problems.TooLarge(limits.MostUploadBytes);
        }
        catch (Exception fault) when (fault is InvalidDataException or IOException)
        {
            return Problems.BadRequest($"The form is not usable: {fault.Message.TrimEnd('.')}.");
        }
    }
}
