namespace WaterMix.Web.State.Figures;

/// <summary>
/// A window on the earth: plate carrée with east-west shrunk by the cosine of the middle latitude, so that shapes are true there. The
/// drawing is <see cref="Width"/> by <see cref="Height"/> units.
/// </summary>
/// <param name="Longitude">The longitude in the middle, degrees east; windows may cross the date line.</param>
/// <param name="Latitude">The latitude in the middle, degrees north.</param>
/// <param name="Span">Degrees of latitude from the lower to the upper edge.</param>
public sealed record MapView(double Longitude, double Latitude, double Span)
{
    /// <summary>Width of the drawing.</summary>
    public const double Width = 640;

    /// <summary>Height of the drawing.</summary>
    public const double Height = 420;

    private const double WidestSpan = 180;
    private const double NarrowestSpan = 0.02;

    /// <summary>Units per degree of latitude.</summary>
    public double Scale => Height / Span;

    /// <summary>Units per degree of longitude.</summary>
    public double ScaleEast => Scale * Shrink;

    private double Shrink => Math.Max(0.2, Math.Cos(double.DegreesToRadians(Latitude)));

    /// <summary>The smallest window that shows all stations with a margin; the whole earth without any.</summary>
    /// <param name="stations">The stations.</param>
    public static MapView Of(IReadOnlyList<MapStation> stations)
    {
        ArgumentNullException.ThrowIfNull(stations);
        MapStation[] placed = [.. stations.Where(s => double.IsFinite(s.Latitude) && double.IsFinite(s.Longitude))];
        if (placed.Length == 0)
        {
            return new MapView(0, 0, WidestSpan);
        }

        double south = placed.Min(s => s.Latitude);
        double north = placed.Max(s => s.Latitude);
        (double west, double east) = ShortestArc([.. placed.Select(s => s.Longitude)]);
        double latitude = (south + north) / 2;
        double shrink = Math.Max(0.2, Math.Cos(double.DegreesToRadians(latitude)));
        double span = Math.Max(north - south, (east - west) * shrink * Height / Width);
        return new MapView(Wrapped((west + east) / 2), latitude, Math.Clamp(Math.Max(1, span) * 1.3, NarrowestSpan, WidestSpan));
    }

    /// <summary>Where a position stands in the drawing, on the side of the earth nearest to the middle.</summary>
    /// <param name="longitude">Degrees east.</param>
    /// <param name="latitude">Degrees north.</param>
    public PlanePoint Place(double longitude, double latitude) =>
        new((Width / 2) + (Wrapped(longitude - Longitude) * ScaleEast), (Height / 2) - ((latitude - Latitude) * Scale));

    /// <summary>The window with more or less of the earth in it.</summary>
    /// <param name="factor">2 shows half as much.</param>
    public MapView Zoomed(double factor) => this with { Span = Math.Clamp(Span / factor, NarrowestSpan, WidestSpan) };

    /// <summary>The window moved by shares of its size.</summary>
    /// <param name="east">To the east, 1 a whole width.</param>
    /// <param name="north">To the north.</param>
    public MapView Moved(double east, double north) =>
        new(Wrapped(Longitude + (east * Width / ScaleEast)), Math.Clamp(Latitude + (north * Span), -85, 85), Span);

    /// <summary>A longitude within half a turn of 0.</summary>
    internal static double Wrapped(double degrees) => Math.IEEERemainder(degrees, 360);

    /// <summary>The shortest arc that holds all longitudes: what is left when the widest gap is taken out.</summary>
    private static (double West, double East) ShortestArc(double[] longitudes)
    {
        Array.Sort(longitudes);
        double widest = longitudes[0] + 360 - longitudes[^1];
        (double West, double East) arc = (longitudes[0], longitudes[^1]);
        for (int i = 1; i < longitudes.Length; i++)
        {
            double gap = longitudes[i] - longitudes[i - 1];
            if (gap > widest)
            {
                widest = gap;
                arc = (longitudes[i], longitudes[i - 1] + 360);
            }
        }

        return arc;
    }
}
