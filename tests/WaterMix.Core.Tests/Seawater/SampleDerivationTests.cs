using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Core.Seawater;

namespace WaterMix.Core.Tests.Seawater;

/// <summary>Property. The rules by which derived columns are added to a table, each against the formula classes.</summary>
public class SampleDerivationTests
{
    private const double Nan = double.NaN;

    private static readonly string[] All =
    [
        "pressure", "practical_salinity", "absolute_salinity", "conservative_temperature", "potential_temperature", "sigma0", "sigma1", "sigma2",
        "sigma3", "sigma4", "apparent_oxygen_utilisation", "no", "po", "n_star", "po4_star",
    ];

    private static SampleColumn Latitude => new(Quantity.Latitude, [40]);

    private static SampleColumn Longitude => new(Quantity.Longitude, [-30]);

    private static SampleColumn Pressure => new(Quantity.Pressure, [2000]);

    private static SampleColumn InSitu => new(Quantity.InSituTemperature, [3.6]);

    private static SampleColumn Salinity => new(Quantity.PracticalSalinity, [34.95]);

    private static SampleColumn Oxygen => new(Quantity.Oxygen, [265]);

    private static SampleColumn Nitrate => new(Quantity.Nitrate, [17.5]);

    private static SampleColumn Phosphate => new(Quantity.Phosphate, [1.15]);

    private static double SA => AbsoluteSalinity.FromPractical(34.95, 2000, -30, 40);

    private static double CT => ConservativeTemperature.FromInSitu(SA, 3.6, 2000);

    private static double Theta => PotentialTemperature.FromInSitu(SA, 3.6, 2000);

    [Fact]
    public void Derive_CompleteSample_GivesWhatTheFormulasGive()
    {
        DerivedSamples derived = SampleDerivation.Derive(Table(Latitude, Longitude, Pressure, InSitu, Salinity, Oxygen, Nitrate, Phosphate), All);

        var factors = new DerivedTracerFactors();
        Assert.Equal(SA, One(derived, "absolute_salinity"));
        Assert.Equal(CT, One(derived, "conservative_temperature"));
        Assert.Equal(Theta, One(derived, "potential_temperature"));
        for (int i = 0; i <= 4; i++)
        {
            Assert.Equal(Density.PotentialAnomaly(SA, CT, 1000 * i), One(derived, FormattableString.Invariant($"sigma{i}")));
        }

        Assert.Equal(OxygenSolubility.FromPractical(34.95, Theta) - 265, One(derived, "apparent_oxygen_utilisation"));
        Assert.Equal(DerivedTracers.No(265, 17.5, factors), One(derived, "no"));
        Assert.Equal(DerivedTracers.Po(265, 1.15, factors), One(derived, "po"));
        Assert.Equal(DerivedTracers.NStar(17.5, 1.15, factors), One(derived, "n_star"));
        Assert.Equal(DerivedTracers.Po4Star(1.15, 265, factors), One(derived, "po4_star"));
        Assert.Empty(derived.Notes);
    }

    [Fact]
    public void Derive_MeasuredColumns_AreLeftAsTheyAre()
    {
        SampleTable table = Table(Latitude, Longitude, Pressure, InSitu, Salinity);
        DerivedSamples derived = SampleDerivation.Derive(table, ["pressure", "practical_salinity", "in_situ_temperature", "my_tracer", "absolute_salinity"]);

        Assert.Equal([.. table.Columns.Select(c => c.Id), "absolute_salinity"], derived.Table.Columns.Select(c => c.Id));
        Assert.Same(table.Find("pressure"), derived.Table.Find("pressure"));
    }

    [Fact]
    public void Derive_NothingWanted_ReturnsTheSameTable()
    {
        SampleTable table = Table(Latitude, Salinity);
        Assert.Same(table, SampleDerivation.Derive(table, []).Table);
    }

    [Fact]
    public void Derive_PressureMissing_ComesFromDepthAndLatitudeAndIsNoted()
    {
        var depth = new SampleColumn(Quantity.Depth, [1000, 1000, 1000]);
        var pressure = new SampleColumn(Quantity.Pressure, [500, Nan, Nan]);
        var latitude = new SampleColumn(Quantity.Latitude, [40, 40, Nan]);
        DerivedSamples derived = SampleDerivation.Derive(new SampleTable(3, [], [depth, pressure, latitude]), ["pressure"]);

        SampleColumn filled = derived.Table.Find("pressure")!;
        Assert.Equal([500, SeaPressure.FromDepth(1000, 40), Nan], filled.Values.ToArray());
        Assert.Equal(1, Assert.Single(derived.Notes).Count);
    }

