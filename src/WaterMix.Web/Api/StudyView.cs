using WaterMix.Workspace.Studies;

namespace WaterMix.Web.Api;

/// <summary>A study as the API gives it.</summary>
/// <param name="Id">The study.</param>
/// <param name="Name">Its name.</param>
/// <param name="Revision">Counts saved edits of the model.</param>
/// <param name="Cruises">The cruises, in the order of their rows.</param>
/// <param name="Runs">The runs, the newest first.</param>
internal sealed record StudyView(Guid Id, string Name, long Revision, IReadOnlyList<CruiseView> Cruises, IReadOnlyList<RunView> Runs)
{
    /// <summary>The view of a study.</summary>
    public static StudyView Of(Study study) => new(
        study.Id,
        study.Name,
        study.Revision,
        [.. study.Cruises.Select(c => new CruiseView(c.Id, c.Name, c.SamplesHash, c.SampleCount))],
        [.. study.Runs.Select(RunView.Of)]);
}

/// <summary>A cruise as the API gives it.</summary>
/// <param name="Id">The cruise.</param>
/// <param name="Name">Its name.</param>
/// <param name="SamplesHash">The key to its samples' columns.</param>
/// <param name="SampleCount">Number of samples.</param>
internal sealed record CruiseView(Guid Id, string Name, string SamplesHash, long SampleCount);
