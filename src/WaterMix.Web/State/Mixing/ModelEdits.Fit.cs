using System.Globalization;
using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;

namespace WaterMix.Web.State.Mixing;

public static partial class ModelEdits
{
    /// <summary>Fits by generalised least squares; measurement errors stay, missing ones take the usual value.</summary>
    /// <param name="model">The model.</param>
    /// <param name="spread">How the spread within the sources counts.</param>
    public static MixingModel WithLeastSquares(MixingModel model, EndMemberSpread spread)
    {
        ArgumentNullException.ThrowIfNull(model);
        GeneralisedLeastSquares fit = model.Fit as GeneralisedLeastSquares
            ?? new GeneralisedLeastSquares { MeasurementSd = model.Fit.MeasurementSd, Factors = model.Fit.Factors };
        return UsualErrors.FillIn(model with { Fit = fit with { Spread = spread } });
    }

    /// <summary>Fits by weighted rows, with weights proposed from the end-members; measurement errors stay.</summary>
    /// <param name="model">The model.</param>
    public static MixingModel WithWeightedRows(MixingModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        return model.Fit is WeightedRows
            ? model
            : model with { Fit = new WeightedRows(ProposedWeights(model)) { MeasurementSd = model.Fit.MeasurementSd, Factors = model.Fit.Factors } };
    }

    /// <summary>Changes the weighted rows.</summary>
    /// <param name="model">A model whose fit has weighted rows.</param>
    /// <param name="change">The change.</param>
    public static MixingModel OfRows(MixingModel model, Func<WeightedRows, WeightedRows> change)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(change);
        return model.Fit is WeightedRows rows ? model with { Fit = change(rows) } : model;
    }

    /// <summary>Sets the weight of a tracer.</summary>
    /// <param name="model">A model whose fit has weighted rows.</param>
    /// <param name="tracer">The tracer's id.</param>
    /// <param name="weight">The weight, above 0.</param>
    public static MixingModel WithWeight(MixingModel model, string tracer, double weight) =>
        OfRows(model, rows => rows with { Weights = Changed(rows.Weights, tracer, weight) });

    /// <summary>
    /// Weights by the published recipe (<c>TomczakLarge1989</c>, from memory): W = s^2 / v, with s the standard deviation of the tracer over
    /// the end-members and v the largest variance within one of them; 1 where the end-members give no spread or do not differ.
    /// </summary>
    /// <param name="model">The model.</param>
    public static IReadOnlyDictionary<string, double> ProposedWeights(MixingModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        return model.Tracers.ToDictionary(t => t, t => ProposedWeight(model, t), StringComparer.Ordinal);
    }

    /// <summary>Sets the measurement error of a quantity.</summary>
    /// <param name="model">The model.</param>
    /// <param name="quantity">A parent quantity of a tracer.</param>
    /// <param name="error">The error.</param>
    public static MixingModel WithError(MixingModel model, string quantity, MeasurementError error)
    {
        ArgumentNullException.ThrowIfNull(model);
        return model with { Fit = model.Fit with { MeasurementSd = Changed(model.Fit.MeasurementSd, quantity, error) } };
    }

    private static double ProposedWeight(MixingModel model, string tracer)
    {
        IReadOnlyList<EndMember> set = model.EndMembers.EndMembers;
        double between = model.Fit.Factors.SpreadOf(tracer, set, SdDivisor.N).Sd;
        double within = set.Select(e => VarianceWithin(e, model.Fit.Factors.FormOf(tracer).Terms)).DefaultIfEmpty(double.NaN).Max();
        double weight = between * between / within;
        return weight > 0 && double.IsFinite(weight) ? FourDigits(weight) : 1;
    }

    private static double VarianceWithin(EndMember endMember, IReadOnlyList<(string Parent, double Factor)> terms) =>
        terms.Sum(term => Math.Pow(term.Factor * endMember.Sd.GetValueOrDefault(term.Parent, 0), 2));

    private static double FourDigits(double value) => double.Parse(value.ToString("G4", CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
}
