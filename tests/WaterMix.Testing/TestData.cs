using Xunit;

namespace WaterMix.Testing;

/// <summary>The folder of open data that is not part of the project: <c>WATERMIX_TEST_DATA</c>, else <c>../shared/data</c> beside the checkout.</summary>
public static class TestData
{
    /// <summary>The project's root folder.</summary>
    public static string Root { get; } = FindRoot();

    /// <summary>Path of a file in the data folder; skips the running test with a clear message where the file is absent.</summary>
    /// <param name="relative">Path inside the data folder, such as <c>bottle/a03_hy1.csv</c>.</param>
    public static string File(string relative)
    {
        string path = Path.Combine(Folder(), relative);
        Assert.SkipUnless(System.IO.File.Exists(path), $"The open data file {relative} is not here; set WATERMIX_TEST_DATA to the folder that holds it.");
        return path;
    }

    private static string Folder() =>
        Environment.GetEnvironmentVariable("WATERMIX_TEST_DATA") is { Length: > 0 } folder
            ? folder
            : Path.Combine(Root, "..", "shared", "data");

    private static string FindRoot()
    {
        string? folder = AppContext.BaseDirectory;
        while (folder is not null && !System.IO.File.Exists(Path.Combine(folder, "WaterMix.sln")))
        {
            folder = Path.GetDirectoryName(folder);
        }

        return folder ?? throw new InvalidOperationException("WaterMix.sln is in none of the folders above the tests.");
    }
}
