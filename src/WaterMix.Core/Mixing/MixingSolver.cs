using System.Collections.Concurrent;
using System.Globalization;
using WaterMix.Core.Mixing.Kernels;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;

namespace WaterMix.Core.Mixing;

/// <summary>Apportions samples (<c>Tomczak1981</c>): every sample comes out with fractions, amounts and residuals, or with a status that says why not.</summary>
public static class MixingSolver
{
    private const int ChunkRows = 1024;

    /// <summary>Solves every sample of a table.</summary>
    /// <param name="model">The model, ready for fitting.</param>
    /// <param name="table">The samples; quantities that the model needs are derived where the table lacks them.</param>
    /// <param name="options">Threads, proof, cancellation.</param>
    /// <returns>The result, one entry per sample in input order; it does not depend on the number of threads.</returns>
    /// <exception cref="OperationCanceledException">The work was cancelled.</exception>
    public static SolvedBlock Solve(PreparedModel model, SampleTable table, SolveOptions options)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(table);
        ArgumentNullException.ThrowIfNull(options);
        var values = new UsableValues(model, table);
        var result = new MixingResult(model, table.RowCount, options.WithProof);
        var parallel = new ParallelOptions { MaxDegreeOfParallelism = options.Threads, CancellationToken = options.Cancellation };
        if (table.RowCount > 0)
        {
            Parallel.ForEach(
                Partitioner.Create(0, table.RowCount, ChunkRows),
                parallel,
                () => new RowSolver(model, values, result),
                (range, _, solver) =>
                {
                    for (int row = range.Item1; row < range.Item2; row++)
                    {
                        solver.Solve(row);
                    }

                    return solver;
                },
                _ => { });
        }

