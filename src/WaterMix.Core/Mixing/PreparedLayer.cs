namespace WaterMix.Core.Mixing;

/// <summary>A layer made ready for fitting: the permitted end-members in the tracers' space.</summary>
internal sealed class PreparedLayer
{
    /// <summary>The layer's id.</summary>
    public required string Id { get; init; }

    /// <summary>The conditions that a sample of the layer meets.</summary>
    public required IReadOnlyList<Condition> Where { get; init; }

    /// <summary>The permitted end-members, as indices into the set, in the set's order.</summary>
    public required int[] Permitted { get; init; }

    /// <summary>Tracer values G, one array of all tracers per permitted end-member.</summary>
    public required double[][] Values { get; init; }

    /// <summary>Spread V_i, one symmetric matrix (tracers x tracers, row by row) per permitted end-member.</summary>
    public required double[][] Spreads { get; init; }

    /// <summary>The factor of each tracer's row under weighted rows; 0 where the tracer says nothing in this layer and is left out. Empty otherwise.</summary>
    public required double[] RowFactors { get; init; }

    /// <summary>What is subtracted from each tracer before weighing under weighted rows. Empty otherwise.</summary>
    public required double[] Means { get; init; }

    /// <summary>True where this tracer is a row of the fit in this layer.</summary>
    /// <param name="tracer">Index of the tracer.</param>
    public bool Uses(int tracer) => RowFactors.Length == 0 || RowFactors[tracer] > 0;
}
