using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Samples;

/// <summary>Points coloured by a quantity, the ends of the scale settled beside the thread that draws rather than at each drawing.</summary>
public static class TracerColour
{
    /// <summary>The colours of values.</summary>
    /// <param name="axis">What the values are.</param>
    /// <param name="values">One per point; NaN is missing.</param>
    public static SequentialColour Of(FigureAxis axis, double[] values)
    {
        ArgumentNullException.ThrowIfNull(axis);
        var colour = new SequentialColour(axis.Title, axis.Unit, values);
        return colour with { Range = ScaleRange.Of(colour) };
    }
}