    [Fact]
    public void Derive_OnlyDepth_ServesForPressureEverywhere()
    {
        var depth = new SampleColumn(Quantity.Depth, [1976]);
        DerivedSamples derived = SampleDerivation.Derive(Table(Latitude, Longitude, depth, InSitu, Salinity), ["potential_temperature", "sigma2"]);

        double p = SeaPressure.FromDepth(1976, 40);
        double sa = AbsoluteSalinity.FromPractical(34.95, p, -30, 40);
        Assert.Equal(PotentialTemperature.FromInSitu(sa, 3.6, p), One(derived, "potential_temperature"));
        Assert.Equal(Density.PotentialAnomaly(sa, ConservativeTemperature.FromInSitu(sa, 3.6, p), 2000), One(derived, "sigma2"));
    }

    [Fact]
    public void Derive_NoPosition_GivesPotentialTemperatureWithReferenceSalinityOnly()
    {
        DerivedSamples derived = SampleDerivation.Derive(Table(Pressure, InSitu, Salinity), ["potential_temperature", "conservative_temperature", "sigma0"]);

        double sr = ReferenceSalinity.FromPractical(34.95);
        Assert.Equal(PotentialTemperature.FromInSitu(sr, 3.6, 2000), One(derived, "potential_temperature"));
        Assert.Null(derived.Table.Find("conservative_temperature"));
        Assert.Null(derived.Table.Find("sigma0"));
        Assert.Equal(3, derived.Notes.Count);
        Assert.Contains(derived.Notes, n => n.Severity == Severity.Note && n.Remedy.Contains("Reference salinity", StringComparison.Ordinal));
        Finding longitude = Assert.Single(derived.Notes, n => n.Column == "longitude");
        Assert.Equal((Severity.Warning, 1L), (longitude.Severity, longitude.Count));
        Assert.Equal("longitude for conservative_temperature, sigma0", longitude.Expected);
        Assert.Single(derived.Notes, n => n.Column == "latitude");
    }

    // What stands in for the exact value, 0.02 g/kg of anomaly at 5,000 dbar, matters little: this is the bound that the note states.
    [Fact]
    public void Derive_ReferenceSalinity_ChangesPotentialTemperatureByLessThanStated() =>
        Assert.InRange(
            Math.Abs(PotentialTemperature.FromInSitu(35.03, 1.5, 6000) - PotentialTemperature.FromInSitu(35.0, 1.5, 6000)), 0, 0.001);

    [Fact]
    public void Derive_SomePositionsMissing_CountsThem()
    {
        var table = new SampleTable(
            4,
            [],
            [
                new(Quantity.Latitude, [40, Nan, 40, 40]), new(Quantity.Longitude, [-30, -30, Nan, Nan]), new(Quantity.Pressure, [10, 10, 10, Nan]),
                new(Quantity.InSituTemperature, [10, 10, 10, Nan]), new(Quantity.PracticalSalinity, [35, 35, 35, 35]),
            ]);
        DerivedSamples derived = SampleDerivation.Derive(table, ["absolute_salinity", "sigma0"]);

        Assert.Equal([false, true, true, true], derived.Table.Find("sigma0")!.Values.ToArray().Select(double.IsNaN));
        Assert.Equal(
            [("practical_salinity", 0L), ("pressure", 1), ("longitude", 2), ("latitude", 1), ("in_situ_temperature", 1)],
            new[] { "practical_salinity", "pressure", "longitude", "latitude", "in_situ_temperature" }
                .Select(id => (id, derived.Notes.Where(n => n.Column == id).Sum(n => n.Count))));
        Assert.Equal(Severity.Note, derived.Notes.Single(n => n.Column == "in_situ_temperature").Severity);
    }

