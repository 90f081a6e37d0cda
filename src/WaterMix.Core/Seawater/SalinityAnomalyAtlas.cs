using System.Buffers.Binary;
using System.IO.Compression;
using System.Runtime.CompilerServices;
using System.Runtime.InteropServices;

namespace WaterMix.Core.Seawater;

/// <summary>
/// The anomaly ratio R of Absolute Salinity, S_A = S_R (1 + R), from the TEOS-10 atlas: 91 longitudes (0 to 360 by 4), 45 latitudes
/// (-86 to 90 by 4), 45 pressures (0 to 6,131 dbar), <c>McDougall2012</c>. Its values are embedded unaltered; see NOTICE.
/// </summary>
/// <remarks>
/// Bilinear across, linear down. Pressure is clamped to the deepest level of the deepest of the four columns around. A corner without
/// a value at a level gets the mean of those that have one; where none has, R is 0. Around Central America the corners in the other
/// ocean are dropped first. The atlas is read on first use and shared by all threads.
/// </remarks>
public static class SalinityAnomalyAtlas
{
    private const string Resource = "WaterMix.Core.Seawater.saar_atlas.bin.gz";

    private static readonly Lazy<Grid> Loaded = new(Read);

    /// <summary>The longitudes of the nodes, degrees east, rising by 4 from 0 to 360.</summary>
    public static ReadOnlySpan<double> Longitudes => Loaded.Value.Longitudes;

    /// <summary>The latitudes of the nodes, degrees north, rising by 4 from -86 to 90.</summary>
    public static ReadOnlySpan<double> Latitudes => Loaded.Value.Latitudes;

    /// <summary>The pressures of the nodes, dbar, rising from 0.</summary>
    public static ReadOnlySpan<double> Pressures => Loaded.Value.Pressures;

    /// <summary>The values of one column of nodes, one per pressure, NaN where the atlas has none.</summary>
    /// <param name="longitudeIndex">Index into <see cref="Longitudes"/>.</param>
    /// <param name="latitudeIndex">Index into <see cref="Latitudes"/>.</param>
    public static ReadOnlySpan<double> ColumnAt(int longitudeIndex, int latitudeIndex) => Loaded.Value.Column(longitudeIndex, latitudeIndex);

    /// <summary>Number of levels that a column counts for the clamp at its deepest level; 0 where the atlas gives none.</summary>
    /// <param name="longitudeIndex">Index into <see cref="Longitudes"/>.</param>
    /// <param name="latitudeIndex">Index into <see cref="Latitudes"/>.</param>
    public static int LevelsAt(int longitudeIndex, int latitudeIndex) => Loaded.Value.LevelCount(longitudeIndex, latitudeIndex);

    /// <summary>The anomaly ratio at a place.</summary>
    /// <param name="pressureDbar">Sea pressure, dbar, 0 to 10,000; deeper than the atlas counts as its deepest level.</param>
    /// <param name="longitudeDeg">Longitude, degrees east, -180 to 360.</param>
    /// <param name="latitudeDeg">Latitude, degrees north, -86 to 90.</param>
    /// <returns>The ratio, dimensionless, about -0.0001 to 0.003; 0 on land. NaN where an input is NaN or the position is outside its range.</returns>
    public static double Ratio(double pressureDbar, double longitudeDeg, double latitudeDeg)
    {
        if (!(longitudeDeg >= -180 && longitudeDeg <= 360 && latitudeDeg >= -86 && latitudeDeg <= 90) || double.IsNaN(pressureDbar))
        {
            return double.NaN;
        }

        Grid grid = Loaded.Value;
        double longitude = longitudeDeg < 0 ? longitudeDeg + 360 : longitudeDeg;
        int i = Math.Min((int)(longitude / 4), grid.Longitudes.Length - 2);
        int j = Math.Min((int)((latitudeDeg + 86) / 4), grid.Latitudes.Length - 2);

        int levels = Math.Max(
            Math.Max(grid.LevelCount(i, j), grid.LevelCount(i + 1, j)),
            Math.Max(grid.LevelCount(i, j + 1), grid.LevelCount(i + 1, j + 1)));
        if (levels == 0)
        {
            return 0;
        }

        double[] pressures = grid.Pressures;
        double p = Math.Min(pressureDbar, pressures[levels - 1]);
        int k = LevelAbove(pressures, p);

        double r = (longitude - grid.Longitudes[i]) / 4;
        double s = (latitudeDeg - grid.Latitudes[j]) / 4;
        double t = (p - pressures[k]) / (pressures[k + 1] - pressures[k]);
        Corners kept = Isthmus.Contains(longitude, latitudeDeg)
            ? Isthmus.SameSide(longitude, latitudeDeg, grid.Longitudes[i], grid.Latitudes[j])
            : Corners.All;

        double upper = Across(grid, i, j, k, r, s, kept);
        double lower = Across(grid, i, j, k + 1, r, s, kept);
        return upper + (t * (lower - upper));
    }

