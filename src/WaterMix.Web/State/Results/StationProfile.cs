using WaterMix.Core.Quantities;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Results;

/// <summary>Fractions and tracers of one station, to be drawn against pressure.</summary>
/// <param name="Station">The station.</param>
/// <param name="Series">The fractions in one plot; then for each tracer the observed and the fitted values.</param>
public sealed record StationProfile(MapStation Station, IReadOnlyList<ProfileSeries> Series)
{
    /// <summary>The profiles of a station.</summary>
    /// <param name="results">The results.</param>
    /// <param name="station">One of the stations of <see cref="RunResults.Columns"/>.</param>
    public static StationProfile Of(RunResults results, MapStation station)
    {
        ArgumentNullException.ThrowIfNull(results);
        ArgumentNullException.ThrowIfNull(station);
        int[] rows = [.. station.Rows];
        var fraction = new FigureAxis("fraction", "") { Range = new FigureRange(-0.05, 1.05) };
        PointShape[] shapes = Enum.GetValues<PointShape>();
        List<ProfileSeries> series = [];
        foreach ((int index, string source) in results.Sources.Select(s => s.Id).Index())
        {
            double[] fractions = SectionPanels.At(results.Columns.Fractions(source), rows);
            if (Array.Exists(fractions, double.IsFinite))
            {
                series.Add(new ProfileSeries("fraction_" + source, source, fraction, fractions, rows, SourceColours.At(index), shapes[index % shapes.Length]) { Joined = true });
            }
        }

        foreach (string tracer in results.Model.Tracers)
        {
            Quantity quantity = results.QuantityOf(tracer);
            FigureAxis axis = FigureAxis.For(quantity);
            double[] observed = SectionPanels.At(results.Columns.Values(tracer), rows);
            double[] residuals = SectionPanels.At(results.Columns.Residuals(tracer), rows);
            series.Add(new ProfileSeries("observed_" + tracer, "observed", axis, observed, rows, "--ink", PointShape.Circle));
            series.Add(new ProfileSeries("fitted_" + tracer, "fitted", axis, [.. observed.Zip(residuals, (o, r) => o - r)], rows, "--pencil", PointShape.Plus));
        }

        return new StationProfile(station, series);
    }
}