    [Fact]
    public void Derive_PositionOutsideTheAtlas_IsWarnedOf()
    {
        var latitude = new SampleColumn(Quantity.Latitude, [-88]);
        DerivedSamples derived = SampleDerivation.Derive(Table(latitude, Longitude, Pressure, Salinity), ["absolute_salinity"]);

        Assert.True(double.IsNaN(One(derived, "absolute_salinity")));
        Assert.Equal(Severity.Warning, Assert.Single(derived.Notes).Severity);
    }

    [Theory]
    [InlineData(3.6, 2000, false)]
    [InlineData(Nan, 2000, true)]
    [InlineData(3.6, Nan, true)]
    public void Derive_OwnPotentialTemperature_IsUsedOnlyWithoutInSituTemperatureOrPressure(double t, double p, bool usesOwn)
    {
        var own = new SampleColumn(Quantity.PotentialTemperature, [9.9]) { Source = "THETA" };
        SampleTable table = Table(Latitude, Longitude, Salinity, own, new(Quantity.InSituTemperature, [t]), new(Quantity.Pressure, [p]));
        DerivedSamples derived = SampleDerivation.Derive(table, ["potential_temperature"]);

        Assert.Equal(usesOwn ? 9.9 : Theta, One(derived, "potential_temperature"));
        Assert.Equal(usesOwn, derived.Notes.Any(n => n.Expected.Contains("potential_temperature is derived from", StringComparison.Ordinal)));
        Assert.Contains("; else THETA", derived.Table.Find("potential_temperature")!.Source, StringComparison.Ordinal);
    }

    // In-situ temperature and pressure are there, so the rule keeps the file's own value out even though salinity is missing.
    [Fact]
    public void Derive_OwnPotentialTemperature_IsNotUsedWhereOnlySalinityIsMissing()
    {
        SampleTable table = Table(Latitude, Longitude, Pressure, InSitu, new(Quantity.PracticalSalinity, [Nan]), new(Quantity.PotentialTemperature, [9.9]));
        DerivedSamples derived = SampleDerivation.Derive(table, ["potential_temperature"]);

        Assert.True(double.IsNaN(One(derived, "potential_temperature")));
        Assert.Equal("practical_salinity", Assert.Single(derived.Notes).Column);
    }

    [Fact]
    public void Derive_OwnTeos10Columns_AreUsedOnlyWhereTheMeasurementsAreMissing()
    {
        var table = new SampleTable(
            2,
            [],
            [
                new(Quantity.Latitude, [40, 40]), new(Quantity.Longitude, [-30, -30]), new(Quantity.Pressure, [2000, 2000]),
                new(Quantity.InSituTemperature, [3.6, Nan]), new(Quantity.PracticalSalinity, [34.95, Nan]),
                new(Quantity.ConservativeTemperature, [1, 2]), new(Quantity.AbsoluteSalinity, [30, 31]), new(Quantity.Sigma0, [20, 21]),
            ]);
        DerivedSamples derived = SampleDerivation.Derive(table, ["conservative_temperature", "absolute_salinity", "sigma0"]);

        Assert.Equal([CT, 2], derived.Table.Find("conservative_temperature")!.Values.ToArray());
        Assert.Equal([SA, 31], derived.Table.Find("absolute_salinity")!.Values.ToArray());
        Assert.Equal(
            [Density.PotentialAnomaly(SA, CT, 0), Density.PotentialAnomaly(31, 2, 0)],
            derived.Table.Find("sigma0")!.Values.ToArray());
    }

    [Fact]
    public void Derive_OwnDensityWithoutTemperature_IsUsed()
    {
        DerivedSamples derived = SampleDerivation.Derive(Table(Latitude, Longitude, Pressure, Salinity, new(Quantity.Sigma0, [27.8])), ["sigma0"]);
        Assert.Equal(27.8, One(derived, "sigma0"));
        Assert.Same(derived.Table.Find("sigma0"), SampleDerivation.Derive(derived.Table, ["sigma0"]).Table.Find("sigma0"));
    }

    [Fact]
    public void Derive_OnlyConservativeTemperatureAndAbsoluteSalinity_GivesTheOlderPair()
    {
        SampleTable table = Table(
            Latitude, Longitude, Pressure, new(Quantity.ConservativeTemperature, [CT]), new(Quantity.AbsoluteSalinity, [SA]));
        DerivedSamples derived = SampleDerivation.Derive(table, ["potential_temperature", "practical_salinity", "sigma2"]);

        Assert.Equal(Theta, One(derived, "potential_temperature"), 1e-13);
        Assert.Equal(34.95, One(derived, "practical_salinity"), 1e-13);
        Assert.Equal(Density.PotentialAnomaly(SA, CT, 2000), One(derived, "sigma2"));
    }

