namespace WaterMix.Workspace.Storage;

/// <summary>A cruise as a run took it: what happens to the cruise later does not change the run.</summary>
internal sealed class RunCruiseRow
{
    public Guid RunId { get; set; }

    /// <summary>Its place in the run, from 0.</summary>
    public int Position { get; set; }

    public Guid CruiseId { get; set; }

    public required string Name { get; set; }

    public required string SamplesHash { get; set; }

    public long SampleCount { get; set; }

    /// <summary>Measurement errors of its own as JSON, or null.</summary>
    public string? MeasurementSd { get; set; }
}
