namespace WaterMix.Cli.Tests;

/// <summary>A small model and a row of samples that it solves.</summary>
internal static class SmallModel
{
    public const string Header = "station,pressure,potential_temperature,practical_salinity,oxygen,nitrate,phosphate,silicate";

    public const string Row = "1,2000,3.5,34.95,270,18,1.2,15";

    public const string Samples = Header + "\n" + Row + "\n";

    public const string Json = """
        {
          "schema": "watermix/mixing-model/1", "name": "m",
          "endMembers": { "schema": "watermix/end-member-set/1", "name": "s", "version": 1, "endMembers": [
            { "id": "A", "name": "", "values": { "potential_temperature": 3, "practical_salinity": 34.9, "oxygen": 285, "silicate": 10 }, "provenance": { "kind": "manual" } },
            { "id": "B", "name": "", "values": { "potential_temperature": -0.4, "practical_salinity": 34.66, "oxygen": 240, "silicate": 121 }, "provenance": { "kind": "manual" } } ] },
          "tracers": ["potential_temperature", "practical_salinity", "oxygen"],
          "fit": { "kind": "generalised-least-squares", "measurementSd": { "potential_temperature": 0.01, "practical_salinity": 0.005, "oxygen": 2 } },
          "massConservation": { "kind": "exact" }
        }
        """;
}
