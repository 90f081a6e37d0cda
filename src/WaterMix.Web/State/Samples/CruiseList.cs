using WaterMix.Core;
using WaterMix.Workspace.Cruises;

namespace WaterMix.Web.State.Samples;

/// <summary>The cruises of a study: what is being named, what can be undone, what they share.</summary>
/// <param name="cruises">The cruises.</param>
public sealed class CruiseList(ICruises cruises)
{
    private const int LongestName = 200;

    private readonly List<CruiseUndo> _undo = [];

    /// <summary>The cruises, in the study's order.</summary>
    public IReadOnlyList<Cruise> Cruises { get; private set; } = [];

    /// <summary>The lines of the table.</summary>
    public IReadOnlyList<CruiseLine> Lines { get; private set; } = [];

    /// <summary>The cruise being renamed, or null.</summary>
    public Guid? Renaming { get; private set; }

    /// <summary>Why a name was not taken, or null.</summary>
    public string? Problem { get; private set; }

    /// <summary>The measurement errors being edited, or null.</summary>
    public MeasurementErrorForm? Errors { get; private set; }

    /// <summary>What was done on this page and can be undone, until its message is dismissed.</summary>
    public IReadOnlyList<CruiseUndo> Undo => _undo;

    /// <summary>What cruises hold twice, a sentence each.</summary>
    public IReadOnlyList<string> Duplicates { get; private set; } = [];

    /// <summary>Number of samples of all cruises.</summary>
    public long SampleCount => Cruises.Sum(c => c.SampleCount);

    /// <summary>Takes over the cruises of a study that was read.</summary>
    /// <param name="read">The cruises, in the study's order.</param>
    public void Show(IReadOnlyList<Cruise> read)
    {
        ArgumentNullException.ThrowIfNull(read);
        Cruises = read;
        Lines = [.. read.Select(Line)];
    }

    /// <summary>Looks for samples that stand twice.</summary>
    /// <param name="study">The study.</param>
    public async Task FindDuplicatesAsync(Guid study) =>
        Duplicates = [.. (await cruises.DuplicatesAsync(study)).Select(Sentence).OfType<string>()];

    /// <summary>Begins to rename a cruise.</summary>
    /// <param name="id">The cruise.</param>
    public void BeginRename(Guid id) => (Renaming, Problem, Errors) = (id, null, null);

    /// <summary>Leaves whatever is being edited as it was.</summary>
    public void GiveUp() => (Renaming, Problem, Errors) = (null, null, null);

    /// <summary>Renames the cruise that is being renamed.</summary>
    /// <param name="name">Its new name.</param>
    /// <returns>False where the name was not taken.</returns>
    public async Task<bool> RenameAsync(string name)
    {
        Problem = ProblemOf(name);
        if (Problem is not null || Renaming is not { } id)
        {
            return false;
        }

        await cruises.RenameAsync(id, name.Trim());
        Renaming = null;
        return true;
    }

    /// <summary>Takes a cruise out of the study; it can be put back.</summary>
    /// <param name="line">The cruise.</param>
    public async Task TakeOutAsync(CruiseLine line)
    {
        ArgumentNullException.ThrowIfNull(line);
        await cruises.RemoveAsync(line.Id);
        _undo.Insert(0, new CruiseUndo($"“{line.Name}” was taken out of the study ({line.Samples} samples).", line.Id, null));
    }

    /// <summary>Notes that a cruise was read again, so that it can be undone.</summary>
    /// <param name="before">The cruise that was replaced.</param>
    /// <param name="after">The cruise that took its place.</param>
    public void NoteReadAgain(Cruise before, Cruise after)
    {
        ArgumentNullException.ThrowIfNull(before);
        ArgumentNullException.ThrowIfNull(after);
        _undo.Insert(0, new CruiseUndo($"“{before.Name}” was read again: {PlainText.Count(after.SampleCount, "sample")} in place of {PlainText.Count(before.SampleCount)}.", before.Id, after.Id));
    }