        return new SolvedBlock(result, values.Notes, values.CountUsable(table.RowCount));
    }

    /// <summary>One thread's share of the work: a fitter and what it needs for a row.</summary>
    private sealed class RowSolver(PreparedModel model, UsableValues values, MixingResult result)
    {
        private readonly SampleFitter _fitter = new(model, new ActiveSetKernel());
        private readonly double[] _parents = new double[model.Transform.Parents.Count];
        private readonly bool[] _inMask = new bool[model.Model.Processes.Count];

        public void Solve(int row)
        {
            if (values.Impossible(row) is { } column)
            {
                result.Status[row] = SolveStatus.BadInput;
                Quantity quantity = column.Quantity;
                string unit = quantity.Unit is "1" or "" ? "" : " " + quantity.Unit;
                result.Notes[row] = string.Create(
                    CultureInfo.InvariantCulture,
                    $"{column.Id} {column.Values[row]} is not possible: {quantity.Lowest} to {quantity.Highest}{unit} is");
                return;
            }

            int layerIndex = LayerOf(row);
            if (layerIndex < 0)
            {
                result.Status[row] = SolveStatus.OutsideLayers;
                result.Notes[row] = MissingForLayers(row);
                return;
            }

            for (int k = 0; k < _parents.Length; k++)
            {
                _parents[k] = values.Parent(k, row);
            }

            IReadOnlyList<Process> processes = model.Model.Processes;
            for (int k = 0; k < _inMask.Length; k++)
            {
                _inMask[k] = values.Holds(processes[k].Where, row);
            }

            PreparedLayer layer = model.Layers[layerIndex];
            _fitter.Fit(layer, _parents, _inMask);
            Write(row, layerIndex, layer);
        }

        private int LayerOf(int row)
        {
            for (int k = 0; k < model.Layers.Count; k++)
            {
                if (values.Holds(model.Layers[k].Where, row))
                {
                    return k;
                }
            }

            return -1;
        }

        private string? MissingForLayers(int row)
        {
            var missing = model.Layers.SelectMany(l => l.Where)
                .Where(c => double.IsNaN(values.Value(c, row)))
                .Select(c => c.Quantity)
                .Distinct()
                .ToList();
            return missing.Count > 0 ? $"no usable {string.Join(", ", missing)} for the layers' conditions" : null;
        }

        private void Write(int row, int layerIndex, PreparedLayer layer)
        {
            result.Layer[row] = layerIndex;
            result.Status[row] = _fitter.Status;
            result.TracerCount[row] = _fitter.TracerCount;
            if (_fitter.Status == SolveStatus.TooFewTracers)
            {
                result.Notes[row] = TooFew(layer);
                return;
            }

            for (int i = 0; i < layer.Permitted.Length; i++)
            {
                result.Fractions[layer.Permitted[i]][row] = _fitter.Fractions[i];
            }

            for (int k = 0; k < _inMask.Length; k++)
            {
                result.Amounts[k][row] = _fitter.Amounts[k];
            }

            for (int t = 0; t < result.Residuals.Length; t++)
            {
                result.Residuals[t][row] = _fitter.Residuals[t];
            }

            result.FractionSum[row] = _fitter.FractionSum;
            result.ResidualMass[row] = 1 - _fitter.FractionSum;
            result.Misfit[row] = _fitter.Misfit;
            result.Chi2[row] = _fitter.Chi2;
            result.DegreesOfFreedom[row] = _fitter.DegreesOfFreedom;
            if (_fitter.DegreesOfFreedom >= 1)
            {
                result.PValue[row] = ChiSquare.UpperTail(_fitter.Chi2, _fitter.DegreesOfFreedom);
            }

            if (result.KktViolation is { } violation)
            {
                violation[row] = _fitter.KktViolation;
            }

            result.Notes[row] = Remarks(row, layer);
        }

        private string TooFew(PreparedLayer layer)
        {
            int[] tracers = [.. Enumerable.Range(0, model.Model.Tracers.Count)];
            string[] unusable = [.. tracers.Where(t => layer.Uses(t) && double.IsNaN(model.Transform.Value(t, _parents))).Select(t => model.Model.Tracers[t])];
            string[] leftOut = [.. tracers.Where(t => !layer.Uses(t)).Select(t => model.Model.Tracers[t])];
            return string.Create(CultureInfo.InvariantCulture, $"{_fitter.TracerCount} usable tracers for {_fitter.UnknownCount} unknowns")
                + (unusable.Length > 0 ? $"; without a usable value: {string.Join(", ", unusable)}" : "")
                + (leftOut.Length > 0 ? $"; left out of the layer, its end-members do not differ: {string.Join(", ", leftOut)}" : "");
        }

        private string? Remarks(int row, PreparedLayer layer)
        {
            if (double.IsNaN(_fitter.FractionSum))
            {
                return "the errors given span too many orders of magnitude to be weighed against each other";
            }

            List<string>? remarks = null;
            if (_fitter.Status == SolveStatus.NotConverged)
            {
                (remarks ??= []).Add(string.Create(CultureInfo.InvariantCulture, $"the fractions still changed by {_fitter.LastChange:0.0e+0} at the last iteration"));
            }

            if (_fitter.Status == SolveStatus.NotUnique)
            {
                (remarks ??= []).Add($"dependent on those before: {string.Join(", ", Dependent(layer))}");
            }

            for (int k = 0; k < _inMask.Length; k++)
            {
                Process process = model.Model.Processes[k];
                if (_inMask[k] && double.IsNaN(_fitter.Amounts[k]))
                {
                    (remarks ??= []).Add($"{process.Id} is off: it changes none of the tracers used");
                }
                else if (!_inMask[k])
                {
                    foreach (Condition condition in process.Where)
                    {
                        if (double.IsNaN(values.Value(condition, row)))
                        {
                            (remarks ??= []).Add($"{process.Id} is off: no usable {condition.Quantity}");
                            break;
                        }
                    }
                }
            }

            return remarks is null ? null : string.Join("; ", remarks);
        }

        private IEnumerable<string> Dependent(PreparedLayer layer)
        {
            int members = layer.Permitted.Length;
            for (int j = 0; j < members + _fitter.ProcessCount; j++)
            {
                if (_fitter.IsDependent(j))
                {
                    yield return j < members
                        ? model.Model.EndMembers.EndMembers[layer.Permitted[j]].Id
                        : model.Model.Processes[_fitter.ProcessOf(j - members)].Id;
                }
            }
        }
    }
}
