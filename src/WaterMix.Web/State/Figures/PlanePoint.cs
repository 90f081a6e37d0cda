namespace WaterMix.Web.State.Figures;

/// <summary>A place in the plane of two quantities.</summary>
/// <param name="X">Along x, in the axis' unit.</param>
/// <param name="Y">Along y, in the axis' unit.</param>
public readonly record struct PlanePoint(double X, double Y);
