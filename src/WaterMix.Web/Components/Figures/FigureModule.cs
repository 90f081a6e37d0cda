using Microsoft.AspNetCore.Components;
using Microsoft.JSInterop;

namespace WaterMix.Web.Components.Figures;

/// <summary>Begins and ends the browser's side of a figure.</summary>
internal static class FigureModule
{
    /// <summary>Makes a drawing in an element.</summary>
    /// <param name="js">The runtime.</param>
    /// <param name="file">The module's file under <c>scripts/figures</c>.</param>
    /// <param name="host">The element.</param>
    /// <param name="self">What it calls back.</param>
    /// <returns>The drawing, or null where the figure has gone while its script was loading.</returns>
    public static async Task<IJSObjectReference?> CreateAsync<T>(IJSRuntime js, string file, ElementReference host, DotNetObjectReference<T> self)
        where T : class
    {
        IJSObjectReference? drawing = null;
        try
        {
            await using IJSObjectReference module = await js.InvokeAsync<IJSObjectReference>("import", "./scripts/figures/" + file);
            drawing = await module.InvokeAsync<IJSObjectReference>("create", host, self);
            _ = self.Value; // Throws where the figure was disposed of meanwhile.
            return drawing;
        }
        catch (Exception fault) when (fault is ObjectDisposedException or JSDisconnectedException or OperationCanceledException)
        {
            await DisposeAsync(drawing);
            return null;
        }
    }

    /// <summary>Ends a drawing; nothing happens where the page has already gone.</summary>
    /// <param name="drawing">The drawing, or null.</param>
    public static async ValueTask DisposeAsync(IJSObjectReference? drawing)
    {
        if (drawing is null)
        {
            return;
        }

        try
        {
            await drawing.InvokeVoidAsync("dispose");
            await drawing.DisposeAsync();
        }
        catch (Exception fault) when (fault is JSDisconnectedException or OperationCanceledException)
        {
            // The page was closed, and its drawing with it.
        }
    }
}
