using System.Globalization;
using System.Text;
using System.Text.Json;
using System.Text.Json.Nodes;

namespace WaterMix.Formats.Json;

/// <summary>Numbers and strings as RFC 8785 spells them; what is written for people uses the same spelling.</summary>
internal static class JsonText
{
    /// <summary>
    /// The fewest digits that read back to the same double, laid out as ECMAScript does (<c>Rfc8785</c>, 3.2.2.3): no exponent
    /// from 1e-6 up to below 1e21; minus zero is 0.
    /// </summary>
    /// <exception cref="ArgumentException">The value is not finite: JSON has no such number.</exception>
    public static string Number(double value)
    {
        if (!double.IsFinite(value))
        {
            throw new ArgumentException($"JSON holds finite numbers only, and the value is {value.ToString(CultureInfo.InvariantCulture)}.", nameof(value));
        }

        if (value == 0)
        {
            return "0";
        }

        // .NET writes the same shortest digits, so only the layout differs: take digits and exponent apart.
        string shortest = Math.Abs(value).ToString("R", CultureInfo.InvariantCulture);
        int exponentAt = shortest.IndexOf('E', StringComparison.Ordinal);
        string mantissa = exponentAt < 0 ? shortest : shortest[..exponentAt];
        string digits = mantissa.Replace(".", "", StringComparison.Ordinal).TrimStart('0').TrimEnd('0');
        int point = PointAfter(mantissa) + (exponentAt < 0 ? 0 : int.Parse(shortest.AsSpan(exponentAt + 1), NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture));
        return (value < 0 ? "-" : "") + Layout(digits, point);
    }

    /// <summary>Appends a string in quotes, escaping only what JSON must have escaped (<c>Rfc8785</c>, 3.2.2.2).</summary>
    /// <exception cref="ArgumentException">The string holds half of a surrogate pair.</exception>
    public static void AppendString(StringBuilder into, string value)
    {
        into.Append('"');
        for (int i = 0; i < value.Length; i++)
        {
            char c = value[i];
            switch (c)
            {
                case '"':
                    into.Append("\\\"");
                    break;
                case '\\':
                    into.Append("\\\\");
                    break;
                case '\b':
                    into.Append("\\b");
                    break;
                case '\f':
                    into.Append("\\f");
                    break;
                case '\n':
                    into.Append("\\n");
                    break;
                case '\r':
                    into.Append("\\r");
                    break;
                case '\t':
                    into.Append("\\t");
                    break;
                case < ' ':
                    into.Append(CultureInfo.InvariantCulture, $"\\u{(int)c:x4}");
                    break;
                default:
                    bool isPair = char.IsHighSurrogate(c) && i + 1 < value.Length && char.IsLowSurrogate(value[i + 1]);
                    if (char.IsSurrogate(c) && !isPair)
                    {
                        throw new ArgumentException($"The text \"{value}\" holds half of a surrogate pair at character {i + 1}; JSON in UTF-8 cannot hold it.", nameof(value));
                    }

                    into.Append(c);
                    if (isPair)
                    {
                        into.Append(value[++i]);
                    }

                    break;
            }
        }

        into.Append('"');
    }

    /// <summary>Appends a number, a string, true, false or null.</summary>
    public static void AppendScalar(StringBuilder into, JsonNode? value)
    {
        switch (value?.GetValueKind())
        {
            case JsonValueKind.String:
                AppendString(into, value.GetValue<string>());
                break;
            case JsonValueKind.Number:
                into.Append(Number(value.AsValue().TryGetValue(out double number) ? number : double.Parse(value.ToJsonString(), CultureInfo.InvariantCulture)));
                break;
            case JsonValueKind.True:
                into.Append("true");
                break;
            case JsonValueKind.False:
                into.Append("false");
                break;
            default:
                into.Append("null");
                break;
        }
    }

    // Where the decimal point stands, counted from the first digit that is not zero: 2 for 12.5, 0 for 0.125, -1 for 0.0125.
    private static int PointAfter(string mantissa)
    {
        int point = mantissa.IndexOf('.', StringComparison.Ordinal);
        int whole = point < 0 ? mantissa.Length : point;
        int first = mantissa.IndexOfAny(['1', '2', '3', '4', '5', '6', '7', '8', '9']);
        return first < whole ? whole - first : whole - first + 1;
    }

    private static string Layout(string digits, int point)
    {
        int k = digits.Length;
        if (point > 21 || point <= -6)
        {
            string fraction = k == 1 ? "" : "." + digits[1..];
            return string.Create(CultureInfo.InvariantCulture, $"{digits[0]}{fraction}e{(point > 0 ? "+" : "")}{point - 1}");
        }

        if (point <= 0)
        {
            return "0." + new string('0', -point) + digits;
        }

        return k <= point ? digits + new string('0', point - k) : digits[..point] + "." + digits[point..];
    }
}
