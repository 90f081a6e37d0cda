using System.Text;
using System.Text.Json.Nodes;
using WaterMix.Core;
using WaterMix.Core.EndMembers;
using WaterMix.Formats.EndMemberSets;
using WaterMix.Formats.Json;

namespace WaterMix.Formats.Tests.EndMemberSets;

public class EndMemberSetFileTests
{
    private const string Full = """
        {
          "schema": "watermix/end-member-set/1", "name": "Näme \"x\"\n", "version": 2147483647, "citations": [], "units": { "dye": "nmol/kg", "argon": "umol/kg" },
          "endMembers": [
            { "id": "A.1_b-C", "name": "", "values": { "dye": 1e-7, "oxygen": 0.1, "conservative_temperature": -1.5, "absolute_salinity": 35.123456789012345 },
              "sd": { "oxygen": 0, "dye": 5e-324 }, "meanSd": { "oxygen": 1.5 },
              "correlations": { "tracers": ["oxygen", "dye"], "matrix": [[1, -0.25], [-0.25, 1]] },
              "observations": 1, "position": { "latitude": -90, "longitude": 360, "pressure": 0 },
              "provenance": { "kind": "samples", "note": "", "citation": "doi" } },
            { "id": "B", "name": "b", "values": {}, "provenance": { "kind": "proposal" } } ]
        }
        """;

    [Fact]
    public void Read_ContractExample_HasNoFindingsAndEveryValue()
    {
        Reading<EndMemberSet> reading = Read(HalcyonSet.Json);

        Assert.Empty(reading.Findings);
        EndMemberSet set = reading.Value!;
        Assert.Equal(("Halcyon Basin deep sources", 3, ""), (set.Name, set.Version, set.Description));
        Assert.Equal(["..."], set.Citations!);
        Assert.Equal(["NDW", "SBW", "MSW"], set.EndMembers.Select(e => e.Id));
        EndMember first = set.EndMembers[0];
        Assert.Equal(34.9, first.Values["practical_salinity"]);
        Assert.Equal(0.06, first.Sd["phosphate"]);
        Assert.Equal(12, first.Observations);
        Assert.Equal(new EndMemberPosition(62, -30, 2000), first.Position);
        Assert.Equal(new Provenance(ProvenanceKind.Manual, "invented", ""), first.Provenance);
        Assert.Equal(new Provenance(ProvenanceKind.Manual), set.EndMembers[1].Provenance);
        Assert.Null(set.EndMembers[1].Observations);
        Assert.Empty(set.EndMembers[1].Sd);
    }

    [Theory]
    [InlineData(HalcyonSet.Json)]
    [InlineData(Full)]
    public void Write_WhatWasRead_KeepsEveryKeyAndValue(string text)
    {
        EndMemberSet set = Read(text).Value!;

        byte[] written = EndMemberSetFile.Write(set);

        Assert.Equal(set, EndMemberSetFile.Read(written, "again").Value);
        Assert.Equal(CanonicalJson.Write(JsonNode.Parse(text)), CanonicalJson.Write(JsonNode.Parse(written)));
        Assert.Equal(written, EndMemberSetFile.Write(EndMemberSetFile.Read(written, "again").Value!));
    }

    [Fact]
    public void Write_Set_IsLaidOutForPeople()
    {
        string[] lines = Encoding.UTF8.GetString(EndMemberSetFile.Write(Read(HalcyonSet.Json).Value!)).Split('\n');

        Assert.Equal(
            ["{", "  \"schema\": \"watermix/end-member-set/1\",", "  \"name\": \"Halcyon Basin deep sources\",", "  \"version\": 3,", "  \"description\": \"\",", "  \"citations\": [\"...\"],", "  \"endMembers\": ["],
            lines[..7]);
        Assert.Contains("      \"position\": { \"latitude\": 62, \"longitude\": -30, \"pressure\": 2000 },", lines);
        Assert.Equal("", lines[^1]);
    }

    [Fact]
    public void Write_NotANumber_IsTheCallersMistake()
    {
        EndMemberSet set = Read(HalcyonSet.Json).Value!;
        EndMember broken = set.EndMembers[0] with { Values = new Dictionary<string, double> { ["oxygen"] = double.NaN } };

        Assert.Throws<ArgumentException>(() => EndMemberSetFile.Write(set with { EndMembers = [broken] }));
    }

    [Fact]
    public void Equals_OneDigitOfOneValue_Differs()
    {
        EndMemberSet set = Read(HalcyonSet.Json).Value!;

        Assert.Equal(set, Read(HalcyonSet.Json).Value);
        Assert.Equal(set.GetHashCode(), Read(HalcyonSet.Json).Value!.GetHashCode());
        Assert.NotEqual(set, Read(HalcyonSet.Json.Replace("1.08", "1.09", StringComparison.Ordinal)).Value);
        Assert.NotEqual(set, Read(HalcyonSet.Json.Replace("\"description\": \"\", ", "", StringComparison.Ordinal)).Value);
    }

