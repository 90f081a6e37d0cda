using System.Collections.Frozen;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;

namespace WaterMix.Formats.Matching;

/// <summary>
/// Column names met in the wild, in lower case with words joined by '_' (common practice, no source). A name stands here only where it
/// can mean one thing: <c>sigma</c> or <c>t</c> do not.
/// </summary>
internal static class KnownNames
{
    private static readonly FrozenDictionary<string, Quantity> Quantities = Build(
        (Quantity.Latitude, "lat latitude lat_deg latitude_deg decimal_latitude lat_n latitude_n"),
        (Quantity.Longitude, "lon long longitude lon_deg longitude_deg decimal_longitude lon_e longitude_e"),
        (Quantity.Pressure, "pressure pres press prs sea_pressure water_pressure p_dbar sea_water_pressure"),
        (Quantity.Depth, "depth sample_depth bottle_depth sampling_depth depth_of_sample"),
        (Quantity.BottomDepth, "bottom_depth sounding bottom water_depth bot_depth seafloor_depth depth_bottom depth_sounding"),
        (Quantity.InSituTemperature, "temperature temp in_situ_temperature insitu_temperature in_situ_temp water_temperature sea_water_temperature tmp temp_insitu temperature_insitu"),
        (Quantity.PotentialTemperature, "potential_temperature theta pot_temp potential_temp ptemp pot_temperature sea_water_potential_temperature theta0"),
        (Quantity.ConservativeTemperature, "conservative_temperature ct cons_temp conservative_temp sea_water_conservative_temperature"),
        (Quantity.PracticalSalinity, "salinity sal practical_salinity salnty psal salinity_psu sea_water_practical_salinity salinity_pss"),
        (Quantity.AbsoluteSalinity, "absolute_salinity sa abs_salinity abs_sal sea_water_absolute_salinity"),
        (Quantity.Oxygen, "oxygen o2 oxy dissolved_oxygen diss_oxygen do oxygen_concentration doxy oxygen_winkler"),
        (Quantity.Nitrate, "nitrate no3 nitrat no3_n"),
        (Quantity.Nitrite, "nitrite no2 nitrit no2_n"),
        (Quantity.NitratePlusNitrite, "nitrate_plus_nitrite nitrate_nitrite no2_no3 no3_no2 no2_plus_no3 no3_plus_no2 nox nitrite_nitrate nitrite_plus_nitrate nitrate_and_nitrite"),
        (Quantity.Ammonium, "ammonium nh4 ammonia amon"),
        (Quantity.Phosphate, "phosphate po4 phspht phos srp dip"),
        (Quantity.Silicate, "silicate silicic_acid sio4 sio2 si_oh_4 sioh4 si silcat slca silica dsi"),
        (Quantity.DissolvedInorganicCarbon, "dissolved_inorganic_carbon dic tco2 tcarbn ct_dic total_carbon total_dissolved_inorganic_carbon"),
        (Quantity.TotalAlkalinity, "total_alkalinity alkalinity ta talk alk alkali at total_alk"),
        (Quantity.DeltaOxygen18, "delta_oxygen_18 d18o delo18 delta18o delta_18o d18o_h2o d18o_water delta_o_18 d18o_vsmow"),
        (Quantity.Cfc11, "cfc11 cfc_11 f11 f_11"),
        (Quantity.Cfc12, "cfc12 cfc_12 f12 f_12"),
        (Quantity.SulfurHexafluoride, "sulfur_hexafluoride sulphur_hexafluoride sf6"),
        (Quantity.NeutralDensity, "neutral_density gamma_n gamman neutral_density_anomaly"),
        (Quantity.ApparentOxygenUtilisation, "apparent_oxygen_utilisation apparent_oxygen_utilization aou"));

