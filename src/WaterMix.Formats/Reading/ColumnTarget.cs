using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Formats.Matching;

namespace WaterMix.Formats.Reading;

/// <summary>A planned column while its file is read: its buffer, and what is remembered from row to row.</summary>
internal sealed class ColumnTarget(PlannedColumn plan)
{
    private readonly Dictionary<string, UnitConversion?> _units = new(StringComparer.Ordinal);
    private byte[] _unitText = [];
    private UnitConversion? _unit;

    /// <summary>What is read.</summary>
    public PlannedColumn Plan { get; } = plan;

    /// <summary>The rows of the block.</summary>
    public ColumnBuffer Buffer { get; } = new(plan);

    /// <summary>See <see cref="MissingValues.MinusNineIsData"/>.</summary>
    public bool MinusNineIsData { get; } = MissingValues.MinusNineIsData(plan.Quantity);

    /// <summary>True for longitudes, which are brought into [-180, 180).</summary>
    public bool IsLongitude { get; } = plan.Quantity == Quantity.Longitude;

    /// <summary>Cells that were numbers.</summary>
    public long Numbers { get; set; }

    /// <summary>Values that a bottle which did not trip made void.</summary>
    public long Voided { get; set; }

    /// <summary>The conversion for the unit that stands in this row, or null where it is not understood.</summary>
    /// <param name="text">The unit's text, trimmed.</param>
    public UnitConversion? ConversionOf(ReadOnlySpan<byte> text)
    {
        if (text.IsEmpty)
        {
            return Plan.Conversion;
        }

        if (!text.SequenceEqual(_unitText))
        {
            _unitText = text.ToArray();
            string unit = FieldText.ToText(text);
            if (!_units.TryGetValue(unit, out _unit))
            {
                _unit = Units.Find(Plan.Quantity, unit);
                _units.Add(unit, _unit);
            }
        }

        return _unit;
    }

    /// <summary>A longitude within one turn of zero, in [-180, 180); one beyond is left to be found impossible.</summary>
    public static double WrapLongitude(double degrees) => degrees switch
    {
        >= 180 and <= 360 => degrees - 360,
        < -180 and >= -360 => degrees + 360,
        _ => degrees,
    };

    /// <summary>The instrument that a text names.</summary>
    public static ValueOrigin? OriginOf(ReadOnlySpan<byte> text) =>
        text.IsEmpty ? ValueOrigin.None : text.SequenceEqual("bottle"u8) ? ValueOrigin.Bottle : text.SequenceEqual("ctd"u8) ? ValueOrigin.Ctd : null;
}