    [Fact]
    public void Derive_OnlyPotentialTemperatureAndPracticalSalinity_GivesConservativeTemperature()
    {
        SampleTable table = Table(Latitude, Longitude, Pressure, Salinity, new(Quantity.PotentialTemperature, [3.4]));
        DerivedSamples derived = SampleDerivation.Derive(table, ["conservative_temperature", "potential_temperature"]);

        Assert.Equal(ConservativeTemperature.FromPotential(SA, 3.4), One(derived, "conservative_temperature"));
        Assert.Same(table.Find("potential_temperature"), derived.Table.Find("potential_temperature"));
    }

    [Fact]
    public void Derive_FlaggedInputs_CarryTheWorstFlagAndItsOrigin()
    {
        SampleTable table = new(
            4,
            [],
            [
                new(Quantity.Latitude, [40, 40, 40, 40]), new(Quantity.Longitude, [-30, -30, -30, -30]), new(Quantity.Pressure, [2000, 2000, 2000, 2000]),
                new(Quantity.InSituTemperature, [3.6, 3.6, 3.6, Nan], [2, 7, 2, 9], origin: ValueOrigin.Ctd),
                new(Quantity.PracticalSalinity, [34.95, 34.95, 34.95, 34.95], [2, 6, 3, 2], [ValueOrigin.Ctd, ValueOrigin.Bottle, ValueOrigin.Bottle, ValueOrigin.Bottle]),
                new(Quantity.Oxygen, [265, 265, 265, 265], [2, 2, 4, 2]),
            ]);
        DerivedSamples derived = SampleDerivation.Derive(table, ["sigma2", "apparent_oxygen_utilisation"]);

        SampleColumn sigma = derived.Table.Find("sigma2")!;
        Assert.Equal([2, 7, 3, QualityFlags.NotSampled], sigma.Flags.ToArray());
        Assert.Equal([ValueOrigin.Ctd, ValueOrigin.Ctd, ValueOrigin.Bottle, ValueOrigin.None], Enumerable.Range(0, 4).Select(sigma.OriginAt));
        Assert.True(double.IsNaN(sigma.Values[3]));

        SampleColumn aou = derived.Table.Find("apparent_oxygen_utilisation")!;
        Assert.Equal([2, 7, 4, QualityFlags.NotSampled], aou.Flags.ToArray());

        // Despiked counts as good in the CTD's table; the same flag of a water sample would not.
        Assert.False(double.IsNaN(sigma.UsableAt(1, AcceptedFlags.Default)));
        Assert.True(double.IsNaN(sigma.UsableAt(2, AcceptedFlags.Default)));
    }

    [Fact]
    public void Derive_SameFlagFromBothInstruments_IsReadInTheStricterTable()
    {
        SampleTable table = Table(
            new(Quantity.Oxygen, [265], [7], origin: ValueOrigin.Ctd), new(Quantity.Nitrate, [17.5], [7], origin: ValueOrigin.Bottle));
        SampleColumn no = SampleDerivation.Derive(table, ["no"]).Table.Find("no")!;
        Assert.Equal(((byte)7, ValueOrigin.Bottle), (no.FlagAt(0), no.OriginAt(0)));
    }

    [Fact]
    public void Derive_NoFlagsAnywhere_HasNone() =>
        Assert.False(SampleDerivation.Derive(Table(Latitude, Longitude, Pressure, InSitu, Salinity), ["sigma0"]).Table.Find("sigma0")!.HasFlags);

    [Fact]
    public void Derive_OtherFactors_AreUsedAndStoredWithTheColumn()
    {
        var factors = new DerivedTracerFactors { NoOxygenPerNitrate = 9.5, Po4StarOxygenPerPhosphate = 150, Po4StarOffset = -2 };
        DerivedSamples derived = SampleDerivation.Derive(Table(Oxygen, Nitrate, Phosphate), ["no", "po4_star"], factors);

        Assert.Equal(265 + (9.5 * 17.5), One(derived, "no"));
        Assert.Equal("NO = O2 + 9.5 NO3", derived.Table.Find("no")!.Conversion);
        Assert.Equal("PO4* = PO4 + O2 / 150 + (-2)", derived.Table.Find("po4_star")!.Conversion);
        Assert.Equal("derived from oxygen, nitrate", derived.Table.Find("no")!.Source);
    }

