namespace WaterMix.Core.Mixing.Kernels;

/// <summary>
/// The scalar kernel: one sample at a time, a primal active set on QR that always ends. It is the answer that faster kernels are held against.
/// </summary>
/// <remarks>
/// <para><c>LawsonHanson1974</c>, chapter 23 (NNLS), generalised to a sum condition and to unknowns without a bound.</para>
/// <para>
/// The passive set P holds the unknowns that are not at their bound. With exact mass conservation the largest fraction in P is the reference r,
/// x_r = 1 - sum of the others, and the columns become a_j - a_r: the least-squares problem on P has no condition left, and no normal
/// equations are formed. A feasible point moves towards that solution until a bound stops it; then the bounded unknown with the steepest gradient enters.
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
                _blocked[entering] = true;
                Residual(system, b, x);
            }
        }

        return KernelOutcome.IterationLimit;
    }

    // The unconstrained minimum with the unknowns outside P at zero, into _target.
    private void LeastSquaresOnPassiveSet(MixingSystem system, ReadOnlySpan<double> b, ReadOnlySpan<double> x)
    {
        int unknowns = system.Unknowns;
        int reference = system.ExactMass ? Reference(system, x) : -1;
        int count = 0;
        for (int j = 0; j < unknowns; j++)
        {
            count += _passive[j] && j != reference ? 1 : 0;
        }

        _qr.Reshape(system.Rows, count);
        b.CopyTo(_qr.RightHandSide);
        if (reference >= 0)
        {
            Vectors.AddScaled(-1, system.Column(reference), _qr.RightHandSide);
        }

        int k = 0;
        for (int j = 0; j < unknowns; j++)
        {
            if (_passive[j] && j != reference)
            {
                Span<double> column = _qr.Column(k++);
                system.Column(j).CopyTo(column);
                if (reference >= 0 && j < system.Fractions)
                {
                    Vectors.AddScaled(-1, system.Column(reference), column);
                }
            }
        }

        _qr.Factor();
        _qr.Solve(_coefficients.AsSpan(0, count));

        k = 0;
        double rest = 1;
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

    // Fills _residual = b - A x and returns its squared length. With exact mass every column is taken relative to the reference.
    private double Residual(MixingSystem system, ReadOnlySpan<double> b, ReadOnlySpan<double> x)
    {
        Span<double> residual = _residual.AsSpan(0, system.Rows);
        b.CopyTo(residual);
        for (int j = 0; j < x.Length; j++)
        {
            if (x[j] != 0)
            {
                Vectors.AddScaled(-x[j], system.Column(j), residual);
            }
        }

        return Vectors.Dot(residual, residual);
    }

    // The unknown at its bound whose entry lowers the misfit fastest per length of its column, or -1 where none does.
    private int SteepestBounded(MixingSystem system, ReadOnlySpan<double> b, ReadOnlySpan<double> x)
    {
        int reference = system.ExactMass ? Reference(system, x) : -1;
        ReadOnlySpan<double> residual = _residual.AsSpan(0, system.Rows);
        Span<double> gap = _gap.AsSpan(0, system.Rows);
        b.CopyTo(gap);
        if (reference >= 0)
        {
            Vectors.AddScaled(-1, system.Column(reference), gap);
        }

        double scale = Vectors.Norm(gap);
        int steepest = -1;
        double most = 0;
        for (int j = 0; j < x.Length; j++)
        {
            if (_passive[j] || _blocked[j] || !system.IsIndependent[j])
            {
                continue;
            }

            system.Column(j).CopyTo(gap);
            if (reference >= 0 && j < system.Fractions)
            {
                Vectors.AddScaled(-1, system.Column(reference), gap);
            }

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

    // The largest fraction of P: never zero, so it cannot be the next to leave by rounding.
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
