using WaterMix.Core.Seawater;

namespace WaterMix.SampleData;

/// <summary>The water at one place of the section: how much of each source it holds, and what happened to it.</summary>
/// <param name="Fractions">One per source, not negative, summing to one.</param>
/// <param name="Respiration">Phosphate released since the sources, umol/kg.</param>
/// <param name="Opal">Silicate dissolved since the sources, umol/kg.</param>
public sealed record Water(double[] Fractions, double Respiration, double Opal)
{
    private const int Parts = 10_000;

    /// <summary>
    /// The water at a place. The thermocline water deepens northwards; the intermediate water is a tongue from the south; the marginal
    /// sea's water spreads westwards from the strait at 1,050 dbar; the northern deep water fills what is below; the southern bottom water
    /// hugs the floor, and the ridge holds part of it back. Each source ages away from where it enters.
    /// </summary>
    /// <param name="along">Place along the section, 0 in the southwest to 1 in the northeast.</param>
    /// <param name="pressure">Sea pressure, dbar.</param>
    public static Water At(double along, double pressure)
    {
        double s = along;
        double p = pressure;
        double u = Math.Min(1, p / (600 + (300 * s)));
        double htw = (0.6 + (0.37 * s)) * (1 - u) * (1 - u) * (1 + (2 * u));
        double msw = 0.44 * s * s * Shape.Bump((p - 1050) / (p < 1050 ? 600 : 1000));
        double pastRidge = Shape.Step((s - 0.47) / 0.16);
        double sbwAtFloor = 0.93 - (0.2 * s) - (0.28 * pastRidge);
        double sbwTop = 2000 + (500 * s) + (150 * pastRidge);
        double sbw = sbwAtFloor * Shape.Step((p - sbwTop) / (4900 - sbwTop));
        double rest = 1 - htw - msw - sbw;
        double ndwShare = Shape.Step((p - (540 - (60 * s))) / (2300 - (100 * s)));
        double ndw = rest * ndwShare;
        double hiw = rest - ndw;

        // Age is distance from the door through which a source comes in.
        double respiration = (0.7 * htw * Shape.Step(p / 550)) + (hiw * (0.04 + (0.4 * s))) + (msw * (0.03 + (0.3 * (1 - s))))
            + (ndw * (0.04 + (0.5 * (1 - s)))) + (sbw * (0.03 + (0.25 * s)));
        double opal = (hiw * (1 + (8 * s))) + (msw * 4 * (1 - s)) + (ndw * (2 + (28 * (1 - s)))) + (sbw * (2 + (12 * s)));
        return new Water([htw, hiw, msw, ndw, sbw], respiration, opal);
    }

    /// <summary>The same to four decimals, the fractions still summing to one: the truth as it can be printed, exactly.</summary>
    public Water Rounded()
    {
        int[] counts = [.. Fractions.Select(f => (int)Math.Round(f * Parts))];
        int largest = Array.IndexOf(counts, counts.Max());
        counts[largest] += Parts - counts.Sum();
        return new Water([.. counts.Select(c => c / (double)Parts)], Math.Round(Respiration, 4), Math.Round(Opal, 4));
    }

    /// <summary>How far summer and the air have changed the water: 1 down to 30 dbar, 0 below the winter's mixed layer.</summary>
    /// <param name="pressure">Sea pressure, dbar.</param>
    public static double Summer(double pressure) => Shape.Step((Models.MixedLayer - pressure) / 120);

    /// <summary>The tracers of this water, the mixed layer's summer included.</summary>
    /// <param name="along">As in <see cref="At"/>.</param>
    /// <param name="pressure">Sea pressure, dbar.</param>
    public double[] Tracers(double along, double pressure)
    {
        double[] values = Sources.Mix(Fractions, Respiration, Opal);
        double summer = Summer(pressure);
        if (summer > 0)
        {
            values[0] += summer * (3.5 + (2 * along));
            values[1] += summer * 0.25 * (along - 0.5);
            double saturated = 1.01 * OxygenSolubility.FromPractical(values[1], values[0]);
            values[2] += summer * (saturated - values[2]);
            for (int t = 3; t < values.Length; t++)
            {
                values[t] *= 1 - (summer * (0.6 + (0.4 * Shape.Step(along / 0.6))));
            }
        }

        return values;
    }
}
