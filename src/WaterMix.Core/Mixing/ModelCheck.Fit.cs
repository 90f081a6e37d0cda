using WaterMix.Core.EndMembers;

namespace WaterMix.Core.Mixing;

public static partial class ModelCheck
{
    private static void OfFit(MixingModel model, CheckFindings findings)
    {
        IReadOnlyList<string> parents = Parents(model);
        foreach ((string quantity, MeasurementError error) in model.Fit.MeasurementSd)
        {
            string at = JsonPointer.Append("/fit/measurementSd", quantity);
            if (EndMemberSetCheck.IsKnown(quantity, model.EndMembers, at, findings))
            {
                Error(error, at, findings);
                NoteUnlessFitted(quantity, parents, at, "a measurement error", findings);
            }
        }

        if (model.Fit is GeneralisedLeastSquares leastSquares)
        {
            OfLeastSquares(model, leastSquares, parents, findings);
        }
        else if (model.Fit is WeightedRows rows)
        {
            OfWeightedRows(model, rows, findings);
        }

        Factors(model.Fit.Factors, findings);
        if (model.Mass.Weight is { } weight && !(weight > 0 && double.IsFinite(weight)))
        {
            findings.Error("/massConservation/weight", "a weight above 0", Text(weight), "Give a positive weight, or \"kind\": \"exact\".");
        }
    }

    private static void OfLeastSquares(MixingModel model, GeneralisedLeastSquares fit, IReadOnlyList<string> parents, CheckFindings findings)
    {
        const string At = "/fit/measurementCovariance";
        if (fit.MeasurementCovariance is { } covariance)
        {
            for (int i = 0; i < covariance.Tracers.Count; i++)
            {
                string at = JsonPointer.Append(At + "/tracers", i);
                if (EndMemberSetCheck.IsKnown(covariance.Tracers[i], model.EndMembers, at, findings))
                {
                    NoteUnlessFitted(covariance.Tracers[i], parents, at, "a measurement error", findings);
                }
            }

            TracerMatrixCheck.Covariance(covariance, At, findings);
        }

        foreach (string parent in parents)
        {
            if (!fit.MeasurementSd.ContainsKey(parent) && fit.MeasurementCovariance?.Tracers.Contains(parent) != true)
            {
                findings.Error(
                    JsonPointer.Append("/fit/measurementSd", parent),
                    $"a measurement error of {parent}, which is fitted",
                    "none",
                    $"Add \"{parent}\" to \"measurementSd\" with one standard deviation of the measurement.");
            }
        }
    }

    private static void OfWeightedRows(MixingModel model, WeightedRows fit, CheckFindings findings)
    {
        foreach ((string tracer, double weight) in fit.Weights)
        {
            string at = JsonPointer.Append("/fit/weights", tracer);
            if (EndMemberSetCheck.IsKnown(tracer, model.EndMembers, at, findings))
            {
                NoteUnlessFitted(tracer, model.Tracers, at, "a weight", findings);
            }

            if (!(weight > 0 && double.IsFinite(weight)))
            {
                findings.Error(at, "a weight above 0", Text(weight), "Give a positive weight; leave a tracer out of \"tracers\" to give it none.");
            }
        }

        foreach ((_, string tracer) in Rows(model))
        {
            if (!fit.Weights.ContainsKey(tracer))
            {
                findings.Error(JsonPointer.Append("/fit/weights", tracer), $"a weight of {tracer}, which is fitted", "none", $"Add \"{tracer}\" to \"weights\".");
            }
        }

        if (fit.Standardise != Standardisation.None)
        {
            foreach (Layer layer in model.LayersOrAll)
            {
                Spreads(model, fit, layer, findings);
            }
        }
    }

