namespace WaterMix.Workspace.Storage;

/// <summary>A piece of a run's work: some rows of one cruise. Its result is a column file; doing it twice gives the same bytes.</summary>
internal sealed class ChunkRow
{
    public Guid RunId { get; set; }

    /// <summary>Its place among the run's chunks, from 0.</summary>
    public int Number { get; set; }

    /// <summary>The cruise's place in the run.</summary>
    public int Cruise { get; set; }

    /// <summary>Index of its first row in the cruise.</summary>
    public int FirstRow { get; set; }

    public int RowCount { get; set; }

    public bool IsDone { get; set; }

    /// <summary>For each parent quantity of the tracers, the samples with a usable value, with spaces between; empty until it is done.</summary>
    public string Usable { get; set; } = "";
}
