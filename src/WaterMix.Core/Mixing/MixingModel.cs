using WaterMix.Core.EndMembers;
using WaterMix.Core.Samples;

namespace WaterMix.Core.Mixing;

/// <summary>Everything that turns samples into fractions: sources, tracers, fit, mass conservation, processes, layers.</summary>
/// <param name="Name">The model's name.</param>
/// <param name="EndMembers">The end-member set.</param>
/// <param name="Tracers">Quantity ids of the rows of the fit, each once.</param>
/// <param name="Fit">How residuals are weighed.</param>
/// <param name="Mass">How mass is conserved.</param>
public sealed record MixingModel(
    string Name,
    EndMemberSet EndMembers,
    IReadOnlyList<string> Tracers,
    Fit Fit,
    MassConservation Mass)
{
    /// <summary>Where the set stands if the model names a file instead of holding it; relative to the model's file. Null: inline.</summary>
    public string? EndMembersFile { get; init; }

    /// <summary>The processes, in the order that results keep.</summary>
    public IReadOnlyList<Process> Processes { get; init; } = [];

    /// <summary>The layers; a sample belongs to the first that takes it. Empty: one layer <c>all</c> with every end-member.</summary>
    public IReadOnlyList<Layer> Layers { get; init; } = [];

    /// <summary>The layers that samples are sorted into: <see cref="Layers"/>, or where there are none, one layer <c>all</c> with every end-member.</summary>
    public IReadOnlyList<Layer> LayersOrAll => Layers.Count > 0 ? Layers : [new Layer("all", [.. EndMembers.EndMembers.Select(e => e.Id)], [])];

    /// <summary>WHP water-sample flags that count as usable.</summary>
    public IReadOnlyList<int> AcceptFlags { get; init; } = [2, 6];

    /// <summary>WHP CTD flags that count as usable.</summary>
    public IReadOnlyList<int> AcceptCtdFlags { get; init; } = [2, 6, 7];

    /// <summary>Which value is preferred where a bottle's and a CTD's exist: bottle or CTD.</summary>
    public ValueOrigin Prefer { get; init; } = ValueOrigin.Bottle;

    /// <summary>True where the other holds the same content; dictionaries in any order.</summary>
    /// <param name="other">Another one, or null.</param>
    public bool Equals(MixingModel? other) =>
        other is not null
        && Name == other.Name
        && EndMembers == other.EndMembers
        && EndMembersFile == other.EndMembersFile
        && Structural.Same(Tracers, other.Tracers)
        && Fit == other.Fit
        && Mass == other.Mass
        && Structural.Same(Processes, other.Processes)
        && Structural.Same(Layers, other.Layers)
        && Structural.Same(AcceptFlags, other.AcceptFlags)
        && Structural.Same(AcceptCtdFlags, other.AcceptCtdFlags)
        && Prefer == other.Prefer;

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(Name, EndMembers, Structural.Hash(Tracers), Fit, Mass);
}
