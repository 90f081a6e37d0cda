using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;
using WaterMix.Web.State.Figures;
using WaterMix.Web.State.Mixing;

namespace WaterMix.Web.State.EndMembers;

/// <summary>What the page of end-members shows: the plane of two tracers, the samples and sources in it, and what the sources cannot make.</summary>
/// <param name="samples">The samples.</param>
public sealed class EndMembersDesk(StudySamples samples)
{
    /// <summary>Above this number of samples the shares of all pairs are counted beside the page's own work, and not while a source moves.</summary>
    private const int MostAtOnce = 30_000;

    private MixingModel? _present;
    private MixingModel? _moving;
    private LayerCensus? _census;
    private (FigureColumns Columns, IReadOnlyList<Layer> Layers)? _counted;
    private (FigureColumns Columns, string X, string Y, string Colour, string? Layer, IReadOnlyList<Layer> Layers)? _drawn;
    private bool[] _counts = [];
    private (string? X, string? Y, string? Layer, string? Colour) _asked;

    /// <summary>The tracer along x.</summary>
    public string X { get; private set; } = Quantity.PracticalSalinity.Id;

    /// <summary>The tracer along y.</summary>
    public string Y { get; private set; } = Quantity.PotentialTemperature.Id;

    /// <summary>The quantity that colours the samples; empty: none does.</summary>
    public string Colour { get; private set; } = Quantity.Pressure.Id;

    /// <summary>The layer that is looked at; null: all of them together.</summary>
    public string? LayerId { get; private set; }

    /// <summary>The model as it is shown: with the source where it is being moved to.</summary>
    public MixingModel Shown => _moving ?? _present ?? throw new InvalidOperationException("Nothing was looked at yet.");

    /// <summary>The samples under the model's flags.</summary>
    public FigureColumns Columns { get; private set; } = new([]);

    /// <summary>The samples in the plane; the same object as long as nothing of them changes.</summary>
    public PointLayer Points { get; private set; } = new("samples", "Samples", [], [], new OneColour("--faint"));

    /// <summary>The sources in the plane.</summary>
    public IReadOnlyList<PropertySource> Sources { get; private set; } = [];

    /// <summary>The processes in the plane.</summary>
    public IReadOnlyList<ProcessDirection> Processes { get; private set; } = [];

    /// <summary>What the sources cannot make, by pairs of tracers.</summary>
    public PlaneShares Shares { get; private set; } = new([], 0, double.NaN);

    /// <summary>True where <see cref="Shares"/> are those of before, because there are many samples: <see cref="CountAsync"/> counts them anew.</summary>
    public bool IsCounting { get; private set; }

    /// <summary>Number of samples that are looked at.</summary>
    public long Looked { get; private set; }

    /// <summary>The quantities that an axis can show: the tracers, then whatever else the end-members have.</summary>
    public IReadOnlyList<string> Axes { get; private set; } = [];

    /// <summary>True where a source can be moved: both axes show what end-members have values of, not something computed from it.</summary>
    public bool CanMove => Quantity.FindOrFurther(X).Use == TracerUse.Row && Quantity.FindOrFurther(Y).Use == TracerUse.Row;

    /// <summary>Looks at a model in a plane. Costs nothing where all is as before.</summary>
    /// <param name="model">The model.</param>
    /// <param name="x">The tracer along x; null or unknown: a usual one.</param>
    /// <param name="y">The tracer along y.</param>
    /// <param name="layer">The layer; null or unknown: all.</param>
    /// <param name="colour">What colours the samples; null: pressure; empty: nothing.</param>
    public void Look(MixingModel model, string? x, string? y, string? layer, string? colour)
    {
        ArgumentNullException.ThrowIfNull(model);
        FigureColumns columns = samples.Columns(model);
        if (_moving is null && ReferenceEquals(model, _present) && ReferenceEquals(columns, Columns) && _asked == (x, y, layer, colour))
        {
            return;
        }

        _asked = (x, y, layer, colour);
        _present = model;
        _moving = null;
        Columns = columns;
        Axes = [.. model.Tracers.Concat(SetColumns.Of(model, [])).Distinct()];
        X = Chosen(x, [Quantity.PracticalSalinity.Id, Quantity.AbsoluteSalinity.Id]);
        Y = Chosen(y, [Quantity.PotentialTemperature.Id, Quantity.ConservativeTemperature.Id]);
        if (X == Y && Axes.Count > 1)
        {
            Y = Axes.First(a => a != X);
        }

        LayerId = model.LayersOrAll.Any(l => l.Id == layer) ? layer : null;
        Colour = colour ?? Quantity.Pressure.Id;
        if (_census is null || _counted is not { } counted || !ReferenceEquals(counted.Columns, columns) || !counted.Layers.SequenceEqual(model.LayersOrAll))
        {
            _census = LayerCensus.Of(model, columns);
            _counted = (columns, model.LayersOrAll);
        }

        IsCounting = columns.RowCount > MostAtOnce;
        Draw(!IsCounting);
    }