    /// <summary>Undoes what a message speaks of.</summary>
    /// <param name="undo">The message.</param>
    public async Task UndoAsync(CruiseUndo undo)
    {
        ArgumentNullException.ThrowIfNull(undo);
        await cruises.RestoreAsync(undo.PutBack);
        if (undo.TakeOut is { } replaced)
        {
            await cruises.RemoveAsync(replaced);
        }

        _undo.Remove(undo);
    }

    /// <summary>Dismisses a message; what it speaks of stays done.</summary>
    /// <param name="undo">The message.</param>
    public void Dismiss(CruiseUndo undo) => _undo.Remove(undo);

    /// <summary>Begins to edit the measurement errors of a cruise.</summary>
    /// <param name="id">The cruise.</param>
    /// <param name="model">The model's errors, for comparison.</param>
    public void BeginErrors(Guid id, IReadOnlyDictionary<string, Core.Mixing.MeasurementError> model)
    {
        GiveUp();
        if (Cruises.FirstOrDefault(c => c.Id == id) is { } cruise)
        {
            Errors = new MeasurementErrorForm(cruise, model);
        }
    }

    /// <summary>Saves the measurement errors that are being edited.</summary>
    /// <returns>False where a number was not taken; the form says which.</returns>
    public async Task<bool> SaveErrorsAsync()
    {
        if (Errors is not { } form || !form.TryRead(out IReadOnlyDictionary<string, Core.Mixing.MeasurementError>? errors))
        {
            return false;
        }

        await cruises.SetMeasurementSdAsync(form.Cruise, errors);
        Errors = null;
        return true;
    }

    /// <summary>What is wrong with a cruise's name and what to do, or null.</summary>
    /// <param name="name">The name.</param>
    public static string? ProblemOf(string? name) => (name ?? "").Trim().Length switch
    {
        0 => "A cruise needs a name. Type one, such as its expedition code and section.",
        > LongestName => $"The name has {PlainText.Count(name!.Trim().Length)} characters; {LongestName} fit. Shorten it.",
        _ => null,
    };

    private static CruiseLine Line(Cruise cruise)
    {
        long warnings = cruise.Report.Findings.Count(f => f.Severity == Severity.Warning);
        int own = cruise.MeasurementSd?.Count ?? 0;
        string files = cruise.Report.Files.Count == 1 ? cruise.Report.Files[0].Name : PlainText.Count(cruise.Report.Files.Count, "file");
        return new CruiseLine(
            cruise.Id, cruise.Name, PlainText.Count(cruise.SampleCount), files,
            warnings == 0 ? "nothing to look at" : PlainText.Count(warnings, "point to look at", "points to look at"),
            own == 0 ? "the model’s" : $"its own for {PlainText.Count(own, "tracer")}");
    }

    private string? Sentence(DuplicateSamples pair)
    {
        string? first = Cruises.FirstOrDefault(c => c.Id == pair.First)?.Name;
        string? second = Cruises.FirstOrDefault(c => c.Id == pair.Second)?.Name;
        string alike = "alike in position, pressure, temperature and salinity";
        string count = pair.Count == 1 ? "1 sample" : PlainText.Count(pair.Count, "sample");
        return first is null || second is null ? null
            : pair.First == pair.Second ? $"“{first}” holds {count} twice ({alike}). Take the doubles out of its file and read it again, or they count double."
            : $"“{first}” and “{second}” share {count} ({alike}). Take one of the two cruises out, or they count double.";
    }
}

/// <summary>Something done to a cruise that can be undone.</summary>
/// <param name="Text">What was done, in a sentence.</param>
/// <param name="PutBack">The cruise that comes back.</param>
/// <param name="TakeOut">The cruise that goes again; null for none.</param>
public sealed record CruiseUndo(string Text, Guid PutBack, Guid? TakeOut);