    [Theory]
    [InlineData("\"version\": 3", "\"version\": 0", "/version", "a whole number, 1 or more")]
    [InlineData("\"version\": 3", "\"version\": 1.5", "/version", "a whole number, 1 or more")]
    [InlineData("\"version\": 3, ", "", "/version", "the key \"version\"")]
    [InlineData("\"citations\"", "\"citation\"", "/citation", "one of the keys schema, name, version, description, citations, units, endMembers")]
    [InlineData("end-member-set/1", "end-member-set/2", "/schema", "the schema \"watermix/end-member-set/1\"")]
    [InlineData("end-member-set/1", "mixing-model/1", "/schema", "the schema \"watermix/end-member-set/1\"")]
    [InlineData("\"SBW\"", "\"ndw\"", "/endMembers/1/id", "an id that no other end-member or process has (upper and lower case count as the same)")]
    [InlineData("\"SBW\"", "\"S W\"", "/endMembers/1/id", "an id of 1 to 32 characters: letters A to Z, digits, '.', '_' and '-', beginning with a letter or digit")]
    [InlineData("\"SBW\"", "\"SBW\\n\"", "/endMembers/1/id", "an id of 1 to 32 characters: letters A to Z, digits, '.', '_' and '-', beginning with a letter or digit")]
    [InlineData("\"SBW\"", "\"\"", "/endMembers/1/id", "an id of 1 to 32 characters: letters A to Z, digits, '.', '_' and '-', beginning with a letter or digit")]
    [InlineData("\"oxygen\": 285", "\"oxigen\": 285", "/endMembers/0/values/oxigen", "a quantity's id, or a tracer that \"units\" of the end-member set names")]
    [InlineData("\"oxygen\": 285", "\"oxygen\": 1e30", "/endMembers/0/values/oxygen", "oxygen from -10 to 1000 umol/kg")]
    [InlineData("\"oxygen\": 285", "\"oxygen\": 1e400", "/endMembers/0/values/oxygen", "a number that fits a double (up to 1.8e308)")]
    [InlineData("\"oxygen\": 285", "\"oxygen\": \"285\"", "/endMembers/0/values/oxygen", "a number")]
    [InlineData("\"oxygen\": 6", "\"oxygen\": -6", "/endMembers/0/sd/oxygen", "a standard deviation, 0 or more")]
    [InlineData("\"observations\": 12", "\"observations\": 0", "/endMembers/0/observations", "a whole number, 1 or more")]
    [InlineData("\"latitude\": 62", "\"latitude\": 90.5", "/endMembers/0/position/latitude", "a number from -90 to 90 degrees north")]
    [InlineData("\"longitude\": -30", "\"longitude\": -181", "/endMembers/0/position/longitude", "a number from -180 to 360 degrees east")]
    [InlineData("\"pressure\": 2000", "\"pressure\": -1", "/endMembers/0/position/pressure", "a number from 0 to 12000 dbar")]
    [InlineData(", \"pressure\": 2000", "", "/endMembers/0/position/pressure", "the key \"pressure\"")]
    [InlineData("\"kind\": \"manual\", \"note\"", "\"kind\": \"guess\", \"note\"", "/endMembers/0/provenance/kind", "\"manual\" or \"samples\" or \"literature\" or \"remembered\" or \"proposal\"")]
    [InlineData("\"observations\": 12", "\"meanSd\": { \"silicate\": -1 }", "/endMembers/0/meanSd/silicate", "a standard deviation, 0 or more")]
    [InlineData("\"observations\": 12", "\"correlations\": { \"tracers\": [\"oxygen\", \"nitrate\"], \"matrix\": [[1, 0.5], [0.4, 1]] }", "/endMembers/0/correlations/matrix/1/0", "the same number as for oxygen and nitrate, 0.5")]
    [InlineData("\"observations\": 12", "\"correlations\": { \"tracers\": [\"oxygen\", \"nitrate\"], \"matrix\": [[1, 1.5], [1.5, 1]] }", "/endMembers/0/correlations/matrix/0/1", "a correlation from -1 to 1")]
    [InlineData("\"observations\": 12", "\"correlations\": { \"tracers\": [\"oxygen\", \"nitrate\"], \"matrix\": [[2, 0.5], [0.5, 1]] }", "/endMembers/0/correlations/matrix/0/0", "1 on the diagonal of a correlation matrix")]
    [InlineData("\"observations\": 12", "\"correlations\": { \"tracers\": [\"oxygen\", \"nitrate\"], \"matrix\": [[1, 0.5]] }", "/endMembers/0/correlations/matrix", "2 rows of 2 numbers, as many as there are tracers")]
    [InlineData("\"observations\": 12", "\"correlations\": { \"tracers\": [\"oxygen\", \"oxygen\"], \"matrix\": [[1, 0.5], [0.5, 1]] }", "/endMembers/0/correlations/tracers/1", "each tracer once")]
    [InlineData("\"observations\": 12", "\"correlations\": { \"tracers\": [\"oxygen\", \"dye\"], \"matrix\": [[1, 0.5], [0.5, 1]] }", "/endMembers/0/correlations/tracers/1", "a quantity's id, or a tracer that \"units\" of the end-member set names")]
    [InlineData("\"observations\": 12", "\"correlations\": { \"tracers\": [\"oxygen\", \"nitrate\", \"silicate\"], \"matrix\": [[1, 0.9, -0.9], [0.9, 1, 0.9], [-0.9, 0.9, 1]] }", "/endMembers/0/correlations/matrix", "correlations that can hold together (positive semi-definite)")]
    [InlineData("\"citations\": [\"...\"]", "\"units\": { \"oxygen\": \"mL/L\" }", "/units/oxygen", "umol/kg, the unit that oxygen always has")]
    [InlineData("\"citations\": [\"...\"]", "\"units\": { \"dye\": \"\" }", "/units/dye", "a tracer's name and its unit")]
    [InlineData("\"citations\": [\"...\"]", "\"citations\": [3]", "/citations/0", "text in double quotes")]
    public void Read_OneFault_NamesItsPlaceAndWhatWasExpected(string original, string faulty, string path, string expected)
    {
        int at = HalcyonSet.Json.IndexOf(original, StringComparison.Ordinal);
        string text = HalcyonSet.Json[..at] + faulty + HalcyonSet.Json[(at + original.Length)..];

        Reading<EndMemberSet> reading = Read(text);

        Assert.Null(reading.Value);
        Finding finding = Assert.Single(reading.Findings, f => f.Severity == Severity.Error);
        Assert.Equal(path, finding.Path);
        Assert.Equal(expected, finding.Expected);
        Assert.Equal("set.json", finding.File);
        Assert.NotNull(finding.Line);
    }