    /// <summary>Counts the shares where that is still to be done; what was looked at meanwhile is not overwritten.</summary>
    public async Task CountAsync()
    {
        if (!IsCounting || _present is not { } model)
        {
            return;
        }

        IReadOnlyList<string>? permitted = Permitted(model);
        (IReadOnlyList<double[]> values, bool[] counts) = (Values(model), _counts);
        PlaneShares shares = await Task.Run(() => PlaneShares.Of(model, permitted, values, counts));
        if (ReferenceEquals(model, _present) && ReferenceEquals(counts, _counts))
        {
            (Shares, IsCounting) = (shares, false);
        }
    }

    /// <summary>Shows a source where it is being moved to.</summary>
    /// <param name="move">The move.</param>
    public void Move(MarkMove move)
    {
        _moving = Moved(_present!, move);
        Draw(Columns.RowCount <= MostAtOnce);
    }

    /// <summary>The model with a source moved, its values rounded to a thousandth of what the plot shows.</summary>
    /// <param name="model">The model.</param>
    /// <param name="move">The move.</param>
    public MixingModel Moved(MixingModel model, MarkMove move)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(move);
        int index = model.EndMembers.EndMembers.Index().Where(e => e.Item.Id == move.Mark).Select(e => e.Index).DefaultIfEmpty(-1).First();
        if (index < 0 || !CanMove)
        {
            return model;
        }

        PlaneExtent extent = PlaneExtent.Of(Points.X, Points.Y);
        return Along(Along(model, index, X, move.X, extent.X.Width), index, Y, move.Y, extent.Y.Width);
    }

    // What did not move along an axis keeps its value to the last digit.
    private static MixingModel Along(MixingModel model, int index, string quantity, double value, double width)
    {
        double before = model.EndMembers.EndMembers[index].Values.GetValueOrDefault(quantity, double.NaN);
        if (Math.Abs(value - before) <= 1e-6 * width)
        {
            return model;
        }

        int decimals = Math.Clamp(3 - (int)Math.Floor(Math.Log10(width)), 0, 9);
        Quantity of = Quantity.FindOrFurther(quantity);
        return SetEdits.WithValue(model, index, quantity, Math.Clamp(Math.Round(value, decimals), of.Lowest, of.Highest));
    }

    private string Chosen(string? wanted, string[] usual) =>
        wanted is not null && Axes.Contains(wanted) ? wanted : Array.Find(usual, Axes.Contains) ?? (Axes.Count > 0 ? Axes[0] : usual[0]);

    private void Draw(bool withShares)
    {
        MixingModel model = Shown;
        IReadOnlyList<string>? permitted = Permitted(model);
        DrawPoints(model);
        Sources = PropertySource.Of(model.EndMembers, X, Y, model.Fit.Factors, permitted);
        Processes = ProcessDirection.Of(model.Processes, X, Y, model.Fit.Factors);
        if (withShares)
        {
            Shares = PlaneShares.Of(model, permitted, Values(model), _counts);
        }
    }

    private IReadOnlyList<string>? Permitted(MixingModel model) => model.LayersOrAll.FirstOrDefault(l => l.Id == LayerId)?.EndMembers;

    private IReadOnlyList<double[]> Values(MixingModel model) => [.. model.Tracers.Select(Columns.Values)];

    private void DrawPoints(MixingModel model)
    {
        if (_drawn is { } drawn && ReferenceEquals(drawn.Columns, Columns) && drawn.X == X && drawn.Y == Y && drawn.Colour == Colour
            && drawn.Layer == LayerId && drawn.Layers.SequenceEqual(model.LayersOrAll))
        {
            return;
        }

        _drawn = (Columns, X, Y, Colour, LayerId, model.LayersOrAll);
        int wanted = LayerId is null ? -1 : model.LayersOrAll.Select(l => l.Id).ToList().IndexOf(LayerId);
        _counts = Array.ConvertAll(_census!.LayerOf, layer => layer >= 0 && (wanted < 0 || layer == wanted));
        int[] rows = [.. Enumerable.Range(0, _counts.Length).Where(row => _counts[row])];
        Looked = rows.Length;
        PointColour colour = Colour.Length == 0
            ? new OneColour("--faint")
            : new SequentialColour(TracerText.Name(Colour), TracerText.Unit(Colour, model.EndMembers), Of(Colour, rows));
        Points = new PointLayer("samples", "Samples", Of(X, rows), Of(Y, rows), colour) { Rows = rows, Size = 6 };
    }

    private double[] Of(string quantity, int[] rows)
    {
        double[] values = Columns.Values(quantity);
        return Array.ConvertAll(rows, row => values[row]);
    }
}
