using WaterMix.Core.EndMembers;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Core.Seawater;

namespace WaterMix.Core.Mixing;

/// <summary>A mixing model made ready for fitting: everything that does not depend on a sample is computed once.</summary>
public sealed class PreparedModel
{
    private PreparedModel(MixingModel model, TracerTransform transform)
    {
        Model = model;
        Transform = transform;
        Accepted = new AcceptedFlags(model.AcceptFlags, model.AcceptCtdFlags);
        ProcessColumns = [.. model.Processes.Select(process => model.Tracers.Select(t => model.Fit.Factors.ChangeOf(t, process.Ratios)).ToArray())];
        TracerMatrix? covariance = (model.Fit as GeneralisedLeastSquares)?.MeasurementCovariance;
        (MeasurementCovariance, HasMeasurementError) = Measurement(model.Fit, covariance, transform);
        RelativeErrors = [.. transform.Parents.Select(p =>
            covariance?.Tracers.Contains(p) == true ? 0 : model.Fit.MeasurementSd.GetValueOrDefault(p)?.Relative ?? 0)];
        Layers = [.. model.LayersOrAll.Select(Prepare)];
        LayerIds = [.. Layers.Select(l => l.Id)];
    }

    /// <summary>The model.</summary>
    public MixingModel Model { get; }

    /// <summary>The ids of the layers, in order.</summary>
    public IReadOnlyList<string> LayerIds { get; }

    /// <summary>How the tracers follow from the measured quantities.</summary>
    internal TracerTransform Transform { get; }

    /// <summary>The flags that count as usable.</summary>
    internal AcceptedFlags Accepted { get; }

    /// <summary>The layers, in order; the first that takes a sample has it.</summary>
    internal IReadOnlyList<PreparedLayer> Layers { get; }

    /// <summary>B: the change in each tracer per 1 of the amount, one array of all tracers per process.</summary>
    internal double[][] ProcessColumns { get; }

    /// <summary>The part of the measurement covariance that is the same for every sample (tracers x tracers, row by row).</summary>
    internal double[] MeasurementCovariance { get; }

    /// <summary>Per tracer: true where every parent has a measurement error.</summary>
    internal bool[] HasMeasurementError { get; }

    /// <summary>Per parent: the relative part of its measurement error; the variance (relative * observed)^2 is added for each sample.</summary>
    internal double[] RelativeErrors { get; }

    /// <summary>The measured quantities that the tracers follow from: the tracers themselves, or the parents of derived ones.</summary>
    public IReadOnlyList<string> ParentIds => Transform.Parents;

    /// <summary>The quantities that the model reads from samples: parents of its tracers, and the quantities of its conditions.</summary>
    public IReadOnlyList<string> QuantityIds =>
        [.. Transform.Parents.Concat(AllConditions.Where(c => c.Scale == DensityScale.Teos10).Select(c => c.Quantity)).Distinct()];

    /// <summary>The quantities that files must bring for this model: those it reads, and what they are derived from.</summary>
    public IReadOnlySet<string> InputIds =>
        SampleDerivation.InputsOf([.. QuantityIds, .. AllConditions.Where(c => c.Scale == DensityScale.Eos80).Select(_ => Quantity.PotentialTemperature.Id)]);

    /// <summary>Every condition of the layers and the processes.</summary>
    internal IEnumerable<Condition> AllConditions =>
        Layers.SelectMany(l => l.Where).Concat(Model.Processes.SelectMany(p => p.Where));

    /// <summary>Makes a model ready.</summary>
    /// <param name="model">A model without errors in <see cref="ModelCheck"/>.</param>
    /// <exception cref="ArgumentException">The model has an error; the message is the first finding.</exception>
    public static PreparedModel From(MixingModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        if (ModelCheck.Findings(model).FirstOrDefault(f => f.Severity == Severity.Error) is { } error)
        {
            throw new ArgumentException(error.ToString(), nameof(model));
        }

        return new PreparedModel(model, TracerTransform.For(model.Tracers, model.Fit.Factors));
    }

    /// <summary>The row factors of a layer under weighted rows, by tracer: 0 where the tracer is left out. Empty for generalised least squares.</summary>
    /// <param name="layer">Index of the layer.</param>
    public IReadOnlyList<double> RowFactors(int layer) => Layers[layer].RowFactors;

