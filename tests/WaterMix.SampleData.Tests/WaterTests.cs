using WaterMix.Core.Seawater;

namespace WaterMix.SampleData.Tests;

/// <summary>Property. The invented water obeys what real water obeys.</summary>
public class WaterTests
{
    private static readonly Cruise _cruise = new(Cruise.Seed);

    /// <summary>The bottles whose water is a mixture of the sources.</summary>
    private static IEnumerable<Bottle> Mixtures => _cruise.Bottles.Where(b => b.Pressure >= Models.MixedLayer);

    [Fact]
    public void Fractions_EveryBottle_AreNotNegativeAndSumToOne() =>
        Assert.All(_cruise.Bottles, b =>
        {
            Assert.All(b.Water.Fractions, f => Assert.InRange(f, 0, 1));
            Assert.Equal(10_000, b.Water.Fractions.Sum(f => (int)Math.Round(f * 10_000)));
            Assert.Equal(1, b.Water.Fractions.Sum(), 1e-12);
            Assert.True(b.Water.Respiration >= 0 && b.Water.Opal >= 0);
        });

    // 0.05 in sigma2 is more than errors of temperature and salinity can move a sample.
    [Fact]
    public void Fractions_BothLayers_HoldOnlySourcesThatTheModelPermitsThere() =>
        Assert.All(Mixtures, b =>
        {
            double sigma2 = Sigma(b.Station, b.Pressure, b.Parcel, 2000);
            Assert.True(b.Water.Fractions[Sources.Htw] == 0 || sigma2 < Models.LayerSigma2 - 0.05);
            Assert.True(b.Water.Fractions[Sources.Sbw] == 0 || sigma2 > Models.LayerSigma2 + 0.05);
        });

    [Fact]
    public void Water_EveryStationWithoutSpread_IsStablyStratified()
    {
        foreach (Station station in _cruise.Stations)
        {
            double[] p = [.. Enumerable.Range(0, (int)(SeaPressure.FromDepth(station.BottomDepth, station.Latitude) / 20)).Select(k => 20.0 * k)];
            double[][] water = [.. p.Select(x => Water.At(station.Along, x).Tracers(station.Along, x))];
            double[] salinity = [.. p.Zip(water, (x, w) => AbsoluteSalinity.FromPractical(w[1], x, station.Longitude, station.Latitude))];
            double[] temperature = [.. salinity.Zip(water, (s, w) => ConservativeTemperature.FromPotential(s, w[0]))];
            var squared = new double[p.Length - 1];
            BuoyancyFrequency.Squared(salinity, temperature, p, station.Latitude, squared, new double[p.Length - 1]);
            Assert.All(squared, n2 => Assert.True(n2 > 0, $"station {station.Number}, {p[Array.IndexOf(squared, n2)]} dbar: N2 = {n2}"));
        }
    }

    // The spread within the sources moves density by about 0.01 kg/m3 in the deep water and twice that in the thermocline.
    [Fact]
    public void Bottles_EveryStation_AreStablyStratifiedButForNoise()
    {
        int inversions = 0;
        foreach (IGrouping<Station, Bottle> station in _cruise.Bottles.GroupBy(b => b.Station))
        {
            foreach ((Bottle above, Bottle below) in station.Zip(station.Skip(1)))
            {
                Assert.True(below.Pressure >= above.Pressure);
                double middle = (above.Pressure + below.Pressure) / 2;
                double step = Sigma(station.Key, below.Pressure, below.Parcel, middle) - Sigma(station.Key, above.Pressure, above.Parcel, middle);
                Assert.True(step > -0.02, $"station {station.Key.Number}, {above.Pressure} dbar: {step}");
                inversions += step < 0 ? 1 : 0;
            }
        }

        Assert.InRange(inversions, 0, _cruise.Bottles.Count / 50);
    }

    // Common practice, no source: what the sources bring accounts for deep oxygen, and respiration only lowers it.
    [Fact]
    public void Oxygen_BelowTheMixedLayer_NeverExceedsWhatTheSourcesBring() =>
        Assert.All(Mixtures.Where(b => b.Flag == 2 && b[Column.Oxygen].Flag is 2 or 6), b =>
        {
            double brought = Sources.Mix(b.Water.Fractions, 0, 0)[Sources.Oxygen];
            Assert.True(Sources.Mix(b.Water.Fractions, b.Water.Respiration, b.Water.Opal)[Sources.Oxygen] <= brought);
            double spread = Math.Sqrt(b.Water.Fractions.Zip(Sources.Spread, (f, sd) => f * f * sd[Sources.Oxygen] * sd[Sources.Oxygen]).Sum());
            Assert.True(b[Column.Oxygen].Value <= brought + (4 * (spread + Cruise.ErrorSd(Sources.Oxygen, brought))));
        });

    // Common practice, no source: along the path of ageing oxygen falls and nutrients rise in the ratios of respiration, here
    // P : N : O2 = 1 : 16 : -170 (Anderson and Sarmiento 1994, from memory).
    [Fact]
    public void Respiration_AlongTheNorthernDeepWater_LowersOxygenAndRaisesNutrientsInItsRatios()
    {
        Bottle[] path = [.. Mixtures.Where(b => b.Water.Fractions[Sources.Ndw] > 0.8 && b.Values.All(v => v.Flag is 2 or 6))];
        Bottle[][] thirds = [.. path.OrderByDescending(b => b.Station.Along).Chunk((path.Length + 2) / 3)];
        double[] oxygen = [.. thirds.Select(third => third.Average(b => b[Column.Oxygen].Value))];
        double[] phosphate = [.. thirds.Select(third => third.Average(b => Gained(b, Column.Phspht)))];
        Assert.Equal(3, thirds.Length);
        Assert.True(oxygen[0] > oxygen[1] + 10 && oxygen[1] > oxygen[2] + 10, string.Join(", ", oxygen));
        Assert.True(phosphate[0] < phosphate[1] && phosphate[1] < phosphate[2]);
        Assert.Equal(16, path.Sum(b => Gained(b, Column.Nitrat)) / path.Sum(b => Gained(b, Column.Phspht)), 0.5);
        Assert.Equal(-170, path.Sum(b => Gained(b, Column.Oxygen)) / path.Sum(b => Gained(b, Column.Phspht)), 5.0);
        Assert.True(path.Sum(b => Gained(b, Column.Silcat)) > 0);
    }

    /// <summary>What a bottle holds beyond what its sources brought.</summary>
    private static double Gained(Bottle bottle, Column column) =>
        bottle[column].Value - Sources.Mix(bottle.Water.Fractions, 0, 0)[Bottle.TracerOf(column)];

    private static double Sigma(Station station, double pressure, double[] parcel, double reference)
    {
        double salinity = AbsoluteSalinity.FromPractical(parcel[1], pressure, station.Longitude, station.Latitude);
        return Density.PotentialAnomaly(salinity, ConservativeTemperature.FromPotential(salinity, parcel[0]), reference);
    }
}
