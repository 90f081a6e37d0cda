namespace WaterMix.Web.State.Figures;

/// <summary>One column at a station, to be drawn against pressure. Series of one axis title and unit share a plot.</summary>
/// <param name="Id">Unique in the figure.</param>
/// <param name="Name">Its name in the legend, such as <c>bottle</c>.</param>
/// <param name="Axis">What the values are: the plot it is drawn in.</param>
/// <param name="Values">Length n; NaN is missing.</param>
/// <param name="Rows">The row of each value, length n.</param>
/// <param name="Colour">The colour.</param>
/// <param name="Shape">The shape: another one for the CTD than for bottles.</param>
public sealed record ProfileSeries(string Id, string Name, FigureAxis Axis, double[] Values, int[] Rows, string Colour, PointShape Shape)
{
    /// <summary>True where a thin line joins the values.</summary>
    public bool Joined { get; init; }
}
