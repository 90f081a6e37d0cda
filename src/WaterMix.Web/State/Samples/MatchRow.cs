using WaterMix.Core.Samples;
using WaterMix.Formats.Matching;

namespace WaterMix.Web.State.Samples;

/// <summary>What one column of a file is, as a person corrects it.</summary>
/// <param name="match">The match as guessed or said before.</param>
/// <param name="words">How it came about, in words.</param>
public sealed class MatchRow(ColumnMatch match, string words)
{
    /// <summary>The meaning of a column that is left out.</summary>
    public const string LeftOut = "";

    /// <summary>The meaning of a further tracer under a name of its own.</summary>
    public const string OwnName = "own";

    /// <summary>The beginning of the meaning of an identity column.</summary>
    public const string IdentityPrefix = "identity:";

    private string _meaning = MeaningOf(match);
    private string _name = match.Quantity ?? match.Column;
    private string _unit = match.Unit ?? "";
    private string _flag = match.Flag ?? "";
    private ValueOrigin? _origin = match.Origin;

    /// <summary>The header name.</summary>
    public string Column => match.Column;

    /// <summary>How the match came about, in words.</summary>
    public string Words => IsEdited ? "corrected by you" : words;

    /// <summary>True where a person changed it since the files were read.</summary>
    public bool IsEdited { get; private set; }

    /// <summary>True where a person or a saved match says it, now or before; what was only guessed is guessed anew.</summary>
    public bool IsSaid => IsEdited || match.By == MatchedBy.MatchFile;

    /// <summary>A quantity's id, an identity column with <see cref="IdentityPrefix"/>, <see cref="OwnName"/> or <see cref="LeftOut"/>.</summary>
    public string Meaning
    {
        get => _meaning;
        set => Set(ref _meaning, value);
    }

    /// <summary>The name of a further tracer.</summary>
    public string Name
    {
        get => _name;
        set => Set(ref _name, value);
    }

    /// <summary>The unit; empty: as the file says.</summary>
    public string Unit
    {
        get => _unit;
        set => Set(ref _unit, value);
    }

    /// <summary>The header name of the flag column; empty for none.</summary>
    public string Flag
    {
        get => _flag;
        set => Set(ref _flag, value);
    }

    /// <summary>The instrument; null: the usual one for the quantity.</summary>
    public ValueOrigin? Origin
    {
        get => _origin;
        set => Set(ref _origin, value);
    }

    /// <summary>True where the column holds numbers, so that unit, flags and instrument have a meaning.</summary>
    public bool IsQuantity => Meaning.Length > 0 && !Meaning.StartsWith(IdentityPrefix, StringComparison.Ordinal);

    /// <summary>The match that is said now.</summary>
    public ColumnMatch ToMatch()
    {
        if (!IsEdited)
        {
            return match;
        }

        if (!IsQuantity)
        {
            return new ColumnMatch(Column) { Identity = Meaning.Length == 0 ? null : Meaning[IdentityPrefix.Length..] };
        }

        string quantity = Meaning == OwnName ? (Name.Trim().Length > 0 ? Name.Trim() : Column) : Meaning;
        return match with
        {
            Quantity = quantity,
            Identity = null,
            Unit = Unit.Trim().Length > 0 ? Unit.Trim() : null,
            Flag = Flag.Length > 0 ? Flag : null,
            Origin = Origin,
            UnitColumn = quantity == match.Quantity ? match.UnitColumn : null,
            Source = quantity == match.Quantity ? match.Source : null,
            By = MatchedBy.MatchFile,
        };
    }

    private static string MeaningOf(ColumnMatch match) =>
        match.Identity is { } identity ? IdentityPrefix + identity
        : match.Quantity is not { } quantity ? LeftOut
        : Core.Quantities.Quantity.Find(quantity) is null ? OwnName : quantity;

    private void Set<T>(ref T field, T value)
    {
        if (!EqualityComparer<T>.Default.Equals(field, value))
        {
            field = value;
            IsEdited = true;
        }
    }
}
