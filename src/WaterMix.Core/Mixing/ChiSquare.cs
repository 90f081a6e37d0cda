namespace WaterMix.Core.Mixing;

/// <summary>The chi-square distribution.</summary>
public static class ChiSquare
{
    private const int Limit = 10_000;

    /// <summary>The probability that a chi-square variable exceeds a value.</summary>
    /// <param name="value">The value, >= 0.</param>
    /// <param name="degreesOfFreedom">At least 1.</param>
    /// <returns>A probability in [0, 1]; NaN in gives NaN out.</returns>
    /// <remarks>
    /// Q(a, x) with a = dof/2, x = value/2: the series of P below x = a + 1, the continued fraction of Q above (<c>Dlmf</c>, 8.11.4 and 8.9.2,
    /// the latter by Lentz's method). Gamma(a) is a product, since 2a is an integer; so no library function whose last bit differs between machines is used.
    /// </remarks>
    public static double UpperTail(double value, int degreesOfFreedom)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(degreesOfFreedom, 1);
        if (double.IsNaN(value))
        {
            return double.NaN;
        }

        double a = degreesOfFreedom / 2.0;
        double x = value / 2;
        if (x <= 0)
        {
            return 1;
        }

        if (double.IsPositiveInfinity(x))
        {
            return 0;
        }

        return x < a + 1 ? 1 - LowerBySeries(a, x) : UpperByFraction(a, x);
    }

    // P(a, x) = x^a e^-x / Gamma(a+1) (1 + x/(a+1) + x^2/((a+1)(a+2)) + ...)
    private static double LowerBySeries(double a, double x)
    {
        double term = 1;
        double sum = 1;
        for (int k = 1; k < Limit && term > sum * 1e-17; k++)
        {
            term *= x / (a + k);
            sum += term;
        }

        return Math.Min(1, Leading(a, x) * sum / a);
    }

    // Q(a, x) = x^a e^-x / Gamma(a) (1/(x+1-a-) (1(1-a)/(x+3-a-)) ...)
    private static double UpperByFraction(double a, double x)
    {
        const double tiny = 1e-300;
        double b = x + 1 - a;
        double c = 1 / tiny;
        double d = 1 / b;
        double fraction = d;
        for (int k = 1; k < Limit; k++)
        {
            double an = -k * (k - a);
            b += 2;
            d = Math.FusedMultiplyAdd(an, d, b);
            d = d == 0 ? tiny : d;
            c = b + (an / c);
            c = c == 0 ? tiny : c;
            d = 1 / d;
            double change = d * c;
            fraction *= change;
            if (Math.Abs(change - 1) < 1e-16)
            {
                break;
            }
        }

        return Leading(a, x) * fraction;
    }

    // x^a e^-x / Gamma(a), multiplied up one factor at a time with part of e^-x in each, so that nothing overflows.
    private static double Leading(double a, double x)
    {
        bool whole = a == Math.Floor(a);
        double start = whole ? 1 : 0.5;
        int factors = (int)(a - start);
        double product = whole ? x : Math.Sqrt(x / Math.PI);
        double exponent = -x / (factors + 1);
        double share = exponent < -700 ? 0 : Elementary.Exp(exponent);
        product *= share;
        for (int k = 0; k < factors; k++)
        {
            product *= x / (start + k) * share;
        }

        return product;
    }
}
