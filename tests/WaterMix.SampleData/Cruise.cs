using WaterMix.Core.Mixing;
using WaterMix.Core.Seawater;

namespace WaterMix.SampleData;

/// <summary>The invented cruise: stations, bottles, and what was measured on them.</summary>
public sealed class Cruise
{
    /// <summary>The seed that the files in <c>sample-data</c> were made with.</summary>
    public const ulong Seed = 20_240_206;

    /// <summary>The cruise's invented EXPOCODE.</summary>
    public const string Expocode = "ZZHB20240206";

    /// <summary>The section's invented name.</summary>
    public const string SectionId = "HB01";

    /// <summary>The station whose upper bottles come from a second, shallow cast.</summary>
    public const int TwoCastStation = 18;

    // Where the deepest bottle was closed twice.
    private static readonly int[] _replicateStations = [6, 15, 24, 33];

    private readonly Noise _noise;

    /// <summary>Sails, samples and measures.</summary>
    /// <param name="seed">The seed of all random numbers.</param>
    public Cruise(ulong seed)
    {
        _noise = new Noise(seed);
        Stations = Section.Stations(_noise);
        Bottles = [.. Stations.SelectMany(SampleStation)];
        new Incidents(_noise).Apply(Bottles);
    }

    /// <summary>The stations, southwest to northeast.</summary>
    public IReadOnlyList<Station> Stations { get; }

    /// <summary>The bottles in the order of the file: by station, from the surface down.</summary>
    public IReadOnlyList<Bottle> Bottles { get; }

    /// <summary>The error of one measurement of a tracer: the model's measurement error times a normal number.</summary>
    /// <param name="tracer">Index of the tracer.</param>
    /// <param name="value">The true value.</param>
    public static double ErrorSd(int tracer, double value)
    {
        MeasurementError error = Models.Errors[tracer];
        double relative = error.Relative * value;
        return Math.Sqrt((error.Absolute * error.Absolute) + (relative * relative));
    }

    /// <summary>In-situ temperature of a parcel.</summary>
    /// <param name="station">Where.</param>
    /// <param name="pressure">Sea pressure, dbar.</param>
    /// <param name="parcel">Value of each tracer.</param>
    public static double InSitu(Station station, double pressure, double[] parcel)
    {
        ArgumentNullException.ThrowIfNull(station);
        ArgumentNullException.ThrowIfNull(parcel);
        double salinity = AbsoluteSalinity.FromPractical(parcel[1], pressure, station.Longitude, station.Latitude);
        return PotentialTemperature.FromInSitu(salinity, parcel[0], 0, pressure);
    }

    private IEnumerable<Bottle> SampleStation(Station station)
    {
        double[] pressures = [.. Section.BottlePressures(station, _noise)];
        if (_replicateStations.Contains(station.Number))
        {
            pressures[^2] = pressures[^1];
        }

        int shallow = station.Number == TwoCastStation ? pressures.Count(p => p < 1000) : 0;
        for (int k = 0; k < pressures.Length; k++)
        {
            bool second = k < shallow;
            int sample = (second ? shallow : pressures.Length) - k;

            // Bottles closed at one pressure hold one parcel.
            int level = Array.IndexOf(pressures, pressures[k]);
            yield return Sample(station, second ? 2 : 1, sample, pressures[k], level, k);
        }
    }

    private Bottle Sample(Station station, int cast, int sample, double pressure, int level, int k)
    {
        Water water = Water.At(station.Along, pressure).Rounded();
        double[] parcel = water.Tracers(station.Along, pressure);

        // The wind has mixed the parcels of the uppermost layer.
        double unmixed = 1 - Water.Summer(pressure);
        for (int t = 0; t < parcel.Length; t++)
        {
            for (int i = 0; i < water.Fractions.Length; i++)
            {
                parcel[t] += unmixed * water.Fractions[i] * Sources.Spread[i][t] * _noise.Normal(Purpose.SourceSpread + i, station.Number, level, t);
            }
        }

        double temperature = InSitu(station, pressure, parcel) + (ErrorSd(0, parcel[0]) * _noise.Normal(Purpose.CtdMeasurement, station.Number, k, 0));
        var bottle = new Bottle(station, cast, sample, pressure, water, parcel, temperature);
        foreach (Column column in Enum.GetValues<Column>())
        {
            int t = Bottle.TracerOf(column);
            Purpose purpose = Bottle.IsCtd(column) ? Purpose.CtdMeasurement : Purpose.Measurement;
            bottle[column] = new Measured(parcel[t] + (ErrorSd(t, parcel[t]) * _noise.Normal(purpose, station.Number, k, t)), 2);
        }

        return bottle;
    }
}
