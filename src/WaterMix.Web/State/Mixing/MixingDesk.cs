using WaterMix.Core;
using WaterMix.Core.Mixing;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Mixing;

/// <summary>What the page of the model shows beside the model itself: findings, the census of layers, the plot of the layers, proposals of errors.</summary>
/// <param name="samples">The samples.</param>
public sealed class MixingDesk(StudySamples samples)
{
    private readonly Dictionary<(string Quantity, bool IsCtd), ErrorProposal?> _proposals = [];
    private (FigureColumns Columns, IReadOnlyList<Layer> Layers)? _counted;
    private MixingModel? _model;

    /// <summary>The samples under the model's flags.</summary>
    public FigureColumns Columns { get; private set; } = new([]);

    /// <summary>The layers in numbers; null before <see cref="Look"/>.</summary>
    public LayerCensus? Census { get; private set; }

    /// <summary>What the model lacks, errors first.</summary>
    public IReadOnlyList<FindingSentence> Findings { get; private set; } = [];

    /// <summary>The tracers that some sample has.</summary>
    public IReadOnlyList<string> Measured { get; private set; } = [];

    /// <summary>Row factors, one list of all tracers per layer; empty unless rows are weighted and the model has no error.</summary>
    public IReadOnlyList<IReadOnlyList<double>> RowFactors { get; private set; } = [];

    /// <summary>True where the model can be run.</summary>
    public bool CanRun => Columns.RowCount > 0 && Findings.All(f => f.Severity != Severity.Error);

    /// <summary>Looks at a model. Costs nothing where the model is the one of before and so are the samples.</summary>
    /// <param name="model">The model.</param>
    public void Look(MixingModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        FigureColumns columns = samples.Columns(model);
        bool sameSamples = ReferenceEquals(columns, Columns);
        if (sameSamples && ReferenceEquals(model, _model))
        {
            return;
        }

        if (!sameSamples)
        {
            Columns = columns;
            Measured = samples.Tracers(model);
        }

        _model = model;
        Findings = FindingSentence.Of(model);
        Census = LayerCensus.Of(model, columns);
        if (_counted is not { } counted || !ReferenceEquals(counted.Columns, columns) || !counted.Layers.SequenceEqual(model.LayersOrAll))
        {
            _counted = (columns, model.LayersOrAll);
            _proposals.Clear();
        }

        RowFactors = model.Fit is WeightedRows && Findings.All(f => f.Severity != Severity.Error) ? Factors(PreparedModel.From(model)) : [];
    }

    /// <summary>The error that replicates propose; null where there are too few.</summary>
    /// <param name="quantity">The quantity's id.</param>
    public ErrorProposal? FromReplicates(string quantity) =>
        Proposal(quantity, false, counts => ErrorProposals.FromReplicates(Columns, quantity, counts));

    /// <summary>The error that bottle against CTD proposes; null where there are too few samples with both.</summary>
    /// <param name="quantity">The quantity's id.</param>
    public ErrorProposal? FromBottleAndCtd(string quantity) =>
        Proposal(quantity, true, counts => ErrorProposals.FromBottleAndCtd(Columns, quantity, counts));

    /// <summary>Number of values that are means of replicates already.</summary>
    /// <param name="quantity">The quantity's id.</param>
    public long MeansOfReplicates(string quantity) => ErrorProposals.MeansOfReplicates(samples.Tables, quantity);

    /// <summary>The samples that no layer takes because a condition names a quantity that they lack, by quantity.</summary>
    public IReadOnlyList<(string Quantity, long Samples)> Unsorted()
    {
        if (_model is null || Census is null)
        {
            return [];
        }

        return
        [
            .. _model.LayersOrAll.SelectMany(l => l.Where).Where(c => c.Scale == DensityScale.Teos10).Select(c => c.Quantity).Distinct()
                .Select(q => (q, Columns.Values(q).Where((v, row) => Census.LayerOf[row] < 0 && double.IsNaN(v)).LongCount()))
                .Where(pair => pair.Item2 > 0),
        ];
    }

    private static IReadOnlyList<double>[] Factors(PreparedModel model) => [.. Enumerable.Range(0, model.LayerIds.Count).Select(model.RowFactors)];

    private ErrorProposal? Proposal(string quantity, bool isCtd, Func<bool[], ErrorProposal?> make)
    {
        if (Census is null)
        {
            return null;
        }

        if (!_proposals.TryGetValue((quantity, isCtd), out ErrorProposal? proposal))
        {
            proposal = make(Array.ConvertAll(Census.LayerOf, layer => layer >= 0));
            _proposals[(quantity, isCtd)] = proposal;
        }

        return proposal;
    }
}
