using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;

namespace WaterMix.SampleData;

/// <summary>The mixing models that fit the invented cruise.</summary>
public static class Models
{
    /// <summary>The name of the end-member set's file, beside the models.</summary>
    public const string SetFile = "halcyon.endmembers.json";

    /// <summary>
    /// The TEOS-10 sigma2 between the layers, kg/m3. At every station the thermocline water ends above it and the bottom water begins
    /// below it, so that each layer's sources are all that a sample there can hold.
    /// </summary>
    public const double LayerSigma2 = 36.6;

    /// <summary>Above this pressure, dbar, summer and the air have changed the water: no mixture of the sources.</summary>
    public const double MixedLayer = 150;

    /// <summary>The errors that the cruise's measurements are drawn with, by tracer in the order of <see cref="Sources.Tracers"/>.</summary>
    public static IReadOnlyList<MeasurementError> Errors { get; } = [new(0.003), new(0.003), new(0.4, 0.003), new(0.12), new(0.01), new(0.2, 0.01)];

    /// <summary>Two layers, four sources in each, respiration and opal.</summary>
    public static MixingModel TwoLayers { get; } = new(
        "Halcyon Basin, two layers", Sources.Set, Sources.Tracers, Fit(Sources.Tracers), MassConservation.Exact)
    {
        EndMembersFile = SetFile,
        Processes = [Sources.Respiration, Sources.Opal],
        Layers =
        [
            new Layer("upper", ["HTW", "HIW", "MSW", "NDW"],
                [new Condition(Quantity.Pressure.Id, MixedLayer, null), new Condition(Quantity.Sigma2.Id, null, LayerSigma2)]),
            new Layer("deep", ["HIW", "MSW", "NDW", "SBW"],
                [new Condition(Quantity.Pressure.Id, MixedLayer, null), new Condition(Quantity.Sigma2.Id, LayerSigma2, null)]),
        ],
    };

    /// <summary>The smallest useful model: two sources and respiration where nothing else reaches.</summary>
    public static MixingModel Simple { get; } = new(
        "Halcyon Basin, deepest water", Sources.Set, SimpleTracers, Fit(SimpleTracers), MassConservation.Exact)
    {
        EndMembersFile = SetFile,
        Processes = [Sources.Respiration],
        Layers = [new Layer("deepest", ["NDW", "SBW"], [new Condition(Quantity.Pressure.Id, 2900, null)])],
    };

    private static IReadOnlyList<string> SimpleTracers => [.. Sources.Tracers.Where(t => t != Quantity.Silicate.Id)];

    private static GeneralisedLeastSquares Fit(IReadOnlyList<string> tracers) => new()
    {
        MeasurementSd = Sources.Tracers.Zip(Errors).Where(pair => tracers.Contains(pair.First)).ToDictionary(pair => pair.First, pair => pair.Second),
    };
}
