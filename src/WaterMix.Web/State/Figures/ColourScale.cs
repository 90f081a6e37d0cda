namespace WaterMix.Web.State.Figures;

/// <summary>Scales that map a value on a colour.</summary>
public static class ColourScale
{
    /// <summary>Cividis (<c>NunezAndertonRenslow2018</c>) at equal steps from 0 to 1, as plotly.js 3.7.0 tabulates it.</summary>
    private static readonly Rgb[] CividisStops =
    [
        new(0, 32, 76), new(0, 42, 102), new(0, 52, 110), new(39, 63, 108), new(60, 74, 107), new(76, 85, 107),
        new(91, 95, 109), new(104, 106, 112), new(117, 117, 117), new(131, 129, 120), new(146, 140, 120), new(161, 152, 118),
        new(176, 165, 114), new(192, 177, 109), new(209, 191, 102), new(225, 204, 92), new(243, 219, 79), new(255, 233, 69),
    ];

    /// <summary>Blue over a neutral centre to red: three steps of the scheme BuRd of <c>Tol2021</c>.</summary>
    private static readonly Rgb[] LightPair = [Rgb.Parse("#2166AC"), Rgb.Parse("#F7F7F7"), Rgb.Parse("#B2182B")];

    /// <summary>The same on a dark sheet: lighter ends, and a centre that is neutral there.</summary>
    private static readonly Rgb[] DarkPair = [Rgb.Parse("#4393C3"), Rgb.Parse("#3A454B"), Rgb.Parse("#D6604D")];

    /// <summary>The colour of a place on the cividis scale.</summary>
    /// <param name="t">0 to 1.</param>
    public static Rgb Cividis(double t) => Between(CividisStops, t);

    /// <summary>The colour of a place on the pair of colours.</summary>
    /// <param name="t">0 to 1, the neutral centre at 0.5.</param>
    /// <param name="dark">True for the dark theme.</param>
    public static Rgb Diverging(double t, bool dark) => Between(dark ? DarkPair : LightPair, t);

    private static Rgb Between(Rgb[] stops, double t)
    {
        double place = Math.Clamp(t, 0, 1) * (stops.Length - 1);
        int lower = Math.Min((int)place, stops.Length - 2);
        return stops[lower].Mixed(stops[lower + 1], place - lower);
    }
}
