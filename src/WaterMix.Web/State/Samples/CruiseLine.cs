namespace WaterMix.Web.State.Samples;

/// <summary>A line of the table of cruises, in words.</summary>
/// <param name="Id">The cruise.</param>
/// <param name="Name">Its name.</param>
/// <param name="Samples">Number of samples.</param>
/// <param name="Files">The files that it was read from.</param>
/// <param name="Problems">What its import report warns of, in a word or two.</param>
/// <param name="Errors">Whose measurement errors it has.</param>
public sealed record CruiseLine(Guid Id, string Name, string Samples, string Files, string Problems, string Errors);
