using AngleSharp.Dom;
using Bunit;
using WaterMix.Web.Components.Common;

namespace WaterMix.Web.Tests.Components.Common;

public sealed class FileDropTests : BunitContext
{
    private Guid? _received;

    public FileDropTests()
    {
        BunitJSModuleInterop module = JSInterop.SetupModule("./scripts/upload.js");
        module.Mode = JSRuntimeMode.Loose;
        module.SetupModule("attach", _ => true).Mode = JSRuntimeMode.Loose;
    }

    [Fact]
    public void Button_WithALabel_IsReachableByKeyboard()
    {
        IRenderedComponent<FileDrop> drop = RenderDrop();

        IElement button = drop.Find("button");
        Assert.Equal("Choose files", button.TextContent);
        Assert.False(button.HasAttribute("disabled"));
        Assert.Equal("-1", drop.Find("input[type=file]").GetAttribute("tabindex"));
    }

    [Fact]
    public async Task Files_AllReceived_RaisesTheUploadOnce()
    {
        IRenderedComponent<FileDrop> drop = RenderDrop();
        await drop.InvokeAsync(() => drop.Instance.FilesChosen([new SentFile(0, "a.csv", 10), new SentFile(1, "b.csv", 20)]));
        string? address = await drop.InvokeAsync(() => drop.Instance.AddressOf(0));
        await drop.InvokeAsync(() => drop.Instance.Progress(0, 0.5));

        Assert.StartsWith("uploads/", address, StringComparison.Ordinal);
        Assert.Contains("a.csv, 10 bytes, 50 % sent", drop.Markup, StringComparison.Ordinal);
        Assert.Equal("0.5", drop.Find("progress").GetAttribute("value"));

        await drop.InvokeAsync(() => drop.Instance.Received(0));
        Assert.Null(_received);
        await drop.InvokeAsync(() => drop.Instance.Received(1));
        Assert.Equal(address, $"uploads/{_received}");
    }

    [Fact]
    public async Task File_Cancelled_IsNotSent()
    {
        IRenderedComponent<FileDrop> drop = RenderDrop();
        await drop.InvokeAsync(() => drop.Instance.FilesChosen([new SentFile(0, "a.csv", 10)]));

        await drop.Find("li button").ClickAsync();

        Assert.Null(await drop.InvokeAsync(() => drop.Instance.AddressOf(0)));
        Assert.Empty(drop.FindAll("li"));
        Assert.Null(_received);
    }

    [Fact]
    public async Task File_Refused_SaysWhyAndOffersToGoOn()
    {
        IRenderedComponent<FileDrop> drop = RenderDrop();
        await drop.InvokeAsync(() => drop.Instance.FilesChosen([new SentFile(0, "a.csv", 10), new SentFile(1, "<b>.csv", 20)]));
        await drop.InvokeAsync(() => drop.Instance.Received(0));
        await drop.InvokeAsync(() => drop.Instance.Refused(1, "It is too large. Send less."));

        IElement alert = drop.Find("[role=alert]");
        Assert.Contains("<b>.csv: It is too large. Send less.", alert.TextContent, StringComparison.Ordinal);
        Assert.Null(_received);

        await alert.QuerySelector("button")!.ClickAsync();
        Assert.NotNull(_received);
    }

    private IRenderedComponent<FileDrop> RenderDrop() => Render<FileDrop>(p => p.Add(d => d.OnReceived, upload => _received = upload));
}
