using WaterMix.Core;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Formats.Reading;
using WaterMix.Formats.WhpExchange;

namespace WaterMix.Formats.Matching;

/// <summary>What the columns of a file probably are, from their names and units. A guess is a match like a saved one: it can be corrected, saved and used again.</summary>
public static class ColumnGuess
{
    private const StringComparison NoCase = StringComparison.OrdinalIgnoreCase;

    private static readonly string[] FlagEndings = ["_FLAG_W", "_flag"];

    private static readonly string[] OtherFlagEndings = ["_FLAG_I", "_qc", "_qf", "_qv"];

    /// <summary>One match for each column that is not another column's flag, unit or source.</summary>
    /// <param name="header">The file's header.</param>
    /// <param name="findings">Names that were suggested and flags that were not understood; place and column are filled.</param>
    public static IReadOnlyList<ColumnMatch> Of(FileHeader header, out IReadOnlyList<Finding> findings)
    {
        ArgumentNullException.ThrowIfNull(header);
        var notes = new List<Finding>();
        findings = notes;
        var companions = new HashSet<SourceColumn>();
        var main = new List<(SourceColumn Column, ColumnMatch Match)>();
        foreach (SourceColumn column in header.Columns)
        {
            if (IsBottleFlag(column) || Stem(column, FlagEndings) is null && Stem(column, OtherFlagEndings) is null && !IsSource(header, column) && !IsKindOrScale(column))
            {
                main.Add((column, OfOne(header, column, notes)));
            }
            else
            {
                companions.Add(column);
            }
        }

        for (int i = 0; i < main.Count; i++)
        {
            (SourceColumn column, ColumnMatch match) = main[i];
            if (match.Quantity is null)
            {
                continue;
            }

            SourceColumn? flag = companions.FirstOrDefault(c => Stem(c, FlagEndings) is { } stem && IsNameOf(stem, column, match, main));
            SourceColumn? source = companions.FirstOrDefault(c => IsSource(header, c) && c.BaseName == match.Quantity + "_source" && column.BaseName == match.Quantity);
            SourceColumn? scale = match.Quantity == Quantity.InSituTemperature.Id
                ? companions.FirstOrDefault(c => KnownNames.TemperatureScales.Contains(KnownNames.Key(c.BaseName)))
                : null;
            main[i] = (column, match with { Flag = flag?.Name, Source = source?.Name, UnitColumn = scale?.Name });
            companions.RemoveWhere(c => c == flag || c == source || c == scale);
        }

        foreach (SourceColumn left in companions.OrderBy(c => c.Index))
        {
            notes.Add(Leftover(header, left));
        }

        return UseBottleNumbers(main, header, notes);
    }

    private static ColumnMatch OfOne(FileHeader header, SourceColumn column, List<Finding> notes)
    {
        var match = new ColumnMatch(column.Name);
        string name = column.BaseName;
        if (header.HasWhpNames)
        {
            if (ExchangeNames.FindIdentity(name) is { } whpIdentity)
            {
                return match with { Identity = whpIdentity, By = MatchedBy.WhpName };
            }

            if (ExchangeNames.FindQuantity(name) is { } parameter)
            {
                ValueOrigin origin = header.Format == SampleFormat.ExchangeCtd && parameter.Quantity.Use != TracerUse.Never ? ValueOrigin.Ctd : parameter.Origin;
                return match with { Quantity = parameter.Quantity.Id, Origin = Explicit(parameter.Quantity, origin), By = MatchedBy.WhpName };
            }
        }

        if (Quantity.Find(name) is not null)
        {
            return match with { Quantity = name, By = MatchedBy.Id };
        }

        if (IdentityColumn.Ids.Contains(name) || name == "bottle_flag")
        {
            return match with { Identity = name, By = MatchedBy.Id };
        }

        if (Original(name) is { } original)
        {
            return match with { Quantity = original.Id, Origin = original.Origin, By = MatchedBy.Id };
        }

        string key = KnownNames.Key(name);
        if (KnownNames.FindIdentity(key) is { } identity)
        {
            return match with { Identity = identity, By = MatchedBy.Name };
        }

        if (KnownNames.FindQuantity(key) is { } known && Agrees(known.Quantity, column))
        {
            string? unit = column.Unit.Length == 0 && known.Unit.Length > 0 ? known.Unit : null;
            ValueOrigin? said = header.Format == SampleFormat.ExchangeCtd && known.Quantity.Use != TracerUse.Never ? ValueOrigin.Ctd : known.Origin;
            return match with { Quantity = known.Quantity.Id, Origin = said is { } o ? Explicit(known.Quantity, o) : null, Unit = unit, By = MatchedBy.Name };
        }

        // Short names and names with digits are near to each other without being misspelt, and so are WHP's.
        if (!header.HasWhpNames && key.Length >= 5 && !key.Any(char.IsAsciiDigit) && NearestName.Of(key, KnownNames.Long) is { } suggestion)
        {
            notes.Add(new Finding(Severity.Warning, "a known column name", $"'{column.Name}', which is near to '{suggestion}'", "It was kept as a further tracer. Rename it if that is what it is, or say so in a match file (--columns).")
            { File = header.File.Name, Line = header.NamesLine, Column = column.Name });
        }

        Quantity further = Quantity.Further(name, "");
        return match with { Quantity = name, Origin = header.Format == SampleFormat.ExchangeCtd ? Explicit(further, ValueOrigin.Ctd) : null, By = MatchedBy.OwnName };
    }

