using WaterMix.Formats.Reading;

namespace WaterMix.Formats.Tests.Reading;

public sealed class RealPathTests : IDisposable
{
    private readonly string _folder = RealPath.Of(Directory.CreateTempSubdirectory("watermix-path").FullName);

    public void Dispose() => Directory.Delete(_folder, recursive: true);

    [Theory]
    [InlineData("a.csv")]
    [InlineData("./a.csv")]
    [InlineData("inner/../a.csv")]
    [InlineData("link.csv")]
    [InlineData("linktolink.csv")]
    [InlineData("innerlink/../a.csv")]
    [InlineData("inner/back/a.csv")]
    public void Of_AnyNameOfAFile_IsOnePath(string name)
    {
        File.WriteAllText(Path.Combine(_folder, "a.csv"), "");
        Directory.CreateDirectory(Path.Combine(_folder, "inner"));
        File.CreateSymbolicLink(Path.Combine(_folder, "link.csv"), "a.csv");
        File.CreateSymbolicLink(Path.Combine(_folder, "linktolink.csv"), Path.Combine(_folder, "link.csv"));
        Directory.CreateSymbolicLink(Path.Combine(_folder, "inner", "back"), "..");
        Directory.CreateSymbolicLink(Path.Combine(_folder, "innerlink"), "inner");

        Assert.Equal(Path.Combine(_folder, "a.csv"), RealPath.Of(Path.Combine(_folder, name)));
    }

    [Fact]
    public void Of_NothingThere_IsTheFullPath() =>
        Assert.Equal(Path.Combine(_folder, "no", "such.csv"), RealPath.Of(Path.Combine(_folder, "no", ".", "such.csv")));

    [Fact]
    public void Of_LinksInACircle_EndsWithOneOfThem()
    {
        File.CreateSymbolicLink(Path.Combine(_folder, "a"), "b");
        File.CreateSymbolicLink(Path.Combine(_folder, "b"), "a");

        Assert.StartsWith(_folder, RealPath.Of(Path.Combine(_folder, "a")), StringComparison.Ordinal);
    }
}
