using WaterMix.Testing;

namespace WaterMix.SampleData.Tests;

/// <summary>Regression. The committed files are what the generator makes.</summary>
public class SampleFilesTests
{
    private static readonly string _folder = Path.Combine(TestData.Root, "sample-data");

    [Fact]
    public void Make_SeedOfTheCommittedFiles_GivesTheSameBytes()
    {
        IReadOnlyDictionary<string, byte[]> made = SampleFiles.Make(Cruise.Seed);
        Assert.All(made, file => Assert.True(
            file.Value.AsSpan().SequenceEqual(File.ReadAllBytes(Path.Combine(_folder, file.Key))),
            $"{file.Key} differs from what the generator makes: run tests/WaterMix.SampleData again."));
        string[] committed = [.. Directory.GetFiles(_folder, "*", SearchOption.AllDirectories).Select(p => Path.GetRelativePath(_folder, p).Replace('\\', '/'))];
        Assert.Equal([.. made.Keys.Append("README.md").Order(StringComparer.Ordinal)], committed.Order(StringComparer.Ordinal));
    }

    [Fact]
    public void Make_AnotherSeed_GivesAnotherCruise() =>
        Assert.False(SampleFiles.Make(Cruise.Seed + 1)["halcyon_hy1.csv"].AsSpan().SequenceEqual(SampleFiles.Make(Cruise.Seed)["halcyon_hy1.csv"]));

    [Fact]
    public void Folder_AllFiles_StaySmall() =>
        Assert.InRange(Directory.GetFiles(_folder, "*", SearchOption.AllDirectories).Sum(p => new FileInfo(p).Length), 1, 600_000);

    // The first numbers of SplitMix64 for the seed 1234567, from memory.
    [Fact]
    public void Next_SeedWithKnownSequence_GivesIt()
    {
        var generator = new SplitMix64(1234567);
        Assert.Equal([6457827717110365317UL, 3203168211198807973UL, 9817491932198370423UL], [generator.Next(), generator.Next(), generator.Next()]);
    }

    // Mean 0, standard deviation 1, 4.55 % beyond two: the normal distribution. Tolerances are 4 standard errors of 100,000 draws.
    [Fact]
    public void Normal_ManyDraws_AreNormal()
    {
        var noise = new Noise(1);
        double[] draws = [.. Enumerable.Range(0, 100_000).Select(k => noise.Normal(Purpose.Measurement, k, 0, 0))];
        Assert.Equal(0, draws.Average(), 0.0127);
        Assert.Equal(1, draws.Average(d => d * d), 0.0179);
        Assert.Equal(0.0455, draws.Count(d => Math.Abs(d) > 2) / 100_000.0, 0.0027);
    }
}
