namespace WaterMix.SampleData;

/// <summary>Curves made of additions and multiplications only, the same bits on every machine.</summary>
internal static class Shape
{
    /// <summary>0 below 0, 1 above 1, and smooth between: t^2 (3 - 2t).</summary>
    public static double Step(double t)
    {
        double u = Math.Clamp(t, 0, 1);
        return u * u * (3 - (2 * u));
    }

    /// <summary>1 at 0, falling to 0 at -1 and 1 and staying there: (1 - t^2)^2.</summary>
    public static double Bump(double t)
    {
        double u = Math.Min(1, t * t);
        return (1 - u) * (1 - u);
    }
}
