using System.Globalization;
using WaterMix.Core.Quantities;
using WaterMix.Core.Seawater;

namespace WaterMix.Formats.Matching;

/// <summary>The units that are understood, in the spellings met in files, and the way from each to the canonical unit of a quantity.</summary>
public static class Units
{
    private static readonly string[] Prefixes = ["", "m", "u", "n", "p", "f"];

    /// <summary>The conversion from a unit to the canonical unit of a quantity, or null where the unit is not understood for it.</summary>
    /// <param name="quantity">What the values are. A further tracer keeps any unit.</param>
    /// <param name="unit">The unit as the file writes it; empty means that the file gives none, which counts as the canonical unit.</param>
    public static UnitConversion? Find(Quantity quantity, string unit)
    {
        ArgumentNullException.ThrowIfNull(quantity);
        ArgumentNullException.ThrowIfNull(unit);
        if (unit.Trim().Length == 0 || Quantity.Find(quantity.Id) is null)
        {
            return UnitConversion.Identity;
        }

        string text = Normalise(unit);
        return quantity.Unit switch
        {
            "degC" => Temperature(quantity, text),
            "umol/kg" or "pmol/kg" or "fmol/kg" => Amount(quantity, text),
            "degrees north" => OneOf(text, "degreesnorth", "degreenorth", "degn", "degreesn", "degreen", "n", "°n", "deg", "degrees", "degree", "°", "decimaldegrees", "decdeg"),
            "degrees east" => text is "w" or "degw" or "degreeswest" or "degreewest" or "°w"
                ? new UnitConversion(-1, 1, 0, VolumeBasis.None, "degrees east = -degrees west")
                : OneOf(text, "degreeseast", "degreeeast", "dege", "degreese", "degreee", "e", "°e", "deg", "degrees", "degree", "°", "decimaldegrees", "decdeg"),
            "dbar" => OneOf(text, "dbar", "dbars", "db", "decibar", "decibars"),
            "m" => OneOf(text, "m", "meter", "meters", "metre", "metres"),
            "1" => OneOf(text, "1", "pss78", "pss", "psu", "practicalsalinityunits", "iss78", "pss1978", "dimensionless"),
            "g/kg" => OneOf(text, "g/kg", "gkg"),
            "permil" => OneOf(text, "permil", "‰", "o/oo", "0/00", "permilvsmow"),
            "kg/m3" => OneOf(text, "kg/m3", "kgm3"),
            _ => null,
        };
    }

    /// <summary>True where the text is a unit of some quantity.</summary>
    /// <param name="unit">A unit as a file writes it.</param>
    public static bool IsUnit(string unit)
    {
        ArgumentNullException.ThrowIfNull(unit);
        return unit.Trim().Length > 0 && Quantity.All.Any(q => Find(q, unit) is not null);
    }

    /// <summary>A unit's spelling without case, spaces and the signs that differ from file to file.</summary>
    internal static string Normalise(string unit)
    {
        string text = unit.Trim().ToLowerInvariant().Replace('µ', 'u').Replace('μ', 'u').Replace("⁻¹", "-1", StringComparison.Ordinal).Replace("⁻³", "-3", StringComparison.Ordinal);
        text = string.Concat(text.Where(c => c is not (' ' or '^' or '*' or '_' or '.' or '·' or '{' or '}' or '(' or ')')));
        text = text.Replace("micro", "u", StringComparison.Ordinal)
            .Replace("moles", "mol", StringComparison.Ordinal).Replace("mole", "mol", StringComparison.Ordinal)
            .Replace("liters", "l", StringComparison.Ordinal).Replace("litres", "l", StringComparison.Ordinal)
            .Replace("liter", "l", StringComparison.Ordinal).Replace("litre", "l", StringComparison.Ordinal)
            .Replace("per", "/", StringComparison.Ordinal).Replace("/mil", "permil", StringComparison.Ordinal).Replace("permille", "permil", StringComparison.Ordinal)
            .Replace("/kg-1", "kg-1", StringComparison.Ordinal);
        foreach (string per in (string[])["kg", "l", "m"])
        {
            string power = per == "m" ? "m-3" : per + "-1";
            if (text.EndsWith(power, StringComparison.Ordinal))
            {
                string stem = text[..^power.Length].TrimEnd('/');
                return stem + (per == "m" ? "/m3" : "/" + per);
            }
        }

        return text;
    }

    private static UnitConversion? OneOf(string text, params ReadOnlySpan<string> spellings)
    {
        string plain = text.Replace("-", "", StringComparison.Ordinal);
        foreach (string spelling in spellings)
        {
            if (spelling == plain || Normalise(spelling) == text)
            {
                return UnitConversion.Identity;
            }
        }

        return null;
    }

