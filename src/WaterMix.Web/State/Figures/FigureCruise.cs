using WaterMix.Core.Mixing;
using WaterMix.Core.Samples;

namespace WaterMix.Web.State.Figures;

/// <summary>The samples of a cruise and, where there is a run, what became of them.</summary>
/// <param name="Name">The cruise's name.</param>
/// <param name="Samples">The samples.</param>
/// <param name="Result">One entry per sample, or null without a run.</param>
public sealed record FigureCruise(string Name, SampleTable Samples, MixingResult? Result = null);
