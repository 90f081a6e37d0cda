using WaterMix.Core;
using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Formats.EndMemberSets;
using WaterMix.Formats.Json;
using WaterMix.Formats.MixingModels;
using WaterMix.Formats.Reading;
using WaterMix.Testing;

namespace WaterMix.SampleData.Tests;

/// <summary>Property. The project's own readers take every file, and find in it what the generator put there.</summary>
public class ReadingTests
{
    private static readonly Cruise _cruise = new(Cruise.Seed);

    [Theory]
    [InlineData("halcyon.mixmodel.json")]
    [InlineData("halcyon-simple.mixmodel.json")]
    public void Read_Model_HasNeitherErrorsNorWarnings(string name)
    {
        Reading<MixingModel> reading = MixingModelFile.Read(SamplePath(name));
        Assert.NotNull(reading.Value);
        Assert.All(reading.Findings, f => Assert.True(f.Severity == Severity.Note, f.ToString()));
        Assert.Equal(name.Contains("simple", StringComparison.Ordinal) ? Models.Simple : Models.TwoLayers, reading.Value);
    }

    [Fact]
    public void Read_EndMemberSet_IsTheGeneratorsSet() =>
        Assert.Equal(Sources.Set, EndMemberSetFile.Read(File.ReadAllBytes(SamplePath(Models.SetFile)), Models.SetFile).Value);

    [Fact]
    public void Read_BottleFile_GivesTheMeasuredValuesAndVoidsTheBottleThatTrippedWrongly()
    {
        SampleTable table = ReadAll("halcyon_hy1.csv");
        Assert.Equal(_cruise.Bottles.Count, table.RowCount);
        SampleColumn nitrate = table.Find(Quantity.Nitrate)!;
        SampleColumn salinity = table.Find(Quantity.PracticalSalinity)!;
        for (int row = 0; row < table.RowCount; row++)
        {
            Bottle bottle = _cruise.Bottles[row];
            bool isVoid = bottle.Flag is 4 or 9;
            double usable = nitrate.UsableAt(row, AcceptedFlags.Default);
            if (isVoid || bottle[Column.Nitrat].Flag is not (2 or 6))
            {
                Assert.True(double.IsNaN(usable), $"row {row + 1}: nitrate {usable}");
            }
            else
            {
                Assert.Equal(bottle[Column.Nitrat].Value, usable, 0.00501);
            }

            bool fromBottle = !isVoid && bottle[Column.Salnty].Flag is 2 or 6;
            Column expected = fromBottle ? Column.Salnty : Column.Ctdsal;
            if (bottle[expected].Flag is 2 or 6)
            {
                Assert.Equal(bottle[expected].Value, salinity.UsableAt(row, AcceptedFlags.Default), 0.0000501);
                Assert.Equal(fromBottle ? ValueOrigin.Bottle : ValueOrigin.Ctd, salinity.OriginAt(row));
            }
        }

        Assert.Contains(_cruise.Bottles, b => b.Flag == 4);
    }

    [Fact]
    public void Read_Casts_AgreeWithTheBottles()
    {
        foreach (int number in CtdCast.Stations)
        {
            SampleTable table = ReadAll($"casts/halcyon_{number:D5}_00001_ct1.csv");
            ReadOnlySpan<double> pressure = table.Find(Quantity.Pressure)!.Values;
            SampleColumn temperature = table.Find(Quantity.InSituTemperature)!;
            foreach (Bottle bottle in _cruise.Bottles.Where(b => b.Station.Number == number && b.Pressure is > 200 and < 4800))
            {
                int below = 0;
                while (below < pressure.Length - 1 && pressure[below] < bottle.Pressure)
                {
                    below++;
                }

                // Within the 10 dbar the thermocline changes by less than 0.3 degC.
                Assert.Equal(bottle.Temperature, temperature.Values[below], 0.3);
            }
        }
    }

    internal static string SamplePath(string name) => Path.Combine(TestData.Root, "sample-data", name);

    /// <summary>The one block of a sample file, read without an error.</summary>
    internal static SampleTable ReadAll(string name)
    {
        using OpenedSamples samples = SampleReader.Open([SamplePath(name)], new ReadingOptions());
        SampleBlock block = Assert.Single(samples.ReadBlocks(TestContext.Current.CancellationToken));
        Assert.False(samples.HasErrors, string.Join('\n', samples.Findings));
        return block.Table;
    }
}
