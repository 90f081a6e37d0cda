using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;
using WaterMix.Core.Samples;
using WaterMix.Web.State.Figures;
using WaterMix.Workspace.Runs;

namespace WaterMix.Web.State.Results;

/// <summary>A finished run with its samples, as columns over the rows of all its cruises.</summary>
public sealed class RunResults
{
    private readonly Lazy<IReadOnlyList<ResultColumn>> _table;

    /// <summary>The results of a run.</summary>
    /// <param name="run">The run.</param>
    /// <param name="results">Its results, in the study's order.</param>
    /// <param name="samples">The samples of each, in the same order.</param>
    public RunResults(Run run, IReadOnlyList<CruiseResult> results, IReadOnlyList<SampleTable> samples)
    {
        ArgumentNullException.ThrowIfNull(run);
        ArgumentNullException.ThrowIfNull(results);
        ArgumentNullException.ThrowIfNull(samples);
        Run = run;
        Results = results;
        Columns = new FigureColumns(
            [.. results.Select((r, index) => new FigureCruise(r.CruiseName, samples[index], r.Result))],
            new AcceptedFlags(run.Model.AcceptFlags, run.Model.AcceptCtdFlags),
            run.Model.Fit.Factors);
        Status = Joined(results, r => r.Status);
        Layer = Joined(results, r => r.Layer);
        LayerIds = [.. run.Model.LayersOrAll.Select(l => l.Id)];
        _table = new Lazy<IReadOnlyList<ResultColumn>>(() => ResultTableColumns.Of(this));
    }

    /// <summary>The run.</summary>
    public Run Run { get; }

    /// <summary>The results of each cruise.</summary>
    public IReadOnlyList<CruiseResult> Results { get; }

    /// <summary>The samples and results as arrays for figures.</summary>
    public FigureColumns Columns { get; }

    /// <summary>Number of samples.</summary>
    public int RowCount => Columns.RowCount;

    /// <summary>The model of the run.</summary>
    public MixingModel Model => Run.Model;

    /// <summary>The sources, in the set's order.</summary>
    public IReadOnlyList<EndMember> Sources => Model.EndMembers.EndMembers;

    /// <summary>The ids of the layers.</summary>
    public IReadOnlyList<string> LayerIds { get; }

    /// <summary>What became of each sample; length n.</summary>
    public SolveStatus[] Status { get; }

    /// <summary>Index of each sample's layer in <see cref="LayerIds"/>, -1 where it has none; length n.</summary>
    public int[] Layer { get; }

    /// <summary>Every column of the table, in the order of the result file.</summary>
    public IReadOnlyList<ResultColumn> Table => _table.Value;

    /// <summary>The sum of the fractions; NaN where the sample has no answer; length n.</summary>
    public double[] FractionSum => Columns.OfResult("fraction_sum", r => r.FractionSum);

    /// <summary>The misfit; length n.</summary>
    public double[] Misfit => Columns.OfResult("misfit", r => r.Misfit);

    /// <summary>Chi-square; length n.</summary>
    public double[] Chi2 => Columns.OfResult("chi2", r => r.Chi2);

    /// <summary>The upper tail of chi-square; length n.</summary>
    public double[] PValue => Columns.OfResult("p_value", r => r.PValue);

    /// <summary>1 less the sum of the fractions; length n.</summary>
    public double[] ResidualMass => Columns.OfResult("residual_mass", r => r.ResidualMass);

    /// <summary>Degrees of freedom, NaN where the sample has no fit; length n.</summary>
    public double[] DegreesOfFreedom => Columns.OfResult("dof", r => [.. r.DegreesOfFreedom.Select(d => d < 0 ? double.NaN : d)]);

    /// <summary>Number of usable tracers; length n.</summary>
    public double[] TracerCount => Columns.OfResult("tracers", r => [.. r.TracerCount.Select(c => (double)c)]);

    /// <summary>The quantity of a tracer, with the unit that the set or the samples give it.</summary>
    /// <param name="id">Its id.</param>
    public Quantity QuantityOf(string id)
    {
        Quantity quantity = Columns.QuantityOf(id);
        return quantity.Unit.Length == 0 && Model.EndMembers.Units.TryGetValue(id, out string? unit) ? Quantity.Further(id, unit) : quantity;
    }

    /// <summary>The solver's remark on a sample, or null.</summary>
    /// <param name="row">A row of all cruises.</param>
    public string? NoteOf(int row)
    {
        (int cruise, int own) = Columns.Locate(row);
        return Results[cruise].Result.Notes[own];
    }

    /// <summary>The rows of a cruise.</summary>
    /// <param name="cruise">The cruise, from 1.</param>
    /// <returns>The first row and the number of rows of the cruise; nothing where there is no such cruise.</returns>
    public (int First, int Count) RowsOfCruise(int cruise) =>
        cruise >= 1 && cruise <= Results.Count ? (Columns.FirstRow(cruise - 1), Results[cruise - 1].Result.RowCount) : (0, 0);

    private static T[] Joined<T>(IReadOnlyList<CruiseResult> results, Func<MixingResult, T[]> column) => [.. results.SelectMany(r => column(r.Result))];
}
