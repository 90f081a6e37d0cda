using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;

namespace WaterMix.Web.State.Mixing;

/// <summary>
/// Keeps the winter mixed layer out of the fit: every layer of the model begins at a pressure. It is nothing but conditions of the layers,
/// so that a model means the same wherever it is solved.
/// </summary>
public static class WinterMask
{
    /// <summary>The depth of a new model's mask, dbar: within the 100 to 200 dbar that are common practice (no source); the deepest monthly mixed layer is better where it is known.</summary>
    public const double UsualDbar = 150;

    /// <summary>Why there is a mask, in a sentence.</summary>
    public const string Reason =
        "Above the deepest winter mixing, temperature, oxygen and nutrients follow the air and the season, not the mixing of sources.";

    /// <summary>The pressure at which the fit begins, dbar; null where a layer has no such bound.</summary>
    /// <param name="model">The model.</param>
    public static double? Of(MixingModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        double?[] starts = [.. model.LayersOrAll.Select(layer => layer.Where.Where(IsPressure).Max(c => c.AtLeast))];
        return Array.TrueForAll(starts, s => s is not null) ? starts.Min() : null;
    }

    /// <summary>Lets the fit begin at a pressure. Layers that begin at the mask as it was, or above the new one, begin there; deeper ones stay.</summary>
    /// <param name="model">The model.</param>
    /// <param name="dbar">The pressure, dbar; null takes the mask out.</param>
    public static MixingModel With(MixingModel model, double? dbar)
    {
        ArgumentNullException.ThrowIfNull(model);
        double? before = Of(model);
        if (dbar is null && before is null)
        {
            return model;
        }

        IReadOnlyList<Layer> layers = model.LayersOrAll.Count == 1 && model.Layers.Count == 0 ? [model.LayersOrAll[0] with { Id = "interior" }] : model.Layers;
        return model with { Layers = [.. layers.Select(layer => layer with { Where = Begun(layer.Where, before, dbar) })] };
    }

    private static IReadOnlyList<Condition> Begun(IReadOnlyList<Condition> where, double? before, double? now)
    {
        int at = where.Index().Where(c => IsPressure(c.Item)).Select(c => c.Index).DefaultIfEmpty(-1).First();
        if (at < 0)
        {
            return now is null ? where : [new Condition(Quantity.Pressure.Id, now, null), .. where];
        }

        Condition own = where[at];
        bool follows = own.AtLeast is not { } start || start == before || start < now;
        Condition changed = follows ? own with { AtLeast = now } : own;
        return [.. where.Select((c, i) => i == at ? changed : c).Where(c => c.AtLeast is not null || c.LessThan is not null)];
    }

    private static bool IsPressure(Condition condition) => condition.Quantity == Quantity.Pressure.Id;
}
