using WaterMix.Core;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Formats.Matching;

namespace WaterMix.Formats.Reading;

/// <summary>From a header, and a match file if there is one, to what is read from the file.</summary>
internal sealed class FilePlanner(FileHeader header, ReadingOptions options, FindingList findings)
{
    private readonly Dictionary<string, SourceColumn> _byName = header.Columns.ToDictionary(c => c.Name, StringComparer.Ordinal);

    /// <summary>The plan for the file, or null where its first line names no column of samples; problems become findings.</summary>
    public FilePlan? Plan()
    {
        List<ColumnMatch> matches = NitrateFromSum(SettleAmbiguity(Matches()));
        var identity = new Dictionary<string, SourceColumn>(StringComparer.Ordinal);
        SourceColumn? bottleFlag = null;
        var columns = new List<PlannedColumn>();
        for (int i = 0; i < matches.Count; i++)
        {
            ColumnMatch match = matches[i];
            SourceColumn column = _byName[match.Column];
            if (match.Identity == "bottle_flag")
            {
                bottleFlag = column;
            }
            else if (match.Identity is not null && !identity.TryAdd(match.Identity, column))
            {
                Report(Severity.Warning, column, $"one column for {match.Identity}", $"'{identity[match.Identity].Name}' and '{column.Name}'", "The first was used. Say which it is in a match file (--columns).");
            }
            else if (match.Quantity is not null && Planned(match, column, columns) is { } planned)
            {
                columns.Add(planned);
            }
        }

        if (columns.All(c => c.By == MatchedBy.OwnName) && identity.Count == 0)
        {
            findings.Add(new Finding(Severity.Error, "column names of samples, such as station, latitude, pressure, oxygen", $"a first line with none of them ('{string.Join("', '", header.Columns.Take(3).Select(c => c.Name))}', ...)", "Begin the table with a header line, or name its columns in a match file (--columns).")
            { File = header.File.Name, Line = header.NamesLine });
            return null;
        }

        return new FilePlan(header, columns, identity, bottleFlag, matches);
    }

    private static ValueOrigin Role(ColumnMatch match) =>
        match.Source is not null ? ValueOrigin.None : match.Origin ?? Origins.Usual(Quantity.FindOrFurther(match.Quantity!));

    // What the match file says, then guesses for the columns it does not speak of.
    private List<ColumnMatch> Matches()
    {
        List<ColumnMatch> said = [.. (options.Match?.Columns ?? []).Where(m => _byName.ContainsKey(m.Column))];
        foreach (ColumnMatch match in said)
        {
            foreach (string name in match.Columns.Where(n => !_byName.ContainsKey(n)))
            {
                Report(Severity.Error, _byName[match.Column], $"the column '{name}' that the match file names", "no such column", "Correct the match file.");
            }
        }

        var spoken = said.SelectMany(m => m.Columns).ToHashSet(StringComparer.Ordinal);
        var claimed = said.Where(m => m.Quantity is not null).Select(m => (m.Quantity, Role(m))).ToHashSet();
        var claimedIdentity = said.Select(m => m.Identity).OfType<string>().ToHashSet(StringComparer.Ordinal);
        IReadOnlyList<ColumnMatch> guesses = ColumnGuess.Of(header, out IReadOnlyList<Finding> notes);
        foreach (Finding note in notes.Where(n => n.Column is null || !spoken.Contains(n.Column)))
        {
            findings.Fold($"guess {note.Expected} {note.Found}", note.Column, () => note);
        }

        foreach (ColumnMatch guess in guesses.Where(g => !spoken.Contains(g.Column)))
        {
            bool isClaimed = guess.Quantity is not null ? claimed.Contains((guess.Quantity, Role(guess))) : guess.Identity is not null && claimedIdentity.Contains(guess.Identity);
            said.Add(isClaimed ? OwnName(guess) : guess);
        }

        return [.. said.Select(m => m with { Flag = Present(m.Flag), UnitColumn = Present(m.UnitColumn), Source = Present(m.Source) })
            .OrderBy(m => _byName[m.Column].Index)];
    }

    private string? Present(string? name) => name is not null && _byName.ContainsKey(name) ? name : null;

    private ColumnMatch OwnName(ColumnMatch match) => match.Identity is not null
        ? match with { Identity = null }
        : match with { Quantity = _byName[match.Column].Name, Origin = null, Source = null, UnitColumn = null, By = MatchedBy.OwnName };

