using System.Text;
using System.Text.Json.Nodes;
using WaterMix.Core;
using WaterMix.Core.Mixing;
using WaterMix.Core.Samples;
using WaterMix.Formats.EndMemberSets;
using WaterMix.Formats.Json;
using WaterMix.Formats.MixingModels;
using WaterMix.Formats.Tests.EndMemberSets;

namespace WaterMix.Formats.Tests.MixingModels;

public class MixingModelFileTests
{
    private const string CovarianceJson = """
        {
          "schema": "watermix/mixing-model/1", "name": "", "endMembers": { "file": "halcyon.endmembers.json" },
          "tracers": ["oxygen", "nitrate", "phosphate"],
          "fit": { "kind": "generalised-least-squares", "measurementSd": { "phosphate": 0.02 }, "endMemberSpread": "none",
                   "measurementCovariance": { "tracers": ["oxygen", "nitrate"], "matrix": [[1, -0.05], [-0.05, 0.04]] } },
          "massConservation": { "kind": "exact" }
        }
        """;

    [Fact]
    public void Read_ContractExample_HasNotesOnlyAndEveryValue()
    {
        Reading<MixingModel> reading = Read(HalcyonModel.Json);

        MixingModel model = reading.Value!;
        Assert.Equal("Halcyon Basin, two layers", model.Name);
        Assert.Equal("halcyon.endmembers.json", model.EndMembersFile);
        Assert.Equal(EndMemberSetFile.Read(Encoding.UTF8.GetBytes(HalcyonSet.Json), "").Value, model.EndMembers);
        Assert.Equal(["potential_temperature", "practical_salinity", "oxygen", "nitrate", "phosphate", "silicate"], model.Tracers);
        GeneralisedLeastSquares fit = Assert.IsType<GeneralisedLeastSquares>(model.Fit);
        Assert.Equal(new MeasurementError(0.5, 0.005), fit.MeasurementSd["oxygen"]);
        Assert.Equal(new MeasurementError(0.2), fit.MeasurementSd["nitrate"]);
        Assert.Equal(EndMemberSpread.Iterated, fit.Spread);
        Assert.True(model.Mass.IsExact);
        Assert.Equal(["respiration", "opal", "denitrification"], model.Processes.Select(p => p.Id));
        Assert.Equal(-170, model.Processes[0].Ratios["oxygen"]);
        Assert.Equal(new Condition("oxygen", null, 10), Assert.Single(model.Processes[2].Where));
        Layer layer = Assert.Single(model.Layers);
        Assert.Equal([new Condition("sigma2", 36.9, null), new Condition("pressure", 150, null)], layer.Where);

        // SBW and MSW of the example have no spread: the contract asks that this be said.
        Assert.All(reading.Findings, f => Assert.Equal(Severity.Note, f.Severity));
        Assert.Equal(["/endMembers/1/sd", "/endMembers/2/sd"], reading.Findings.Select(f => f.Path));
        Assert.All(reading.Findings, f => Assert.Equal("halcyon.endmembers.json", f.File));
    }

    [Fact]
    public void Read_EveryOptionAwayFromItsDefault_IsTaken()
    {
        MixingModel model = Read(HalcyonModel.WeightedJson).Value!;

        WeightedRows fit = Assert.IsType<WeightedRows>(model.Fit);
        Assert.Equal((Standardisation.Sd, StandardiseOver.Set, SdDivisor.NMinus1, WeightMeaning.Squared), (fit.Standardise, fit.Over, fit.SdOver, fit.WeightsAre));
        Assert.Equal(24, fit.Weights["conservative_temperature"]);
        Assert.Equal(
            new DerivedTracerFactors { NoOxygenPerNitrate = 9.5, PoOxygenPerPhosphate = 175, NStarNitratePerPhosphate = 14, NStarOffset = 3, Po4StarOxygenPerPhosphate = 170, Po4StarOffset = -2 },
            fit.Factors);
        Assert.Equal(200, model.Mass.Weight);
        Assert.Equal([ProcessSign.NonPositive, ProcessSign.Free], model.Processes.Select(p => p.Sign));
        Assert.Equal(DensityScale.Eos80, model.Processes[1].Where[0].Scale);
        Assert.Equal([2], model.AcceptFlags);
        Assert.Equal([2, 6], model.AcceptCtdFlags);
        Assert.Equal(ValueOrigin.Ctd, model.Prefer);
        Assert.Null(model.EndMembersFile);
    }

