namespace WaterMix.Core.Mixing.Kernels;

/// <summary>An exponential that returns the same bits on every machine; a C library's may differ in the last.</summary>
internal static class ExactExponential
{
    // ln 2 in two parts, the first with 21 trailing zero bits so that k * LnTwoHigh is exact.
    private const double LnTwoHigh = 6.93147180369123816490e-01;
    private const double LnTwoLow = 1.90821492927058770002e-10;

    /// <summary>e^x to within two units in the last place; 0 below -745, infinity above 709.78.</summary>
    /// <remarks>x = k ln 2 + r with |r| &lt;= ln 2 / 2, and the Taylor series of e^r to r^13 (remainder below 1e-17).</remarks>
    public static double Exp(double x)
    {
        if (double.IsNaN(x))
        {
            return double.NaN;
        }

        if (x > 709.78)
        {
            return double.PositiveInfinity;
        }

        if (x < -745)
        {
            return 0;
        }

        double k = Math.Round(x / 0.6931471805599453);
        double r = Math.FusedMultiplyAdd(-k, LnTwoHigh, x);
        r = Math.FusedMultiplyAdd(-k, LnTwoLow, r);
        double sum = 1;
        for (int n = 13; n >= 1; n--)
        {
            sum = Math.FusedMultiplyAdd(sum, r / n, 1);
        }

        return Math.ScaleB(sum, (int)k);
    }
}
