using System.Collections.Frozen;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;

namespace WaterMix.Formats.WhpExchange;

/// <summary>What the parameter names of WHP-Exchange stand for, <c>WhpExchange</c>.</summary>
public static class ExchangeNames
{
    private static readonly FrozenDictionary<string, (Quantity Quantity, ValueOrigin Origin)> Parameters =
        new Dictionary<string, (Quantity, ValueOrigin)>(StringComparer.Ordinal)
        {
            ["LATITUDE"] = (Quantity.Latitude, ValueOrigin.Bottle),
            ["LONGITUDE"] = (Quantity.Longitude, ValueOrigin.Bottle),
            ["DEPTH"] = (Quantity.BottomDepth, ValueOrigin.Bottle),
            ["CTDPRS"] = (Quantity.Pressure, ValueOrigin.Ctd),
            ["CTDTMP"] = (Quantity.InSituTemperature, ValueOrigin.Ctd),
            ["CTDSAL"] = (Quantity.PracticalSalinity, ValueOrigin.Ctd),
            ["SALNTY"] = (Quantity.PracticalSalinity, ValueOrigin.Bottle),
            ["CTDOXY"] = (Quantity.Oxygen, ValueOrigin.Ctd),
            ["OXYGEN"] = (Quantity.Oxygen, ValueOrigin.Bottle),
            ["THETA"] = (Quantity.PotentialTemperature, ValueOrigin.Ctd),
            ["NITRAT"] = (Quantity.Nitrate, ValueOrigin.Bottle),
            ["NITRIT"] = (Quantity.Nitrite, ValueOrigin.Bottle),
            ["NO2+NO3"] = (Quantity.NitratePlusNitrite, ValueOrigin.Bottle),
            ["NH4"] = (Quantity.Ammonium, ValueOrigin.Bottle),
            ["AMMONI"] = (Quantity.Ammonium, ValueOrigin.Bottle),
            ["PHSPHT"] = (Quantity.Phosphate, ValueOrigin.Bottle),
            ["SILCAT"] = (Quantity.Silicate, ValueOrigin.Bottle),
            ["TCARBN"] = (Quantity.DissolvedInorganicCarbon, ValueOrigin.Bottle),
            ["ALKALI"] = (Quantity.TotalAlkalinity, ValueOrigin.Bottle),
            ["DELO18"] = (Quantity.DeltaOxygen18, ValueOrigin.Bottle),
            ["CFC-11"] = (Quantity.Cfc11, ValueOrigin.Bottle),
            ["CFC-12"] = (Quantity.Cfc12, ValueOrigin.Bottle),
            ["CFC11"] = (Quantity.Cfc11, ValueOrigin.Bottle),
            ["CFC12"] = (Quantity.Cfc12, ValueOrigin.Bottle),
            ["SF6"] = (Quantity.SulfurHexafluoride, ValueOrigin.Bottle),
        }.ToFrozenDictionary(StringComparer.Ordinal);

    private static readonly FrozenDictionary<string, string> IdentityIds = new Dictionary<string, string>(StringComparer.Ordinal)
    {
        ["EXPOCODE"] = "expocode",
        ["SECT_ID"] = "section",
        ["SECT"] = "section",
        ["STNNBR"] = "station",
        ["CASTNO"] = "cast",
        ["SAMPNO"] = "sample",
        ["DATE"] = "date",
        ["TIME"] = "time",
        ["BTLNBR_FLAG_W"] = "bottle_flag",
    }.ToFrozenDictionary(StringComparer.Ordinal);

    /// <summary>True where a name occurs only in this format's headers, so that the others may be read as its names too.</summary>
    /// <param name="name">A header name without its unit.</param>
    public static bool IsTelltale(string name) => name is "EXPOCODE" or "STNNBR" or "CTDPRS" or "CASTNO" or "SAMPNO";

    /// <summary>The quantity and instrument of a parameter, or null where the name is none of them.</summary>
    /// <param name="name">The parameter's name, upper case.</param>
    public static (Quantity Quantity, ValueOrigin Origin)? FindQuantity(string name) =>
        Parameters.TryGetValue(name, out (Quantity, ValueOrigin) found) ? found : null;

    /// <summary>The identity column of a parameter (date and time of day apart), or null.</summary>
    /// <param name="name">The parameter's name, upper case.</param>
    public static string? FindIdentity(string name) => IdentityIds.GetValueOrDefault(name);
}
