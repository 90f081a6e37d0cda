namespace WaterMix.Formats.Tests.EndMemberSets;

/// <summary>The contract's example of an end-member set, word for word; an invented ocean.</summary>
internal static class HalcyonSet
{
    public const string Json = """
        {
          "schema": "watermix/end-member-set/1",
          "name": "Halcyon Basin deep sources", "version": 3, "description": "", "citations": ["..."],
          "endMembers": [
            { "id": "NDW", "name": "Northern Deep Water",
              "values": { "potential_temperature": 3.3, "practical_salinity": 34.9, "oxygen": 285, "nitrate": 16.5, "phosphate": 1.08, "silicate": 10.5 },
              "sd":     { "potential_temperature": 0.15, "practical_salinity": 0.02, "oxygen": 6, "nitrate": 0.6, "phosphate": 0.06, "silicate": 2 },
              "observations": 12,
              "position": { "latitude": 62, "longitude": -30, "pressure": 2000 },
              "provenance": { "kind": "manual", "note": "invented", "citation": "" } },
            { "id": "SBW", "name": "Southern Bottom Water",
              "values": { "potential_temperature": -0.4, "practical_salinity": 34.66, "oxygen": 240, "nitrate": 32.5, "phosphate": 2.25, "silicate": 121 },
              "provenance": { "kind": "manual" } },
            { "id": "MSW", "name": "Marginal Sea Water",
              "values": { "potential_temperature": 11.9, "practical_salinity": 36.5, "oxygen": 200, "nitrate": 10.5, "phosphate": 0.62, "silicate": 7.5 },
              "provenance": { "kind": "manual" } }
          ]
        }
        """;
}