    /// <summary>Bilinear interpolation on one level, after the corners without a value have been given the mean of the others.</summary>
    private static double Across(Grid grid, int i, int j, int k, double r, double s, Corners kept)
    {
        double southWest = kept.SouthWest ? grid.Column(i, j)[k] : double.NaN;
        double southEast = kept.SouthEast ? grid.Column(i + 1, j)[k] : double.NaN;
        double northEast = kept.NorthEast ? grid.Column(i + 1, j + 1)[k] : double.NaN;
        double northWest = kept.NorthWest ? grid.Column(i, j + 1)[k] : double.NaN;

        double sum = 0;
        int count = 0;
        Add(southWest, ref sum, ref count);
        Add(southEast, ref sum, ref count);
        Add(northEast, ref sum, ref count);
        Add(northWest, ref sum, ref count);
        double mean = count == 0 ? 0 : sum / count;

        southWest = double.IsNaN(southWest) ? mean : southWest;
        southEast = double.IsNaN(southEast) ? mean : southEast;
        northEast = double.IsNaN(northEast) ? mean : northEast;
        northWest = double.IsNaN(northWest) ? mean : northWest;
        return ((1 - s) * (southWest + (r * (southEast - southWest)))) + (s * (northWest + (r * (northEast - northWest))));
    }

    private static void Add(double value, ref double sum, ref int count)
    {
        if (!double.IsNaN(value))
        {
            sum += value;
            count++;
        }
    }

    /// <summary>The last level at or above p that has one below it.</summary>
    private static int LevelAbove(double[] pressures, double p)
    {
        int low = 0;
        int high = pressures.Length - 1;
        while (high - low > 1)
        {
            int middle = (low + high) / 2;
            if (pressures[middle] <= p)
            {
                low = middle;
            }
            else
            {
                high = middle;
            }
        }

        return low;
    }

    /// <summary>Unpacks the resource; its layout is told in the script that makes it, <c>tests/Reference/seawater/make_saar_resource.py</c>.</summary>
    private static Grid Read()
    {
        using Stream packed = typeof(SalinityAnomalyAtlas).Assembly.GetManifestResourceStream(Resource)
            ?? throw new InvalidOperationException($"The assembly lacks its resource {Resource}; build WaterMix.Core again from a complete checkout.");
        using var gzip = new GZipStream(packed, CompressionMode.Decompress);
        using var memory = new MemoryStream(1_600_000);
        gzip.CopyTo(memory);
        ReadOnlySpan<byte> bytes = memory.GetBuffer().AsSpan(0, (int)memory.Length);

        int nx = BinaryPrimitives.ReadInt32LittleEndian(bytes);
        int ny = BinaryPrimitives.ReadInt32LittleEndian(bytes[4..]);
        int nz = BinaryPrimitives.ReadInt32LittleEndian(bytes[8..]);
        bytes = bytes[12..];
        double[] longitudes = Doubles(ref bytes, nx);
        double[] latitudes = Doubles(ref bytes, ny);
        double[] pressures = Doubles(ref bytes, nz);
        byte[] levels = bytes[..(nx * ny)].ToArray();
        return new Grid(longitudes, latitudes, pressures, levels, Planes(bytes[(nx * ny)..], nx * ny * nz));
    }

    private static double[] Doubles(ref ReadOnlySpan<byte> bytes, int count)
    {
        var values = new double[count];
        for (int i = 0; i < count; i++)
        {
            values[i] = BinaryPrimitives.ReadDoubleLittleEndian(bytes[(8 * i)..]);
        }

        bytes = bytes[(8 * count)..];
        return values;
    }

    /// <summary>Doubles from eight planes of bytes, the lowest byte of every value first. It runs once, so it is compiled at its best at once.</summary>
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    private static double[] Planes(ReadOnlySpan<byte> bytes, int count)
    {
        var values = new double[count];
        Span<ulong> bits = MemoryMarshal.Cast<double, ulong>(values.AsSpan());
        for (int place = 0; place < 8; place++)
        {
            ReadOnlySpan<byte> plane = bytes.Slice(place * count, count);
            for (int i = 0; i < plane.Length; i++)
            {
                bits[i] |= (ulong)plane[i] << (8 * place);
            }
        }

        return values;
    }

    private sealed record Grid(double[] Longitudes, double[] Latitudes, double[] Pressures, byte[] Levels, double[] Values)
    {
        public int LevelCount(int i, int j) => Levels[(i * Latitudes.Length) + j];

        public ReadOnlySpan<double> Column(int i, int j) =>
            Values.AsSpan(((i * Latitudes.Length) + j) * Pressures.Length, Pressures.Length);
    }
}
