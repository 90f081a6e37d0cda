using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Samples;

/// <summary>The casts of one cruise as a section: distance along its track against pressure.</summary>
/// <param name="Cruise">The cruise.</param>
/// <param name="Quantity">The quantity that colours it.</param>
/// <param name="Columns">Where the samples stand.</param>
/// <param name="Panels">The one panel.</param>
/// <param name="Caption">What is shown, in a sentence.</param>
public sealed record SectionOfCasts(Guid Cruise, string Quantity, SectionColumns Columns, IReadOnlyList<SectionPanel> Panels, string Caption)
{
    private static readonly string[] Usual = ["oxygen", "potential_temperature", "practical_salinity", "pressure"];

    /// <summary>The cruise whose section is shown: the one asked for, or the first with samples on screen.</summary>
    /// <param name="samples">The samples of the study.</param>
    /// <param name="along">The cruise asked for, or null.</param>
    /// <param name="rows">The rows on screen.</param>
    /// <returns>Its place among the study's cruises.</returns>
    public static int CruiseOf(StudySamples samples, Guid? along, int[] rows)
    {
        ArgumentNullException.ThrowIfNull(samples);
        ArgumentNullException.ThrowIfNull(rows);
        int asked = samples.Cruises.ToList().FindIndex(c => c.Id == along);
        return asked >= 0 ? asked : rows.Length > 0 ? samples.Columns.Locate(rows[0]).Cruise : 0;
    }

    /// <summary>The quantity that colours the section: the one asked for, or the first of a usual order.</summary>
    /// <param name="samples">The samples of the study.</param>
    /// <param name="asked">The quantity asked for; empty for none.</param>
    public static string QuantityOf(StudySamples samples, string asked)
    {
        ArgumentNullException.ThrowIfNull(samples);
        return samples.Has(asked) ? asked : samples.FirstOf(Usual);
    }

    /// <summary>Where the samples of one cruise stand.</summary>
    /// <param name="samples">The samples of the study.</param>
    /// <param name="cruise">The cruise's place.</param>
    /// <param name="rows">The rows on screen, rising.</param>
    public static SectionColumns Place(StudySamples samples, int cruise, int[] rows)
    {
        ArgumentNullException.ThrowIfNull(samples);
        ArgumentNullException.ThrowIfNull(rows);
        int first = samples.Columns.FirstRow(cruise);
        int end = first + samples.Columns.Cruises[cruise].Samples.RowCount;
        return samples.Columns.Section(SectionAlong.Distance, SectionAgainst.Pressure, [.. rows.Where(row => row >= first && row < end)]);
    }

    /// <summary>The section of casts.</summary>
    /// <param name="samples">The samples of the study.</param>
    /// <param name="cruise">The cruise's place.</param>
    /// <param name="quantity">The quantity that colours it.</param>
    /// <param name="place">Where the samples stand.</param>
    public static SectionOfCasts Of(StudySamples samples, int cruise, string quantity, SectionColumns place)
    {
        ArgumentNullException.ThrowIfNull(samples);
        ArgumentNullException.ThrowIfNull(place);
        FigureAxis axis = samples.AxisOf(quantity);
        double[] all = samples.Columns.Values(quantity);
        double[] values = [.. place.Rows.Select(row => all[row])];
        int missing = values.Count(double.IsNaN);
        string caption = $"{samples.Cruises[cruise].Name}: {PlainText.Count(values.Length, "sample")} at {PlainText.Count(place.Stations.Count, "station")}"
            + (missing > 0 ? $"; {PlainText.Count(missing, "hollow mark has", "hollow marks have")} no usable value of {axis.Title}." : ".");
        return new SectionOfCasts(samples.Cruises[cruise].Id, quantity, place, [new SectionPanel(quantity, axis.Label, TracerColour.Of(axis, values))], caption);
    }
}
