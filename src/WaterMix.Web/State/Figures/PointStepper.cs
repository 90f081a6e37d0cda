namespace WaterMix.Web.State.Figures;

/// <summary>Which way an arrow key steps, as seen on the screen.</summary>
public enum StepDirection
{
    /// <summary>To the left.</summary>
    Left,

    /// <summary>To the right.</summary>
    Right,

    /// <summary>Upwards.</summary>
    Up,

    /// <summary>Downwards.</summary>
    Down,
}

/// <summary>Finds the point that an arrow key steps to.</summary>
public static class PointStepper
{
    /// <summary>How much farther a step aside counts than a step ahead.</summary>
    private const double Aside = 2;

    /// <summary>The nearest point that way, among those in view; a step aside counts twice.</summary>
    /// <param name="x">Length n; NaN is missing.</param>
    /// <param name="y">Length n.</param>
    /// <param name="from">Index of the point to step from; -1: the point nearest to the middle of the view.</param>
    /// <param name="direction">Which way.</param>
    /// <param name="left">The x at the left edge of the view.</param>
    /// <param name="right">The x at the right edge; below <paramref name="left"/> on a reversed axis.</param>
    /// <param name="bottom">The y at the bottom edge.</param>
    /// <param name="top">The y at the top edge.</param>
    /// <returns>Index of the point; <paramref name="from"/> where there is none that way.</returns>
    public static int Next(ReadOnlySpan<double> x, ReadOnlySpan<double> y, int from, StepDirection direction, double left, double right, double bottom, double top)
    {
        double width = right - left;
        double height = top - bottom;
        double atX = from < 0 ? left + (width / 2) : x[from];
        double atY = from < 0 ? bottom + (height / 2) : y[from];
        int best = from;
        double bestCost = double.PositiveInfinity;
        for (int i = 0; i < x.Length; i++)
        {
            double u = (x[i] - left) / width;
            double v = (y[i] - bottom) / height;
            if (i == from || !(u >= 0 && u <= 1 && v >= 0 && v <= 1))
            {
                continue;
            }

            double cost = Cost((x[i] - atX) / width, (y[i] - atY) / height, from < 0 ? null : direction);
            if (cost < bestCost)
            {
                bestCost = cost;
                best = i;
            }
        }

        return best;
    }

    private static double Cost(double dx, double dy, StepDirection? direction)
    {
        (double ahead, double aside) = direction switch
        {
            null => (Math.Sqrt((dx * dx) + (dy * dy)), 0),
            StepDirection.Left => (-dx, dy),
            StepDirection.Right => (dx, dy),
            StepDirection.Up => (dy, dx),
            _ => (-dy, dx),
        };
        return ahead > 0 || direction is null ? ahead + (Aside * Math.Abs(aside)) : double.PositiveInfinity;
    }
}