    [Fact]
    public void Read_OnlyWhatIsRequired_HasTheDefaultsOfTheContract()
    {
        MixingModel gls = Read(CovarianceJson.Replace("\"endMemberSpread\": \"none\",", "", StringComparison.Ordinal)).Value!;
        MixingModel rows = Read("""
            { "schema": "watermix/mixing-model/1", "name": "", "endMembers": { "file": "halcyon.endmembers.json" }, "tracers": ["oxygen", "nitrate"],
              "fit": { "kind": "weighted-rows", "weights": { "oxygen": 1, "nitrate": 2 } }, "massConservation": { "kind": "exact" } }
            """).Value!;

        Assert.Equal(EndMemberSpread.Iterated, Assert.IsType<GeneralisedLeastSquares>(gls.Fit).Spread);
        Assert.Equal([2, 6], gls.AcceptFlags);
        Assert.Equal([2, 6, 7], gls.AcceptCtdFlags);
        Assert.Equal(ValueOrigin.Bottle, gls.Prefer);
        Assert.Empty(gls.Processes);
        Layer all = Assert.Single(gls.LayersOrAll);
        Assert.Equal("all", all.Id);
        Assert.Equal(["NDW", "SBW", "MSW"], all.EndMembers);
        WeightedRows fit = Assert.IsType<WeightedRows>(rows.Fit);
        Assert.Equal((Standardisation.MeanAndSd, StandardiseOver.Layer, SdDivisor.N, WeightMeaning.RowFactors), (fit.Standardise, fit.Over, fit.SdOver, fit.WeightsAre));
    }

    [Theory]
    [InlineData(HalcyonModel.Json)]
    [InlineData(HalcyonModel.WeightedJson)]
    [InlineData(CovarianceJson)]
    public void Write_WhatWasRead_ReadsBackEqual(string text)
    {
        MixingModel model = Read(text).Value!;

        byte[] written = MixingModelFile.Write(model);
        MixingModel again = MixingModelFile.Read(written, "again", HalcyonModel.OpenSet).Value!;

        Assert.Equal(model, again);
        Assert.Equal(model.GetHashCode(), again.GetHashCode());
        Assert.Equal(written, MixingModelFile.Write(again));
        Assert.Equal(ContentHash.OfModel(model), ContentHash.OfModel(again));
    }

    [Fact]
    public void Write_EveryOptionAwayFromItsDefault_KeepsEveryKey() =>
        Assert.Equal(
            CanonicalJson.Write(JsonNode.Parse(HalcyonModel.WeightedJson)),
            CanonicalJson.Write(JsonNode.Parse(MixingModelFile.Write(Read(HalcyonModel.WeightedJson).Value!))));

