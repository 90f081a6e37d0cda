namespace WaterMix.Workspace.Storage;

/// <summary>Another process works on the data folder; the message says what to do.</summary>
public sealed class DataFolderInUseException : IOException
{
    /// <summary>The refusal of one folder.</summary>
    /// <param name="path">The folder.</param>
    /// <param name="inner">What the operating system said.</param>
    public DataFolderInUseException(string path, Exception? inner = null)
        : base($"The data folder {path} is in use by another WaterMix. Close that one, or set WATERMIX_DATA to another folder.", inner)
    {
        FolderPath = path;
    }

    /// <summary>The folder.</summary>
    public string FolderPath { get; }
}
