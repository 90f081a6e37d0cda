namespace WaterMix.Workspace.Tests;

/// <summary>A folder of a test's own, gone afterwards.</summary>
internal sealed class Scratch : IDisposable
{
    private readonly DirectoryInfo _folder = Directory.CreateTempSubdirectory("watermix-tests-");

    public string Folder => _folder.FullName;

    public string Path(string name) => System.IO.Path.Combine(_folder.FullName, name);

    public void Dispose() => _folder.Delete(recursive: true);
}
