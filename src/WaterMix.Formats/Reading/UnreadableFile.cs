using WaterMix.Core;

namespace WaterMix.Formats.Reading;

/// <summary>What the system says of a file that cannot be read, as a finding.</summary>
internal static class UnreadableFile
{
    /// <summary>The finding; the system's message is a sentence, of which the full stop is left to the finding.</summary>
    public static Finding Of(Exception fault, string expected, string remedy, string file) =>
        new(Severity.Error, expected, fault.Message.TrimEnd('.'), remedy) { File = file };
}
