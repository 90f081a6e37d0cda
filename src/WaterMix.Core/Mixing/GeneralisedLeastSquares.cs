using WaterMix.Core.EndMembers;

namespace WaterMix.Core.Mixing;

/// <summary>Minimise (d - Gx - By)' S^-1 (d - Gx - By), S from the errors of measurement and the spread within the sources.</summary>
public sealed record GeneralisedLeastSquares : Fit
{
    /// <summary>How the spread within the sources enters S.</summary>
    public EndMemberSpread Spread { get; init; } = EndMemberSpread.Iterated;

    /// <summary>A full measurement covariance over quantity ids, which takes the place of <see cref="Fit.MeasurementSd"/> for those; or null.</summary>
    public TracerMatrix? MeasurementCovariance { get; init; }
}
