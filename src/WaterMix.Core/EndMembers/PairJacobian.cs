namespace WaterMix.Core.EndMembers;

/// <summary>A pair of functions of temperature and salinity at one point: their values and their derivatives.</summary>
internal readonly record struct PairJacobian(double Temperature, double Salinity, double TByT, double TByS, double SByT, double SByS)
{
    /// <summary>True where values and derivatives are numbers.</summary>
    public bool IsFinite => double.IsFinite(Temperature + Salinity + TByT + TByS + SByT + SByS);

    /// <summary>Values, and derivatives by central differences; one-sided at a salinity below the step, since none is negative.</summary>
    public static PairJacobian At(Func<double, double, (double T, double S)> pair, double t, double s, double step)
    {
        (double valueT, double valueS) = pair(t, s);
        (double t1, double s1) = pair(t - step, s);
        (double t2, double s2) = pair(t + step, s);
        double lower = Math.Max(0, s - step);
        double upper = s + step;
        (double t3, double s3) = pair(t, lower);
        (double t4, double s4) = pair(t, upper);
        return new PairJacobian(valueT, valueS, (t2 - t1) / (2 * step), (t4 - t3) / (upper - lower), (s2 - s1) / (2 * step), (s4 - s3) / (upper - lower));
    }

    /// <summary>J C J' of the covariance of temperature and salinity.</summary>
    public (double TT, double TS, double SS) Covariance(double tt, double ts, double ss) => (
        (TByT * TByT * tt) + (2 * TByT * TByS * ts) + (TByS * TByS * ss),
        (TByT * SByT * tt) + (((TByT * SByS) + (TByS * SByT)) * ts) + (TByS * SByS * ss),
        (SByT * SByT * tt) + (2 * SByT * SByS * ts) + (SByS * SByS * ss));
}
