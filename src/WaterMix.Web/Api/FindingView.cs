using WaterMix.Core;

namespace WaterMix.Web.Api;

/// <summary>A finding as the API gives it.</summary>
/// <param name="Severity"><c>note</c>, <c>warning</c> or <c>error</c>.</param>
/// <param name="Expected">What was needed.</param>
/// <param name="Found">What stands there instead.</param>
/// <param name="Remedy">The next step.</param>
/// <param name="File">The file's name.</param>
/// <param name="Line">The line in the file, from 1.</param>
/// <param name="Column">The column.</param>
/// <param name="Path">The place in a JSON document, an RFC 6901 pointer.</param>
/// <param name="Count">How often the same thing was found; the place is the first's.</param>
internal sealed record FindingView(string Severity, string Expected, string Found, string Remedy, string? File, long? Line, string? Column, string? Path, long Count)
{
    /// <summary>The view of a finding.</summary>
    public static FindingView Of(Finding finding) => new(
        finding.Severity switch { Core.Severity.Error => "error", Core.Severity.Warning => "warning", _ => "note" },
        finding.Expected,
        finding.Found,
        finding.Remedy,
        finding.File,
        finding.Line,
        finding.Column,
        finding.Path,
        finding.Count);
}
