using System.Text.RegularExpressions;
using WaterMix.Testing;

namespace WaterMix.Cli.Tests;

/// <summary>docs/references.md holds every cited source once.</summary>
public partial class ReferencesTests
{
    private static readonly string[] Keys = [.. Entry()
        .Matches(File.ReadAllText(Path.Combine(TestData.Root, "docs", "references.md")))
        .Select(m => m.Groups[1].Value)];

    [Fact]
    public void Entries_StandOnce() => Assert.Equal(Keys.Distinct(), Keys);

    [Fact]
    public void KeysCitedInTheSource_HaveAnEntry()
    {
        // A key is an author or a standard with a number, in <c>...</c>.
        var cited = Sources("src").SelectMany(text => Citation().Matches(text)).Select(m => m.Groups[1].Value).Distinct().ToList();

        Assert.True(cited.Count > 20);
        Assert.All(cited, key => Assert.Contains(key, Keys));
    }

    [Fact]
    public void Entries_AreCitedSomewhere()
    {
        string all = string.Concat(Sources("src").Concat(Sources("tests")));

        Assert.All(Keys, key => Assert.Contains(key, all, StringComparison.Ordinal));
    }

    private static IEnumerable<string> Sources(string folder) =>
        Directory.EnumerateFiles(Path.Combine(TestData.Root, folder), "*.cs", SearchOption.AllDirectories)
            .Where(f => Path.GetFileName(f) != nameof(ReferencesTests) + ".cs")
            .Select(File.ReadAllText);

    [GeneratedRegex("^- `([A-Za-z0-9]+)`:", RegexOptions.Multiline)]
    private static partial Regex Entry();

    [GeneratedRegex("<c>([A-Z][A-Za-z]+[0-9]{2,4}|WhpExchange|Dlmf)</c>")]
    private static partial Regex Citation();
}
