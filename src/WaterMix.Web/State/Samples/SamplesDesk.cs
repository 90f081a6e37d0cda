using WaterMix.Core.Mixing;
using WaterMix.Core.Samples;
using WaterMix.Web.State.Figures;
using WaterMix.Workspace.Cruises;
using WaterMix.Workspace.Runs;
using WaterMix.Workspace.Studies;

namespace WaterMix.Web.State.Samples;

/// <summary>The page of samples: the study, its cruises, what is on screen, an import. Long work goes beside the thread that draws; the latest wish wins.</summary>
public sealed class SamplesDesk : IDisposable
{
    private readonly IStudies _studies;
    private readonly ICruises _cruises;
    private readonly IRuns _runs;
    private readonly SemaphoreSlim _one = new(1, 1);
    private (string Key, StudySamples Samples, SampleFigureMaker Maker)? _made;
    private int _wish;

    /// <summary>A desk over the services.</summary>
    /// <param name="studies">The studies.</param>
    /// <param name="cruises">The cruises.</param>
    /// <param name="runs">The runs, whose last one says what became of a sample.</param>
    public SamplesDesk(IStudies studies, ICruises cruises, IRuns runs)
    {
        (_studies, _cruises, _runs) = (studies, cruises, runs);
        List = new CruiseList(cruises);
        Import = new ImportDesk(cruises);
        Import.Changed += () => Changed?.Invoke();
    }

    /// <summary>Raised when something to show changed; not always on the thread that draws.</summary>
    public event Action? Changed;

    /// <summary>The study; null until read, or where there is none.</summary>
    public Study? Study { get; private set; }

    /// <summary>True once the study was looked for.</summary>
    public bool IsRead { get; private set; }

    /// <summary>The cruises.</summary>
    public CruiseList List { get; }

    /// <summary>The import.</summary>
    public ImportDesk Import { get; }

    /// <summary>What is shown.</summary>
    public SampleView View { get; private set; } = new();

    /// <summary>The samples; null where the study has none or they were not read yet.</summary>
    public StudySamples? Samples { get; private set; }

    /// <summary>The figures of <see cref="View"/>, or of the one before while new ones are made; null without samples.</summary>
    public SampleFigures? Figures { get; private set; }

    /// <summary>The card of the chosen sample, or null.</summary>
    public SampleCardText? Card { get; private set; }

    /// <summary>The report that is open: of the import, or of a cruise that was kept; or null.</summary>
    public ReportText? OpenReport { get; private set; }

    /// <summary>What is being made, or null.</summary>
    public string? Work { get; private set; }

    /// <summary>What went wrong with the samples and what to do, or null.</summary>
    public string? Problem { get; private set; }

    /// <summary>The cruise whose report is open, or null.</summary>
    public Cruise? Reported => View.Report is { } id ? List.Cruises.FirstOrDefault(c => c.Id == id) : null;

    /// <summary>What is on screen, for the status line.</summary>
    public IReadOnlyList<string> Status
    {
        get
        {
            if (Study is null)
            {
                return [];
            }

            List<string> parts = [PlainText.Count(List.SampleCount, "sample"), PlainText.Count(List.Cruises.Count, "cruise")];
            if (Samples is not null && Figures is not null)
            {
                parts.Add(Figures.Rows.Length == Samples.Columns.RowCount ? "all shown" : $"{PlainText.Count(Figures.Rows.Length)} shown");
                parts.Add($"water-sample flags {FlagText.Of(Samples.Accepted.WaterSample)}; CTD flags {FlagText.Of(Samples.Accepted.Ctd)}");
            }

            return parts;
        }
    }

    /// <summary>Reads the study, or reads it again, and shows a view of it.</summary>
    /// <param name="study">The study.</param>
    /// <param name="view">What is shown.</param>
    public async Task OpenAsync(Guid study, SampleView view)
    {
        Study = await _studies.FindAsync(study);
        IsRead = true;
        List.Show(Study?.Cruises ?? []);
        Changed?.Invoke();
        if (Study is not null)
        {
            await ShowAsync(view);
            await List.FindDuplicatesAsync(study);
            Changed?.Invoke();
        }
    }

