using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Core.Seawater;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Mixing;

/// <summary>Which layer takes each sample, and how many have too few tracers: what the solver would do, also for a model that is not complete yet.</summary>
public sealed class LayerCensus
{
    private LayerCensus(int[] layerOf, IReadOnlyList<LayerCount> layers)
    {
        LayerOf = layerOf;
        Layers = layers;
        Outside = layerOf.LongCount(l => l < 0);
    }

    /// <summary>For each sample the index of its layer; -1 where no layer takes it.</summary>
    public int[] LayerOf { get; }

    /// <summary>The layers in numbers.</summary>
    public IReadOnlyList<LayerCount> Layers { get; }

    /// <summary>Number of samples that no layer takes.</summary>
    public long Outside { get; }

    /// <summary>Number of samples with too few tracers.</summary>
    public long TooFew => Layers.Sum(l => l.TooFew);

    /// <summary>Sorts and counts.</summary>
    /// <param name="model">The model.</param>
    /// <param name="columns">The samples under the model's flags and factors.</param>
    public static LayerCensus Of(MixingModel model, FigureColumns columns)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(columns);
        IReadOnlyList<Layer> layers = model.LayersOrAll;
        var tests = new ConditionTests(model, columns);
        int[] layerOf = new int[columns.RowCount];
        for (int row = 0; row < layerOf.Length; row++)
        {
            layerOf[row] = -1;
            for (int k = 0; k < layers.Count && layerOf[row] < 0; k++)
            {
                layerOf[row] = tests.Hold(layers[k].Where, row) ? k : -1;
            }
        }

        double[][] tracers = [.. model.Tracers.Select(columns.Values)];
        return new LayerCensus(layerOf, [.. layers.Select((layer, k) => Count(model, layer, k, layerOf, tracers, tests))]);
    }

    private static LayerCount Count(MixingModel model, Layer layer, int index, int[] layerOf, double[][] tracers, ConditionTests tests)
    {
        int[] used = [.. Enumerable.Range(0, tracers.Length).Where(t => IsUsed(model, layer, model.Tracers[t]))];
        int[][] changed = [.. model.Processes.Select(p => used.Where(t => model.Fit.Factors.ChangeOf(model.Tracers[t], p.Ratios) != 0).ToArray())];
        int permitted = model.EndMembers.EndMembers.Count(e => layer.EndMembers.Contains(e.Id));
        long samples = 0;
        long tooFew = 0;
        for (int row = 0; row < layerOf.Length; row++)
        {
            if (layerOf[row] != index)
            {
                continue;
            }

            samples++;
            int unknowns = permitted - 1;
            for (int p = 0; p < changed.Length; p++)
            {
                unknowns += Usable(tracers, changed[p], row) > 0 && tests.Hold(model.Processes[p].Where, row) ? 1 : 0;
            }

            tooFew += Usable(tracers, used, row) < Math.Max(unknowns, 1) ? 1 : 0;
        }

        Process[] effective = [.. model.Processes.Where((_, p) => changed[p].Length > 0)];
        return new LayerCount(layer.Id, samples, tooFew, used.Length, permitted, effective.Count(p => p.Where.Count == 0), effective.Count(p => p.Where.Count > 0));
    }

    private static int Usable(double[][] tracers, int[] which, int row)
    {
        int count = 0;
        foreach (int t in which)
        {
            count += double.IsFinite(tracers[t][row]) ? 1 : 0;
        }

        return count;
    }

    // Standardised rows leave a tracer out in which the end-members do not differ.
    private static bool IsUsed(MixingModel model, Layer layer, string tracer)
    {
        if (model.Fit is not WeightedRows { Standardise: not Standardisation.None } rows)
        {
            return true;
        }

        var over = rows.Over == StandardiseOver.Set ? model.EndMembers.EndMembers : [.. model.EndMembers.EndMembers.Where(e => layer.EndMembers.Contains(e.Id))];
        return rows.Factors.SpreadOf(tracer, over, rows.SdOver).Sd != 0;
    }

    /// <summary>The columns that conditions test.</summary>
    private sealed class ConditionTests
    {
        private readonly Dictionary<(string, DensityScale), double[]> _values = [];

        public ConditionTests(MixingModel model, FigureColumns columns)
        {
            foreach (Condition condition in model.LayersOrAll.SelectMany(l => l.Where).Concat(model.Processes.SelectMany(p => p.Where)))
            {
                if (!_values.ContainsKey((condition.Quantity, condition.Scale)))
                {
                    _values[(condition.Quantity, condition.Scale)] =
                        condition.Scale == DensityScale.Eos80 ? Eos80(model, condition.Quantity, columns) : columns.Values(condition.Quantity);
                }
            }
        }

        public bool Hold(IReadOnlyList<Condition> conditions, int row)
        {
            foreach (Condition condition in conditions)
            {
                if (!condition.Holds(_values[(condition.Quantity, condition.Scale)][row]))
                {
                    return false;
                }
            }

            return true;
        }

        private static double[] Eos80(MixingModel model, string sigma, FigureColumns columns)
        {
            var accepted = new AcceptedFlags(model.AcceptFlags, model.AcceptCtdFlags);
            var values = new List<double>(columns.RowCount);
            foreach (FigureCruise cruise in columns.Cruises)
            {
                SampleTable derived = SampleDerivation.Derive(cruise.Samples, [Quantity.PotentialTemperature.Id], model.Fit.Factors).Table;
                SampleColumn column = SampleDerivation.Eos80Anomaly(derived, Quantity.FindOrFurther(sigma));
                values.AddRange(Enumerable.Range(0, column.Length).Select(row => column.UsableAt(row, accepted)));
            }

            return [.. values];
        }
    }
}
