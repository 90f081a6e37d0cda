using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;

namespace WaterMix.Web.State.EndMembers;

/// <summary>Which temperature and salinity a model and its set speak of, and whether they are the same.</summary>
public static class TracerPairs
{
    /// <summary>The pair that the model's tracers ask for; null where no tracer is a temperature or a salinity.</summary>
    /// <param name="model">The model.</param>
    public static TemperatureSalinityPair? Wanted(MixingModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        return model.Tracers.Any(IsTeos10) ? TemperatureSalinityPair.ConservativeAndAbsolute
            : model.Tracers.Any(t => t == Quantity.PotentialTemperature.Id || t == Quantity.PracticalSalinity.Id) ? TemperatureSalinityPair.PotentialAndPractical
            : null;
    }

    /// <summary>The end-members that have the other pair than the model asks for, and not this one.</summary>
    /// <param name="model">The model.</param>
    public static IReadOnlyList<EndMember> Unmatched(MixingModel model)
    {
        if (Wanted(model) is not { } wanted)
        {
            return [];
        }

        bool isTeos10 = wanted == TemperatureSalinityPair.ConservativeAndAbsolute;
        return
        [
            .. model.EndMembers.EndMembers.Where(e =>
                e.Values.Keys.Any(id => IsTeos10(id) != isTeos10 && IsOfPair(id)) && !e.Values.Keys.Any(id => IsTeos10(id) == isTeos10 && IsOfPair(id))),
        ];
    }

    /// <summary>A pair in words.</summary>
    /// <param name="pair">The pair.</param>
    public static string Words(TemperatureSalinityPair pair) => pair == TemperatureSalinityPair.ConservativeAndAbsolute
        ? "Conservative Temperature and Absolute Salinity"
        : "potential temperature and Practical Salinity";

    private static bool IsTeos10(string id) => id == Quantity.ConservativeTemperature.Id || id == Quantity.AbsoluteSalinity.Id;

    private static bool IsOfPair(string id) => IsTeos10(id) || id == Quantity.PotentialTemperature.Id || id == Quantity.PracticalSalinity.Id;
}