    [Fact]
    public void Derive_TracerWithoutItsParents_IsNotAddedAndNoted()
    {
        DerivedSamples derived = SampleDerivation.Derive(Table(Oxygen), ["no"]);
        Assert.Null(derived.Table.Find("no"));
        Assert.Equal(("nitrate", 1L, Severity.Note), Assert.Single(derived.Notes.Select(n => (n.Column!, n.Count, n.Severity))));
    }

    [Fact]
    public void Eos80Anomaly_StandsBesideTeos10()
    {
        SampleTable table = Table(Pressure, InSitu, Salinity);
        SampleColumn column = SampleDerivation.Eos80Anomaly(table, Quantity.Sigma2);
        Assert.Equal("sigma2_eos80", column.Id);
        Assert.Equal(Eos80.PotentialAnomaly(34.95, 3.6, 2000, 2000), column.Values[0]);
    }

    [Fact]
    public void Eos80Anomaly_OnlyPotentialTemperature_StartsFromTheSurface()
    {
        SampleTable table = Table(Salinity, new(Quantity.PotentialTemperature, [3.4]));
        Assert.Equal(Eos80.PotentialAnomaly(34.95, 3.4, 0, 4000), SampleDerivation.Eos80Anomaly(table, Quantity.Sigma4).Values[0]);
    }

    [Fact]
    public void Eos80Anomaly_NothingToDeriveItFrom_IsMissing() =>
        Assert.True(double.IsNaN(SampleDerivation.Eos80Anomaly(Table(Oxygen), Quantity.Sigma0).Values[0]));

    [Fact]
    public void Eos80Anomaly_AnotherQuantity_IsRefused() =>
        Assert.Contains(
            "oxygen",
            Assert.Throws<ArgumentException>(() => SampleDerivation.Eos80Anomaly(Table(Oxygen), Quantity.Oxygen)).Message,
            StringComparison.Ordinal);

    // A block of a long file gives the same bits as the whole, and a second run the same as the first.
    [Fact]
    public void Derive_BlockByBlock_GivesTheSameBitsAsAtOnce()
    {
        const int N = 4096;
        SampleTable whole = Random(N, 0, N);
        DerivedSamples atOnce = SampleDerivation.Derive(whole, All);
        for (int start = 0; start < N; start += 1000)
        {
            int length = Math.Min(1000, N - start);
            DerivedSamples block = SampleDerivation.Derive(Random(N, start, length), All);
            foreach (string id in All)
            {
                long[] expected = [.. atOnce.Table.Find(id)!.Values.Slice(start, length).ToArray().Select(BitConverter.DoubleToInt64Bits)];
                Assert.Equal(expected, block.Table.Find(id)!.Values.ToArray().Select(BitConverter.DoubleToInt64Bits));
            }
        }
    }

    private static SampleTable Random(int count, int start, int length)
    {
        var random = new Random(20240611);
        SampleColumn Draw(Quantity quantity, double low, double high)
        {
            double[] values = [.. Enumerable.Range(0, count).Select(_ => random.NextDouble() < 0.05 ? Nan : low + ((high - low) * random.NextDouble()))];
            return new SampleColumn(quantity, values[start..(start + length)]);
        }

        return new SampleTable(
            length,
            [],
            [
                Draw(Quantity.Latitude, -80, 90), Draw(Quantity.Longitude, -180, 180), Draw(Quantity.Pressure, 0, 6000), Draw(Quantity.Depth, 0, 6000),
                Draw(Quantity.InSituTemperature, -2, 30), Draw(Quantity.PracticalSalinity, 5, 38), Draw(Quantity.PotentialTemperature, -2, 30),
                Draw(Quantity.Oxygen, 0, 350), Draw(Quantity.Nitrate, 0, 40), Draw(Quantity.Phosphate, 0, 3),
            ]);
    }

    private static SampleTable Table(params SampleColumn[] columns) => new(1, [], columns);

    private static double One(DerivedSamples derived, string id) => derived.Table.Find(id)!.Values[0];
}
