using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Serialization;

namespace WaterMix.Formats.Reading;

/// <summary>The import report as JSON: the record's parts under their names in camel case, absent places left out.</summary>
public static class ImportReportJson
{
    private static readonly JsonSerializerOptions Options = new(JsonSerializerDefaults.Web)
    {
        WriteIndented = true,
        NewLine = "\n",
        DefaultIgnoreCondition = JsonIgnoreCondition.WhenWritingNull,
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
        Converters = { new JsonStringEnumConverter(JsonNamingPolicy.KebabCaseLower) },
    };

    /// <summary>Writes a report.</summary>
    /// <param name="report">The report.</param>
    public static string Write(ImportReport report) => JsonSerializer.Serialize(report, Options) + "\n";

    /// <summary>Reads what <see cref="Write"/> wrote.</summary>
    /// <param name="json">The text.</param>
    /// <exception cref="JsonException">The text is no report.</exception>
    public static ImportReport Read(string json) => JsonSerializer.Deserialize<ImportReport>(json, Options) ?? throw new JsonException("The text holds no report.");
}
