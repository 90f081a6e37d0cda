namespace WaterMix.Formats.Reading;

/// <summary>One file that was read.</summary>
/// <param name="Name">Its name.</param>
/// <param name="Format">Its kind: <c>exchange-bottle</c>, <c>exchange-ctd</c> or <c>csv</c>.</param>
/// <param name="Rows">Rows of data read from it.</param>
public sealed record ImportedFile(string Name, string Format, long Rows);
