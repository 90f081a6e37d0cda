namespace WaterMix.Core.Mixing.Kernels;

/// <summary>What a kernel says of one sample.</summary>
public enum KernelOutcome
{
    /// <summary>The answer is optimal: no permitted change of an unknown lowers the misfit.</summary>
    Optimal,

    /// <summary>The limit of iterations was reached; the last feasible point is given.</summary>
    IterationLimit,
}

/// <summary>Solves whitened mixing systems. One system serves any number of samples that share its columns.</summary>
public interface IMixingKernel
{
    /// <summary>Minimises |b - A z| for each sample, within the bounds and the mass condition of the system.</summary>
    /// <param name="system">The columns and bounds; unknowns that are not independent stay at zero.</param>
    /// <param name="rightHandSides">Length samples x rows: b of each sample, one after the other.</param>
    /// <param name="solutions">
    /// Length samples x unknowns. On entry a feasible start for each sample (bounds and mass met); on return the answers.
    /// </param>
    /// <param name="outcomes">Length samples.</param>
    void Solve(MixingSystem system, ReadOnlySpan<double> rightHandSides, Span<double> solutions, Span<KernelOutcome> outcomes);
}
