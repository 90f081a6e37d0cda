using System.Text;
using System.Text.Json.Nodes;
using CsCheck;
using WaterMix.Core;
using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;
using WaterMix.Formats.EndMemberSets;
using WaterMix.Formats.Json;
using WaterMix.Formats.MixingModels;
using WaterMix.Formats.Tests.EndMemberSets;

namespace WaterMix.Formats.Tests.MixingModels;

/// <summary>Property: whatever is done to a valid file, reading it never throws: it gives errors, or a value that is written and read back equal.</summary>
public class MutationTests
{
    private static readonly string[] Replacements =
    [
        "null", "true", "0", "-1", "1e999", "-1e308", "1e-320", "0.5", "3.0", "\"\"", "\"oxygen\"", "\"NDW\"", "\"\\uD83D\\uDE00\"", "[]", "{}", "[[]]", "[1]", "{\"file\": \"..\"}",
        "{\"quantity\": \"longitude\", \"atLeast\": 1}", "[null]", "\"in_situ_temperature\"", "\"no\"", "[\"po\", \"oxygen\", \"phosphate\"]", "1e15", "{\"absolute\": 1}",
    ];

    private static readonly Gen<string> Documents = Gen.Int[0, 2].Select(i => new[] { HalcyonSet.Json, HalcyonModel.Json, HalcyonModel.WeightedJson }[i]);

    [Fact]
    public void Read_RandomBytesChanged_NeverThrows() =>
        Gen.Select(Documents, Gen.Select(Gen.Int[0, 4000], Gen.Byte, Gen.Int[0, 3]).Array[1, 6]).Sample(
            (text, edits) =>
            {
                var bytes = new List<byte>(Encoding.UTF8.GetBytes(text));
                foreach ((int place, byte value, int kind) in edits)
                {
                    int at = place % Math.Max(1, bytes.Count);
                    switch (kind)
                    {
                        case 0:
                            bytes.Insert(at, value);
                            break;
                        case 1 when bytes.Count > 0:
                            bytes.RemoveAt(at);
                            break;
                        case 2 when bytes.Count > 0:
                            bytes[at] = value;
                            break;
                        default:
                            bytes.RemoveRange(at, Math.Min(value, bytes.Count - at));
                            break;
                    }
                }

                ReadAndHold([.. bytes]);
            },
            iter: 2_000);

    [Fact]
    public void Read_TruncatedAnywhere_NeverThrowsAndIsNoValue()
    {
        foreach (string text in new[] { HalcyonSet.Json, HalcyonModel.Json, HalcyonModel.WeightedJson })
        {
            byte[] bytes = Encoding.UTF8.GetBytes(text);
            for (int length = 0; length < bytes.Length; length += 3)
            {
                Assert.False(ReadAndHold(bytes[..length]), $"{length} bytes");
            }
        }
    }

    [Fact]
    public void Read_ValuesReplacedRemovedOrRenamed_NeverThrows() =>
        Gen.Select(Documents, Gen.Select(Gen.Int[0, 500], Gen.Int[0, Replacements.Length + 2]).Array[1, 4]).Sample(
            (text, edits) =>
            {
                JsonNode root = JsonNode.Parse(text)!;
                foreach ((int place, int what) in edits)
                {
                    Mutate(root, place, what);
                }

                // The value of 1e999 is not one that the JSON writer takes, so it stands as a text until here.
                ReadAndHold(Encoding.UTF8.GetBytes(root.ToJsonString().Replace("\"1e999\"", "1e999", StringComparison.Ordinal)));
            },
            iter: 2_000);

    private static void Mutate(JsonNode root, int place, int what)
    {
        JsonNode[] nodes = [.. Within(root).Where(n => n.Parent is not null)];
        if (nodes.Length == 0)
        {
            return;
        }

        JsonNode node = nodes[place % nodes.Length];
        if (what < Replacements.Length)
        {
            string with = Replacements[what];
            node.ReplaceWith(with == "1e999" ? JsonValue.Create("1e999") : JsonNode.Parse(with));
        }
        else if (node.Parent is JsonObject owner)
        {
            string key = node.GetPropertyName();
            owner.Remove(key);
            if (what == Replacements.Length)
            {
                owner[key + "s"] = node;
            }
        }
        else if (node.Parent is JsonArray list)
        {
            int index = node.GetElementIndex();
            JsonNode copy = node.DeepClone();
            if (what == Replacements.Length)
            {
                list.RemoveAt(index);
            }
            else
            {
                list.Insert(index, copy);
            }
        }
    }

    private static IEnumerable<JsonNode> Within(JsonNode node)
    {
        IEnumerable<JsonNode?> children = node switch
        {
            JsonObject members => members.Select(m => m.Value),
            JsonArray items => items,
            _ => [],
        };
        return children.OfType<JsonNode>().SelectMany(Within).Prepend(node);
    }

    // Reads the bytes as a set, as a model, and as the set of a model; true where one of them is a value.
    private static bool ReadAndHold(byte[] bytes)
    {
        Reading<EndMemberSet> set = EndMemberSetFile.Read(bytes, "x");
        Hold(set);
        if (set.Value is not null)
        {
            Assert.Equal(set.Value, EndMemberSetFile.Read(EndMemberSetFile.Write(set.Value), "x").Value);
        }

        Reading<MixingModel> model = MixingModelFile.Read(bytes, "x", HalcyonModel.OpenSet);
        Hold(model);
        if (model.Value is not null)
        {
            Assert.Equal(model.Value, MixingModelFile.Read(MixingModelFile.Write(model.Value), "x", HalcyonModel.OpenSet).Value);
        }

        Hold(MixingModelFile.Read(Encoding.UTF8.GetBytes(HalcyonModel.Json), "x", _ => (bytes, "set")));
        return set.Value is not null || model.Value is not null;
    }

    private static void Hold<T>(Reading<T> reading)
        where T : class
    {
        Assert.Equal(reading.Value is null, reading.Findings.Any(f => f.Severity == Severity.Error));
    }
}
