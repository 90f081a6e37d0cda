namespace WaterMix.Workspace.Storage;

/// <summary>A study as it is stored.</summary>
internal sealed class StudyRow
{
    public Guid Id { get; set; }

    public required string Name { get; set; }

    public DateTimeOffset Created { get; set; }

    public DateTimeOffset LastChange { get; set; }

    /// <summary>When it was deleted, or null.</summary>
    public DateTimeOffset? Deleted { get; set; }

    /// <summary>The model being edited, as JSON with its set inline.</summary>
    public required string Draft { get; set; }

    public long Revision { get; set; }

    public List<CruiseRow> Cruises { get; set; } = [];

    public List<RunRow> Runs { get; set; } = [];
}
