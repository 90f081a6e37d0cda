using System.Globalization;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Formats.Matching;

namespace WaterMix.Formats.Reading;

/// <summary>Which numbers stand for "no value".</summary>
internal sealed class MissingValues
{
    private readonly double[] _numbers;

    /// <summary>The rules for a file read with this match, or without one.</summary>
    public MissingValues(ColumnMatchFile? match)
    {
        DeclaresMinusNine = false;
        var numbers = new List<double>();
        var texts = new List<string>();
        foreach (string text in match?.Missing ?? [])
        {
            string pointed = match!.DecimalMark == ',' ? text.Replace(',', '.') : text;
            if (!double.TryParse(pointed, NumberStyles.Float, CultureInfo.InvariantCulture, out double number))
            {
                texts.Add(text);
            }
            else if (number == -9)
            {
                DeclaresMinusNine = true;
            }
            else
            {
                numbers.Add(number);
            }
        }

        _numbers = [.. numbers];
        Texts = [.. texts.Select(System.Text.Encoding.UTF8.GetBytes)];
    }

    /// <summary>The declared texts that are not numbers.</summary>
    public IReadOnlyList<byte[]> Texts { get; }

    /// <summary>True where the match declares -9 as fill.</summary>
    public bool DeclaresMinusNine { get; }

    /// <summary>True where -9 can be a value of this quantity whatever is said: positions, temperatures and isotopes.</summary>
    public static bool MinusNineIsData(Quantity quantity) =>
        quantity == Quantity.Latitude || quantity == Quantity.Longitude || quantity.Unit == "degC" || quantity == Quantity.DeltaOxygen18
        || (Quantity.Find(quantity.Id) is null && IsFurtherPlaceOrIsotope(quantity));

    /// <summary>True where the number stands for no value.</summary>
    /// <param name="value">The number as it stands in the file; NaN is missing.</param>
    /// <param name="flag">Its flag.</param>
    /// <param name="minusNineIsData">See <see cref="MinusNineIsData"/>.</param>
    public bool Holds(double value, byte flag, bool minusNineIsData)
    {
        // Every fill value is negative or huge, or was declared; most cells end here.
        if (value is >= 0 and < 9e36 && _numbers.Length == 0)
        {
            return false;
        }

        // 9.96921e36 is the default fill of netCDF doubles and floats, cut to any number of digits.
        return double.IsNaN(value)
            || value == -999
            || value is > 9.969e36 and < 9.970e36
            || (value == -9 && !minusNineIsData && (DeclaresMinusNine || flag is QualityFlags.NotSampled or QualityFlags.NotReported))
            || _numbers.Contains(value);
    }

    private static bool IsFurtherPlaceOrIsotope(Quantity quantity)
    {
        string unit = Units.Normalise(quantity.Unit);
        return quantity.Id.StartsWith("DEL", StringComparison.OrdinalIgnoreCase)
            || quantity.Id is "BTL_LAT" or "BTL_LON"
            || unit is "permil" or "‰" or "o/oo" or "degc" or "its-90" or "ipts-68" or "its-68" or "degrees" or "deg";
    }
}
