namespace WaterMix.Core.Mixing.Kernels;

/// <summary>
/// QR of a few short columns by Householder reflections, in the order given and without pivoting. A column that depends on the ones
/// before it, |R_kk| &lt;= 1e-12 |a_k|, is passed over: the columns kept are the maximal independent set in that order.
/// </summary>
/// <remarks><c>GolubVanLoan2013</c>, sections 5.1 and 5.2. Not thread-safe: it owns its work arrays.</remarks>
internal sealed class OrderedQr
{
    /// <summary>A column whose part outside the span of the earlier ones is no larger than this share of it counts as dependent.</summary>
    public const double DependenceTolerance = 1e-12;

    private double[] _columns = [];
    private double[] _rightHandSide = [];
    private int[] _pivotRow = [];
    private int _rows;
    private int _count;

    /// <summary>Number of columns found independent.</summary>
    public int Rank { get; private set; }

    /// <summary>Starts a system of this shape; fill <see cref="Column"/> and <see cref="RightHandSide"/>, then <see cref="Factor"/>.</summary>
    public void Reshape(int rows, int count)
    {
        if (_columns.Length < rows * count)
        {
            _columns = new double[rows * count];
        }

        if (_rightHandSide.Length < rows)
        {
            _rightHandSide = new double[rows];
        }

        if (_pivotRow.Length < count)
        {
            _pivotRow = new int[count];
        }

        (_rows, _count) = (rows, count);
    }

    /// <summary>The rows of one column.</summary>
    public Span<double> Column(int k) => _columns.AsSpan(k * _rows, _rows);

    /// <summary>The right-hand side.</summary>
    public Span<double> RightHandSide => _rightHandSide.AsSpan(0, _rows);

    /// <summary>True where column k was found independent of the ones before it.</summary>
    public bool IsIndependent(int k) => _pivotRow[k] >= 0;

    /// <summary>Reduces the columns to upper triangular form and the right-hand side to Q'b.</summary>
    public void Factor()
    {
        int row = 0;
        for (int k = 0; k < _count; k++)
        {
            Span<double> column = Column(k);
            Span<double> below = column[row..];
            double length = Vectors.Norm(column);
            double rest = Vectors.Norm(below);
            if (row == _rows || rest <= DependenceTolerance * length)
            {
                _pivotRow[k] = -1;
                continue;
            }

            _pivotRow[k] = row;

            // v = a + sign(a_1) |a| e_1, scaled to v_1 = 1; H = I - tau v v'. R_kk = -sign(a_1) |a|.
            double diagonal = below[0] > 0 ? -rest : rest;
            double head = below[0] - diagonal;
            double tau = -head / diagonal;
            for (int i = 1; i < below.Length; i++)
            {
                below[i] /= head;
            }

            below[0] = diagonal;
            for (int j = k + 1; j < _count; j++)
            {
                Reflect(below, tau, Column(j)[row..]);
            }

            Reflect(below, tau, RightHandSide[row..]);
            row++;
        }

        Rank = row;
    }

    /// <summary>Back-substitution: the least-squares coefficients, zero for dependent columns.</summary>
    /// <param name="coefficients">Length count.</param>
    public void Solve(Span<double> coefficients)
    {
        Span<double> rest = RightHandSide;
        for (int k = _count - 1; k >= 0; k--)
        {
            int row = _pivotRow[k];
            if (row < 0)
            {
                coefficients[k] = 0;
                continue;
            }

            Span<double> column = Column(k);
            double value = rest[row] / column[row];
            coefficients[k] = value;
            Vectors.AddScaled(-value, column[..row], rest[..row]);
        }
    }

    // target -= tau v (v' target), where v is 1 followed by the stored tail of the reflector.
    private static void Reflect(ReadOnlySpan<double> reflector, double tau, Span<double> target)
    {
        double product = target[0] + Vectors.Dot(reflector[1..], target[1..]);
        double factor = -tau * product;
        target[0] += factor;
        Vectors.AddScaled(factor, reflector[1..], target[1..]);
    }
}
