using static WaterMix.Core.Seawater.Polynomial;

namespace WaterMix.Core;

/// <summary>
/// exp, ln and sin^2 from additions and multiplications only, so that the same input gives the same bits on every machine; those
/// of the system's mathematics library do not. Each is within 2 units of the last place in the range it is used in.
/// </summary>
internal static class Elementary
{
    // ln 2 in two parts: the first has so few bits that a small integer times it is exact.
    private const double Ln2High = 6.93147180369123816490e-1;
    private const double Ln2Low = 1.90821492927058770002e-10;

    /// <summary>e^x for |x| up to 700; NaN in gives NaN out.</summary>
    public static double Exp(double x)
    {
        if (!(Math.Abs(x) <= 700))
        {
            return double.NaN;
        }

        double k = Math.Round(x / (Ln2High + Ln2Low));
        double r = x - (k * Ln2High) - (k * Ln2Low);

        // The Taylor series at |r| <= ln 2 / 2; the first term left out is under 1e-17.
        double tail = Of(r, 1.0 / 5040, 1.0 / 40320, 1.0 / 362880, 1.0 / 3628800, 1.0 / 39916800, 1.0 / 479001600, 1.0 / 6227020800);
        double series = Of(r, 1.0, 1.0, 1.0 / 2, 1.0 / 6, 1.0 / 24, 1.0 / 120, Of(r, 1.0 / 720, tail));
        return series * BitConverter.Int64BitsToDouble(((long)k + 1023) << 52);
    }

    /// <summary>ln x for positive x with a full mantissa; NaN where x is not positive or not finite.</summary>
    public static double Log(double x)
    {
        if (!(x >= 2.3e-308 && x <= double.MaxValue))
        {
            return double.NaN;
        }

        // x = m 2^e with m from sqrt(1/2) to sqrt(2), then ln m = 2 artanh f with f = (m - 1) / (m + 1).
        long bits = BitConverter.DoubleToInt64Bits(x);
        int e = (int)(bits >> 52) - 1023;
        double m = BitConverter.Int64BitsToDouble((bits & 0x000F_FFFF_FFFF_FFFF) | 0x3FF0_0000_0000_0000);
        if (m > 1.4142135623730951)
        {
            m *= 0.5;
            e++;
        }

        double f = (m - 1) / (m + 1);
        double f2 = f * f;
        double tail = Of(f2, 1.0 / 15, 1.0 / 17, 1.0 / 19, 1.0 / 21, 1.0 / 23);
        double series = Of(f2, 1.0 / 3, 1.0 / 5, 1.0 / 7, 1.0 / 9, 1.0 / 11, 1.0 / 13, tail);
        return (e * Ln2High) + ((e * Ln2Low) + (2 * f * f2 * series) + (2 * f));
    }

    /// <summary>sin^2 of a latitude in degrees; NaN outside -90 to 90.</summary>
    public static double SineSquared(double latitudeDeg)
    {
        double a = Math.Abs(latitudeDeg);
        if (!(a <= 90))
        {
            return double.NaN;
        }

        // Above 45 degrees from the complement, so that the series stays short.
        double angle = (a <= 45 ? a : 90 - a) * (Math.PI / 180);
        double x2 = angle * angle;
        double tail = Of(x2, -1.0 / 39916800, 1.0 / 6227020800, -1.0 / 1307674368000);
        double sine = angle * Of(x2, 1.0, -1.0 / 6, 1.0 / 120, -1.0 / 5040, 1.0 / 362880, tail);
        return a <= 45 ? sine * sine : 1 - (sine * sine);
    }
}
