namespace WaterMix.Formats.Reading;

/// <summary>What was made of one column of the table, over all files.</summary>
/// <param name="Id">The column's id.</param>
/// <param name="Unit">Its unit in the table.</param>
/// <param name="Source">The header names it was read from.</param>
/// <param name="MatchedBy">How it was matched: <c>id</c>, <c>whp-name</c>, <c>name</c>, <c>match-file</c> or <c>own-name</c>.</param>
/// <param name="Conversion">The conversion made, or empty.</param>
/// <param name="Values">Samples with a value.</param>
/// <param name="Missing">Samples without.</param>
/// <param name="Usable">Samples with a value whose flag is accepted.</param>
/// <param name="FromBottle">Values from the bottle.</param>
/// <param name="FromCtd">Values from the CTD.</param>
/// <param name="Voided">Values made void because their bottle did not trip correctly; they count as missing.</param>
/// <param name="Flags">Number of samples by WHP flag, of those that have a flag.</param>
public sealed record ImportedColumn(
    string Id,
    string Unit,
    string Source,
    string MatchedBy,
    string Conversion,
    long Values,
    long Missing,
    long Usable,
    long FromBottle,
    long FromCtd,
    long Voided,
    IReadOnlyDictionary<int, long> Flags);
