using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Samples;

/// <summary>
/// Makes the figures of a view. Parts whose choices did not change stay the same objects, so that nothing is made or sent again for them.
/// One making at a time.
/// </summary>
/// <param name="samples">The samples of the study.</param>
public sealed class SampleFigureMaker(StudySamples samples)
{
    private readonly Dictionary<string, (object Key, object Value)> _kept = new(StringComparer.Ordinal);

    /// <summary>The figures of a view.</summary>
    /// <param name="view">What is shown.</param>
    public SampleFigures Make(SampleView view)
    {
        ArgumentNullException.ThrowIfNull(view);
        int[] rows = Kept("rows", view.Filter, () => view.Filter.Rows(samples));
        int cruise = SectionOfCasts.CruiseOf(samples, view.Along, rows);
        string section = SectionOfCasts.QuantityOf(samples, view.Section);
        var place = Kept("place", (rows, cruise), () => SectionOfCasts.Place(samples, cruise, rows));
        string x = samples.Has(view.X) ? view.X : samples.FirstOf("practical_salinity", "absolute_salinity");
        string y = samples.Has(view.Y) ? view.Y : samples.FirstOf("potential_temperature", "in_situ_temperature", "pressure");
        string colour = view.Colour.Length == 0 || samples.Has(view.Colour) ? view.Colour : "";
        MapStation? station = StationProfiles.StationOf(samples, view.Station, rows);
        IReadOnlyList<string> profiles = StationProfiles.QuantitiesOf(samples, view.Profiles);
        string? compared = InstrumentDifference.QuantityOf(samples, view.Compare);
        IReadOnlyList<MapStation> stations = Kept("stations", rows, () => StationsOf(rows));
        return new SampleFigures(
            rows,
            stations,
            Kept("facts", rows, () => CruiseFacts.Of(samples, stations, rows)),
            Kept("section", (place, section), () => SectionOfCasts.Of(samples, cruise, section, place)),
            Kept("property", (rows, x, y, colour), () => PropertyPlot.Of(samples, x, y, colour, rows)),
            Kept("profiles", (station?.Id, string.Join(',', profiles)), () => StationProfiles.Of(samples, station, profiles)),
            compared is null ? null : Kept("difference", (rows, compared), () => InstrumentDifference.Of(samples, compared, rows)));
    }

    private IReadOnlyList<MapStation> StationsOf(int[] rows)
    {
        IReadOnlyList<MapStation> all = samples.Columns.Stations;
        bool[] shown = new bool[all.Count];
        foreach (int row in rows)
        {
            if (samples.Columns.StationOf[row] is >= 0 and var station)
            {
                shown[station] = true;
            }
        }

        return [.. all.Where((_, i) => shown[i])];
    }

    private T Kept<T>(string part, object key, Func<T> make)
        where T : class
    {
        if (_kept.TryGetValue(part, out (object Key, object Value) kept) && kept.Key.Equals(key))
        {
            return (T)kept.Value;
        }

        T made = make();
        _kept[part] = (key, made);
        return made;
    }
}
