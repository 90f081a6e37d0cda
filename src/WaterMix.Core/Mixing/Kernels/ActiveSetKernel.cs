namespace WaterMix.Core.Mixing.Kernels;

/// <summary>
/// The scalar kernel: one sample at a time, a primal active set on QR that always ends. It is the answer that faster kernels are held against.
/// </summary>
/// <remarks>
/// <para><c>LawsonHanson1974</c>, chapter 23 (NNLS), generalised to a sum condition and to unknowns without a bound.</para>
/// <para>
/// The passive set P holds the unknowns that are not at their bound. The largest fraction in P is the reference r, x_r = 1 + e - sum of the others,
/// where e is the excess of the sum over one: zero with exact mass conservation, otherwise an unknown with the column a_r. The other fractions' columns
/// become a_j - a_r. So with exact mass the least-squares problem on P has no condition left, and with a mass row, however heavy, that row is in one column
/// only and drowns nothing. No normal equations are formed. A feasible point moves towards that solution until a bound stops it; then the bounded unknown with the
/// steepest gradient enters.
/// </para>
/// <para>
/// Why it ends: each change of P that is kept lowers the computed misfit, which depends on P alone, so no P is visited twice. An entry that
/// does not lower it is undone, and is not tried again until another one has. Not thread-safe: it owns its work arrays.
/// </para>
/// </remarks>
public sealed class ActiveSetKernel : IMixingKernel
{
    // Half a unit in the last place. A larger tolerance on the gradient accepted wrong sets where the condition number reached 1e7.
    private const double DualTolerance = 2.3e-16;

    private readonly OrderedQr _qr = new();
    private bool[] _passive = [];
    private bool[] _savedPassive = [];
    private bool[] _blocked = [];
    private double[] _target = [];
    private double[] _saved = [];
    private double[] _coefficients = [];
    private double[] _residual = [];
    private double[] _gap = [];
    private double _excess;
    private double _targetExcess;

    /// <inheritdoc/>
    public void Solve(MixingSystem system, ReadOnlySpan<double> rightHandSides, Span<double> solutions, Span<KernelOutcome> outcomes)
    {
        ArgumentNullException.ThrowIfNull(system);
        int samples = outcomes.Length;
        if (rightHandSides.Length != samples * system.Rows || solutions.Length != samples * system.Unknowns)
        {
            throw new ArgumentException(
                $"{samples} samples of {system.Rows} rows and {system.Unknowns} unknowns need {samples * system.Rows} and {samples * system.Unknowns} numbers, but there are {rightHandSides.Length} and {solutions.Length}.");
        }

        Reserve(system);
        for (int s = 0; s < samples; s++)
        {
            outcomes[s] = SolveOne(
                system,
                rightHandSides.Slice(s * system.Rows, system.Rows),
                solutions.Slice(s * system.Unknowns, system.Unknowns));
        }
    }

    private KernelOutcome SolveOne(MixingSystem system, ReadOnlySpan<double> b, Span<double> x)
    {
        int unknowns = system.Unknowns;
        for (int j = 0; j < unknowns; j++)
        {
            _passive[j] = system.IsIndependent[j] && (j >= system.Fractions || x[j] > 0);
            _blocked[j] = false;
        }

        LeastSquaresOnPassiveSet(system, b, x);
        MoveToTarget(system, b, x);
        double misfit = Residual(system, b, x);

        for (int step = 0; step < 50 + (20 * unknowns); step++)
        {
            int entering = SteepestBounded(system, b, x);
            if (entering < 0)
            {
                return KernelOutcome.Optimal;
            }

            x.CopyTo(_saved);
            _passive.CopyTo(_savedPassive.AsSpan());
            double savedExcess = _excess;
            _passive[entering] = true;
            LeastSquaresOnPassiveSet(system, b, x);
            bool lower = false;
            if (_target[entering] > 0)
            {
                MoveToTarget(system, b, x);
                double next = Residual(system, b, x);
                lower = next < misfit;
                misfit = lower ? next : misfit;
            }

            if (lower)
            {
                _blocked.AsSpan(0, unknowns).Clear();
            }
            else
            {
                _saved.AsSpan(0, unknowns).CopyTo(x);
                _savedPassive.CopyTo(_passive.AsSpan());
                _excess = savedExcess;
                _blocked[entering] = true;
                Residual(system, b, x);
            }
        }

        return KernelOutcome.IterationLimit;
    }

    // The unconstrained minimum with the unknowns outside P at zero, into _target and _targetExcess.
    private void LeastSquaresOnPassiveSet(MixingSystem system, ReadOnlySpan<double> b, ReadOnlySpan<double> x)
    {
        int unknowns = system.Unknowns;
        int reference = Reference(system, x);
        bool hasExcess = reference >= 0 && !system.ExactMass;
        int count = hasExcess ? 1 : 0;
        for (int j = 0; j < unknowns; j++)
        {
            count += _passive[j] && j != reference ? 1 : 0;
        }

        _qr.Reshape(system.Rows, count);
        FromReference(system, b, reference, _qr.RightHandSide);
        int k = 0;
        for (int j = 0; j < unknowns; j++)
        {
            if (_passive[j] && j != reference)
            {
                FromReference(system, system.Column(j), j < system.Fractions ? reference : -1, _qr.Column(k++));
            }
        }

        if (hasExcess)
        {
            system.Column(reference).CopyTo(_qr.Column(k));
        }

        _qr.Factor();
        _qr.Solve(_coefficients.AsSpan(0, count));

        _targetExcess = hasExcess ? _coefficients[k] : 0;
        k = 0;
        double rest = 1 + _targetExcess;
        for (int j = 0; j < unknowns; j++)
        {
            _target[j] = _passive[j] && j != reference ? _coefficients[k++] : 0;
            rest -= j < system.Fractions ? _target[j] : 0;
        }

        if (reference >= 0)
        {
            _target[reference] = rest;
        }
    }

