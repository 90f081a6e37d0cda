using WaterMix.Core.Mixing;
using WaterMix.Workspace.Cruises;
using WaterMix.Workspace.Runs;

namespace WaterMix.Workspace.Studies;

/// <summary>A working folder: samples, the model being edited, runs.</summary>
/// <param name="Id">The study.</param>
/// <param name="Name">Its name.</param>
/// <param name="Draft">The model being edited, its set inline; may be incomplete.</param>
/// <param name="Revision">Counts saved edits of the draft.</param>
/// <param name="Cruises">The cruises, in the order of their rows.</param>
/// <param name="Runs">The runs, the newest first.</param>
public sealed record Study(Guid Id, string Name, MixingModel Draft, long Revision, IReadOnlyList<Cruise> Cruises, IReadOnlyList<Run> Runs);
