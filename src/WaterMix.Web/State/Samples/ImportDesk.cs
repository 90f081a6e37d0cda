using WaterMix.Core;
using WaterMix.Formats.Json;
using WaterMix.Formats.Matching;
using WaterMix.Formats.Reading;
using WaterMix.Workspace.Cruises;

namespace WaterMix.Web.State.Samples;

/// <summary>One import: the upload is read, the report looked at, the choices corrected, the files read again, the cruise kept.</summary>
/// <param name="cruises">The cruises.</param>
public sealed class ImportDesk(ICruises cruises) : IDisposable
{
    private CancellationTokenSource? _work;
    private ReadingOptions _options = new();
    private ReadingForm _asRead = new();
    private ImportTrial? _trial;

    /// <summary>Raised when something to show changed.</summary>
    public event Action? Changed;

    /// <summary>The upload; null where nothing is being imported.</summary>
    public Guid? Upload { get; private set; }

    /// <summary>The cruise that is read again; null for a new one.</summary>
    public Cruise? Replaces { get; private set; }

    /// <summary>The report in words; null while the files were not read.</summary>
    public ReportText? Report { get; private set; }

    /// <summary>The first rows; null where there are none.</summary>
    public FirstRows? FirstRows { get; private set; }

    /// <summary>The column match as it is corrected; null while the files were not read.</summary>
    public MatchForm? Match { get; private set; }

    /// <summary>How the files are read.</summary>
    public ReadingForm Reading { get; private set; } = new();

    /// <summary>What went wrong, a sentence each.</summary>
    public IReadOnlyList<string> Problems { get; private set; } = [];

    /// <summary>What is being done, or null.</summary>
    public string? Work { get; private set; }

    /// <summary>How far it is, 0 to 1; null where it is not known.</summary>
    public double? Fraction { get; private set; }

    /// <summary>The name offered for the cruise.</summary>
    public string Name { get; set; } = "";

    /// <summary>True where something was changed since the report was made.</summary>
    public bool HasChanges => Match?.IsEdited == true || Reading != _asRead;

    /// <summary>True where the cruise can be kept as the report shows it.</summary>
    public bool CanKeep => _trial is { HasErrors: false } && Work is null && !HasChanges;

    /// <summary>Why the cruise cannot be kept as it stands and what to do, or null.</summary>
    public string? WhyNot => _trial switch
    {
        null => null,
        _ when HasChanges => "You changed something since the files were read. Read them again to see what it does.",
        { HasErrors: true } => "The files cannot be used as they were read. Correct the points above, here or in the files, and read again.",
        _ => null,
    };

    /// <summary>Begins with an upload and reads it.</summary>
    /// <param name="upload">The upload.</param>
    /// <param name="replaces">The cruise that is read again; null for a new one.</param>
    public Task BeginAsync(Guid upload, Cruise? replaces)
    {
        End();
        Upload = upload;
        Replaces = replaces;
        Name = replaces?.Name ?? "";
        _options = replaces?.Reading ?? new ReadingOptions();
        Reading = ReadingForm.Of(_options);
        return ReadAsync();
    }

    /// <summary>Reads the files again with what was corrected.</summary>
    public Task ReadAgainAsync()
    {
        Problems = Reading.Problems();
        if (Problems.Count > 0)
        {
            Changed?.Invoke();
            return Task.CompletedTask;
        }

        _options = Reading.Options(Match?.Said ?? _options.Match?.Columns ?? []);
        return ReadAsync();
    }

    /// <summary>Takes a saved column match and reads again.</summary>
    /// <param name="utf8">The file's bytes.</param>
    /// <param name="fileName">Its name.</param>
    public Task UseMatchAsync(ReadOnlyMemory<byte> utf8, string fileName)
    {
        Reading<ColumnMatchFile> reading = ColumnMatchFile.Read(utf8.Span, fileName);
        if (reading.Value is not { } match)
        {
            Problems = [.. reading.Findings.Where(f => f.Severity == Severity.Error).Select(f => $"{fileName}: expected {f.Expected}; found {f.Found}. {f.Remedy}")];
            Changed?.Invoke();
            return Task.CompletedTask;
        }

        Reading = Reading with { Delimiter = match.Delimiter ?? ',', DecimalMark = match.DecimalMark, Missing = string.Join('\n', match.Missing) };
        _options = Reading.Options(match.Columns);
        return ReadAsync();
    }

