using WaterMix.Core.Mixing.Kernels;

namespace WaterMix.Core.Mixing;

/// <summary>
/// Fits one sample after another: assembles the whitened system from the usable tracers, hands it to the kernel, and reads the answer back.
/// The last sample's answer stands in the properties. Owns its work arrays: one fitter per thread.
/// </summary>
internal sealed partial class SampleFitter
{
    private const double SettledChange = 1e-9;
    private const int MostIterations = 50;

    private readonly PreparedModel _model;
    private readonly GeneralisedLeastSquares? _leastSquares;
    private readonly IMixingKernel _kernel;
    private readonly IndependentColumns _independent = new();
    private readonly OptimalityProof _proof = new();
    private readonly MixingSystem _system = new();
    private readonly Covariance _covariance = new();
    private readonly KernelOutcome[] _outcome = new KernelOutcome[1];
    private readonly int[] _rows;
    private readonly int[] _processes;
    private readonly double[] _observed;
    private readonly double[] _parents;
    private readonly double[] _fractions;
    private readonly double[] _amounts;
    private readonly double[] _residuals;
    private readonly double[] _unknowns;
    private readonly double[] _rightHandSide;
    private readonly double[] _whitened;
    private readonly bool[] _dependent;
    private PreparedLayer _layer;
    private int _rowCount;
    private int _processCount;

    /// <summary>A fitter for this model.</summary>
    public SampleFitter(PreparedModel model, IMixingKernel kernel)
    {
        _model = model;
        _kernel = kernel;
        _leastSquares = model.Model.Fit as GeneralisedLeastSquares;
        _layer = model.Layers[0];
        int tracers = model.Model.Tracers.Count;
        int members = model.Model.EndMembers.EndMembers.Count;
        int processes = model.Model.Processes.Count;
        _rows = new int[tracers];
        _observed = new double[tracers];
        _residuals = new double[tracers];
        _parents = new double[model.Transform.Parents.Count];
        _processes = new int[processes];
        _amounts = new double[processes];
        _fractions = new double[members];
        _unknowns = new double[members + processes];
        _dependent = new bool[members + processes];
        _rightHandSide = new double[tracers + 1];
        _whitened = new double[tracers];
    }

    /// <summary>What became of the sample: too few tracers, not unique, not converged or solved.</summary>
    public SolveStatus Status { get; private set; }

    /// <summary>Number of tracers used.</summary>
    public int TracerCount => _rowCount;

    /// <summary>Number of unknowns that must be determined: permitted end-members - 1 + processes in force.</summary>
    public int UnknownCount { get; private set; }

    /// <summary>Fractions of the layer's permitted end-members, in their order.</summary>
    public ReadOnlySpan<double> Fractions => _fractions.AsSpan(0, _layer.Permitted.Length);

    /// <summary>Amounts, one per process of the model; NaN where the process is off.</summary>
    public ReadOnlySpan<double> Amounts => _amounts;

    /// <summary>Observed minus fitted, one per tracer of the model, in the tracer's unit; NaN where the tracer is not used.</summary>
    public ReadOnlySpan<double> Residuals => _residuals;

    /// <summary>Sum of the fractions.</summary>
    public double FractionSum { get; private set; }

    /// <summary>Square root of the minimum of what was minimised.</summary>
    public double Misfit { get; private set; }

    /// <summary>Residuals against their covariance; NaN where no covariance is known.</summary>
    public double Chi2 { get; private set; }

    /// <summary>Degrees of freedom on the active set.</summary>
    public int DegreesOfFreedom { get; private set; }

    /// <summary>The largest change of a fraction in the last iteration; 0 where nothing is iterated.</summary>
    public double LastChange { get; private set; }

    /// <summary>The proof's violation, recomputed from the whitened rows of the last system solved.</summary>
    public double KktViolation { get; private set; }

    /// <summary>True where this unknown (end-members of the layer first, then processes in force) depends on the ones before it.</summary>
    /// <param name="unknown">Index of the unknown.</param>
    public bool IsDependent(int unknown) => _dependent[unknown];

    /// <summary>The process of one of the process unknowns.</summary>
    /// <param name="amount">Index among the processes in force.</param>
    public int ProcessOf(int amount) => _processes[amount];

    /// <summary>Number of processes in force.</summary>
    public int ProcessCount => _processCount;

    /// <summary>Fits one sample.</summary>
    /// <param name="layer">The layer that the sample belongs to.</param>
    /// <param name="parents">One usable value per parent quantity, NaN where missing.</param>
    /// <param name="inMask">Per process: whether its conditions hold for the sample.</param>
    public void Fit(PreparedLayer layer, ReadOnlySpan<double> parents, ReadOnlySpan<bool> inMask)
    {
        _layer = layer;
        parents.CopyTo(_parents);
        SelectRowsAndProcesses(inMask);
        int members = layer.Permitted.Length;
        UnknownCount = members - 1 + _processCount;
        _residuals.AsSpan().Fill(double.NaN);
        _amounts.AsSpan().Fill(double.NaN);
        KktViolation = double.NaN;
        LastChange = 0;
        if (_rowCount < Math.Max(UnknownCount, 1))
        {
            Status = SolveStatus.TooFewTracers;
            return;
        }

        _fractions.AsSpan(0, members).Fill(1.0 / members);
        if (_leastSquares is not null && !FactorCovariance())
        {
            // No weighing, so no answer: the errors given span more orders of magnitude than a double holds.
            Status = SolveStatus.NotConverged;
            _fractions.AsSpan(0, members).Fill(double.NaN);
            (FractionSum, Misfit, Chi2, DegreesOfFreedom) = (double.NaN, double.NaN, double.NaN, -1);
            return;
        }

        Status = _leastSquares is null ? SolveWeightedRows() : SolveLeastSquares(_leastSquares.Spread);
        ReadBack();
    }

