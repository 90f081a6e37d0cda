using WaterMix.Core.Mixing.Kernels;

namespace WaterMix.Core.Mixing;

/// <content>Reads the kernel's answer back: amounts, residuals, misfit, chi-square.</content>
internal sealed partial class SampleFitter
{
    private void ReadBack()
    {
        int members = _system.Fractions;
        KktViolation = _proof.Violation(_system, RightHandSide, Unknowns);
        TakeFractions();
        FractionSum = 0;
        int positive = 0;
        foreach (double fraction in Fractions)
        {
            FractionSum += fraction;
            positive += fraction > 0 ? 1 : 0;
        }

        int nonZero = 0;
        for (int k = 0; k < _processCount; k++)
        {
            double amount = _unknowns[members + k];
            amount = Sign(k) == ProcessSign.NonPositive && amount != 0 ? -amount : amount;
            _amounts[_processes[k]] = amount;
            nonZero += amount != 0 ? 1 : 0;
        }

        double massRow = Mass.Weight is { } weight ? weight * (1 - FractionSum) : 0;
        DegreesOfFreedom = Mass.IsExact ? _rowCount - (positive - 1) - nonZero : _rowCount + 1 - positive - nonZero;
        FindResiduals();
        if (_leastSquares is null)
        {
            Chi2 = WeightedRowsChi2();
            Misfit = Vectors.Norm(SystemResidual());
        }
        else
        {
            // S as it was factored last: with the iterated spread that is S at the final fractions.
            Chi2 = Math.FusedMultiplyAdd(massRow, massRow, WhitenedLength());
            Misfit = Math.Sqrt(Chi2);
        }
    }

    // Observed minus fitted. With exact mass everything is taken relative to the first end-member, which loses no digits to the common part.
    private void FindResiduals()
    {
        for (int r = 0; r < _rowCount; r++)
        {
            int t = _rows[r];
            double origin = Mass.IsExact ? _layer.Values[0][t] : 0;
            double rest = _observed[t] - origin;
            for (int i = 0; i < _layer.Permitted.Length; i++)
            {
                rest = Math.FusedMultiplyAdd(-_fractions[i], _layer.Values[i][t] - origin, rest);
            }

            for (int k = 0; k < _processCount; k++)
            {
                rest = Math.FusedMultiplyAdd(-_amounts[_processes[k]], _model.ProcessColumns[_processes[k]][t], rest);
            }

            _residuals[t] = rest;
        }
    }

    // The rows that were minimised, the mass row included: centred rows see a departure of the sum from one, the residuals in units do not.
    private Span<double> SystemResidual()
    {
        Span<double> rest = RightHandSide;
        for (int j = 0; j < _system.Unknowns; j++)
        {
            Vectors.AddScaled(-Unknowns[j], _system.Column(j), rest);
        }

        return rest;
    }

    private double WeightedRowsChi2()
    {
        for (int r = 0; r < _rowCount; r++)
        {
            if (!_model.HasMeasurementError[_rows[r]])
            {
                return double.NaN;
            }
        }

        FillMeasurementCovariance();
        return _covariance.Factor() ? WhitenedLength() : double.NaN;
    }

    private double WhitenedLength()
    {
        Span<double> whitened = _whitened.AsSpan(0, _rowCount);
        for (int r = 0; r < _rowCount; r++)
        {
            whitened[r] = _residuals[_rows[r]];
        }

        _covariance.Whiten(whitened);
        return Vectors.Dot(whitened, whitened);
    }
}
