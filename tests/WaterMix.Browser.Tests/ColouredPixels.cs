using Microsoft.Playwright;

namespace WaterMix.Browser.Tests;

/// <summary>Counts what is coloured in what a person sees: paper, ink and rules are nearly grey, sources are not.</summary>
internal static class ColouredPixels
{
    // The picture is counted in the page itself, which can read it without another library.
    private const string Count = """
        async bytes => {
            const picture = await createImageBitmap(new Blob([Uint8Array.from(atob(bytes), c => c.charCodeAt(0))], { type: "image/png" }));
            const canvas = new OffscreenCanvas(picture.width, picture.height);
            const context = canvas.getContext("2d");
            context.drawImage(picture, 0, 0);
            const pixels = context.getImageData(0, 0, picture.width, picture.height).data;
            let count = 0;
            for (let i = 0; i < pixels.length; i += 4) {
                const most = Math.max(pixels[i], pixels[i + 1], pixels[i + 2]);
                const least = Math.min(pixels[i], pixels[i + 1], pixels[i + 2]);
                count += most - least > 60 ? 1 : 0;
            }
            return count;
        }
        """;

    /// <summary>Waits until an element shows enough coloured pixels.</summary>
    /// <param name="element">The element.</param>
    /// <param name="atLeast">How many.</param>
    /// <returns>False where it does not within half a minute.</returns>
    public static async Task<bool> WaitForAsync(ILocator element, int atLeast)
    {
        for (int k = 0; k < 60; k++)
        {
            byte[] picture = await element.ScreenshotAsync();
            if (await element.Page.EvaluateAsync<int>(Count, Convert.ToBase64String(picture)) >= atLeast)
            {
                return true;
            }

            await Task.Delay(500, TestContext.Current.CancellationToken);
        }

        return false;
    }
}
