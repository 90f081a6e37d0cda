using Bunit;
using Microsoft.Extensions.DependencyInjection;
using WaterMix.Web.Components.Mixing;
using WaterMix.Web.State.Mixing;
using WaterMix.Web.Tests.State.Mixing;
using WaterMix.Workspace.Runs;

namespace WaterMix.Web.Tests.Components.Mixing;

public class RunDeskTests : BunitContext
{
    private readonly DraftStudies _studies = new(SmallModel.Make());
    private readonly OneRun _runs = new();

    [Fact]
    public async Task Submit_WithoutAName_StartsTheRunUnderTheProposedOne()
    {
        IRenderedComponent<RunDesk> desk = await ShowAsync(canRun: true);
        desk.Find("form").Submit();
        Assert.Equal("Run 1", _runs.Name);
    }

    [Fact]
    public async Task Submit_ANameTyped_StartsTheRunUnderIt()
    {
        IRenderedComponent<RunDesk> desk = await ShowAsync(canRun: true);
        desk.Find("#run-name").Input("  Without opal ");
        desk.Find("form").Submit();
        Assert.Equal("Without opal", _runs.Name);
    }

    [Fact]
    public async Task Render_AModelWithErrors_CannotBeRunAndSaysWhy()
    {
        IRenderedComponent<RunDesk> desk = await ShowAsync(canRun: false);
        Assert.True(desk.Find("button[type=submit]").HasAttribute("disabled"));
        Assert.Contains("two errors", desk.Find("#run-why").TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Submit_TheRunIsRefused_ShowsTheSentence()
    {
        _runs.Refusal = "The study has no samples. Add a cruise first.";
        IRenderedComponent<RunDesk> desk = await ShowAsync(canRun: true);
        desk.Find("form").Submit();
        Assert.Contains(_runs.Refusal, desk.Find("[role=alert]").TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Cancel_ARunAtWork_IsCancelled()
    {
        _studies.Run(SmallModel.Make());
        Run running = _studies.Stored.Runs[0] with { State = RunState.Running, Done = 1200, Total = 20_000 };
        _studies.Keep(running);
        IRenderedComponent<RunDesk> desk = await ShowAsync(canRun: true);
        Assert.Contains(RunText.Progress(running), desk.Find("label").TextContent, StringComparison.Ordinal);
        desk.FindAll("button").First(b => b.TextContent.StartsWith("Cancel", StringComparison.Ordinal)).Click();
        Assert.Equal(running.Id, _runs.Cancelled);
    }

    private async Task<IRenderedComponent<RunDesk>> ShowAsync(bool canRun)
    {
        Services.AddSingleton<IRuns>(_runs);
        var editor = new DraftEditor(_studies, _studies.Stored.Id);
        await editor.OpenAsync();
        return Render<RunDesk>(p => p.Add(d => d.Editor, editor).Add(d => d.CanRun, canRun).Add(d => d.Why, canRun ? "" : "two errors stand in the way"));
    }

    private sealed class OneRun : IRuns
    {
        public event Action<Guid>? Progressed;

        public string? Name { get; private set; }

        public string? Refusal { get; set; }

        public Guid? Cancelled { get; private set; }

        public Task<Guid> StartAsync(Guid study, string name)
        {
            if (Refusal is not null)
            {
                throw new InvalidOperationException(Refusal);
            }

            Name = name;
            var id = Guid.NewGuid();
            Progressed?.Invoke(id);
            return Task.FromResult(id);
        }

        public Task CancelAsync(Guid run)
        {
            Cancelled = run;
            return Task.CompletedTask;
        }

        public Task<Run?> FindAsync(Guid run) => Task.FromResult<Run?>(null);

        public Task<IReadOnlyList<CruiseResult>> ResultsAsync(Guid run) => throw new NotSupportedException();

        public Task RenameAsync(Guid run, string name) => throw new NotSupportedException();

        public Task WriteCsvAsync(Guid run, Stream output, CancellationToken cancellation) => throw new NotSupportedException();
    }
}
