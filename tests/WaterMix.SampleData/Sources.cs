using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;

namespace WaterMix.SampleData;

/// <summary>The source waters of Halcyon Basin, all invented, and what changes them on their way.</summary>
public static class Sources
{
    /// <summary>Index of the thermocline water.</summary>
    public const int Htw = 0;

    /// <summary>Index of the intermediate water.</summary>
    public const int Hiw = 1;

    /// <summary>Index of the marginal sea's water.</summary>
    public const int Msw = 2;

    /// <summary>Index of the northern deep water.</summary>
    public const int Ndw = 3;

    /// <summary>Index of the southern bottom water.</summary>
    public const int Sbw = 4;

    /// <summary>Index of oxygen among the tracers.</summary>
    public const int Oxygen = 2;

    /// <summary>The tracers, in the order of every array of tracer values here.</summary>
    public static IReadOnlyList<string> Tracers { get; } =
    [
        Quantity.PotentialTemperature.Id, Quantity.PracticalSalinity.Id, Quantity.Oxygen.Id, Quantity.Nitrate.Id, Quantity.Phosphate.Id, Quantity.Silicate.Id,
    ];

    /// <summary>The set as it is written to <c>halcyon.endmembers.json</c>; its order is that of every array of fractions here.</summary>
    public static EndMemberSet Set { get; } = new("Halcyon Basin sources", 1,
    [
        Source("HTW", "Halcyon Thermocline Water", [15.5, 35.55, 238, 2, 0.25, 2], [0.2, 0.03, 4, 0.4, 0.03, 0.5], 9, new(-31.5, -117, 180)),
        Source("HIW", "Halcyon Intermediate Water", [4.6, 34.3, 258, 24, 1.65, 12], [0.08, 0.01, 2.5, 0.3, 0.02, 0.8], 10, new(-45.5, -119, 550)),
        Source("MSW", "Marginal Sea Water", [11.9, 36.5, 200, 10.5, 0.62, 7.5], [0.15, 0.025, 3, 0.3, 0.02, 0.5], 7, new(-34.4, -107.8, 900)),
        Source("NDW", "Northern Deep Water", [3.3, 34.9, 285, 16.5, 1.08, 10.5], [0.03, 0.004, 2, 0.2, 0.013, 0.8], 12, new(-30, -121, 2200)),
        Source("SBW", "Southern Bottom Water", [-0.4, 34.66, 240, 32.5, 2.25, 121], [0.02, 0.003, 2, 0.2, 0.013, 1.5], 11, new(-46.2, -126, 4500)),
    ])
    {
        Description = "Source waters of an invented ocean: every number is made up.",
    };

    /// <summary>Value of each tracer in each source: rows are sources, columns tracers.</summary>
    public static double[][] Values { get; } = [.. Set.EndMembers.Select(e => Tracers.Select(t => e.Values[t]).ToArray())];

    /// <summary>Spread of each tracer within each source (one standard deviation), as <see cref="Values"/>.</summary>
    public static double[][] Spread { get; } = [.. Set.EndMembers.Select(e => Tracers.Select(t => e.Sd[t]).ToArray())];

    /// <summary>Oxygen falls and nutrients rise in these ratios, counted per phosphate; <c>AndersonSarmiento1994</c>, from memory.</summary>
    public static Process Respiration { get; } = new("respiration", Quantity.Phosphate.Id, new Dictionary<string, double>
    {
        [Quantity.Phosphate.Id] = 1,
        [Quantity.Nitrate.Id] = 16,
        [Quantity.Oxygen.Id] = -170,
    });

    /// <summary>Opal dissolves into silicate and nothing else.</summary>
    public static Process Opal { get; } = new("opal", Quantity.Silicate.Id, new Dictionary<string, double> { [Quantity.Silicate.Id] = 1 });

    /// <summary>What the fractions and amounts give, one value per tracer: the sum over the sources, and what the processes changed.</summary>
    /// <param name="fractions">One per source, summing to one.</param>
    /// <param name="respiration">Phosphate released, umol/kg.</param>
    /// <param name="opal">Silicate dissolved, umol/kg.</param>
    public static double[] Mix(IReadOnlyList<double> fractions, double respiration, double opal)
    {
        var values = new double[Tracers.Count];
        for (int t = 0; t < values.Length; t++)
        {
            for (int i = 0; i < fractions.Count; i++)
            {
                values[t] += fractions[i] * Values[i][t];
            }

            values[t] += respiration * Respiration.Ratios.GetValueOrDefault(Tracers[t]);
            values[t] += opal * Opal.Ratios.GetValueOrDefault(Tracers[t]);
        }

        return values;
    }

    private static EndMember Source(string id, string name, double[] values, double[] sd, int observations, EndMemberPosition position) =>
        new(id, name, ByTracer(values), new Provenance(ProvenanceKind.Manual, "invented"))
        {
            Sd = ByTracer(sd),
            Observations = observations,
            Position = position,
        };

    private static Dictionary<string, double> ByTracer(double[] values) =>
        Tracers.Zip(values).ToDictionary(pair => pair.First, pair => pair.Second);
}
