namespace WaterMix.Core.EndMembers;

/// <summary>A symmetric matrix over named tracers: a covariance or a correlation.</summary>
/// <param name="Tracers">Quantity ids, one per row and column.</param>
/// <param name="Matrix">Rows of the matrix, each as long as <paramref name="Tracers"/>.</param>
public sealed record TracerMatrix(IReadOnlyList<string> Tracers, IReadOnlyList<IReadOnlyList<double>> Matrix)
{
    /// <summary>True where the other holds the same content.</summary>
    /// <param name="other">Another one, or null.</param>
    public bool Equals(TracerMatrix? other) =>
        other is not null
        && Structural.Same(Tracers, other.Tracers)
        && Matrix.Count == other.Matrix.Count
        && Matrix.Zip(other.Matrix).All(rows => Structural.Same(rows.First, rows.Second));

    /// <inheritdoc/>
    public override int GetHashCode() => Structural.Hash(Tracers);
}