    // Absolute and Conservative Temperature were born on ITS-90; a 1968 scale on the latter is a mistake of the file and not understood.
    private static UnitConversion? Temperature(Quantity quantity, string text)
    {
        string plain = text.Replace("-", "", StringComparison.Ordinal);
        if (plain.Contains("68", StringComparison.Ordinal) && quantity != Quantity.ConservativeTemperature)
        {
            // T90 = T68 / 1.00024, Saunders1990. The misspelling ITS-68 stands in distributed files and can only mean IPTS-68.
            return plain.Contains("its68", StringComparison.Ordinal) || plain.Contains("ipts68", StringComparison.Ordinal) || plain is "t68" or "degc68" or "c68"
                ? new UnitConversion(1, 1.00024, 0, VolumeBasis.None, "T90 = T68 / 1.00024")
                : null;
        }

        return plain switch
        {
            "its90" or "t90" or "degc" or "c" or "°c" or "celsius" or "degreec" or "degreesc" or "degcelsius" or "degreecelsius" or "degreescelsius"
                or "degcits90" or "its90degc" or "degc90" or "°cits90" or "its90°c" or "degcelsiusits90" or "celsiusits90" or "cits90" => UnitConversion.Identity,
            "k" or "kelvin" => new UnitConversion(1, 1, -273.15, VolumeBasis.None, "degC = K - 273.15"),
            _ => null,
        };
    }

    private static UnitConversion? Amount(Quantity quantity, string text)
    {
        VolumeBasis basis = IsGas(quantity) ? VolumeBasis.PotentialDensity : VolumeBasis.LaboratoryDensity;
        string density = basis == VolumeBasis.PotentialDensity
            ? "(1 + sigma0 / 1000)"
            : "density at the laboratory's temperature in kg/L";
        if (quantity == Quantity.Oxygen && text is ("ml/l" or "mll" or "cm3/l" or "cc/l"))
        {
            return Oxygen(ConcentrationUnits.OxygenMicromolesPerMillilitre, "mL/L");
        }

        if (quantity == Quantity.Oxygen && text is ("mg/l" or "mgl"))
        {
            return Oxygen(ConcentrationUnits.OxygenMicromolesPerMilligram, "mg/L");
        }

        if (quantity == Quantity.Oxygen && text is ("ugat/l" or "ug-at/l" or "uga/l"))
        {
            return Oxygen(ConcentrationUnits.OxygenMicromolesPerMicrogramAtom, "ug-at/L");
        }

        (string amount, string per) = SplitAmount(text);
        if (amount.Length == 0)
        {
            return null;
        }

        int from = Array.IndexOf(Prefixes, amount[..^3]);
        int to = Array.IndexOf(Prefixes, quantity.Unit[..^"mol/kg".Length]);
        if (from < 0)
        {
            return null;
        }

        int thousands = to - from - (per == "m3" ? 1 : 0);
        (double multiply, double divide) = thousands >= 0 ? (Math.Pow(10, 3 * thousands), 1.0) : (1.0, Math.Pow(10, -3 * thousands));
        string scale = multiply != 1 ? string.Create(CultureInfo.InvariantCulture, $" * {multiply:G}") : divide != 1 ? string.Create(CultureInfo.InvariantCulture, $" / {divide:G}") : "";
        if (per == "kg")
        {
            return thousands == 0
                ? UnitConversion.Identity
                : new UnitConversion(multiply, divide, 0, VolumeBasis.None, $"{quantity.Unit} = {amount}/kg{scale}");
        }

        return new UnitConversion(multiply, divide, 0, basis, $"{quantity.Unit} = {amount}/{(per == "l" ? "L" : "m3")}{scale} / {density}");
    }

    private static UnitConversion Oxygen(double micromoles, string unit) =>
        new(micromoles, 1, 0, VolumeBasis.PotentialDensity, string.Create(CultureInfo.InvariantCulture, $"umol/kg = {unit} * {micromoles} / (1 + sigma0 / 1000)"));

    // "umol/kg", "umolkg", "um" (micromolar), "ug-at/l" (microgram-atoms per litre) as amount and what it is per.
    private static (string Amount, string Per) SplitAmount(string text)
    {
        if (text is "ugat/l" or "ug-at/l" or "uga/l")
        {
            return ("umol", "l");
        }

        if (text is "mm" or "um" or "nm" or "pm" or "fm")
        {
            return (text[..1] + "mol", "l");
        }

        int end = text.IndexOf("mol", StringComparison.Ordinal) + 3;
        if (end < 3 || end > 4)
        {
            return ("", "");
        }

        string per = text[end..].TrimStart('/');
        return per is "kg" or "l" or "m3" ? (text[..end], per) : ("", "");
    }

    private static bool IsGas(Quantity quantity) =>
        quantity == Quantity.Oxygen || quantity == Quantity.Cfc11 || quantity == Quantity.Cfc12 || quantity == Quantity.SulfurHexafluoride;
}
