using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;

namespace WaterMix.Web.State.Figures;

/// <summary>An end-member in the plane of two quantities.</summary>
/// <param name="Id">Its id.</param>
/// <param name="X">Its value along x; NaN where it has none.</param>
/// <param name="Y">Its value along y; NaN where it has none.</param>
/// <param name="Colour">Its colour.</param>
/// <param name="Permitted">True where it takes part in the region: it is permitted in the layer that is looked at.</param>
public sealed record PropertySource(string Id, double X, double Y, string Colour, bool Permitted = true)
{
    /// <summary>One standard deviation within the source along x and y, >= 0; null: not drawn.</summary>
    public (double X, double Y)? Spread { get; init; }

    /// <summary>The end-members of a set in the plane of two tracers, in the set's order and colours.</summary>
    /// <param name="set">The set.</param>
    /// <param name="x">Quantity id along x; may be a derived tracer.</param>
    /// <param name="y">Quantity id along y.</param>
    /// <param name="factors">The factors of derived tracers.</param>
    /// <param name="permitted">Ids of the permitted end-members; null for all.</param>
    public static IReadOnlyList<PropertySource> Of(EndMemberSet set, string x, string y, DerivedTracerFactors factors, IReadOnlyList<string>? permitted = null)
    {
        ArgumentNullException.ThrowIfNull(set);
        ArgumentNullException.ThrowIfNull(factors);
        return
        [
            .. set.EndMembers.Select((member, index) => new PropertySource(
                member.Id,
                factors.ValueOf(x, member.Values),
                factors.ValueOf(y, member.Values),
                SourceColours.At(index),
                permitted?.Contains(member.Id) ?? true)
            {
                Spread = member.Sd.TryGetValue(x, out double sx) && member.Sd.TryGetValue(y, out double sy) ? (sx, sy) : null,
            }),
        ];
    }
}