    [Theory]
    [InlineData("\"name\": \"Halcyon Basin, two layers\",", "", "/name", "the key \"name\"")]
    [InlineData("\"tracers\"", "\"tracer\"", "/tracer", "one of the keys schema, name, endMembers, tracers, fit, massConservation, processes, layers, acceptFlags, acceptCtdFlags, samples")]
    [InlineData("mixing-model/1", "mixing-model/2", "/schema", "the schema \"watermix/mixing-model/1\"")]
    [InlineData("mixing-model/1", "end-member-set/1", "/schema", "the schema \"watermix/mixing-model/1\"")]
    [InlineData("generalised-least-squares", "least-squares", "/fit/kind", "\"generalised-least-squares\" or \"weighted-rows\"")]
    [InlineData("\"endMemberSpread\": \"iterated\"", "\"weights\": {}", "/fit/weights", "one of the keys kind, measurementSd, factors, endMemberSpread, measurementCovariance")]
    [InlineData("\"iterated\"", "\"always\"", "/fit/endMemberSpread", "\"none\" or \"fixed\" or \"iterated\"")]
    [InlineData("\"nitrate\": 0.2", "\"nitrate\": 0", "/fit/measurementSd/nitrate", "a measurement error above 0")]
    [InlineData("\"nitrate\": 0.2", "\"nitrate\": -0.2", "/fit/measurementSd/nitrate", "a measurement error above 0")]
    [InlineData("\"nitrate\": 0.2", "\"nitrate\": 1e999", "/fit/measurementSd/nitrate", "a number that fits a double (up to 1.8e308)")]
    [InlineData("\"nitrate\": 0.2", "\"nitrate\": Infinity", "/fit/measurementSd/nitrate", "a finite number")]
    [InlineData("\"relative\": 0.005", "\"relative\": -0.005", "/fit/measurementSd/oxygen/relative", "a relative error, 0 or more")]
    [InlineData("\"absolute\": 0.5, ", "", "/fit/measurementSd/oxygen/absolute", "the key \"absolute\"")]
    [InlineData("\"nitrate\": 0.2, ", "", "/fit/measurementSd/nitrate", "a measurement error of nitrate, which is fitted")]
    [InlineData("{ \"kind\": \"exact\" }", "{ \"kind\": \"exact\", \"weight\": 2 }", "/massConservation/weight", "one of the keys kind")]
    [InlineData("{ \"kind\": \"exact\" }", "{ \"kind\": \"weighted\" }", "/massConservation/weight", "the key \"weight\"")]
    [InlineData("{ \"kind\": \"exact\" }", "{ \"kind\": \"weighted\", \"weight\": 0 }", "/massConservation/weight", "a weight above 0")]
    [InlineData("\"potential_temperature\", \"practical", "\"in_situ_temperature\", \"practical", "/tracers/0", "a quantity that mixes linearly")]
    [InlineData("\"opal\"", "\"sbw\"", "/processes/1/id", "an id that no other end-member or process has (upper and lower case count as the same)")]
    [InlineData("{ \"silicate\": 1 }", "{ \"silicate\": 2 }", "/processes/1/ratios/silicate", "the ratio 1 of silicate, which the amount counts")]
    [InlineData("\"sign\": \"non-negative\" },", "\"sign\": \"positive\" },", "/processes/0/sign", "\"non-negative\" or \"non-positive\" or \"free\"")]
    [InlineData("\"lessThan\": 10", "\"lessthan\": 10", "/processes/2/where/0/lessthan", "one of the keys quantity, atLeast, lessThan, scale")]
    [InlineData(", \"lessThan\": 10", "", "/processes/2/where/0", "\"atLeast\", \"lessThan\" or both")]
    [InlineData("[\"NDW\", \"SBW\", \"MSW\"]", "[\"NDW\", \"SBW\", \"MWS\"]", "/layers/0/endMembers/2", "the id of an end-member of the set")]
    [InlineData("\"atLeast\": 150", "\"atLeast\": 150, \"scale\": \"eos80\"", "/layers/0/where/1/scale", "the scale eos80 on sigma0 to sigma4 only")]
    [InlineData("\"acceptFlags\": [2, 6]", "\"acceptFlags\": [2, 10]", "/acceptFlags/1", "a whole number from 0 to 9")]
    [InlineData("\"prefer\": \"bottle\"", "\"prefer\": \"both\"", "/samples/prefer", "\"bottle\" or \"ctd\"")]
    [InlineData("\"halcyon.endmembers.json\"", "\"absent.endmembers.json\"", "/endMembers/file", "the end-member set as a file that can be read")]
    [InlineData("\"halcyon.endmembers.json\"", "\"/etc/halcyon.json\"", "/endMembers/file", "a file's name relative to the model's folder")]
    [InlineData("\"halcyon.endmembers.json\"", "3", "/endMembers/file", "text in double quotes")]
    [InlineData("\"endMemberSpread\": \"iterated\"", "\"factors\": { \"no\": { \"oxygenPerNitrate\": 0 } }", "/fit/factors/no/oxygenPerNitrate", "a ratio above 0")]
    [InlineData("\"endMemberSpread\": \"iterated\"", "\"factors\": { \"nstar\": {} }", "/fit/factors/nstar", "one of the keys no, po, n_star, po4_star")]
    [InlineData("\"endMemberSpread\": \"iterated\"", "\"measurementCovariance\": { \"tracers\": [\"oxygen\", \"nitrate\"], \"matrix\": [[1, 2], [2, 1]] }", "/fit/measurementCovariance/matrix", "a positive definite covariance")]
    public void Read_OneFault_NamesItsPlaceAndWhatWasExpected(string original, string faulty, string path, string expected)
    {
        Reading<MixingModel> reading = Read(Replace(HalcyonModel.Json, original, faulty));

        Assert.Null(reading.Value);
        Finding[] errors = [.. reading.Findings.Where(f => f.Severity == Severity.Error)];
        Finding finding = Assert.Single(errors, f => f.Path == path);
        Assert.Equal(expected, finding.Expected);
        Assert.Equal("model.json", finding.File);
        Assert.NotNull(finding.Line);

        // A misspelt key also leaves the right one missing; nothing else may follow from one fault.
        Assert.True(errors.Length == 1 || (original == "\"tracers\"" && errors.Length == 2), string.Join('\n', errors.Select(f => f.ToString())));
    }

