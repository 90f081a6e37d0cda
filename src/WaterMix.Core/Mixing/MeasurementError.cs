namespace WaterMix.Core.Mixing;

/// <summary>One standard deviation of a measurement: variance = absolute^2 + (relative * observed)^2.</summary>
/// <param name="Absolute">In the quantity's unit, > 0.</param>
/// <param name="Relative">A fraction of the observed value, >= 0.</param>
public sealed record MeasurementError(double Absolute, double Relative = 0);