    private static readonly FrozenDictionary<string, string> Identities = new Dictionary<string, string[]>
    {
        ["expocode"] = ["expocode", "cruise", "cruise_id", "expedition", "cruise_name"],
        ["section"] = ["section", "sect_id", "sect", "section_id", "line", "woce_line", "transect"],
        ["station"] = ["station", "stnnbr", "station_no", "station_number", "stn", "sta", "station_id", "stn_no", "stat", "station_name", "stationno", "station_nr"],
        ["cast"] = ["cast", "castno", "cast_no", "cast_number", "cast_id", "castnumber"],
        ["sample"] = ["sample", "sampno", "sample_no", "sample_number", "sample_id", "samp_no", "sample_nr"],
        ["date"] = ["date", "date_utc", "sampling_date", "yyyymmdd", "cruise_date"],
        ["time"] = ["time", "time_utc", "datetime", "date_time", "timestamp", "utc", "datetime_utc", "iso_time", "date_time_utc", "time_of_day", "hhmm", "yyyy_mm_ddthh_mm"],
        ["bottle_flag"] = ["bottle_flag", "btlnbr_flag_w", "btl_flag", "niskin_flag"],
        ["bottle"] = ["bottle", "btlnbr", "bottle_no", "bottle_number", "niskin", "niskin_no", "btl", "btl_no", "bottle_id", "niskin_number", "rosette_position"],
    }.SelectMany(pair => pair.Value.Select(name => (name, pair.Key))).ToFrozenDictionary(p => p.name, p => p.Key, StringComparer.Ordinal);

    /// <summary>The names under which a temperature scale stands row by row.</summary>
    public static readonly FrozenSet<string> TemperatureScales = FrozenSet.ToFrozenSet(["temp_scale", "temperature_scale", "t_scale", "scale_of_temperature"], StringComparer.Ordinal);

    /// <summary>The names under which a file says what its nitrate column holds.</summary>
    public static readonly FrozenSet<string> NitrateKinds = FrozenSet.ToFrozenSet(["nitrate_kind", "nitrate_type"], StringComparer.Ordinal);

    /// <summary>The names that a misspelling may be near to: ids first, then the others of five letters and more.</summary>
    public static IReadOnlyList<string> Long { get; } =
        [.. Quantity.All.Select(q => q.Id).Concat(Quantities.Keys).Concat(Identities.Keys).Where(n => n.Length >= 5).Distinct()];

    /// <summary>The identity column of a name: <see cref="IdentityColumn.Ids"/>, <c>date</c>, <c>bottle_flag</c> or <c>bottle</c>; or null.</summary>
    /// <param name="key">A name as <see cref="Key"/> makes it.</param>
    public static string? FindIdentity(string key) => Identities.GetValueOrDefault(key);

    /// <summary>The quantity, instrument and unit in a name, or null where the name is none of these.</summary>
    /// <param name="key">A name as <see cref="Key"/> makes it, such as <c>temperature_c</c> or <c>salinity_ctd</c>.</param>
    public static (Quantity Quantity, ValueOrigin? Origin, string Unit)? FindQuantity(string key)
    {
        if (Quantities.TryGetValue(key, out Quantity? whole))
        {
            return (whole, null, "");
        }

        List<string> words = [.. key.Split('_')];
        ValueOrigin? origin = null;
        if (words.Remove("ctd"))
        {
            origin = ValueOrigin.Ctd;
        }
        else if (words.Count > 1 && (words[^1] is "bottle" or "btl" || words[0] is "bottle" or "btl"))
        {
            words.RemoveAt(words[0] is "bottle" or "btl" ? 0 : words.Count - 1);
            origin = ValueOrigin.Bottle;
        }

        // The longest name that is known, with a unit of that quantity behind it.
        for (int count = words.Count; count > 0; count--)
        {
            if (Quantities.TryGetValue(string.Join('_', words.Take(count)), out Quantity? quantity))
            {
                string unit = string.Join('_', words.Skip(count));
                bool isPlaceOfBottle = origin == ValueOrigin.Bottle && quantity.Use == TracerUse.Never;
                if (!isPlaceOfBottle && (unit.Length == 0 || Units.Find(quantity, unit) is not null))
                {
                    return (quantity, origin, unit);
                }
            }
        }

        return null;
    }

    /// <summary>A name in lower case with its words joined by '_': <c>Station No.</c> becomes <c>station_no</c>, <c>CTDSAL</c> stays one word.</summary>
    public static string Key(string name)
    {
        var key = new System.Text.StringBuilder(name.Length);
        foreach (char c in name.Replace('µ', 'u').Replace('μ', 'u').Replace('δ', 'd'))
        {
            if (char.IsLetterOrDigit(c))
            {
                key.Append(char.ToLowerInvariant(c));
            }
            else if (key.Length > 0 && key[^1] != '_')
            {
                key.Append('_');
            }
        }

        return key.ToString().TrimEnd('_');
    }

    private static FrozenDictionary<string, Quantity> Build(params (Quantity Quantity, string Names)[] table) =>
        table.SelectMany(row => row.Names.Split(' ').Select(name => (name, row.Quantity))).ToFrozenDictionary(p => p.name, p => p.Quantity, StringComparer.Ordinal);
}