    /// <summary>The column match as it stands, as a file for the next import.</summary>
    public byte[] SavedMatch() => Reading.Match(Match?.All ?? []).Write();

    /// <summary>Keeps the cruise as the report shows it.</summary>
    /// <param name="study">The study.</param>
    /// <returns>The cruise, or null where it was not kept; <see cref="Problems"/> or the report say why.</returns>
    public async Task<Cruise?> KeepAsync(Guid study)
    {
        if (Upload is not { } upload || !CanKeep)
        {
            return null;
        }

        if (CruiseList.ProblemOf(Name) is { } problem)
        {
            Problems = [problem];
            Changed?.Invoke();
            return null;
        }

        Cruise? kept = null;
        Cruise? before = Replaces;
        long total = Math.Max(1, _trial!.Report.Rows);
        var progress = new DirectProgress(rows => Tell($"Keeping the samples: {PlainText.Count(rows)} of {PlainText.Count(total)}", Math.Min(1, (double)rows / total)));
        await DoAsync("Keeping the samples", async cancellation =>
        {
            (ImportTrial trial, kept) = await cruises.KeepAsync(study, upload, Name.Trim(), _options, progress, cancellation);
            Take(trial);
            if (kept is not null && before is not null)
            {
                await cruises.SetMeasurementSdAsync(kept.Id, before.MeasurementSd);
                await cruises.RemoveAsync(before.Id);
            }
        });
        return kept;
    }

    /// <summary>Stops what is being done; the study stays as it is.</summary>
    public void Cancel() => _work?.Cancel();

    /// <summary>Leaves the import; the upload waits for a while, so that its address still opens it.</summary>
    public void End()
    {
        Cancel();
        (Upload, Replaces, Report, FirstRows, Match, _trial) = (null, null, null, null, null, null);
        (Work, Fraction, Problems) = (null, null, []);
    }

    /// <inheritdoc/>
    public void Dispose()
    {
        _work?.Cancel();
        _work?.Dispose();
    }

    private Task ReadAsync() => DoAsync("Reading the files", async cancellation => Take(await cruises.TryAsync(Upload!.Value, _options, cancellation)));

    private void Take(ImportTrial trial)
    {
        _trial = trial;
        Report = new ReportText(trial.Report);
        FirstRows = trial.FirstRows is { RowCount: > 0 } first ? Samples.FirstRows.Of(first) : null;
        Match = new MatchForm(trial);
        _asRead = Reading with { };
        if (Name.Length == 0)
        {
            Name = NameOf(trial);
        }
    }

    private static string NameOf(ImportTrial trial)
    {
        string First(string id) => trial.FirstRows is { RowCount: > 0 } rows ? rows.Identity.FirstOrDefault(c => c.Id == id)?[0].Trim() ?? "" : "";
        string[] parts = [.. new[] { First("section"), First("expocode") }.Where(p => p.Length > 0)];
        return parts.Length > 0 ? string.Join(", ", parts)
            : trial.Report.Files.Count > 0 ? Path.GetFileNameWithoutExtension(trial.Report.Files[0].Name) : "";
    }

    private async Task DoAsync(string words, Func<CancellationToken, Task> work)
    {
        _work?.Cancel();
        var mine = new CancellationTokenSource();
        _work = mine;
        Problems = [];
        Tell(words, null);
        try
        {
            await work(mine.Token);
        }
        catch (OperationCanceledException)
        {
            // The person stopped it, or began something else.
            Problems = _work == mine && Upload is not null ? ["You stopped it. Nothing in the study changed; read the files again when you like."] : Problems;
        }
        catch (Exception fault) when (fault is ArgumentException or IOException or InvalidDataException or UnauthorizedAccessException)
        {
            Problems = [$"{fault.Message.Split(" (Parameter", 2)[0]} Nothing in the study changed."];
        }
        finally
        {
            if (_work == mine)
            {
                Tell(null, null);
            }
        }
    }

    private void Tell(string? words, double? fraction)
    {
        (Work, Fraction) = (words, fraction);
        Changed?.Invoke();
    }

    private sealed class DirectProgress(Action<long> tell) : IProgress<long>
    {
        public void Report(long value) => tell(value);
    }
}
