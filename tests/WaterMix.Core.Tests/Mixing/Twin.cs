using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;

namespace WaterMix.Core.Tests.Mixing;

/// <summary>
/// A synthetic twin with known fractions: four illustrative sources over six tracers and one respiration column. All sources have the same spread.
/// </summary>
internal static class Twin
{
    public static readonly string[] Tracers =
        ["potential_temperature", "practical_salinity", "oxygen", "nitrate", "phosphate", "silicate"];

    public static readonly double[] Fractions = [0.30, 0.45, 0.15, 0.10];

    public const double Amount = 0.20;

    /// <summary>The exact mixture of <see cref="Fractions"/> with <see cref="Amount"/>.</summary>
    public static readonly double[] Exact = [3.625, 34.8265, 221.25, 24.6, 1.6775, 35.9];

    /// <summary><see cref="Exact"/> with an error in every tracer.</summary>
    public static readonly double[] Disturbed = [3.675, 34.8065, 225.25, 24.1, 1.7175, 37.4];

    public static readonly double[] MeasurementSd = [0.005, 0.003, 1.5, 0.2, 0.02, 0.6];

    public static readonly double[] SourceSd = [0.15, 0.03, 5, 0.6, 0.05, 2];

    public static readonly Process Respiration = new(
        "respiration", "phosphate", new Dictionary<string, double> { ["phosphate"] = 1, ["nitrate"] = 16, ["oxygen"] = -170, ["silicate"] = 15 });

    private static readonly (string Id, double[] Values)[] Sources =
    [
        ("a", [4.0, 34.20, 270, 28, 1.95, 20]),
        ("b", [3.0, 34.95, 265, 16, 1.10, 18]),
        ("c", [-0.5, 34.66, 240, 32, 2.25, 120]),
        ("e", [11.5, 36.40, 190, 10, 0.60, 8]),
    ];

    public static EndMemberSet Set => new("twin", 1, [.. Sources.Select(s => Member(s.Id, s.Values))]);

    public static EndMember Member(string id, double[] values) =>
        new(id, "", ByTracer(values), new Provenance(ProvenanceKind.Manual)) { Sd = ByTracer(SourceSd) };

    public static IReadOnlyDictionary<string, double> ByTracer(double[] values) =>
        Tracers.Zip(values).ToDictionary(p => p.First, p => p.Second);

    public static IReadOnlyDictionary<string, MeasurementError> Errors(double[] sd) =>
        Tracers.Zip(sd).ToDictionary(p => p.First, p => new MeasurementError(p.Second));

    public static MixingModel LeastSquares(EndMemberSpread spread, double[]? measurementSd = null) =>
        Model(new GeneralisedLeastSquares { Spread = spread, MeasurementSd = Errors(measurementSd ?? MeasurementSd) });

    public static MixingModel Model(Fit fit, MassConservation? mass = null) =>
        new("twin", Set, Tracers, fit, mass ?? MassConservation.Exact) { Processes = [Respiration] };

    public static SampleTable Table(params double[][] samples) =>
        new(samples.Length, [], [.. Tracers.Select((tracer, t) =>
            new SampleColumn(Quantity.Find(tracer)!, [.. samples.Select(s => s[t])]))]);

    public static MixingResult Solve(MixingModel model, params double[][] samples) => Solve(model, Table(samples));

    public static MixingResult Solve(MixingModel model, SampleTable table, int threads = 1) =>
        MixingSolver.Solve(PreparedModel.From(model), table, new SolveOptions { Threads = threads, WithProof = true }).Result;
}
