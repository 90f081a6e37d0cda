using WaterMix.Core.Quantities;
using WaterMix.Core.Seawater;

namespace WaterMix.Web.State.Figures;

/// <summary>Lays samples out as a section.</summary>
internal static class SectionMaker
{
    /// <summary>The section of some rows, or of all.</summary>
    public static SectionColumns Make(FigureColumns columns, SectionAlong along, SectionAgainst against, IReadOnlyList<int>? rows)
    {
        double[] x = along switch
        {
            SectionAlong.Latitude => columns.Values(Quantity.Latitude.Id),
            SectionAlong.Longitude => columns.Values(Quantity.Longitude.Id),
            _ => columns.DistanceKm,
        };
        Quantity down = against switch
        {
            SectionAgainst.Depth => Quantity.Depth,
            SectionAgainst.Sigma0 => Quantity.Sigma0,
            SectionAgainst.Sigma2 => Quantity.Sigma2,
            _ => Quantity.Pressure,
        };
        double[] y = columns.Values(down.Id);
        int[] shown = rows is null ? [.. Enumerable.Range(0, columns.RowCount)] : [.. rows];
        List<StationColumn> stations = StationColumns(columns, x, shown, against == SectionAgainst.Pressure);
        FigureRange? yRange = FigureRange.Of(shown.Select(row => y[row]).Concat(HasFloor(against) ? stations.Select(s => s.Bottom) : []));
        PolygonLayer? bottom = HasFloor(against) ? Floor(stations, yRange) : null;
        FigureAxis yAxis = FigureAxis.For(down) with { Reversed = true, Range = yRange is { } r ? Shown(r, against) : null };
        return new SectionColumns(
            AxisAlong(along),
            yAxis,
            [.. shown.Select(row => x[row])],
            [.. shown.Select(row => y[row])],
            shown,
            [.. stations.Select(s => new FigureTick(s.X, s.Label))],
            bottom);
    }

    private static bool HasFloor(SectionAgainst against) => against is SectionAgainst.Pressure or SectionAgainst.Depth;

    /// <summary>From the surface to a little under the deepest; densities with a margin on both sides.</summary>
    private static FigureRange Shown(FigureRange values, SectionAgainst against) =>
        HasFloor(against) ? new FigureRange(Math.Min(0, values.From), values.To + (0.03 * values.Width)) : values.WithMargin(0.03);

    private static FigureAxis AxisAlong(SectionAlong along) => along switch
    {
        SectionAlong.Latitude => FigureAxis.For(Quantity.Latitude),
        SectionAlong.Longitude => FigureAxis.For(Quantity.Longitude),
        _ => new FigureAxis("distance along the track", "km"),
    };

    private static List<StationColumn> StationColumns(FigureColumns columns, double[] x, int[] shown, bool bottomAsPressure)
    {
        double[] soundings = columns.Values(Quantity.BottomDepth.Id);
        double[] latitudes = columns.Values(Quantity.Latitude.Id);
        var stations = new List<StationColumn>();
        foreach (IGrouping<int, int> station in shown.Where(row => columns.StationOf[row] >= 0).GroupBy(row => columns.StationOf[row]))
        {
            int at = station.First();
            if (!double.IsFinite(x[at]))
            {
                continue;
            }

            double sounding = station.Select(row => soundings[row]).FirstOrDefault(double.IsFinite, double.NaN);
            double bottom = bottomAsPressure && double.IsFinite(sounding) ? SeaPressure.FromDepth(sounding, latitudes[at]) : sounding;
            stations.Add(new StationColumn(x[at], columns.Stations[station.Key].Name, bottom));
        }

        stations.Sort((a, b) => a.X.CompareTo(b.X));
        return stations;
    }

    private static PolygonLayer? Floor(List<StationColumn> stations, FigureRange? shown)
    {
        var known = stations.Where(s => double.IsFinite(s.Bottom)).ToList();
        if (known.Count < 2 || shown is not { } range)
        {
            return null;
        }

        double below = range.To + range.Width;
        return new PolygonLayer(
            "sea-floor",
            "",
            [.. known.Select(s => s.X), known[^1].X, known[0].X],
            [.. known.Select(s => s.Bottom), below, below],
            "--rule")
        {
            Opacity = 1,
        };
    }

    private sealed record StationColumn(double X, string Label, double Bottom);
}
