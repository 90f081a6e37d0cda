using WaterMix.Core.Mixing;

namespace WaterMix.Web.State.Mixing;

/// <summary>Measurement errors to begin with, where a cruise says nothing better.</summary>
/// <remarks>
/// Temperature 0.002 degC and salinity 0.002: accuracy that <c>McTaggart2010</c> asks of a CTD. Oxygen 1 %, nitrate 1 %, phosphate 2 %,
/// silicate 2 %, inorganic carbon and alkalinity 2 umol/kg: from memory. The parts in units beside a percentage are common practice, no
/// source: they keep small concentrations from counting as exact.
/// </remarks>
public static class UsualErrors
{
    private static readonly Dictionary<string, MeasurementError> All = new(StringComparer.Ordinal)
    {
        ["potential_temperature"] = new(0.002),
        ["conservative_temperature"] = new(0.002),
        ["practical_salinity"] = new(0.002),
        ["absolute_salinity"] = new(0.002),
        ["oxygen"] = new(0.5, 0.01),
        ["nitrate"] = new(0.1, 0.01),
        ["phosphate"] = new(0.01, 0.02),
        ["silicate"] = new(0.2, 0.02),
        ["dissolved_inorganic_carbon"] = new(2),
        ["total_alkalinity"] = new(2),
    };

    /// <summary>The usual error of a quantity; null where there is none.</summary>
    /// <param name="quantity">The quantity's id.</param>
    public static MeasurementError? Of(string quantity) => All.GetValueOrDefault(quantity);

    /// <summary>Gives every fitted quantity without a measurement error its usual one, where there is one.</summary>
    /// <param name="model">The model.</param>
    public static MixingModel FillIn(MixingModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        var covered = (model.Fit as GeneralisedLeastSquares)?.MeasurementCovariance?.Tracers ?? [];
        var missing = ModelEdits.Parents(model).Where(p => All.ContainsKey(p) && !covered.Contains(p) && !model.Fit.MeasurementSd.ContainsKey(p)).ToArray();
        return missing.Aggregate(model, (m, p) => ModelEdits.WithError(m, p, All[p]));
    }
}
