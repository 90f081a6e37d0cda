namespace WaterMix.Core.Mixing.Kernels;

/// <summary>Sums of products in one fixed order with explicit fused multiply-add, so that every machine returns the same bits.</summary>
internal static class Vectors
{
    /// <summary>sum a_k b_k, from the first element to the last.</summary>
    public static double Dot(ReadOnlySpan<double> a, ReadOnlySpan<double> b)
    {
        double sum = 0;
        for (int k = 0; k < a.Length; k++)
        {
            sum = Math.FusedMultiplyAdd(a[k], b[k], sum);
        }

        return sum;
    }

    /// <summary>y += factor * x.</summary>
    public static void AddScaled(double factor, ReadOnlySpan<double> x, Span<double> y)
    {
        for (int k = 0; k < y.Length; k++)
        {
            y[k] = Math.FusedMultiplyAdd(factor, x[k], y[k]);
        }
    }

    /// <summary>The Euclidean length. The largest element is taken out first, so that squares neither overflow nor vanish.</summary>
    public static double Norm(ReadOnlySpan<double> a)
    {
        double largest = 0;
        foreach (double value in a)
        {
            largest = Math.Max(largest, Math.Abs(value));
        }

        if (largest == 0 || double.IsInfinity(largest))
        {
            return largest;
        }

        double sum = 0;
        foreach (double value in a)
        {
            double ratio = value / largest;
            sum = Math.FusedMultiplyAdd(ratio, ratio, sum);
        }

        return largest * Math.Sqrt(sum);
    }
}
