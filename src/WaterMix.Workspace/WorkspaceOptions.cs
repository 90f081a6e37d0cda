namespace WaterMix.Workspace;

/// <summary>Limits and times of a workspace; the defaults suit one lab's machine.</summary>
public sealed record WorkspaceOptions
{
    /// <summary>Most bytes of one upload, all its files together.</summary>
    public long MostUploadBytes { get; init; } = 2L << 30;

    /// <summary>Most files of one upload.</summary>
    public int MostUploadFiles { get; init; } = 500;

    /// <summary>Bytes of samples and results that are kept in memory for all pages together.</summary>
    public long CacheBytes { get; init; } = 256L << 20;

    /// <summary>How long deleted studies, removed cruises and their files are kept before they are gone for good.</summary>
    public TimeSpan KeepDeleted { get; init; } = TimeSpan.FromDays(30);

    /// <summary>How long an upload waits that no cruise was read from.</summary>
    public TimeSpan KeepUnusedUploads { get; init; } = TimeSpan.FromDays(2);

    /// <summary>Samples in one piece of a run's work; small enough that the work of others and a cancellation wait 50 ms at most.</summary>
    public int ChunkRows { get; init; } = 8_192;

    /// <summary>Most threads at work on one piece.</summary>
    public int Threads { get; init; } = Environment.ProcessorCount;
}