    [Fact]
    public void Read_ManyFaults_ListsThemAllByLine()
    {
        string text = HalcyonSet.Json
            .Replace("\"version\": 3", "\"version\": \"3\"", StringComparison.Ordinal)
            .Replace("285", "NaN", StringComparison.Ordinal)
            .Replace("\"silicate\": 2 }", "\"silicate\": -2 }", StringComparison.Ordinal)
            .Replace("\"MSW\"", "\"SBW\"", StringComparison.Ordinal)
            .Replace("\"note\"", "\"notes\"", StringComparison.Ordinal);

        Reading<EndMemberSet> reading = Read(text);

        Assert.Null(reading.Value);
        Assert.Equal(
            ["/version", "/endMembers/0/values/oxygen", "/endMembers/0/sd/silicate", "/endMembers/0/provenance/notes", "/endMembers/2/id"],
            reading.Findings.Select(f => f.Path));
        Assert.Equal([3L, 6L, 7L, 10L, 14L], reading.Findings.Select(f => f.Line!.Value));
    }

    [Theory]
    [InlineData("{}")]
    [InlineData("[]")]
    [InlineData("3")]
    [InlineData("null")]
    [InlineData("\"text\"")]
    [InlineData("""{ "schema": "watermix/end-member-set/1", "name": "x", "version": 1, "endMembers": [] }""")]
    [InlineData("""{ "schema": "watermix/end-member-set/1", "name": "x", "version": 1, "endMembers": [3, null, [], {}] }""")]
    public void Read_OtherShapes_GiveFindings(string text)
    {
        Reading<EndMemberSet> reading = Read(text);

        Assert.Null(reading.Value);
        Assert.NotEmpty(reading.Findings);
    }

    [Fact]
    public void Read_ValueThatNoFitUses_IsTakenWithAWarning()
    {
        Reading<EndMemberSet> reading = Read(HalcyonSet.Json.Replace("\"oxygen\": 240", "\"in_situ_temperature\": 3, \"no\": 400, \"oxygen\": 240", StringComparison.Ordinal));

        Assert.NotNull(reading.Value);
        Assert.Equal(["/endMembers/1/values/in_situ_temperature", "/endMembers/1/values/no"], reading.Findings.Select(f => f.Path));
        Assert.All(reading.Findings, f => Assert.Equal(Severity.Warning, f.Severity));
    }

    [Fact]
    public void Read_Stream_ReadsAsBytesDo()
    {
        using var stream = new MemoryStream(Encoding.UTF8.GetBytes(HalcyonSet.Json));

        Assert.Equal(Read(HalcyonSet.Json).Value, EndMemberSetFile.Read(stream, "set.json").Value);
    }

    private static Reading<EndMemberSet> Read(string text) => EndMemberSetFile.Read(Encoding.UTF8.GetBytes(text), "set.json");
}
