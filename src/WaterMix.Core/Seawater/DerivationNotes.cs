using WaterMix.Core.Quantities;

namespace WaterMix.Core.Seawater;

/// <summary>What a derivation has to say. The texts hold no numbers: counts are set beside them.</summary>
internal static class DerivationNotes
{
    public static readonly Finding PressureFromDepth = new(
        Severity.Note,
        "pressure",
        "depth in its place",
        "Pressure was computed from depth and latitude for a standard ocean (TEOS-10).")
    {
        Column = Quantity.Pressure.Id,
    };

    public static readonly Finding ReferenceSalinityStoodIn = new(
        Severity.Note,
        "a position for the Absolute Salinity that potential temperature is derived with",
        "none",
        "Reference salinity stood in for it, which changes potential temperature by less than 0.001 degC; give latitude and longitude to have it exact.")
    {
        Column = Quantity.PotentialTemperature.Id,
    };

    /// <summary>The file's own values of a derived quantity were used.</summary>
    public static Finding OwnValues(Quantity quantity) => new(
        Severity.Note,
        $"the measurements that {quantity.Id} is derived from",
        "only the file's own value",
        "The file's own values are used there; check that they are on the scale that this column holds.")
    {
        Column = quantity.Id,
    };

    /// <summary>One temperature was derived from another that the file holds.</summary>
    public static Finding FromOtherTemperature(Quantity quantity, Quantity other) => new(
        Severity.Note,
        $"in-situ temperature and pressure for {quantity.Id}",
        $"the file's own {other.Id}",
        "It was converted with Absolute Salinity (TEOS-10).")
    {
        Column = quantity.Id,
    };

    /// <summary>Values are missing because something they need is.</summary>
    public static Finding Lacking(Quantity needed, IEnumerable<string> derived, long count)
    {
        bool place = needed.Id is "latitude" or "longitude" or "pressure";
        return new Finding(
            place ? Severity.Warning : Severity.Note,
            $"{needed.Id} for {string.Join(", ", derived)}",
            "none",
            place
                ? $"These values are missing in such samples; add {(needed.Id == "pressure" ? "pressure, or depth with latitude" : needed.Id)} to the input, or match its column."
                : "These values are missing in such samples.")
        {
            Column = needed.Id,
            Count = count,
        };
    }

    /// <summary>Values are missing although all they need is there.</summary>
    public static Finding OutsideRange(IEnumerable<string> derived, long count) => new(
        Severity.Warning,
        $"inputs in the range of the formulas for {string.Join(", ", derived)} (latitude -86 to 90, longitude -180 to 360, salinity not negative)",
        "an input outside it",
        "These values are missing in such samples; correct the position or the salinity.")
    {
        Count = count,
    };
}
