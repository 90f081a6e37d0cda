namespace WaterMix.Web.State.Mixing;

/// <summary>A layer in numbers.</summary>
/// <param name="Id">The layer.</param>
/// <param name="Samples">Number of samples that it takes.</param>
/// <param name="TooFew">Of these, samples with fewer usable tracers than unknowns: they cannot be solved.</param>
/// <param name="Tracers">Tracers that are rows in this layer.</param>
/// <param name="EndMembers">End-members permitted.</param>
/// <param name="ProcessesAlways">Processes that act everywhere.</param>
/// <param name="ProcessesInPlaces">Processes that act where their conditions hold.</param>
public sealed record LayerCount(string Id, long Samples, long TooFew, int Tracers, int EndMembers, int ProcessesAlways, int ProcessesInPlaces)
{
    /// <summary>Unknowns where only the processes without conditions act: fractions less one, plus processes.</summary>
    public int Unknowns => EndMembers - 1 + ProcessesAlways;

    /// <summary>Unknowns where all processes act.</summary>
    public int UnknownsAtMost => Unknowns + ProcessesInPlaces;
}
