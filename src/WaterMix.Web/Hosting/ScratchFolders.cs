using WaterMix.Workspace.Storage;

namespace WaterMix.Web.Hosting;

/// <summary>Folders for files that are needed for the length of a request.</summary>
internal sealed class ScratchFolders
{
    private readonly string _root;

    /// <summary>The folders stand in the data folder, where there is room; what a process left behind that ended at once is cleared away.</summary>
    public ScratchFolders(DataFolder folder)
    {
        _root = Path.Combine(folder.Root, "scratch");
        if (Directory.Exists(_root))
        {
            Directory.Delete(_root, recursive: true);
        }
    }

    /// <summary>Makes a folder; it goes with everything in it when it is disposed.</summary>
    public ScratchFolder Make() => new(Directory.CreateDirectory(Path.Combine(_root, Guid.NewGuid().ToString("N"))).FullName);
}