    /// <summary>Shows a view; where another is asked for meanwhile, that one counts.</summary>
    /// <param name="view">What is shown.</param>
    public async Task ShowAsync(SampleView view)
    {
        ArgumentNullException.ThrowIfNull(view);
        View = view;
        OpenReport = Reported is { } cruise ? new ReportText(cruise.Report) : null;
        Task import = view.Upload is { } upload && upload != Import.Upload
            ? Import.BeginAsync(upload, List.Cruises.FirstOrDefault(c => c.Id == view.Again))
            : Task.CompletedTask;
        if (view.Upload is null && Import.Upload is not null)
        {
            Import.End();
        }

        await MakeAsync(view);
        await import;
    }

    /// <summary>Keeps the import as a cruise.</summary>
    /// <returns>The cruise, or null where it was not kept.</returns>
    public async Task<Cruise?> KeepAsync()
    {
        Cruise? before = Import.Replaces;
        Cruise? kept = Study is null ? null : await Import.KeepAsync(Study.Id);
        if (kept is not null && before is not null)
        {
            List.NoteReadAgain(before, kept);
        }

        return kept;
    }

    /// <inheritdoc/>
    public void Dispose()
    {
        Import.Dispose();
        _one.Dispose();
    }

    private async Task MakeAsync(SampleView view)
    {
        int wish = ++_wish;
        if (List.Cruises.Count == 0)
        {
            (Samples, Figures, Card, _made) = (null, null, null, null);
            Changed?.Invoke();
            return;
        }

        Work = Samples is null ? "Reading the samples" : "Drawing";
        Changed?.Invoke();
        try
        {
            await _one.WaitAsync();
            try
            {
                if (wish == _wish)
                {
                    (StudySamples samples, SampleFigureMaker maker) = await ReadSamplesAsync(view);
                    Take(samples, await Task.Run(() => maker.Make(view)), view, wish);
                }
            }
            finally
            {
                _one.Release();
            }
        }
        catch (ObjectDisposedException)
        {
            return; // The page was left meanwhile.
        }
        catch (Exception fault) when (fault is IOException or InvalidDataException)
        {
            Problem = $"The samples cannot be read: {fault.Message} Look whether the data folder is whole, then load the page again.";
        }

        if (wish == _wish)
        {
            Work = null;
            Changed?.Invoke();
        }
    }

    // Samples and figures change together: rows of one mean nothing in the other.
    private void Take(StudySamples samples, SampleFigures figures, SampleView view, int wish)
    {
        if (wish == _wish)
        {
            (Problem, Samples, Figures) = (null, samples, figures);
            Card = view.Sample is { } row && row < samples.Columns.RowCount ? SampleCardText.Of(samples.Columns, row) : null;
        }
    }

    // The columns are made anew only where the samples, the results or the flags changed.
    private async Task<(StudySamples Samples, SampleFigureMaker Maker)> ReadSamplesAsync(SampleView view)
    {
        Study study = Study!;
        AcceptedFlags accepted = view.Filter.Accepted(new AcceptedFlags([.. study.Draft.AcceptFlags], [.. study.Draft.AcceptCtdFlags]));
        Run? last = study.Runs.FirstOrDefault(r => r.State == RunState.Finished);
        string key = string.Join('|', [.. study.Cruises.Select(c => $"{c.Id} {c.SamplesHash} {c.Name}"), FlagText.Of(accepted.WaterSample), FlagText.Of(accepted.Ctd), last?.Id, study.Draft.Fit.Factors]);
        if (_made is { } made && made.Key == key)
        {
            return (made.Samples, made.Maker);
        }

        IReadOnlyList<CruiseResult> results = last is null ? [] : await _runs.ResultsAsync(last.Id);
        var tables = new List<FigureCruise>();
        foreach (Cruise cruise in study.Cruises)
        {
            MixingResult? result = results.FirstOrDefault(r => r.Cruise == cruise.Id && r.SamplesHash == cruise.SamplesHash)?.Result;
            tables.Add(new FigureCruise(cruise.Name, await _cruises.SamplesAsync(cruise.SamplesHash), result));
        }

        DerivedTracerFactors factors = study.Draft.Fit.Factors;
        StudySamples samples = await Task.Run(() => new StudySamples(study.Cruises, tables, accepted, factors));
        var maker = new SampleFigureMaker(samples);
        _made = (key, samples, maker);
        return (samples, maker);
    }
}
