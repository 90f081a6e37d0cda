using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Formats.Matching;
using WaterMix.Workspace.Cruises;

namespace WaterMix.Web.State.Samples;

/// <summary>The column match of an import as a person corrects it.</summary>
public sealed class MatchForm
{
    /// <summary>The match of a trial.</summary>
    /// <param name="trial">What reading the upload gave.</param>
    public MatchForm(ImportTrial trial)
    {
        ArgumentNullException.ThrowIfNull(trial);
        Headers = trial.Headers;
        var taken = trial.Match.Columns.SelectMany(c => c.Columns).ToHashSet(StringComparer.Ordinal);
        var matches = trial.Match.Columns.Where(c => c.Column.Length > 0).ToDictionary(c => c.Column, StringComparer.Ordinal);
        Rows =
        [
            .. trial.Headers.Where(h => h.Length > 0 && (matches.ContainsKey(h) || !taken.Contains(h))).Distinct(StringComparer.Ordinal)
                .Select(h => matches.TryGetValue(h, out ColumnMatch? match) ? new MatchRow(match, Words(match)) : new MatchRow(new ColumnMatch(h) { By = MatchedBy.OwnName }, "not used")),
        ];
    }

    /// <summary>The meanings a column can have beside quantities: id and name.</summary>
    public static IReadOnlyList<(string Meaning, string Name)> Identities { get; } =
    [
        (MatchRow.IdentityPrefix + "expocode", "expedition code"),
        (MatchRow.IdentityPrefix + "section", "section"),
        (MatchRow.IdentityPrefix + "station", "station"),
        (MatchRow.IdentityPrefix + "cast", "cast"),
        (MatchRow.IdentityPrefix + "sample", "sample number"),
        (MatchRow.IdentityPrefix + "date", "date"),
        (MatchRow.IdentityPrefix + "time", "time"),
        (MatchRow.IdentityPrefix + "bottle_flag", "bottle flag"),
    ];

    /// <summary>The quantities a column can hold: id and name with unit.</summary>
    public static IReadOnlyList<(string Meaning, string Name)> Quantities { get; } =
        [.. Quantity.All.Select(q => (q.Id, q.Unit == "1" ? q.Name : $"{q.Name} ({Figures.FigureText.Unit(q.Unit)})"))];

    /// <summary>The header names of the first file, in order.</summary>
    public IReadOnlyList<string> Headers { get; }

    /// <summary>One row for each column that is not another's flag, unit or source, in the file's order.</summary>
    public IReadOnlyList<MatchRow> Rows { get; }

    /// <summary>True where a person changed something since the files were read.</summary>
    public bool IsEdited => Rows.Any(r => r.IsEdited);

    /// <summary>What a person said, now or before; the rest is guessed anew.</summary>
    public IReadOnlyList<ColumnMatch> Said => [.. Rows.Where(r => r.IsSaid).Select(r => r.ToMatch())];

    /// <summary>Everything as it stands now, to be saved for the next file of the kind.</summary>
    public IReadOnlyList<ColumnMatch> All => [.. Rows.Select(r => r.ToMatch())];

    /// <summary>The instruments to choose from.</summary>
    public static IReadOnlyList<(ValueOrigin? Origin, string Name)> Instruments { get; } = [(null, "as usual"), (ValueOrigin.Bottle, "bottle"), (ValueOrigin.Ctd, "CTD")];

    private static string Words(ColumnMatch match) => match.By switch
    {
        MatchedBy.MatchFile => "as you said",
        _ when match.Ignore => "not used",
        MatchedBy.Id => "by its id",
        MatchedBy.WhpName => "by its WHP name",
        MatchedBy.Name => "by name and unit",
        _ => "name not known",
    };
}
