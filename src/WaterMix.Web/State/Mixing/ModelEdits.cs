using WaterMix.Core.Mixing;
using WaterMix.Core.Samples;

namespace WaterMix.Web.State.Mixing;

/// <summary>Edits of a mixing model, each from a model to the changed model: tracers, mass, flags. Fit, processes and layers stand in parts of their own.</summary>
public static partial class ModelEdits
{
    /// <summary>The measured quantities that the tracers follow from, in the tracers' order: what end-members and errors are given for.</summary>
    /// <param name="model">The model.</param>
    public static IReadOnlyList<string> Parents(MixingModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        return [.. model.Tracers.SelectMany(t => model.Fit.Factors.FormOf(t).Terms).Select(term => term.Parent).Distinct()];
    }

    /// <summary>Adds a tracer, with the usual measurement error of what it follows from where none is given, and the weight 1 where rows are weighted.</summary>
    /// <param name="model">The model.</param>
    /// <param name="tracer">The quantity's id.</param>
    public static MixingModel AddTracer(MixingModel model, string tracer)
    {
        ArgumentNullException.ThrowIfNull(model);
        if (model.Tracers.Contains(tracer))
        {
            return model;
        }

        MixingModel with = model with { Tracers = TracerText.InOrder(model.Tracers.Append(tracer)) };
        with = UsualErrors.FillIn(with);
        return with.Fit is WeightedRows rows && !rows.Weights.ContainsKey(tracer)
            ? with with { Fit = rows with { Weights = Changed(rows.Weights, tracer, 1) } }
            : with;
    }

    /// <summary>Takes a tracer out, with its weight; and the measurement errors of what no other tracer follows from.</summary>
    /// <param name="model">The model.</param>
    /// <param name="tracer">The quantity's id.</param>
    public static MixingModel RemoveTracer(MixingModel model, string tracer)
    {
        ArgumentNullException.ThrowIfNull(model);
        MixingModel without = model with { Tracers = [.. model.Tracers.Where(t => t != tracer)] };
        IReadOnlyList<string> parents = Parents(without);
        var gone = Parents(model).Where(p => !parents.Contains(p)).ToHashSet(StringComparer.Ordinal);
        Fit fit = without.Fit with { MeasurementSd = Where(without.Fit.MeasurementSd, id => !gone.Contains(id)) };
        return without with { Fit = fit is WeightedRows rows ? rows with { Weights = Where(rows.Weights, id => id != tracer) } : fit };
    }

    /// <summary>Exchanges the temperature and the salinity among the tracers for the other pair; errors, weights and ratios go with them.</summary>
    /// <param name="model">The model.</param>
    public static MixingModel WithOtherPair(MixingModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        Fit fit = model.Fit with { MeasurementSd = model.Fit.MeasurementSd.ToDictionary(e => OtherOf(e.Key), e => e.Value, StringComparer.Ordinal) };
        return model with
        {
            Tracers = TracerText.InOrder(model.Tracers.Select(OtherOf)),
            Fit = fit is WeightedRows rows ? rows with { Weights = rows.Weights.ToDictionary(w => OtherOf(w.Key), w => w.Value, StringComparer.Ordinal) } : fit,
        };
    }

    /// <summary>Conserves mass exactly, or by a weighted row.</summary>
    /// <param name="model">The model.</param>
    /// <param name="weight">The row's factor, above 0; null: exactly.</param>
    public static MixingModel WithMass(MixingModel model, double? weight)
    {
        ArgumentNullException.ThrowIfNull(model);
        return model with { Mass = weight is null ? MassConservation.Exact : new MassConservation(weight) };
    }

    /// <summary>Accepts a water-sample flag, or no longer.</summary>
    /// <param name="model">The model.</param>
    /// <param name="flag">The flag, 0 to 9.</param>
    /// <param name="accepted">True to accept it.</param>
    public static MixingModel WithFlag(MixingModel model, int flag, bool accepted)
    {
        ArgumentNullException.ThrowIfNull(model);
        return model with { AcceptFlags = Flags(model.AcceptFlags, flag, accepted) };
    }

    /// <summary>Accepts a CTD flag, or no longer.</summary>
    /// <param name="model">The model.</param>
    /// <param name="flag">The flag, 0 to 9.</param>
    /// <param name="accepted">True to accept it.</param>
    public static MixingModel WithCtdFlag(MixingModel model, int flag, bool accepted)
    {
        ArgumentNullException.ThrowIfNull(model);
        return model with { AcceptCtdFlags = Flags(model.AcceptCtdFlags, flag, accepted) };
    }

    /// <summary>Prefers the bottle's or the CTD's value where both exist.</summary>
    /// <param name="model">The model.</param>
    /// <param name="origin">Bottle or CTD.</param>
    public static MixingModel WithPreferred(MixingModel model, ValueOrigin origin)
    {
        ArgumentNullException.ThrowIfNull(model);
        return model with { Prefer = origin };
    }

    private static string OtherOf(string id) => id switch
    {
        "potential_temperature" => "conservative_temperature",
        "practical_salinity" => "absolute_salinity",
        "conservative_temperature" => "potential_temperature",
        "absolute_salinity" => "practical_salinity",
        _ => id,
    };

    private static int[] Flags(IReadOnlyList<int> flags, int flag, bool accepted) =>
        [.. (accepted ? flags.Append(flag) : flags.Where(f => f != flag)).Distinct().Order()];

    private static Dictionary<string, T> Changed<T>(IReadOnlyDictionary<string, T> values, string key, T value) =>
        new(values, StringComparer.Ordinal) { [key] = value };

    private static Dictionary<string, T> Where<T>(IReadOnlyDictionary<string, T> values, Func<string, bool> kept) =>
        values.Where(v => kept(v.Key)).ToDictionary(StringComparer.Ordinal);

    private static T[] Replaced<T>(IReadOnlyList<T> items, int index, Func<T, T> change) => [.. items.Select((item, i) => i == index ? change(item) : item)];

    /// <summary>The items, one of them moved as far as there is room.</summary>
    internal static List<T> Moved<T>(IReadOnlyList<T> items, int index, int by)
    {
        var moved = items.ToList();
        T item = moved[index];
        moved.RemoveAt(index);
        moved.Insert(Math.Clamp(index + by, 0, moved.Count), item);
        return moved;
    }
}
