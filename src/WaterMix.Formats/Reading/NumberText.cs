using System.Globalization;

namespace WaterMix.Formats.Reading;

/// <summary>Numbers from UTF-8 text, correctly rounded.</summary>
internal static class NumberText
{
    private const long ExactMantissa = 1L << 53;

    private static readonly double[] PowersOfTen =
    [
        1e0, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15, 1e16, 1e17, 1e18,
    ];

    /// <summary>Reads a number that has no spaces around it.</summary>
    /// <param name="text">The text.</param>
    /// <param name="mark">The decimal mark, '.' or ','.</param>
    /// <param name="value">The nearest double.</param>
    /// <returns>False where the text is not a number.</returns>
    public static bool TryParse(ReadOnlySpan<byte> text, byte mark, out double value)
    {
        // The usual cell: up to 18 digits and a mark. With a mantissa below 2^53 and a power of ten that is exact,
        // one division rounds once, so the result is the nearest double.
        int i = 0;
        bool negative = false;
        if (text.Length > 0 && text[0] is (byte)'-' or (byte)'+')
        {
            negative = text[0] == (byte)'-';
            i = 1;
        }

        long mantissa = 0;
        int digits = 0;
        int decimals = -1;
        for (; i < text.Length && digits <= 18; i++)
        {
            uint digit = (uint)(text[i] - '0');
            if (digit <= 9)
            {
                mantissa = (mantissa * 10) + digit;
                digits++;
                decimals += decimals >= 0 ? 1 : 0;
            }
            else if (text[i] == mark && decimals < 0)
            {
                decimals = 0;
            }
            else
            {
                break;
            }
        }

        if (i == text.Length && digits is > 0 and <= 18 && mantissa <= ExactMantissa)
        {
            double magnitude = decimals > 0 ? mantissa / PowersOfTen[decimals] : mantissa;
            value = negative ? -magnitude : magnitude;
            return true;
        }

        return TryParseOther(text, mark, out value);
    }

    private static bool TryParseOther(ReadOnlySpan<byte> text, byte mark, out double value)
    {
        value = double.NaN;
        if (mark == (byte)'.')
        {
            return double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out value);
        }

        if (text.Length > 64 || text.Contains((byte)'.'))
        {
            return false;
        }

        Span<byte> pointed = stackalloc byte[text.Length];
        text.Replace(pointed, mark, (byte)'.');
        return double.TryParse(pointed, NumberStyles.Float, CultureInfo.InvariantCulture, out value);
    }
}