    private MassConservation Mass => _model.Model.Mass;

    private int TracerTotal => _observed.Length;

    private Span<double> Unknowns => _unknowns.AsSpan(0, _system.Unknowns);

    private Span<double> RightHandSide => _rightHandSide.AsSpan(0, _system.Rows);

    private void SelectRowsAndProcesses(ReadOnlySpan<bool> inMask)
    {
        _rowCount = 0;
        for (int t = 0; t < TracerTotal; t++)
        {
            _observed[t] = _model.Transform.Value(t, _parents);
            if (!double.IsNaN(_observed[t]) && _layer.Uses(t))
            {
                _rows[_rowCount++] = t;
            }
        }

        _processCount = 0;
        for (int k = 0; k < inMask.Length; k++)
        {
            bool acts = false;
            foreach (int t in _rows.AsSpan(0, _rowCount))
            {
                acts |= _model.ProcessColumns[k][t] != 0;
            }

            if (inMask[k] && acts)
            {
                _processes[_processCount++] = k;
            }
        }
    }

    private SolveStatus SolveWeightedRows()
    {
        Assemble();
        for (int j = 0; j < _system.Unknowns; j++)
        {
            ScaleByRowFactors(_system.Column(j));
        }

        ScaleByRowFactors(RightHandSide);
        bool unique = MarkDependent();
        bool optimal = RunKernel();
        return !unique ? SolveStatus.NotUnique : optimal ? SolveStatus.Solved : SolveStatus.NotConverged;
    }

    private SolveStatus SolveLeastSquares(EndMemberSpread spread)
    {
        bool unique = true;
        bool settled = false;
        bool optimal = true;
        int iterations = spread == EndMemberSpread.Iterated ? MostIterations : 1;
        for (int k = 0; k < iterations && !settled; k++)
        {
            Assemble();
            for (int j = 0; j < _system.Unknowns; j++)
            {
                _covariance.Whiten(_system.Column(j)[.._rowCount]);
            }

            _covariance.Whiten(RightHandSide[.._rowCount]);
            if (k == 0)
            {
                unique = MarkDependent();
            }
            else
            {
                RestoreDependent();
            }

            optimal = RunKernel();
            LastChange = spread == EndMemberSpread.Iterated ? TakeFractions() : 0;
            settled = LastChange < SettledChange;
            if (spread == EndMemberSpread.Iterated && !FactorCovariance())
            {
                optimal = false;
                break;
            }
        }

        return !unique ? SolveStatus.NotUnique : settled && optimal ? SolveStatus.Solved : SolveStatus.NotConverged;
    }

    private ProcessSign Sign(int amount) => _model.Model.Processes[_processes[amount]].Sign;

    private void ScaleByRowFactors(Span<double> rows)
    {
        for (int r = 0; r < _rowCount; r++)
        {
            rows[r] *= _layer.RowFactors[_rows[r]];
        }
    }

    private bool MarkDependent()
    {
        bool unique = _independent.Mark(_system, _rowCount);
        for (int j = 0; j < _system.Unknowns; j++)
        {
            _dependent[j] = !_system.IsIndependent[j];
        }

        SpreadOverIndependent();
        return unique;
    }

    private void RestoreDependent()
    {
        for (int j = 0; j < _system.Unknowns; j++)
        {
            _system.IsIndependent[j] = !_dependent[j];
        }
    }

    // A feasible start: equal shares of the end-members that can be told apart, no process.
    private void SpreadOverIndependent()
    {
        int count = 0;
        for (int i = 0; i < _system.Fractions; i++)
        {
            count += _system.IsIndependent[i] ? 1 : 0;
        }

        for (int j = 0; j < _system.Unknowns; j++)
        {
            Unknowns[j] = j < _system.Fractions && _system.IsIndependent[j] ? 1.0 / count : 0;
        }
    }

    private bool RunKernel()
    {
        _kernel.Solve(_system, RightHandSide, Unknowns, _outcome);
        return _outcome[0] == KernelOutcome.Optimal;
    }

    // Takes the kernel's fractions over and returns the largest change.
    private double TakeFractions()
    {
        double change = 0;
        for (int i = 0; i < _system.Fractions; i++)
        {
            change = Math.Max(change, Math.Abs(_unknowns[i] - _fractions[i]));
            _fractions[i] = _unknowns[i];
        }

        return change;
    }
}
