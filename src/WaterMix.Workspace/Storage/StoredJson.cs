using System.Text.Json;
using WaterMix.Core.Mixing;
using WaterMix.Core.Samples;
using WaterMix.Formats.Json;
using WaterMix.Formats.Matching;
using WaterMix.Formats.MixingModels;
using WaterMix.Formats.Reading;
using WaterMix.Workspace.Cruises;

namespace WaterMix.Workspace.Storage;

/// <summary>The parts of rows that are JSON.</summary>
internal static class StoredJson
{
    /// <summary>A model, its set inline.</summary>
    /// <exception cref="ArgumentException">A number is not finite.</exception>
    public static string Of(MixingModel model) => System.Text.Encoding.UTF8.GetString(MixingModelFile.Write(model with { EndMembersFile = null }));

    /// <summary>A model as it was stored.</summary>
    public static MixingModel Model(string json)
    {
        Reading<MixingModel> reading = MixingModelFile.ReadDraft(System.Text.Encoding.UTF8.GetBytes(json), "the stored model");
        return reading.Value ?? throw new InvalidDataException($"The stored model cannot be read: {reading.Findings[0]}");
    }

    /// <summary>Measurement errors, or null.</summary>
    public static string? Of(IReadOnlyDictionary<string, MeasurementError>? errors) => errors is null ? null : JsonSerializer.Serialize(errors);

    /// <summary>Measurement errors as they were stored, or null.</summary>
    public static Dictionary<string, MeasurementError>? Errors(string? json) =>
        json is null ? null : JsonSerializer.Deserialize<Dictionary<string, MeasurementError>>(json);

    /// <summary>Numbers of samples by status.</summary>
    public static string Of(IReadOnlyDictionary<SolveStatus, long> statuses) => JsonSerializer.Serialize(statuses);

    /// <summary>Numbers of samples by status as they were stored; empty for null.</summary>
    public static Dictionary<SolveStatus, long> Statuses(string? json) =>
        json is null ? [] : JsonSerializer.Deserialize<Dictionary<SolveStatus, long>>(json)!;

    /// <summary>Reading options.</summary>
    public static string Of(ReadingOptions options) => JsonSerializer.Serialize(new StoredReading(
        [.. options.AcceptedFlags.WaterSample],
        [.. options.AcceptedFlags.Ctd],
        options.Prefer,
        options.LaboratoryTemperature,
        options.Match is null ? null : System.Text.Encoding.UTF8.GetString(options.Match.Write())));

    /// <summary>Reading options as they were stored.</summary>
    public static ReadingOptions Reading(string json)
    {
        StoredReading stored = JsonSerializer.Deserialize<StoredReading>(json)!;
        return new ReadingOptions
        {
            AcceptedFlags = new AcceptedFlags(stored.AcceptFlags, stored.AcceptCtdFlags),
            Prefer = stored.Prefer,
            LaboratoryTemperature = stored.LaboratoryTemperature,
            Match = stored.Match is null ? null : ColumnMatchFile.Read(System.Text.Encoding.UTF8.GetBytes(stored.Match), "the stored match").Value,
        };
    }

    /// <summary>A cruise of a row.</summary>
    public static Cruise Cruise(CruiseRow row) => new(
        row.Id,
        row.Name,
        row.SamplesHash,
        row.SampleCount,
        row.Upload,
        ImportReportJson.Read(row.Report),
        Errors(row.MeasurementSd))
    {
        Reading = Reading(row.Reading),
    };

    /// <summary>A run of a row.</summary>
    public static Runs.Run Run(RunRow row) => new(
        row.Id,
        row.Name,
        row.Started,
        row.State,
        row.Done,
        row.Total,
        Model(row.Model),
        row.ModelHash,
        Statuses(row.Statuses),
        row.Problem);

    private sealed record StoredReading(int[] AcceptFlags, int[] AcceptCtdFlags, ValueOrigin Prefer, double LaboratoryTemperature, string? Match);
}
