namespace WaterMix.Core.Mixing;

/// <content>Assembles the covariance and the system of a sample.</content>
internal sealed partial class SampleFitter
{
    // S for the fractions as they stand. With the spread fixed they are all 1/n, which makes sum x_i^2 V_i the fixed matrix.
    private bool FactorCovariance()
    {
        bool withSpread = _leastSquares is { Spread: not EndMemberSpread.None };
        FillMeasurementCovariance();
        for (int i = 0; i < _layer.Permitted.Length && withSpread; i++)
        {
            double share = _fractions[i] * _fractions[i];
            double[] spread = _layer.Spreads[i];
            for (int a = 0; a < _rowCount; a++)
            {
                for (int b = 0; b <= a; b++)
                {
                    ref double entry = ref _covariance[a, b];
                    entry = Math.FusedMultiplyAdd(share, spread[(_rows[a] * TracerTotal) + _rows[b]], entry);
                }
            }
        }

        return _covariance.Factor();
    }

    private void FillMeasurementCovariance()
    {
        _covariance.Reshape(_rowCount);
        for (int a = 0; a < _rowCount; a++)
        {
            double[] left = _model.Transform.Rows[_rows[a]];
            for (int b = 0; b <= a; b++)
            {
                double[] right = _model.Transform.Rows[_rows[b]];
                double sum = _model.MeasurementCovariance[(_rows[a] * TracerTotal) + _rows[b]];
                for (int k = 0; k < _parents.Length; k++)
                {
                    double factor = left[k] * right[k];
                    if (factor != 0)
                    {
                        double error = _model.RelativeErrors[k] * _parents[k];
                        sum = Math.FusedMultiplyAdd(factor, error * error, sum);
                    }
                }

                _covariance[a, b] = sum;
            }
        }
    }

    // The system before weighing: tracer rows in the tracers' units, relative to the first end-member where mass is exact (the centred form),
    // relative to the standardising means where it is not, and the mass row.
    private void Assemble()
    {
        int members = _layer.Permitted.Length;
        bool exact = Mass.IsExact;
        _system.Reshape(exact ? _rowCount : _rowCount + 1, members, _processCount, exact);
        Span<double> b = RightHandSide;
        for (int r = 0; r < _rowCount; r++)
        {
            int t = _rows[r];
            double origin = exact ? _layer.Values[0][t] : _layer.Means.Length > 0 ? _layer.Means[t] : 0;
            b[r] = _observed[t] - origin;
            for (int i = 0; i < members; i++)
            {
                _system.Column(i)[r] = _layer.Values[i][t] - origin;
            }

            for (int k = 0; k < _processCount; k++)
            {
                double ratio = _model.ProcessColumns[_processes[k]][t];
                _system.Column(members + k)[r] = Sign(k) == ProcessSign.NonPositive ? -ratio : ratio;
            }
        }

        for (int k = 0; k < _processCount; k++)
        {
            _system.IsFree[members + k] = Sign(k) == ProcessSign.Free;
        }

        if (Mass.Weight is { } weight)
        {
            b[_rowCount] = weight;
            for (int j = 0; j < _system.Unknowns; j++)
            {
                _system.Column(j)[_rowCount] = j < members ? weight : 0;
            }
        }
    }
}
