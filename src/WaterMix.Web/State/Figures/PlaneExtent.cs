namespace WaterMix.Web.State.Figures;

/// <summary>A rectangle in the plane of two quantities.</summary>
/// <param name="X">Along x.</param>
/// <param name="Y">Along y.</param>
public sealed record PlaneExtent(FigureRange X, FigureRange Y)
{
    /// <summary>The smallest one around values; 0 to 1 along an axis without any.</summary>
    /// <param name="x">Values along x, NaN where missing.</param>
    /// <param name="y">Values along y.</param>
    public static PlaneExtent Of(IEnumerable<double> x, IEnumerable<double> y) =>
        new(FigureRange.Of(x) ?? new FigureRange(0, 1), FigureRange.Of(y) ?? new FigureRange(0, 1));

    /// <summary>The smallest one around this and further places.</summary>
    /// <param name="points">The places.</param>
    public PlaneExtent Including(IReadOnlyList<PlanePoint> points) =>
        Of(points.Select(p => p.X).Append(X.From).Append(X.To), points.Select(p => p.Y).Append(Y.From).Append(Y.To));
}
