namespace WaterMix.Core.Mixing.Kernels;

/// <summary>
/// One whitened system of a mixing fit: minimise |b - A z| with z >= 0 where a bound stands, and, with exact mass conservation,
/// the fractions summing to one. The first <see cref="Fractions"/> columns are end-members, the others processes.
/// </summary>
/// <remarks>
/// With exact mass conservation the end-member columns and b are given relative to one common origin (any: the fractions sum to one),
/// which keeps the large common part of the tracers out of the arithmetic: the centred form.
/// </remarks>
public sealed class MixingSystem
{
    private double[] _columns = [];

    /// <summary>Number of rows: tracers, and the mass row where mass is weighted.</summary>
    public int Rows { get; private set; }

    /// <summary>Number of end-member columns, at least 1.</summary>
    public int Fractions { get; private set; }

    /// <summary>Number of process columns.</summary>
    public int Amounts { get; private set; }

    /// <summary>True where the fractions sum to one exactly.</summary>
    public bool ExactMass { get; private set; }

    /// <summary>Number of columns.</summary>
    public int Unknowns => Fractions + Amounts;

    /// <summary>Per column: true where the unknown may have either sign. A column of a non-positive process is entered negated.</summary>
    public bool[] IsFree { get; private set; } = [];

    /// <summary>Per column: false where it is numerically dependent on the ones before it and is held at zero.</summary>
    public bool[] IsIndependent { get; private set; } = [];

    /// <summary>The rows of one column, to read or to fill.</summary>
    /// <param name="column">Index of the column, end-members first.</param>
    public Span<double> Column(int column) => _columns.AsSpan(column * Rows, Rows);

    /// <summary>Sets the shape; the columns are to be filled, every unknown is bounded below by zero and independent.</summary>
    /// <param name="rows">Number of rows, at least 1.</param>
    /// <param name="fractions">Number of end-members, at least 1.</param>
    /// <param name="amounts">Number of processes.</param>
    /// <param name="exactMass">Whether the fractions sum to one exactly.</param>
    public void Reshape(int rows, int fractions, int amounts, bool exactMass)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(rows, 1);
        ArgumentOutOfRangeException.ThrowIfLessThan(fractions, 1);
        ArgumentOutOfRangeException.ThrowIfLessThan(amounts, 0);
        int unknowns = fractions + amounts;
        if (_columns.Length < rows * unknowns)
        {
            _columns = new double[rows * unknowns];
        }

        if (IsFree.Length < unknowns)
        {
            IsFree = new bool[unknowns];
            IsIndependent = new bool[unknowns];
        }

        (Rows, Fractions, Amounts, ExactMass) = (rows, fractions, amounts, exactMass);
        IsFree.AsSpan().Clear();
        IsIndependent.AsSpan().Fill(true);
    }
}
