using System.Text;
using System.Text.Unicode;

namespace WaterMix.Formats.Reading;

/// <summary>Fields as UTF-8 bytes.</summary>
internal static class FieldText
{
    private static readonly UTF8Encoding Tolerant = new(false, throwOnInvalidBytes: false);

    /// <summary>The field without the spaces and tabs around it.</summary>
    public static ReadOnlySpan<byte> Trim(ReadOnlySpan<byte> field)
    {
        int start = 0;
        int end = field.Length;
        while (start < end && field[start] is (byte)' ' or (byte)'\t')
        {
            start++;
        }

        while (end > start && field[end - 1] is (byte)' ' or (byte)'\t')
        {
            end--;
        }

        return field[start..end];
    }

    /// <summary>The field for a message: trimmed, at most 40 characters, bad bytes replaced.</summary>
    public static string Quote(ReadOnlySpan<byte> field)
    {
        string text = Tolerant.GetString(Trim(field[..Math.Min(field.Length, 200)]));
        return text.Length <= 40 ? $"'{text}'" : $"'{text[..37]}...'";
    }

    /// <summary>The field as text, trimmed.</summary>
    public static string ToText(ReadOnlySpan<byte> field) => Tolerant.GetString(Trim(field));

    /// <summary>True where the bytes are UTF-8 text without a NUL.</summary>
    public static bool IsText(ReadOnlySpan<byte> bytes) => !bytes.Contains((byte)0) && (Ascii.IsValid(bytes) || Utf8.IsValid(bytes));
}