    private PreparedLayer Prepare(Layer layer)
    {
        IReadOnlyList<EndMember> set = Model.EndMembers.EndMembers;
        int[] permitted = [.. Enumerable.Range(0, set.Count).Where(i => layer.EndMembers.Contains(set[i].Id))];
        double[][] values = [.. permitted.Select(i => TracerValues(set[i]))];
        bool overSet = Model.Fit is WeightedRows { Over: StandardiseOver.Set };
        (double[] factors, double[] means) = Weighing(overSet ? set : [.. permitted.Select(i => set[i])]);
        return new PreparedLayer
        {
            Id = layer.Id,
            Where = layer.Where,
            Permitted = permitted,
            Values = values,
            Spreads = [.. permitted.Select(i => Spread(set[i]))],
            RowFactors = factors,
            Means = means,
        };
    }

    private (double[] Factors, double[] Means) Weighing(IReadOnlyList<EndMember> over)
    {
        if (Model.Fit is not WeightedRows fit)
        {
            return ([], []);
        }

        int count = Model.Tracers.Count;
        double[] factors = new double[count];
        double[] means = new double[count];
        for (int t = 0; t < count; t++)
        {
            double weight = fit.Weights[Model.Tracers[t]];
            double factor = fit.WeightsAre == WeightMeaning.Squared ? Math.Sqrt(weight) : weight;
            if (fit.Standardise == Standardisation.None)
            {
                factors[t] = factor;
                continue;
            }

            (double mean, double sd) = fit.Factors.SpreadOf(Model.Tracers[t], over, fit.SdOver);
            factors[t] = sd == 0 ? 0 : factor / sd;
            means[t] = fit.Standardise == Standardisation.MeanAndSd ? mean : 0;
        }

        return (factors, means);
    }

    private double[] TracerValues(EndMember member)
    {
        double[] parents = [.. Transform.Parents.Select(p => member.Values[p])];
        return [.. Enumerable.Range(0, Transform.Tracers.Count).Select(t => Transform.Value(t, parents))];
    }

    private double[] Spread(EndMember member)
    {
        IReadOnlyList<string> parents = Transform.Parents;
        double[,] covariance = new double[parents.Count, parents.Count];
        for (int a = 0; a < parents.Count; a++)
        {
            for (int b = 0; b < parents.Count; b++)
            {
                covariance[a, b] = Correlation(member.Correlations, parents[a], parents[b])
                    * member.Sd.GetValueOrDefault(parents[a]) * member.Sd.GetValueOrDefault(parents[b]);
            }
        }

        return Transformed(covariance, Transform);
    }

    private static double Correlation(TracerMatrix? correlations, string a, string b)
    {
        if (a == b)
        {
            return 1;
        }

        return Entry(correlations, a, b) ?? 0;
    }

    private static double? Entry(TracerMatrix? matrix, string a, string b)
    {
        if (matrix is null)
        {
            return null;
        }

        int row = matrix.Tracers.ToList().IndexOf(a);
        int column = matrix.Tracers.ToList().IndexOf(b);
        return row < 0 || column < 0 ? null : matrix.Matrix[row][column];
    }

    private static (double[] Covariance, bool[] Known) Measurement(Fit fit, TracerMatrix? given, TracerTransform transform)
    {
        IReadOnlyList<string> parents = transform.Parents;
        double[,] covariance = new double[parents.Count, parents.Count];
        bool[] known = new bool[parents.Count];
        for (int a = 0; a < parents.Count; a++)
        {
            for (int b = 0; b < parents.Count; b++)
            {
                covariance[a, b] = Entry(given, parents[a], parents[b]) ?? 0;
            }

            known[a] = given?.Tracers.Contains(parents[a]) ?? false;
            if (!known[a] && fit.MeasurementSd.TryGetValue(parents[a], out MeasurementError? error))
            {
                covariance[a, a] = error.Absolute * error.Absolute;
                known[a] = true;
            }
        }

        bool[] tracers = [.. transform.Rows.Select(row => Enumerable.Range(0, row.Length).All(k => row[k] == 0 || known[k]))];
        return (Transformed(covariance, transform), tracers);
    }

    // T C T', row by row.
    private static double[] Transformed(double[,] covariance, TracerTransform transform)
    {
        int count = transform.Tracers.Count;
        double[] result = new double[count * count];
        for (int s = 0; s < count; s++)
        {
            for (int t = 0; t < count; t++)
            {
                double sum = 0;
                for (int a = 0; a < transform.Parents.Count; a++)
                {
                    for (int b = 0; b < transform.Parents.Count; b++)
                    {
                        sum += transform.Rows[s][a] * covariance[a, b] * transform.Rows[t][b];
                    }
                }

                result[(s * count) + t] = sum;
            }
        }

        return result;
    }
}
