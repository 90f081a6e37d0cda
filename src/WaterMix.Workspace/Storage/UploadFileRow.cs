namespace WaterMix.Workspace.Storage;

/// <summary>A file of an upload; it stands under its number in the upload's folder.</summary>
internal sealed class UploadFileRow
{
    public Guid UploadId { get; set; }

    /// <summary>Its place in the upload, from 1.</summary>
    public int Number { get; set; }

    /// <summary>The name for people: the last part of what the browser gave, without what could do harm.</summary>
    public required string Name { get; set; }

    public long Bytes { get; set; }

    public DateTimeOffset Received { get; set; }
}
