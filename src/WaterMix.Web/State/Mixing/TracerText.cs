using WaterMix.Core.EndMembers;
using WaterMix.Core.Quantities;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Mixing;

/// <summary>Quantities as a person reads them, and the lists to choose them from.</summary>
public static class TracerText
{
    /// <summary>The name of a quantity: the trade's, or the user's own.</summary>
    /// <param name="id">The quantity's id.</param>
    public static string Name(string id) => Quantity.FindOrFurther(id).Name;

    /// <summary>The unit as people write it; empty where there is none.</summary>
    /// <param name="id">The quantity's id.</param>
    /// <param name="set">The set, which knows the units of the user's own tracers.</param>
    public static string Unit(string id, EndMemberSet set)
    {
        ArgumentNullException.ThrowIfNull(set);
        return FigureText.Unit(Of(id, set).Unit);
    }

    /// <summary>The quantity of an id; a tracer of the user's has the unit that the set gives.</summary>
    /// <param name="id">The quantity's id.</param>
    /// <param name="set">The set.</param>
    public static Quantity Of(string id, EndMemberSet set)
    {
        ArgumentNullException.ThrowIfNull(set);
        return Quantity.Find(id) ?? Quantity.Further(id, set.Units.GetValueOrDefault(id, ""));
    }

    /// <summary>Names in a sentence: <c>a, b and c</c>.</summary>
    /// <param name="names">The names.</param>
    public static string List(IReadOnlyList<string> names)
    {
        ArgumentNullException.ThrowIfNull(names);
        return names.Count switch
        {
            0 => "",
            1 => names[0],
            _ => $"{string.Join(", ", names.SkipLast(1))} and {names[^1]}",
        };
    }

    /// <summary>Ids in the order of the contract; the user's own come last, by name.</summary>
    /// <param name="ids">The ids.</param>
    public static IReadOnlyList<string> InOrder(IEnumerable<string> ids)
    {
        var order = Quantity.All.Index().ToDictionary(q => q.Item.Id, q => q.Index, StringComparer.Ordinal);
        return [.. ids.Distinct().OrderBy(id => order.GetValueOrDefault(id, int.MaxValue)).ThenBy(id => id, StringComparer.Ordinal)];
    }
}
