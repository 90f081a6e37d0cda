using WaterMix.Core.Mixing;
using WaterMix.Workspace.Runs;

namespace WaterMix.Web.Api;

/// <summary>A run as the API gives it.</summary>
/// <param name="Id">The run.</param>
/// <param name="Name">Its name.</param>
/// <param name="Started">When it was started, UTC.</param>
/// <param name="State"><c>waiting</c>, <c>running</c>, <c>finished</c>, <c>cancelled</c> or <c>failed</c>.</param>
/// <param name="Done">Samples solved so far.</param>
/// <param name="Total">Samples in all.</param>
/// <param name="ModelHash">SHA-256 of the model.</param>
/// <param name="Statuses">Number of samples by status, once finished.</param>
/// <param name="Problem">What went wrong and what to do.</param>
internal sealed record RunView(
    Guid Id, string Name, DateTimeOffset Started, string State, long Done, long Total, string ModelHash, IReadOnlyDictionary<string, long> Statuses, string? Problem)
{
    /// <summary>The view of a run.</summary>
    public static RunView Of(Run run) => new(
        run.Id,
        run.Name,
        run.Started,
        NameOf(run.State),
        run.Done,
        run.Total,
        run.ModelHash,
        run.Statuses.ToDictionary(s => s.Key.Name(), s => s.Value),
        run.Problem);

    /// <summary>A state in the API's words.</summary>
    public static string NameOf(RunState state) => state switch
    {
        RunState.Waiting => "waiting",
        RunState.Running => "running",
        RunState.Finished => "finished",
        RunState.Cancelled => "cancelled",
        _ => "failed",
    };
}
