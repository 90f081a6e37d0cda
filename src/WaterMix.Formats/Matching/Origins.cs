using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;

namespace WaterMix.Formats.Matching;

/// <summary>Which instrument a column comes from where nothing says so, and how the two originals of a merged column are called.</summary>
public static class Origins
{
    /// <summary>The suffix of the bottle's original beside a merged column.</summary>
    public const string BottleSuffix = "_bottle";

    /// <summary>The suffix of the CTD's original beside a merged column.</summary>
    public const string CtdSuffix = "_ctd";

    /// <summary>The instrument of a column that is not marked: the CTD for pressure, temperature and parameters whose name begins with CTD, otherwise the bottle.</summary>
    /// <param name="quantity">What the column holds.</param>
    public static ValueOrigin Usual(Quantity quantity)
    {
        ArgumentNullException.ThrowIfNull(quantity);
        return quantity == Quantity.Pressure || quantity == Quantity.InSituTemperature || quantity == Quantity.PotentialTemperature || quantity == Quantity.ConservativeTemperature
            || (quantity.Id.StartsWith("CTD", StringComparison.OrdinalIgnoreCase) && Quantity.Find(quantity.Id) is null)
            ? ValueOrigin.Ctd
            : ValueOrigin.Bottle;
    }
}