    [Theory]
    [InlineData("\"weights\": { \"conservative_temperature\": 24, \"po\": 7", "\"weights\": { \"conservative_temperature\": 0, \"po\": 7", "/fit/weights/conservative_temperature")]
    [InlineData("\"weights\": { \"conservative_temperature\": 24, \"po\": 7", "\"weights\": { \"conservative_temperature\": 24, \"po\": -7", "/fit/weights/po")]
    [InlineData("\"weights\": { \"conservative_temperature\": 24, \"po\": 7", "\"weights\": { \"po\": 7", "/fit/weights/conservative_temperature")]
    [InlineData("\"weights\": { \"conservative_temperature\": 24, \"po\": 7", "\"weights\": { \"conservative_temperature\": null, \"po\": 7", "/fit/weights/conservative_temperature")]
    [InlineData("\"oxygen\": 200", "\"oxygen\": [200]", "/endMembers/endMembers/1/values/oxygen")]
    [InlineData("\"id\": \"B\"", "\"id\": \"a\"", "/endMembers/endMembers/1/id")]
    [InlineData("\"dye\": 3", "\"die\": 3", "/endMembers/endMembers/1/values/die")]
    public void Read_OneFaultInWeightsOrInlineSet_NamesItsPlace(string original, string faulty, string path)
    {
        Reading<MixingModel> reading = Read(Replace(HalcyonModel.WeightedJson, original, faulty));

        Assert.Null(reading.Value);
        Assert.Contains(reading.Findings, f => f.Severity == Severity.Error && f.Path == path && f.Line is not null);
    }

    [Fact]
    public void Read_FaultsInModelAndNamedSet_AreListedWithTheirFiles()
    {
        string set = HalcyonSet.Json.Replace("\"silicate\": 2 }", "\"silicate\": -2 }", StringComparison.Ordinal).Replace("\"citations\"", "\"citation\"", StringComparison.Ordinal);
        string model = HalcyonModel.Json.Replace("\"potential_temperature\", ", "\"in_situ_temperature\", ", StringComparison.Ordinal).Replace("\"samples\"", "\"sample\"", StringComparison.Ordinal);

        Reading<MixingModel> reading = MixingModelFile.Read(Encoding.UTF8.GetBytes(model), "m.json", name => (Encoding.UTF8.GetBytes(set), "folder/" + name));

        Assert.Null(reading.Value);
        Assert.Equal(
            [("m.json", "/tracers/0"), ("m.json", "/sample"), ("folder/halcyon.endmembers.json", "/citation"), ("folder/halcyon.endmembers.json", "/endMembers/0/sd/silicate")],
            reading.Findings.Where(f => f.Severity == Severity.Error).Select(f => (f.File!, f.Path!)));
    }

