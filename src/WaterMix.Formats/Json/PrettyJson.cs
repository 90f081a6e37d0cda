using System.Text;
using System.Text.Json.Nodes;

namespace WaterMix.Formats.Json;

/// <summary>JSON laid out for people: keys in the order given, two spaces a level, an object or a list of plain values on one line.</summary>
internal static class PrettyJson
{
    /// <summary>The text in UTF-8, lines ended by LF, the last one too.</summary>
    public static byte[] Write(JsonNode? value)
    {
        var text = new StringBuilder();
        Append(text, value, "");
        text.Append('\n');
        return Encoding.UTF8.GetBytes(text.ToString());
    }

    private static void Append(StringBuilder text, JsonNode? value, string indent)
    {
        switch (value)
        {
            case JsonObject members:
                AppendItems(text, '{', '}', [.. members.Select(m => ((string?)m.Key, m.Value))], indent);
                break;
            case JsonArray items:
                AppendItems(text, '[', ']', [.. items.Select(i => ((string?)null, i))], indent);
                break;
            default:
                JsonText.AppendScalar(text, value);
                break;
        }
    }

    private static void AppendItems(StringBuilder text, char open, char close, List<(string? Key, JsonNode? Value)> items, string indent)
    {
        bool oneLine = items.TrueForAll(i => i.Value is not (JsonObject { Count: > 0 } or JsonArray { Count: > 0 }));
        string inner = indent + "  ";
        string padding = open == '{' && items.Count > 0 ? " " : "";
        text.Append(open).Append(oneLine ? padding : "\n" + inner);
        for (int i = 0; i < items.Count; i++)
        {
            if (i > 0)
            {
                text.Append(oneLine ? ", " : ",\n" + inner);
            }

            if (items[i].Key is { } key)
            {
                JsonText.AppendString(text, key);
                text.Append(": ");
            }

            Append(text, items[i].Value, inner);
        }

        text.Append(oneLine ? padding : "\n" + indent).Append(close);
    }
}
