using WaterMix.Formats.Tests.EndMemberSets;

namespace WaterMix.Formats.Tests.MixingModels;

/// <summary>The contract's example of a mixing model, word for word; an invented ocean.</summary>
internal static class HalcyonModel
{
    public const string Json = """
        {
          "schema": "watermix/mixing-model/1",
          "name": "Halcyon Basin, two layers",
          "endMembers": { "file": "halcyon.endmembers.json" },
          "tracers": ["potential_temperature", "practical_salinity", "oxygen", "nitrate", "phosphate", "silicate"],
          "fit": { "kind": "generalised-least-squares",
                   "measurementSd": { "potential_temperature": 0.005, "practical_salinity": 0.003, "oxygen": { "absolute": 0.5, "relative": 0.005 },
                                      "nitrate": 0.2, "phosphate": 0.02, "silicate": { "absolute": 0.3, "relative": 0.02 } },
                   "endMemberSpread": "iterated" },
          "massConservation": { "kind": "exact" },
          "processes": [
            { "id": "respiration", "per": "phosphate", "ratios": { "phosphate": 1, "nitrate": 16, "oxygen": -170 }, "sign": "non-negative" },
            { "id": "opal", "per": "silicate", "ratios": { "silicate": 1 }, "sign": "non-negative" },
            { "id": "denitrification", "per": "phosphate", "ratios": { "phosphate": 1, "nitrate": -104 }, "sign": "non-negative",
              "where": [ { "quantity": "oxygen", "lessThan": 10 } ] } ],
          "layers": [ { "id": "deep", "endMembers": ["NDW", "SBW", "MSW"],
                        "where": [ { "quantity": "sigma2", "atLeast": 36.9 }, { "quantity": "pressure", "atLeast": 150 } ] } ],
          "acceptFlags": [2, 6], "acceptCtdFlags": [2, 6, 7], "samples": { "prefer": "bottle" }
        }
        """;

    /// <summary>Every option away from its default, an inline set, and derived and user-defined tracers.</summary>
    public const string WeightedJson = """
        {
          "schema": "watermix/mixing-model/1", "name": "rows",
          "endMembers": {
            "schema": "watermix/end-member-set/1", "name": "inline", "version": 1, "units": { "dye": "nmol/kg" },
            "endMembers": [
              { "id": "A", "name": "", "values": { "conservative_temperature": 1, "oxygen": 300, "nitrate": 15, "phosphate": 1, "dye": 0 }, "provenance": { "kind": "manual" } },
              { "id": "B", "name": "", "values": { "conservative_temperature": 9, "oxygen": 200, "nitrate": 20, "phosphate": 1.5, "dye": 3 }, "provenance": { "kind": "literature", "citation": "x" } } ] },
          "tracers": ["conservative_temperature", "po", "n_star", "dye"],
          "fit": { "kind": "weighted-rows", "standardise": "sd", "standardiseOver": "set", "sdOver": "n-1",
                   "weights": { "conservative_temperature": 24, "po": 7, "n_star": 2, "dye": 0.5 }, "weightsAre": "squared",
                   "measurementSd": { "conservative_temperature": 0.01, "oxygen": { "absolute": 1, "relative": 0.01 }, "nitrate": 0.1, "phosphate": 0.01, "dye": 0.1 },
                   "factors": { "no": { "oxygenPerNitrate": 9.5 }, "po": { "oxygenPerPhosphate": 175 }, "n_star": { "nitratePerPhosphate": 14, "offset": 3 }, "po4_star": { "oxygenPerPhosphate": 170, "offset": -2 } } },
          "massConservation": { "kind": "weighted", "weight": 200 },
          "processes": [
            { "id": "p1", "per": "nitrate", "ratios": { "nitrate": 1 }, "sign": "non-positive" },
            { "id": "p2", "per": "dye", "ratios": { "dye": 1 }, "sign": "free", "where": [ { "quantity": "sigma1", "atLeast": 32, "lessThan": 33, "scale": "eos80" } ] } ],
          "layers": [
            { "id": "upper", "endMembers": ["A", "B"], "where": [ { "quantity": "longitude", "atLeast": 170, "lessThan": -170 } ] },
            { "id": "rest", "endMembers": ["A", "B"] } ],
          "acceptFlags": [2], "acceptCtdFlags": [2, 6], "samples": { "prefer": "ctd" }
        }
        """;

    public static (byte[] Utf8, string FileName) OpenSet(string name) => name == "halcyon.endmembers.json"
        ? (System.Text.Encoding.UTF8.GetBytes(HalcyonSet.Json), name)
        : throw new FileNotFoundException($"Could not find file '{name}'.");
}
