using WaterMix.Core.Mixing;
using WaterMix.Workspace.Storage;

namespace WaterMix.Workspace.Runs;

/// <summary>A run that the worker has in hand: its models made ready, its chunks that are still to do.</summary>
internal sealed class ActiveRun : IDisposable
{
    private readonly Dictionary<int, PreparedModel> _models = [];

    /// <summary>Takes a run in hand.</summary>
    /// <param name="row">The run with its cruises and chunks.</param>
    /// <param name="stopping">Stops the work when the app stops.</param>
    public ActiveRun(RunRow row, CancellationToken stopping)
    {
        Row = row;
        Model = StoredJson.Model(row.Model);
        Cancellation = CancellationTokenSource.CreateLinkedTokenSource(stopping);
        Left = new Queue<ChunkRow>(row.Chunks.Where(c => !c.IsDone).OrderBy(c => c.Number));
    }

    /// <summary>The run as it was when it was taken in hand.</summary>
    public RunRow Row { get; }

    /// <summary>Its model.</summary>
    public MixingModel Model { get; }

    /// <summary>Ends the work on this run.</summary>
    public CancellationTokenSource Cancellation { get; }

    /// <summary>The chunks still to do.</summary>
    public Queue<ChunkRow> Left { get; }

    /// <summary>The model for one of its cruises.</summary>
    /// <param name="cruise">The cruise's place in the run.</param>
    public PreparedModel ModelFor(int cruise)
    {
        if (!_models.TryGetValue(cruise, out PreparedModel? model))
        {
            model = PreparedModel.From(CruiseModel.For(Model, StoredJson.Errors(CruiseAt(cruise).MeasurementSd)));
            _models.Add(cruise, model);
        }

        return model;
    }

    /// <summary>One of its cruises.</summary>
    /// <param name="cruise">The cruise's place in the run.</param>
    public RunCruiseRow CruiseAt(int cruise) => Row.Cruises.Single(c => c.Position == cruise);

    /// <inheritdoc/>
    public void Dispose() => Cancellation.Dispose();
}
