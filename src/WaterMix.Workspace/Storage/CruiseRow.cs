namespace WaterMix.Workspace.Storage;

/// <summary>A cruise of a study as it is stored; its samples are a column file.</summary>
internal sealed class CruiseRow
{
    public Guid Id { get; set; }

    public Guid StudyId { get; set; }

    /// <summary>Its place in the order of rows.</summary>
    public int Position { get; set; }

    public required string Name { get; set; }

    public required string SamplesHash { get; set; }

    public long SampleCount { get; set; }

    public Guid Upload { get; set; }

    /// <summary>The import report as JSON.</summary>
    public required string Report { get; set; }

    /// <summary>How it was read, as JSON, so that it can be read again.</summary>
    public required string Reading { get; set; }

    /// <summary>The samples as read with the other instrument preferred, or null until a model asks for it.</summary>
    public string? OtherSamplesHash { get; set; }

    /// <summary>Measurement errors of its own as JSON, or null.</summary>
    public string? MeasurementSd { get; set; }

    /// <summary>When it was removed, or null.</summary>
    public DateTimeOffset? Removed { get; set; }
}
