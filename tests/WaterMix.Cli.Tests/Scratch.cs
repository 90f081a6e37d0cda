namespace WaterMix.Cli.Tests;

/// <summary>A folder of a test's own, gone afterwards.</summary>
internal sealed class Scratch : IDisposable
{
    private readonly DirectoryInfo _folder = Directory.CreateTempSubdirectory("watermix-tests-");

    public string Path(string name) => System.IO.Path.Combine(_folder.FullName, name);

    public string Write(string name, string text)
    {
        File.WriteAllText(Path(name), text);
        return Path(name);
    }

    public string Write(string name, byte[] bytes)
    {
        File.WriteAllBytes(Path(name), bytes);
        return Path(name);
    }

    public void Dispose() => _folder.Delete(recursive: true);
}
