using WaterMix.Workspace.Runs;

namespace WaterMix.Workspace.Storage;

/// <summary>A run as it is stored; its results are column files.</summary>
internal sealed class RunRow
{
    public Guid Id { get; set; }

    public Guid StudyId { get; set; }

    public required string Name { get; set; }

    public DateTimeOffset Started { get; set; }

    public RunState State { get; set; }

    /// <summary>Samples solved so far.</summary>
    public long Done { get; set; }

    public long Total { get; set; }

    /// <summary>The model as it was, as JSON with its set inline.</summary>
    public required string Model { get; set; }

    public required string ModelHash { get; set; }

    /// <summary>Number of samples by status as JSON, or null until it is finished.</summary>
    public string? Statuses { get; set; }

    public string? Problem { get; set; }

    /// <summary>The folder of its results; a copied study's runs share their originals' folders.</summary>
    public Guid Folder { get; set; }

    public List<RunCruiseRow> Cruises { get; set; } = [];

    public List<ChunkRow> Chunks { get; set; } = [];
}
