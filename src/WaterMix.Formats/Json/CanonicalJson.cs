using System.Text;
using System.Text.Json.Nodes;

namespace WaterMix.Formats.Json;

/// <summary>The one spelling of a JSON value, <c>Rfc8785</c>: keys sorted by UTF-16 code units, shortest numbers, no white space.</summary>
public static class CanonicalJson
{
    /// <summary>The canonical text in UTF-8, without a byte-order mark.</summary>
    /// <param name="value">The value; null is the JSON null. Its numbers are taken as doubles.</param>
    /// <exception cref="ArgumentException">A number is not finite or a string holds half of a surrogate pair.</exception>
    public static byte[] Write(JsonNode? value)
    {
        var text = new StringBuilder();
        Append(text, value);
        return Encoding.UTF8.GetBytes(text.ToString());
    }

    private static void Append(StringBuilder text, JsonNode? value)
    {
        switch (value)
        {
            case JsonObject members:
                text.Append('{');
                string separator = "";
                foreach ((string key, JsonNode? member) in members.OrderBy(m => m.Key, StringComparer.Ordinal))
                {
                    text.Append(separator);
                    JsonText.AppendString(text, key);
                    text.Append(':');
                    Append(text, member);
                    separator = ",";
                }

                text.Append('}');
                break;
            case JsonArray items:
                text.Append('[');
                for (int i = 0; i < items.Count; i++)
                {
                    text.Append(i == 0 ? "" : ",");
                    Append(text, items[i]);
                }

                text.Append(']');
                break;
            default:
                JsonText.AppendScalar(text, value);
                break;
        }
    }
}