    // A salinity in g/kg is an Absolute Salinity or a misnomer: not for us to say.
    private static bool Agrees(Quantity quantity, SourceColumn column) =>
        quantity != Quantity.PracticalSalinity || Units.Normalise(column.Unit) is not ("g/kg" or "gkg-1");

    private static ValueOrigin? Explicit(Quantity quantity, ValueOrigin origin) => origin == Origins.Usual(quantity) ? null : origin;

    private static (string Id, ValueOrigin Origin)? Original(string name)
    {
        foreach ((string suffix, ValueOrigin origin) in (ReadOnlySpan<(string, ValueOrigin)>)[(Origins.BottleSuffix, ValueOrigin.Bottle), (Origins.CtdSuffix, ValueOrigin.Ctd)])
        {
            if (name.EndsWith(suffix, StringComparison.Ordinal) && Quantity.Find(name[..^suffix.Length]) is { } quantity)
            {
                return (quantity.Id, origin);
            }
        }

        return null;
    }

    private static bool IsBottleFlag(SourceColumn column) => KnownNames.FindIdentity(KnownNames.Key(column.BaseName)) == "bottle_flag";

    private static bool IsSource(FileHeader header, SourceColumn column) =>
        column.BaseName.EndsWith("_source", StringComparison.Ordinal) && header.Columns.Any(c => c.BaseName == column.BaseName[..^"_source".Length]);

    private static bool IsKindOrScale(SourceColumn column)
    {
        string key = KnownNames.Key(column.BaseName);
        return KnownNames.TemperatureScales.Contains(key) || KnownNames.NitrateKinds.Contains(key);
    }

    private static string? Stem(SourceColumn column, string[] endings)
    {
        foreach (string ending in endings)
        {
            if (column.BaseName.Length > ending.Length && column.BaseName.EndsWith(ending, NoCase))
            {
                return column.BaseName[..^ending.Length].TrimEnd();
            }
        }

        return null;
    }

    // A flag's stem names its column outright, or without the unit, or by another name of the same quantity where only one column has it.
    private static bool IsNameOf(string stem, SourceColumn column, ColumnMatch match, List<(SourceColumn Column, ColumnMatch Match)> main)
    {
        if (main.Any(m => m.Column.BaseName.Equals(stem, NoCase) || m.Column.Name.Equals(stem, NoCase)))
        {
            return column.BaseName.Equals(stem, NoCase) || column.Name.Equals(stem, NoCase);
        }

        return KnownNames.FindQuantity(KnownNames.Key(stem)) is { } known
            && known.Quantity.Id == match.Quantity
            && (known.Origin ?? Origins.Usual(known.Quantity)) == (match.Origin ?? Origins.Usual(known.Quantity))
            && main.Count(m => m.Match.Quantity == match.Quantity && m.Match.Origin == match.Origin) == 1;
    }

    private static Finding Leftover(FileHeader header, SourceColumn column)
    {
        string key = KnownNames.Key(column.BaseName);
        Finding finding = KnownNames.NitrateKinds.Contains(key)
            ? new Finding(Severity.Note, "nitrate", $"'{column.Name}', which says row by row what the nitrate column holds", "Where that is nitrate plus nitrite, it is used as nitrate.")
            : Stem(column, OtherFlagEndings) is not null
                ? new Finding(Severity.Warning, "WHP flags (_FLAG_W or _flag)", $"flags of another scheme in '{column.Name}'", "They were not used. If they are WHP flags, say so in a match file (--columns, \"flag\").")
                : new Finding(Severity.Note, "a column to go with every flag, source or scale", $"'{column.Name}' alone", "It was left out.");
        return finding with { File = header.File.Name, Line = header.NamesLine, Column = column.Name };
    }

    // Where a file has no sample numbers, the bottle number tells the samples of a cast apart.
    private static List<ColumnMatch> UseBottleNumbers(List<(SourceColumn Column, ColumnMatch Match)> main, FileHeader header, List<Finding> notes)
    {
        bool hasSample = main.Any(m => m.Match.Identity == "sample");
        var matches = new List<ColumnMatch>(main.Count);
        foreach ((SourceColumn column, ColumnMatch match) in main)
        {
            if (match.Identity == "bottle")
            {
                if (!hasSample)
                {
                    notes.Add(new Finding(Severity.Note, "sample numbers", $"none, but bottle numbers in '{column.Name}'", "They are used as the sample column.") { File = header.File.Name, Line = header.NamesLine, Column = column.Name });
                }

                matches.Add(match with { Identity = hasSample ? null : "sample" });
                hasSample = true;
            }
            else
            {
                matches.Add(match);
            }
        }

        return matches;
    }
}