    // From x towards _target; where a bound is met, that unknown leaves P and the target is found anew. Ends with x at the minimum on P.
    private void MoveToTarget(MixingSystem system, ReadOnlySpan<double> b, Span<double> x)
    {
        while (true)
        {
            double step = 1;
            int blocking = -1;
            for (int j = 0; j < x.Length; j++)
            {
                if (_passive[j] && !system.IsFree[j] && !(_target[j] > 0))
                {
                    double share = x[j] > 0 ? x[j] / (x[j] - _target[j]) : 0;
                    if (blocking < 0 || share < step)
                    {
                        step = share;
                        blocking = j;
                    }
                }
            }

            if (blocking < 0)
            {
                _target.AsSpan(0, x.Length).CopyTo(x);
                _excess = _targetExcess;
                return;
            }

            for (int j = 0; j < x.Length; j++)
            {
                x[j] = Math.FusedMultiplyAdd(step, _target[j] - x[j], x[j]);
                if (j == blocking || (_passive[j] && !system.IsFree[j] && !(x[j] > 0) && !(_target[j] > 0)))
                {
                    x[j] = 0;
                    _passive[j] = false;
                }
            }

            LeastSquaresOnPassiveSet(system, b, x);
        }
    }

    // Fills _residual = b - A x and returns its squared length; everything is taken relative to the reference, which keeps a heavy mass row exact.
    private double Residual(MixingSystem system, ReadOnlySpan<double> b, ReadOnlySpan<double> x)
    {
        int reference = Reference(system, x);
        Span<double> residual = _residual.AsSpan(0, system.Rows);
        Span<double> column = _gap.AsSpan(0, system.Rows);
        FromReference(system, b, reference, residual);
        for (int j = 0; j < x.Length; j++)
        {
            if (x[j] != 0 && j != reference)
            {
                FromReference(system, system.Column(j), j < system.Fractions ? reference : -1, column);
                Vectors.AddScaled(-x[j], column, residual);
            }
        }

        if (reference >= 0 && _excess != 0)
        {
            Vectors.AddScaled(-_excess, system.Column(reference), residual);
        }

        return Vectors.Dot(residual, residual);
    }

    // The unknown at its bound whose entry lowers the misfit fastest per length of its column, or -1 where none does.
    private int SteepestBounded(MixingSystem system, ReadOnlySpan<double> b, ReadOnlySpan<double> x)
    {
        int reference = Reference(system, x);
        ReadOnlySpan<double> residual = _residual.AsSpan(0, system.Rows);
        Span<double> gap = _gap.AsSpan(0, system.Rows);
        FromReference(system, b, reference, gap);
        double scale = Vectors.Norm(gap);
        int steepest = -1;
        double most = 0;
        for (int j = 0; j < x.Length; j++)
        {
            if (_passive[j] || _blocked[j] || !system.IsIndependent[j])
            {
                continue;
            }

            FromReference(system, system.Column(j), j < system.Fractions ? reference : -1, gap);
            double length = Vectors.Norm(gap);
            double slope = Vectors.Dot(gap, residual) / length;
            if (slope > DualTolerance * scale && slope > most)
            {
                steepest = j;
                most = slope;
            }
        }

        return steepest;
    }

    // values - a_r, or values where there is no reference.
    private static void FromReference(MixingSystem system, ReadOnlySpan<double> values, int reference, Span<double> difference)
    {
        values.CopyTo(difference);
        if (reference >= 0)
        {
            Vectors.AddScaled(-1, system.Column(reference), difference);
        }
    }

    // The largest fraction of P, or -1 where none is in it.
    private int Reference(MixingSystem system, ReadOnlySpan<double> x)
    {
        int largest = -1;
        for (int j = 0; j < system.Fractions; j++)
        {
            if (_passive[j] && (largest < 0 || x[j] > x[largest]))
            {
                largest = j;
            }
        }

        return largest;
    }

    private void Reserve(MixingSystem system)
    {
        int unknowns = system.Unknowns;
        if (_passive.Length < unknowns)
        {
            _passive = new bool[unknowns];
            _savedPassive = new bool[unknowns];
            _blocked = new bool[unknowns];
            _target = new double[unknowns];
            _saved = new double[unknowns];
            _coefficients = new double[unknowns];
        }

        if (_residual.Length < system.Rows)
        {
            _residual = new double[system.Rows];
            _gap = new double[system.Rows];
        }
    }
}
