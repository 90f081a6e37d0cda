namespace WaterMix.Web.State.Mixing;

/// <summary>A measurement error that the samples themselves suggest.</summary>
/// <param name="Quantity">The quantity's id.</param>
/// <param name="Sd">One standard deviation, in the quantity's unit; 0 where the values agree in all their digits.</param>
/// <param name="Pairs">Number of pairs it rests on.</param>
/// <param name="Typical">The median of the values, to see the error in proportion.</param>
/// <param name="Offset">The median difference, first less second; 0 for replicates.</param>
/// <param name="MedianAbsolute">The median absolute difference from <paramref name="Offset"/>.</param>
public sealed record ErrorProposal(string Quantity, double Sd, int Pairs, double Typical, double Offset, double MedianAbsolute);
