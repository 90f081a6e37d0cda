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
    public static async Task<IJSObjectReference> CreateAsync<T>(IJSRuntime js, string file, ElementReference host, DotNetObjectReference<T> self)
        where T : class
    {
        await using IJSObjectReference module = await js.InvokeAsync<IJSObjectReference>("import", "./scripts/figures/" + file);
        return await module.InvokeAsync<IJSObjectReference>("create", host, self);
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
        catch (JSDisconnectedException)
        {
            // The page was closed, and its drawing with it.
        }
    }
}
