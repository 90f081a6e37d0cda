using static WaterMix.Core.Seawater.Polynomial;

namespace WaterMix.Core.Seawater;

/// <summary>Temperature of a parcel moved to a reference pressure without gain or loss of heat or salt (TEOS-10).</summary>
public static class PotentialTemperature
{
    /// <summary>Potential temperature referred to 0 dbar: the root of entropy(S_A, pt0, 0) = entropy(S_A, t, p).</summary>
    /// <param name="absoluteSalinity">Absolute Salinity, g/kg, 0 to 42.</param>
    /// <param name="inSituTemperature">In-situ temperature, degC (ITS-90), -2 to 40.</param>
    /// <param name="pressureDbar">Sea pressure, dbar, 0 to 10,000.</param>
    /// <returns>Potential temperature, degC (ITS-90). NaN where an input is NaN or the salinity is negative.</returns>
    /// <remarks><c>IOC2010</c>, section 3.1; two steps as in <see cref="FromInSitu(double, double, double, double)"/>.</remarks>
    public static double FromInSitu(double absoluteSalinity, double inSituTemperature, double pressureDbar)
    {
        double x2 = absoluteSalinity * Teos10.SalinityScale;
        double x = Math.Sqrt(x2);
        double entropy = Entropy(x2, x, inSituTemperature, pressureDbar);
        double pt = Start(absoluteSalinity, inSituTemperature, pressureDbar, 0);
        double slope = StartingSlope(absoluteSalinity, pt);
        for (int step = 0; step < 2; step++)
        {
            double excess = GibbsFunction.EntropyPartAtSurface(x2, x, pt * Teos10.TemperatureScale) - entropy;
            double middle = pt - (0.5 * excess / slope);
            slope = -GibbsFunction.SecondByTemperatureAtSurface(x2, x, middle * Teos10.TemperatureScale);
            pt -= excess / slope;
        }

        return pt;
    }

    /// <summary>Potential temperature at any reference pressure: the root of entropy(S_A, pt, p_ref) = entropy(S_A, t, p).</summary>
    /// <param name="absoluteSalinity">Absolute Salinity, g/kg, 0 to 42.</param>
    /// <param name="inSituTemperature">In-situ temperature, degC (ITS-90), -2 to 40.</param>
    /// <param name="pressureDbar">Sea pressure, dbar, 0 to 10,000.</param>
    /// <param name="referencePressureDbar">Reference pressure, dbar, 0 to 10,000.</param>
    /// <returns>Potential temperature, degC (ITS-90). NaN where an input is NaN or the salinity is negative.</returns>
    /// <remarks>
    /// <c>IOC2010</c>, section 3.1. Newton's method with the slope taken at the middle of each step, <c>McDougallWotherspoon2013</c>: two
    /// steps from the starting polynomial of <c>McDougallBarker2011</c> reach 1e-13 degC, so the count is fixed and nothing branches.
    /// </remarks>
    public static double FromInSitu(double absoluteSalinity, double inSituTemperature, double pressureDbar, double referencePressureDbar)
    {
        double x2 = absoluteSalinity * Teos10.SalinityScale;
        double x = Math.Sqrt(x2);
        double z = referencePressureDbar * Teos10.PressureScale;
        double entropy = Entropy(x2, x, inSituTemperature, pressureDbar);
        double pt = Start(absoluteSalinity, inSituTemperature, pressureDbar, referencePressureDbar);
        double slope = StartingSlope(absoluteSalinity, pt);
        for (int step = 0; step < 2; step++)
        {
            double excess = GibbsFunction.EntropyPart(x2, x, pt * Teos10.TemperatureScale, z) - entropy;
            double middle = pt - (0.5 * excess / slope);
            slope = -GibbsFunction.SecondByTemperature(x2, x, middle * Teos10.TemperatureScale, z);
            pt -= excess / slope;
        }

        return pt;
    }

    /// <summary>Potential temperature referred to 0 dbar from Conservative Temperature: the root of CT(S_A, pt0) = CT.</summary>
    /// <param name="absoluteSalinity">Absolute Salinity, g/kg, 0 to 42.</param>
    /// <param name="conservativeTemperature">Conservative Temperature, degC, -2 to 40.</param>
    /// <returns>Potential temperature, degC (ITS-90). NaN where an input is NaN or the salinity is negative.</returns>
    /// <remarks>
    /// A step and a half of the same modified Newton method, <c>McDougallWotherspoon2013</c>, from the rational function of
    /// <c>McDougallBarker2011</c>.
    /// </remarks>
    public static double FromConservative(double absoluteSalinity, double conservativeTemperature)
    {
        double ct = conservativeTemperature;
        double s = absoluteSalinity / Teos10.GramsPerPracticalSalinity;
        double numerator = Of(s, -1.446013646344788e-2, -3.305308995852924e-3, 1.062415929128982e-4)
            + (ct * (9.477566673794488e-1 + (2.166591947736613e-3 * s) + (3.828842955039902e-3 * ct)));
        double denominator = 1 + (6.506097115635800e-4 * s) + (ct * (3.830289486850898e-3 + (1.247811760368034e-6 * ct)));
        double numeratorSlope = 9.477566673794488e-1 + (2.166591947736613e-3 * s) + (2 * 3.828842955039902e-3 * ct);
        double denominatorSlope = 3.830289486850898e-3 + (2 * 1.247811760368034e-6 * ct);

        double start = numerator / denominator;
        double slope = (numeratorSlope - (denominatorSlope * start)) / denominator;
        double excess = ConservativeTemperature.FromPotential(absoluteSalinity, start) - ct;
        slope = SlopeByConservative(absoluteSalinity, start - (0.5 * excess * slope));
        double pt = start - (excess * slope);
        excess = ConservativeTemperature.FromPotential(absoluteSalinity, pt) - ct;
        return pt - (excess * slope);
    }

    /// <summary>d pt0 / d CT = -cp0 / ((T0 + pt0) g_TT), from CT's definition.</summary>
    private static double SlopeByConservative(double absoluteSalinity, double pt)
    {
        double x2 = absoluteSalinity * Teos10.SalinityScale;
        double gTT = GibbsFunction.SecondByTemperatureAtSurface(x2, Math.Sqrt(x2), pt * Teos10.TemperatureScale);
        return -Teos10.HeatCapacity / ((Teos10.Zero + pt) * gTT);
    }

    private static double Entropy(double x2, double x, double t, double p) =>
        GibbsFunction.EntropyPart(x2, x, t * Teos10.TemperatureScale, p * Teos10.PressureScale);

    /// <summary>Potential temperature to about 0.01 degC, <c>McDougallBarker2011</c>.</summary>
    private static double Start(double absoluteSalinity, double t, double p, double reference)
    {
        double s = absoluteSalinity / Teos10.GramsPerPracticalSalinity;
        double sum = p + reference;
        double constant = 8.65483913395442e-6 - (1.41636299744881e-6 * s) - (7.38286467135737e-9 * sum);
        double linear = -8.38241357039698e-6 + (2.83933368585534e-8 * s) + (1.77803965218656e-8 * t) + (1.71155619208233e-10 * sum);
        return t + ((p - reference) * (constant + (t * linear)));
    }

    /// <summary>d entropy / d pt to a few per cent, for the first half step.</summary>
    private static double StartingSlope(double absoluteSalinity, double pt) =>
        Teos10.HeatCapacity / ((Teos10.Zero + pt) * (1 - (0.05 * (1 - (absoluteSalinity / Teos10.StandardOceanSalinity)))));
}
