using System.Globalization;

namespace WaterMix.Web.State.Figures;

/// <summary>The outline of a mark about the origin, as the data of an SVG path.</summary>
public static class ShapePath
{
    /// <summary>The outline of a shape.</summary>
    /// <param name="shape">The shape.</param>
    /// <param name="radius">About half its width, px.</param>
    public static string Of(PointShape shape, double radius)
    {
        string r = Text(radius);
        string end = Text(radius * 1.25);
        string side = Text(radius * 0.88);
        string wide = Text(radius * 1.2);
        string arm = Text(radius * 0.25);
        string tall = Text(radius * 1.15);
        string half = Text(radius * 0.85);
        return shape switch
        {
            PointShape.Square => $"M-{side},-{side}H{side}V{side}H-{side}Z",
            PointShape.Diamond => $"M0,-{wide}L{wide},0L0,{wide}L-{wide},0Z",
            PointShape.Triangle => $"M0,-{tall}L{tall},{half}H-{tall}Z",
            PointShape.TriangleDown => $"M0,{tall}L{tall},-{half}H-{tall}Z",
            PointShape.Plus => $"M-{arm},-{end}H{arm}V-{arm}H{end}V{arm}H{arm}V{end}H-{arm}V{arm}H-{end}V-{arm}H-{arm}Z",
            _ => $"M-{r},0A{r},{r} 0 1 1 {r},0A{r},{r} 0 1 1 -{r},0Z",
        };
    }

    private static string Text(double number) => number.ToString("0.##", CultureInfo.InvariantCulture);
}