    // How far the sources of a layer lie apart in each tracer: what a standardised row is divided by.
    private static void Spreads(MixingModel model, WeightedRows fit, Layer layer, CheckFindings findings)
    {
        EndMember[] over = StandardisedOver(model, fit, layer);
        foreach ((int i, string tracer) in Rows(model))
        {
            (_, double sd) = fit.Factors.SpreadOf(tracer, over, fit.SdOver);
            if (double.IsNaN(sd))
            {
                continue;
            }

            string where = fit.Over == StandardiseOver.Set ? "over the set" : $"in layer \"{layer.Id}\"";
            string at = JsonPointer.Append("/tracers", i);
            if (sd == 0)
            {
                findings.Warning(at, "end-members that differ in each tracer", $"no difference in {tracer} {where}", $"{tracer} is left out of layer \"{layer.Id}\"; check the values.");
            }
            else if (MeasurementSd(fit, tracer, over) is var measured && sd < 3 * measured)
            {
                findings.Warning(
                    at,
                    "end-members that differ by more than 3 measurement errors",
                    $"{tracer} {where}: they differ by {Text(sd)} (one standard deviation), the measurement by {Text(measured)}",
                    "Standardising blows its noise up; leave the tracer out or give it a small weight.");
            }
        }
    }

    private static EndMember[] StandardisedOver(MixingModel model, WeightedRows fit, Layer layer) =>
        fit.Over == StandardiseOver.Set ? [.. model.EndMembers.EndMembers] : [.. Permitted(model, layer).Select(p => p.EndMember)];

    // The number of tracers that are rows in a layer: standardising leaves out those in which the end-members do not differ.
    private static int RowsIn(MixingModel model, Layer layer)
    {
        if (model.Fit is not WeightedRows { Standardise: not Standardisation.None } fit)
        {
            return Rows(model).Count();
        }

        EndMember[] over = StandardisedOver(model, fit, layer);
        return Rows(model).Count(row => fit.Factors.SpreadOf(row.Tracer, over, fit.SdOver).Sd != 0);
    }

    // One standard deviation of a tracer's measurement near the end-members' mean; NaN where it is not given for every parent.
    private static double MeasurementSd(WeightedRows fit, string tracer, EndMember[] over)
    {
        double variance = 0;
        foreach ((string parent, double factor) in fit.Factors.FormOf(tracer).Terms)
        {
            if (!fit.MeasurementSd.TryGetValue(parent, out MeasurementError? error))
            {
                return double.NaN;
            }

            double typical = over.Select(e => e.Values.GetValueOrDefault(parent, double.NaN)).Where(double.IsFinite).DefaultIfEmpty(0).Average();
            double relative = error.Relative * typical;
            variance += factor * factor * ((error.Absolute * error.Absolute) + (relative * relative));
        }

        return Math.Sqrt(variance);
    }

    private static void Error(MeasurementError error, string at, CheckFindings findings)
    {
        if (!(error.Absolute > 0 && double.IsFinite(error.Absolute)))
        {
            findings.Error(at, "a measurement error above 0", Text(error.Absolute), "Give one standard deviation of the measurement in the quantity's unit.");
        }

        if (!(error.Relative >= 0 && double.IsFinite(error.Relative)))
        {
            findings.Error(JsonPointer.Append(at, "relative"), "a relative error, 0 or more", Text(error.Relative), "Give a fraction of the value, such as 0.005 for half a percent.");
        }
    }

    private static void NoteUnlessFitted(string quantity, IReadOnlyList<string> fitted, string at, string what, CheckFindings findings)
    {
        if (!fitted.Contains(quantity))
        {
            findings.Note(at, $"{what} of something that is fitted", $"{what} of {quantity}, which is not", "It has no effect; take it out, or add the tracer.");
        }
    }

    private static void Factors(DerivedTracerFactors factors, CheckFindings findings)
    {
        (string At, double Value, bool IsOffset)[] all =
        [
            ("/fit/factors/no/oxygenPerNitrate", factors.NoOxygenPerNitrate, false),
            ("/fit/factors/po/oxygenPerPhosphate", factors.PoOxygenPerPhosphate, false),
            ("/fit/factors/n_star/nitratePerPhosphate", factors.NStarNitratePerPhosphate, false),
            ("/fit/factors/n_star/offset", factors.NStarOffset, true),
            ("/fit/factors/po4_star/oxygenPerPhosphate", factors.Po4StarOxygenPerPhosphate, false),
            ("/fit/factors/po4_star/offset", factors.Po4StarOffset, true),
        ];
        foreach ((string at, double value, bool isOffset) in all)
        {
            if (!double.IsFinite(value) || (!isOffset && !(value > 0)))
            {
                findings.Error(at, isOffset ? "a finite number" : "a ratio above 0", Text(value), "Give the published factor, or leave it out for the default.");
            }
        }
    }
}