    [Fact]
    public void Read_CommaTooManyAndFaultOfMeaning_ListsBoth()
    {
        string text = HalcyonModel.Json.Replace("\"bottle\" }", "\"bottle\" },", StringComparison.Ordinal).Replace("\"MSW\"]", "\"MWS\"]", StringComparison.Ordinal);

        Assert.Equal(["/layers/0/endMembers/2", null], Read(text).Findings.Where(f => f.Severity == Severity.Error).Select(f => f.Path));
    }

    [Fact]
    public void Read_TenThousandEndMembers_NotesWhatIsAssumedForEach()
    {
        IEnumerable<string> members = Enumerable.Range(0, 10_000).Select(i => $$"""
            { "id": "E{{i}}", "name": "", "values": { "oxygen": {{i % 900}}, "nitrate": {{i % 31}} }, "sd": { "oxygen": 1 }, "provenance": { "kind": "samples" } }
            """);
        string set = $$"""{ "schema": "watermix/end-member-set/1", "name": "", "version": 1, "endMembers": [{{string.Join(",\n", members)}}] }""";
        string model = """
            { "schema": "watermix/mixing-model/1", "name": "", "endMembers": { "file": "x" }, "tracers": ["oxygen", "nitrate"],
              "fit": { "kind": "weighted-rows", "weights": { "oxygen": 1, "nitrate": 2 } }, "massConservation": { "kind": "exact" } }
            """;

        Reading<MixingModel> reading = MixingModelFile.Read(Encoding.UTF8.GetBytes(model), "m", _ => (Encoding.UTF8.GetBytes(set), "s"));

        Assert.Equal(10_000, reading.Value!.EndMembers.EndMembers.Count);
        Assert.Equal(20_001, reading.Findings.Count);
    }

    [Fact]
    public void Read_FromDisk_ResolvesTheSetBesideTheModel()
    {
        string folder = Directory.CreateTempSubdirectory("watermix-model-").FullName;
        try
        {
            string path = Path.Combine(folder, "halcyon.mixmodel.json");
            File.WriteAllText(path, HalcyonModel.Json);
            Reading<MixingModel> without = MixingModelFile.Read(path);
            File.WriteAllText(Path.Combine(folder, "halcyon.endmembers.json"), HalcyonSet.Json);

            Assert.Equal("/endMembers/file", Assert.Single(without.Findings).Path);
            Assert.Equal(Read(HalcyonModel.Json).Value, MixingModelFile.Read(path).Value);
        }
        finally
        {
            Directory.Delete(folder, recursive: true);
        }
    }

    [Theory]
    [InlineData("no-such-folder/no.mixmodel.json")]
    [InlineData(".")]
    [InlineData("")]
    public void Read_PathThatIsNoFile_IsAFinding(string path)
    {
        Reading<MixingModel> reading = MixingModelFile.Read(path);

        Assert.Null(reading.Value);
        Assert.Equal(path, Assert.Single(reading.Findings).File);
    }

    [Theory]
    [InlineData("")]
    [InlineData("{}")]
    [InlineData("[]")]
    [InlineData("null")]
    [InlineData("{ \"schema\": \"watermix/mixing-model/1\", \"name\": 1, \"endMembers\": [], \"tracers\": {}, \"fit\": 3, \"massConservation\": \"exact\" }")]
    public void Read_OtherShapes_GiveFindings(string text)
    {
        Reading<MixingModel> reading = Read(text);

        Assert.Null(reading.Value);
        Assert.NotEmpty(reading.Findings);
    }

    private static string Replace(string text, string original, string faulty)
    {
        int at = text.IndexOf(original, StringComparison.Ordinal);
        return text[..at] + faulty + text[(at + original.Length)..];
    }

    private static Reading<MixingModel> Read(string text) => MixingModelFile.Read(Encoding.UTF8.GetBytes(text), "model.json", HalcyonModel.OpenSet);
}
