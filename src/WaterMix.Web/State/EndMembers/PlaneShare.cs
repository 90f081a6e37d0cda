namespace WaterMix.Web.State.EndMembers;

/// <summary>How many samples lie outside what the sources can make, in the plane of two tracers.</summary>
/// <param name="X">The tracer along x.</param>
/// <param name="Y">The tracer along y.</param>
/// <param name="Samples">Number of samples with both.</param>
/// <param name="OutsideMixtures">Share outside what mixing alone makes, 0 to 1; NaN without samples.</param>
/// <param name="Outside">Share outside what mixing and the processes make together.</param>
public sealed record PlaneShare(string X, string Y, long Samples, double OutsideMixtures, double Outside);
