using System.Globalization;
using System.Text;

namespace WaterMix.Web.State.Figures;

/// <summary>A map as the texts of an SVG drawing.</summary>
/// <param name="Land">The data of the land's path; empty where no land is in view.</param>
/// <param name="Graticule">The data of the path of meridians and parallels.</param>
/// <param name="Labels">Degrees along the edges.</param>
/// <param name="Track">The data of the path that joins the stations.</param>
/// <param name="Stations">The stations in view.</param>
public sealed record MapDrawing(string Land, string Graticule, IReadOnlyList<MapLabel> Labels, string Track, IReadOnlyList<MapMark> Stations)
{
    /// <summary>Corners of land nearer than this to the one before are left out: they are not seen.</summary>
    private const double LeastStep = 0.6;

    private static readonly double[] RoundSteps = [0.005, 0.01, 0.02, 0.05, 0.1, 0.2, 0.5, 1, 2, 5, 10, 20, 30, 60];

    /// <summary>Draws a window.</summary>
    /// <param name="view">The window.</param>
    /// <param name="land">The land.</param>
    /// <param name="stations">The stations, in the order of the track.</param>
    public static MapDrawing Of(MapView view, Coastline land, IReadOnlyList<MapStation> stations)
    {
        ArgumentNullException.ThrowIfNull(view);
        ArgumentNullException.ThrowIfNull(land);
        ArgumentNullException.ThrowIfNull(stations);
        (string graticule, IReadOnlyList<MapLabel> labels) = Degrees(view);
        MapMark[] marks = [.. stations
            .Where(s => double.IsFinite(s.Latitude) && double.IsFinite(s.Longitude))
            .Select(s => Mark(view, s))];
        return new MapDrawing(LandPath(view, land), graticule, labels, TrackPath(marks), marks);
    }

    private static MapMark Mark(MapView view, MapStation station)
    {
        PlanePoint at = view.Place(station.Longitude, station.Latitude);
        return new MapMark(station, at.X, at.Y, $"translate({Text(at.X)} {Text(at.Y)})", ShapePath.Of(station.Shape, 4.5));
    }

    private static string LandPath(MapView view, Coastline land)
    {
        var path = new StringBuilder();
        foreach (PlanePoint[] ring in land.Rings)
        {
            foreach (double turn in (double[])[-360, 0, 360])
            {
                PlanePoint[] placed = [.. ring.Select(p => new PlanePoint(
                    (MapView.Width / 2) + ((p.X + turn - view.Longitude) * view.ScaleEast),
                    (MapView.Height / 2) - ((p.Y - view.Latitude) * view.Scale)))];
                Append(path, RectangleClip.Of(placed, -20, -20, MapView.Width + 20, MapView.Height + 20));
            }
        }

        return path.ToString();
    }

    private static void Append(StringBuilder path, IReadOnlyList<PlanePoint> ring)
    {
        if (ring.Count < 3)
        {
            return;
        }

        PlanePoint last = ring[0];
        path.Append(CultureInfo.InvariantCulture, $"M{Text(last.X)},{Text(last.Y)}");
        foreach (PlanePoint point in ring.Skip(1))
        {
            if (Math.Abs(point.X - last.X) + Math.Abs(point.Y - last.Y) >= LeastStep)
            {
                path.Append(CultureInfo.InvariantCulture, $"L{Text(point.X)},{Text(point.Y)}");
                last = point;
            }
        }

        path.Append('Z');
    }

    private static string TrackPath(MapMark[] marks)
    {
        var path = new StringBuilder();
        double last = double.NaN;
        foreach (MapMark mark in marks)
        {
            bool breaks = !(Math.Abs(mark.X - last) < MapView.Width);
            path.Append(CultureInfo.InvariantCulture, $"{(breaks ? 'M' : 'L')}{Text(mark.X)},{Text(mark.Y)}");
            last = mark.X;
        }

        return path.ToString();
    }

    private static (string Path, IReadOnlyList<MapLabel> Labels) Degrees(MapView view)
    {
        var path = new StringBuilder();
        var labels = new List<MapLabel>();
        double halfEast = MapView.Width / view.ScaleEast / 2;
        double stepEast = Step(2 * halfEast, 6);
        double stepNorth = Step(view.Span, 5);
        for (double k = Math.Ceiling((view.Longitude - halfEast) / stepEast); k * stepEast <= view.Longitude + halfEast; k++)
        {
            double x = (MapView.Width / 2) + (((k * stepEast) - view.Longitude) * view.ScaleEast);
            path.Append(CultureInfo.InvariantCulture, $"M{Text(x)},0V{Text(MapView.Height)}");
            if (x > 40 && x < MapView.Width - 24)
            {
                labels.Add(new MapLabel(Text(x), Text(MapView.Height - 6), "middle", FigureText.Longitude(k * stepEast, Decimals(stepEast))));
            }
        }

        double north = Math.Min(90, view.Latitude + (view.Span / 2));
        for (double k = Math.Ceiling(Math.Max(-90, view.Latitude - (view.Span / 2)) / stepNorth); k * stepNorth <= north; k++)
        {
            double y = (MapView.Height / 2) - (((k * stepNorth) - view.Latitude) * view.Scale);
            path.Append(CultureInfo.InvariantCulture, $"M0,{Text(y)}H{Text(MapView.Width)}");
            if (y > 16 && y < MapView.Height - 24)
            {
                labels.Add(new MapLabel("6", Text(y - 4), "start", FigureText.Latitude(k * stepNorth, Decimals(stepNorth))));
            }
        }

        return (path.ToString(), labels);
    }

    private static double Step(double width, int about) => RoundSteps.FirstOrDefault(s => width / s <= about, RoundSteps[^1]);

    private static int Decimals(double step) => step >= 1 ? 0 : step >= 0.1 ? 1 : step >= 0.01 ? 2 : 3;

    private static string Text(double number) => number.ToString("0.#", CultureInfo.InvariantCulture);
}

/// <summary>Degrees at the edge of a map.</summary>
/// <param name="X">Where it stands.</param>
/// <param name="Y">Where it stands.</param>
/// <param name="Anchor">start or middle.</param>
/// <param name="Text">The degrees.</param>
public sealed record MapLabel(string X, string Y, string Anchor, string Text);

/// <summary>A station on the drawing.</summary>
/// <param name="Station">The station.</param>
/// <param name="X">Where it stands.</param>
/// <param name="Y">Where it stands.</param>
/// <param name="Transform">The SVG transform that puts its mark there.</param>
/// <param name="Path">The outline of its mark.</param>
public sealed record MapMark(MapStation Station, double X, double Y, string Transform, string Path);
