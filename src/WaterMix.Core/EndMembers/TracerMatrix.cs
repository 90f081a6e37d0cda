namespace WaterMix.Core.EndMembers;

/// <summary>A symmetric matrix over named tracers: a covariance or a correlation.</summary>
/// <param name="Tracers">Quantity ids, one per row and column.</param>
/// <param name="Matrix">Rows of the matrix, each as long as <paramref name="Tracers"/>.</param>
public sealed record TracerMatrix(IReadOnlyList<string> Tracers, IReadOnlyList<IReadOnlyList<double>> Matrix);