    // Two columns that could equally be one quantity: an error where the caller needs it, otherwise both keep their own names.
    private List<ColumnMatch> SettleAmbiguity(List<ColumnMatch> matches)
    {
        var settled = new List<ColumnMatch>(matches);
        foreach (IGrouping<(string?, ValueOrigin), ColumnMatch> same in matches.Where(m => m.Quantity is not null && m.By != MatchedBy.OwnName).GroupBy(m => (m.Quantity, Role(m))).Where(g => g.Count() > 1))
        {
            ColumnMatch[] rivals = [.. same];
            MatchedBy surest = rivals.Min(m => m.By);
            if (rivals.Count(m => m.By == surest) == 1)
            {
                // An id is no guess, and a WHP name hardly one: the others give way.
                foreach (ColumnMatch other in rivals.Where(m => m.By != surest))
                {
                    Report(Severity.Warning, _byName[other.Column], $"one column for {other.Quantity}", $"'{other.Column}' beside it", "It was kept as a further tracer. A match file (--columns) can say which it is.");
                    settled[settled.IndexOf(other)] = OwnName(other);
                }

                continue;
            }

            string names = string.Join(" and ", rivals.Select(m => $"'{m.Column}'"));
            bool needed = IsNeeded(rivals[0].Quantity!) || rivals.Any(m => m.By == MatchedBy.MatchFile);
            Report(
                needed ? Severity.Error : Severity.Warning,
                _byName[rivals[1].Column],
                $"one column for {rivals[0].Quantity}",
                names,
                needed ? "Write a match file (--columns) that says which it is." : "Both were kept as further tracers. A match file (--columns) can say which it is.");
            foreach (ColumnMatch rival in rivals)
            {
                settled[settled.IndexOf(rival)] = OwnName(rival);
            }
        }

        return settled;
    }

    private List<ColumnMatch> NitrateFromSum(List<ColumnMatch> matches)
    {
        int sum = matches.FindIndex(m => m.Quantity == Quantity.NitratePlusNitrite.Id);
        if (sum < 0 || matches.Any(m => m.Quantity == Quantity.Nitrate.Id))
        {
            return matches;
        }

        Fold(Severity.Note, "sum", _byName[matches[sum].Column], "nitrate", "nitrate plus nitrite only", "Nitrate plus nitrite is used as nitrate.");
        return [.. matches.Select((m, i) => i == sum ? m with { Quantity = Quantity.Nitrate.Id } : m)];
    }

    private PlannedColumn? Planned(ColumnMatch match, SourceColumn column, List<PlannedColumn> before)
    {
        Quantity? known = Quantity.Find(match.Quantity!);
        string unit = match.Unit ?? column.Unit;
        UnitConversion? conversion = known is null ? UnitConversion.Identity : Units.Find(known, unit);
        if (known is not null && match.By == MatchedBy.OwnName)
        {
            known = null;
        }

        if (known is not null && conversion is null)
        {
            bool needed = IsNeeded(known.Id) || match.By == MatchedBy.MatchFile;
            Report(
                needed ? Severity.Error : Severity.Warning,
                column,
                $"a unit of {known.Id} ({known.Unit} or one that converts to it)",
                $"'{unit}'",
                needed ? "Give its unit in a match file (--columns)." : "It was kept as a further tracer. A match file (--columns) can give its unit.");
            known = null;
        }

        var planned = new PlannedColumn(column, known ?? Further(match, column, unit, before), Role(match), known is null ? UnitConversion.Identity : conversion!.Value, unit, known is null && match.By != MatchedBy.MatchFile ? MatchedBy.OwnName : match.By)
        {
            Flag = match.Flag is null ? null : _byName[match.Flag],
            UnitColumn = match.UnitColumn is null ? null : _byName[match.UnitColumn],
            Source = match.Source is null ? null : _byName[match.Source],
        };
        NoteUnit(planned);
        return planned;
    }

    // A further tracer keeps its name; one that would stand for something else in the table takes its whole header name.
    private static Quantity Further(ColumnMatch match, SourceColumn column, string unit, List<PlannedColumn> before)
    {
        string id = match.By == MatchedBy.MatchFile && Quantity.Find(match.Quantity!) is null ? match.Quantity! : column.BaseName;
        bool Taken(string name) => Quantity.Find(name) is not null || before.Any(c => c.Quantity.Id == name) || IdentityColumn.Ids.Contains(name);
        if (Taken(id))
        {
            id = column.Name;
        }

        return Quantity.Further(Taken(id) ? $"{column.Name}_{column.Index + 1}" : id, unit);
    }

    private void NoteUnit(PlannedColumn planned)
    {
        Quantity quantity = planned.Quantity;
        bool isTemperature = quantity.Unit == "degC";
        bool saysScale = planned.Unit.Contains("90", StringComparison.Ordinal) || !planned.Conversion.KeepsNumber || planned.UnitColumn is not null;
        if (planned.By is MatchedBy.Id or MatchedBy.OwnName)
        {
            return;
        }

        if (isTemperature && !saysScale)
        {
            Fold(Severity.Note, "scale", planned.Column, "a temperature scale", planned.Unit.Length == 0 ? "none" : $"'{planned.Unit}'", "It was taken as ITS-90.");
        }
        else if (!isTemperature && planned.Unit.Length == 0 && planned.UnitColumn is null && quantity.Unit.Contains("kg", StringComparison.Ordinal))
        {
            Fold(Severity.Note, "no unit", planned.Column, $"a unit for {quantity.Id}", "none", $"It was taken as {quantity.Unit}.");
        }
    }

    private bool IsNeeded(string quantity) => options.NeededQuantities?.Contains(quantity) == true;

    private void Report(Severity severity, SourceColumn column, string expected, string found, string remedy) =>
        findings.Add(new Finding(severity, expected, found, remedy) { File = header.File.Name, Line = header.NamesLine, Column = column.Name });

    private void Fold(Severity severity, string kind, SourceColumn column, string expected, string found, string remedy) =>
        findings.Fold(kind, column.Name, () => new Finding(severity, expected, found, remedy) { File = header.File.Name, Line = header.NamesLine, Column = column.Name });
}
