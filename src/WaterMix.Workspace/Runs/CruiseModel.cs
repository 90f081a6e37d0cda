using WaterMix.Core.Mixing;

namespace WaterMix.Workspace.Runs;

/// <summary>A model as it applies to one cruise: the cruise's own measurement errors take the place of the model's.</summary>
internal static class CruiseModel
{
    /// <summary>The model for a cruise.</summary>
    /// <param name="model">The model.</param>
    /// <param name="errors">The cruise's measurement errors by quantity, or null; other quantities keep the model's.</param>
    public static MixingModel For(MixingModel model, IReadOnlyDictionary<string, MeasurementError>? errors)
    {
        if (errors is null)
        {
            return model;
        }

        var merged = new Dictionary<string, MeasurementError>(model.Fit.MeasurementSd, StringComparer.Ordinal);
        foreach ((string quantity, MeasurementError error) in errors)
        {
            merged[quantity] = error;
        }

        return model with { Fit = model.Fit with { MeasurementSd = merged } };
    }

    /// <summary>Why a cruise's own errors cannot be used with a model, or null.</summary>
    /// <param name="model">The model.</param>
    /// <param name="cruise">The cruise's name.</param>
    /// <param name="errors">Its measurement errors, or null.</param>
    public static string? Contradiction(MixingModel model, string cruise, IReadOnlyDictionary<string, MeasurementError>? errors)
    {
        string[] both = [.. (errors?.Keys ?? []).Where(q => (model.Fit as GeneralisedLeastSquares)?.MeasurementCovariance?.Tracers.Contains(q) == true)];
        return both.Length == 0 ? null
            : $"The cruise {cruise} has a measurement error of its own for {string.Join(", ", both)}, and the model a full covariance. Take one of the two away.";
    }
}
