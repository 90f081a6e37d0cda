using System.Text;
using WaterMix.Core.Mixing;
using WaterMix.Formats.Json;
using WaterMix.Formats.MixingModels;
using WaterMix.Formats.Reading;
using WaterMix.Formats.Results;
using WaterMix.Formats.Tests.Reading;

namespace WaterMix.Formats.Tests.Results;

/// <summary>Two sources, two tracers, one process, and what comes of solving text with them.</summary>
internal static class SmallModel
{
    public const string Header = "station,latitude,longitude,pressure,potential_temperature,practical_salinity,oxygen";

    /// <summary>The model with layers of its own, such as <c>[{ "id": "deep", "endMembers": ["A", "B"], "where": [...] }]</c>, and a mask on its process.</summary>
    public static PreparedModel Prepare(string layers = "[]", string where = "[]")
    {
        string json = $$"""
            {
              "schema": "watermix/mixing-model/1", "name": "m",
              "endMembers": { "schema": "watermix/end-member-set/1", "name": "s", "version": 1, "endMembers": [
                { "id": "A", "name": "", "values": { "potential_temperature": 3, "practical_salinity": 34.9, "oxygen": 285 }, "provenance": { "kind": "manual" } },
                { "id": "B", "name": "", "values": { "potential_temperature": -0.4, "practical_salinity": 34.66, "oxygen": 240 }, "provenance": { "kind": "manual" } } ] },
              "tracers": ["potential_temperature", "practical_salinity", "oxygen"],
              "fit": { "kind": "generalised-least-squares", "measurementSd": { "potential_temperature": 0.01, "practical_salinity": 0.005, "oxygen": 2 } },
              "massConservation": { "kind": "exact" },
              "processes": [ { "id": "respiration", "per": "oxygen", "ratios": { "oxygen": 1 }, "sign": "non-positive", "where": {{where}} } ],
              "layers": {{layers}}
            }
            """;
        Reading<MixingModel> reading = MixingModelFile.Read(Encoding.UTF8.GetBytes(json), "m.mixmodel.json", _ => throw new FileNotFoundException());
        Assert.True(reading.Value is not null, string.Join("\n", reading.Findings));
        return PreparedModel.From(reading.Value);
    }

    /// <summary>The result file of inputs, and what was said of them.</summary>
    public static (string Csv, SolveSummary Summary) Solve(PreparedModel model, SolveOptions options, params IReadOnlyList<InputFile> files)
    {
        using OpenedSamples samples = SampleReader.Open(files, new ReadingOptions());
        using var stream = new MemoryStream();
        SolveSummary summary = StreamedSolve.Run(samples, model, options, stream, null);
        return (Encoding.UTF8.GetString(stream.ToArray()), summary);
    }

    /// <summary>Likewise of one text.</summary>
    public static (string Csv, SolveSummary Summary) Solve(PreparedModel model, string text) => Solve(model, new SolveOptions(), ReadingHelp.File("a.csv", text));
}
