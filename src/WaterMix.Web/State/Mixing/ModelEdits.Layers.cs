using WaterMix.Core.Mixing;

namespace WaterMix.Web.State.Mixing;

public static partial class ModelEdits
{
    /// <summary>Adds a layer at the end, with the end-members and the conditions of the one before it, to be narrowed down.</summary>
    /// <param name="model">The model.</param>
    public static MixingModel AddLayer(MixingModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        Layer like = model.LayersOrAll[^1];
        var taken = model.LayersOrAll.Select(l => l.Id).ToHashSet(StringComparer.Ordinal);
        string id = Enumerable.Range(model.LayersOrAll.Count + 1, taken.Count + 1).Select(n => FormattableString.Invariant($"layer-{n}")).First(name => !taken.Contains(name));
        return model with { Layers = [.. model.LayersOrAll, like with { Id = id }] };
    }

    /// <summary>Takes a layer out.</summary>
    /// <param name="model">The model.</param>
    /// <param name="index">Its place, from 0.</param>
    public static MixingModel RemoveLayer(MixingModel model, int index)
    {
        ArgumentNullException.ThrowIfNull(model);
        return model with { Layers = [.. model.Layers.Where((_, i) => i != index)] };
    }

    /// <summary>Moves a layer up or down the order in which samples are sorted into them.</summary>
    /// <param name="model">The model.</param>
    /// <param name="index">Its place, from 0.</param>
    /// <param name="by">Places: negative is up.</param>
    public static MixingModel MoveLayer(MixingModel model, int index, int by)
    {
        ArgumentNullException.ThrowIfNull(model);
        return model with { Layers = Moved(model.Layers, index, by) };
    }

    /// <summary>Changes a layer. The one that stands for "no layers" becomes a layer of its own.</summary>
    /// <param name="model">The model.</param>
    /// <param name="index">Its place, from 0.</param>
    /// <param name="change">The change.</param>
    public static MixingModel WithLayer(MixingModel model, int index, Func<Layer, Layer> change)
    {
        ArgumentNullException.ThrowIfNull(model);
        return model with { Layers = Replaced(model.LayersOrAll, index, change) };
    }

    /// <summary>Permits an end-member in a layer, or no longer; the set's order is kept.</summary>
    /// <param name="model">The model.</param>
    /// <param name="index">The layer's place, from 0.</param>
    /// <param name="endMember">The end-member's id.</param>
    /// <param name="isPermitted">True to permit it.</param>
    public static MixingModel WithPermitted(MixingModel model, int index, string endMember, bool isPermitted)
    {
        ArgumentNullException.ThrowIfNull(model);
        string[] order = [.. model.EndMembers.EndMembers.Select(e => e.Id)];
        return WithLayer(model, index, layer => layer with
        {
            EndMembers = [.. order.Where(id => id == endMember ? isPermitted : layer.EndMembers.Contains(id))],
        });
    }

    /// <summary>Why a layer cannot have this id and what to do; null where it can.</summary>
    /// <param name="model">The model.</param>
    /// <param name="index">Its place, from 0.</param>
    /// <param name="id">The id.</param>
    public static string? ProblemOfLayerId(MixingModel model, int index, string id)
    {
        ArgumentNullException.ThrowIfNull(model);
        return string.IsNullOrWhiteSpace(id) ? "A layer needs a name; results show it."
            : model.LayersOrAll.Where((l, i) => i != index && l.Id == id).Any() ? $"\u201c{id}\u201d is the name of another layer."
            : null;
    }
}
