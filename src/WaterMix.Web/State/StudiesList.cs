using WaterMix.Workspace.Studies;

namespace WaterMix.Web.State;

/// <summary>What the page of studies remembers: the list, what is being named, what can be undone.</summary>
/// <param name="studies">The studies.</param>
/// <param name="clock">The time zone in which times are shown.</param>
public sealed class StudiesList(IStudies studies, TimeProvider clock)
{
    private const int LongestName = 200;

    private readonly List<StudyLine> _deleted = [];

    /// <summary>The lines, the study changed last first.</summary>
    public IReadOnlyList<StudyLine> Lines { get; private set; } = [];

    /// <summary>Part of a name; empty for all.</summary>
    public string Search { get; private set; } = "";

    /// <summary>True once the list was read.</summary>
    public bool IsRead { get; private set; }

    /// <summary>The study being renamed, or null.</summary>
    public Guid? Renaming { get; private set; }

    /// <summary>Why a name was not taken, or null.</summary>
    public string? Problem { get; private set; }

    /// <summary>Studies deleted on this page, the last one first; each can be brought back until its message is dismissed.</summary>
    public IReadOnlyList<StudyLine> Deleted => _deleted;

    /// <summary>What is on screen, for the status line.</summary>
    public IReadOnlyList<string> Status => Search.Length == 0
        ? [PlainText.Count(Lines.Count, "study", "studies")]
        : [PlainText.Count(Lines.Count, "study", "studies"), $"with \u201c{Search}\u201d in the name"];

    /// <summary>Reads the list.</summary>
    /// <param name="search">Part of a name; null or empty for all.</param>
    public async Task ReadAsync(string? search)
    {
        Search = search?.Trim() ?? "";
        Lines = [.. (await studies.ListAsync(Search)).Select(Line)];
        IsRead = true;
    }

    /// <summary>Creates a study.</summary>
    /// <param name="name">Its name.</param>
    /// <returns>The study, or null where the name was not taken; <see cref="Problem"/> says why.</returns>
    public async Task<Guid?> CreateAsync(string name)
    {
        Problem = ProblemOf(name);
        if (Problem is not null)
        {
            return null;
        }

        Guid created = await studies.CreateAsync(name.Trim());
        await ReadAsync("");
        return created;
    }

    /// <summary>Begins to rename a study.</summary>
    /// <param name="id">The study.</param>
    public void BeginRename(Guid id) => (Renaming, Problem) = (id, null);

    /// <summary>Leaves whatever is being named as it was.</summary>
    public void GiveUp() => (Renaming, Problem) = (null, null);

    /// <summary>Renames the study that is being renamed.</summary>
    /// <param name="name">Its new name.</param>
    /// <returns>False where the name was not taken.</returns>
    public async Task<bool> RenameAsync(string name)
    {
        Problem = ProblemOf(name);
        if (Problem is not null || Renaming is not { } id)
        {
            return false;
        }

        await studies.RenameAsync(id, name.Trim());
        Renaming = null;
        await ReadAsync(Search);
        return true;
    }

    /// <summary>Copies a study with everything in it, under a name that no study of the list has.</summary>
    /// <param name="line">The study.</param>
    public async Task DuplicateAsync(StudyLine line)
    {
        ArgumentNullException.ThrowIfNull(line);
        var names = (await studies.ListAsync()).Select(s => s.Name).ToHashSet(StringComparer.OrdinalIgnoreCase);
        string room = line.Name.Length > LongestName - 12 ? line.Name[..(LongestName - 12)] : line.Name;
        string name = $"{room}, copy";
        for (int n = 2; names.Contains(name); n++)
        {
            name = $"{room}, copy {PlainText.Count(n)}";
        }

        await studies.DuplicateAsync(line.Id, name);
        await ReadAsync(Search);
    }

    /// <summary>Deletes a study; nothing stored is lost until the message is dismissed and long after.</summary>
    /// <param name="line">The study.</param>
    public async Task DeleteAsync(StudyLine line)
    {
        ArgumentNullException.ThrowIfNull(line);
        await studies.DeleteAsync(line.Id);
        _deleted.Insert(0, line);
        await ReadAsync(Search);
    }

    /// <summary>Brings a deleted study back.</summary>
    /// <param name="line">The study.</param>
    public async Task RestoreAsync(StudyLine line)
    {
        ArgumentNullException.ThrowIfNull(line);
        await studies.RestoreAsync(line.Id);
        Dismiss(line);
        await ReadAsync(Search);
    }

    /// <summary>Takes the message about a deleted study away.</summary>
    /// <param name="line">The study.</param>
    public void Dismiss(StudyLine line) => _deleted.Remove(line);

    private static string? ProblemOf(string name) => name.Trim().Length switch
    {
        0 => "A study needs a name. Type one, such as the cruise and the question.",
        > LongestName => $"The name has {PlainText.Count(name.Trim().Length)} characters; {LongestName} fit. Shorten it.",
        _ => null,
    };

    private StudyLine Line(StudySummary study) => new(
        study.Id, study.Name, PlainText.Count(study.SampleCount), PlainText.Count(study.RunCount), PlainText.Time(study.LastChange, clock.LocalTimeZone));
}
