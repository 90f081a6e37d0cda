namespace WaterMix.Core.Mixing.Kernels;

/// <summary>Finds which unknowns a system can tell apart.</summary>
/// <remarks>Not thread-safe: it owns its work arrays.</remarks>
internal sealed class IndependentColumns
{
    private readonly OrderedQr _qr = new();

    /// <summary>
    /// Marks the columns that depend numerically on the ones before them: the end-members relative to the first, then the processes,
    /// over the tracer rows. The mass row cannot tell apart what only differs in the tracers, so it does not count.
    /// </summary>
    /// <param name="system">The whitened system; its <see cref="MixingSystem.IsIndependent"/> is set.</param>
    /// <param name="tracerRows">Number of tracer rows, which come first.</param>
    /// <returns>True where every column is independent.</returns>
    public bool Mark(MixingSystem system, int tracerRows)
    {
        _qr.Reshape(tracerRows, system.Unknowns - 1);
        ReadOnlySpan<double> first = system.Column(0)[..tracerRows];
        for (int j = 1; j < system.Unknowns; j++)
        {
            Span<double> column = _qr.Column(j - 1);
            system.Column(j)[..tracerRows].CopyTo(column);
            if (j < system.Fractions)
            {
                Vectors.AddScaled(-1, first, column);
            }
        }

        _qr.RightHandSide.Clear();
        _qr.Factor();
        for (int j = 1; j < system.Unknowns; j++)
        {
            system.IsIndependent[j] = _qr.IsIndependent(j - 1);
        }

        return _qr.Rank == system.Unknowns - 1;
    }
}
