using System.Runtime.InteropServices;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;

namespace WaterMix.Workspace.Cruises;

/// <summary>Finds samples that stand twice: the same position, pressure, temperature and salinity to the digits that files agree in.</summary>
/// <remarks>
/// The steps are choices (common practice, no source): 0.001 degrees, 0.1 dbar, 0.001 degC, 0.001 of salinity. A sample without position,
/// pressure, or both temperature and salinity is nobody's duplicate. Two values on either side of a rounding step are missed.
/// </remarks>
internal static class Duplicates
{
    private static readonly (Quantity Quantity, double Step)[] Keys =
    [
        (Quantity.Latitude, 0.001),
        (Quantity.Longitude, 0.001),
        (Quantity.Pressure, 0.1),
        (Quantity.InSituTemperature, 0.001),
        (Quantity.PracticalSalinity, 0.001),
    ];

    /// <summary>Pairs of cruises that share samples, in the cruises' order; a cruise with itself where it holds samples twice.</summary>
    /// <param name="cruises">The cruises and their samples.</param>
    public static IReadOnlyList<DuplicateSamples> Find(IReadOnlyList<(Guid Cruise, SampleTable Samples)> cruises)
    {
        // For each sample that was seen: the cruises it was seen in, in order, each once.
        var seen = new Dictionary<SampleKey, int[]>();
        var counts = new SortedDictionary<(int First, int Second), long>();
        for (int k = 0; k < cruises.Count; k++)
        {
            SampleTable table = cruises[k].Samples;
            SampleColumn?[] columns = [.. Keys.Select(key => table.Find(key.Quantity))];
            for (int row = 0; row < table.RowCount; row++)
            {
                if (KeyOf(columns, row) is not { } key)
                {
                    continue;
                }

                ref int[]? holders = ref CollectionsMarshal.GetValueRefOrAddDefault(seen, key, out _);
                foreach (int first in holders ?? [])
                {
                    counts[(first, k)] = counts.GetValueOrDefault((first, k)) + 1;
                }

                if (holders is null || holders[^1] != k)
                {
                    holders = [.. holders ?? [], k];
                }
            }
        }

        return [.. counts.Select(c => new DuplicateSamples(cruises[c.Key.First].Cruise, cruises[c.Key.Second].Cruise, c.Value))];
    }

    private static SampleKey? KeyOf(SampleColumn?[] columns, int row)
    {
        long latitude = Step(columns, 0, row);
        long longitude = Step(columns, 1, row);
        long pressure = Step(columns, 2, row);
        long temperature = Step(columns, 3, row);
        long salinity = Step(columns, 4, row);
        bool isPlaced = latitude != long.MinValue && longitude != long.MinValue && pressure != long.MinValue;
        return isPlaced && (temperature != long.MinValue || salinity != long.MinValue)
            ? new SampleKey(latitude, longitude, pressure, temperature, salinity)
            : null;
    }

    // The smallest long stands for missing.
    private static long Step(SampleColumn?[] columns, int key, int row) =>
        columns[key] is { } column && double.IsFinite(column.Values[row]) ? (long)Math.Round(column.Values[row] / Keys[key].Step) : long.MinValue;

    private readonly record struct SampleKey(long Latitude, long Longitude, long Pressure, long Temperature, long Salinity);
}
