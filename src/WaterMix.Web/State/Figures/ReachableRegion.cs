using WaterMix.Core.Mixing;

namespace WaterMix.Web.State.Figures;

/// <summary>
/// The part of a property plot that mixtures of given sources can reach: with exact conservation of mass and non-negative fractions
/// the convex hull of the sources, and with processes that hull moved along their directions.
/// </summary>
public sealed class ReachableRegion
{
    private ReachableRegion(IReadOnlyList<PlanePoint> mixtures, IReadOnlyList<PlanePoint> withProcesses)
    {
        Mixtures = mixtures;
        WithProcesses = withProcesses;
    }

    /// <summary>The corners of what mixtures reach, anticlockwise in x and y; a line has two, a single source one, none without sources.</summary>
    public IReadOnlyList<PlanePoint> Mixtures { get; }

    /// <summary>The corners of what mixtures and processes reach together, as far as the plot goes; equal to <see cref="Mixtures"/> without processes.</summary>
    public IReadOnlyList<PlanePoint> WithProcesses { get; }

    /// <summary>The region of permitted sources.</summary>
    /// <param name="sources">Where the permitted sources stand; those with a missing value are left out.</param>
    /// <param name="processes">The processes in force.</param>
    /// <param name="within">The samples' places: processes are followed until far beyond them.</param>
    public static ReachableRegion Of(IEnumerable<PlanePoint> sources, IReadOnlyList<ProcessDirection> processes, PlaneExtent within)
    {
        ArgumentNullException.ThrowIfNull(sources);
        ArgumentNullException.ThrowIfNull(processes);
        ArgumentNullException.ThrowIfNull(within);
        IReadOnlyList<PlanePoint> mixtures = ConvexHull.Of(sources);
        if (processes.Count == 0 || mixtures.Count == 0)
        {
            return new ReachableRegion(mixtures, mixtures);
        }

        PlaneExtent all = within.Including(mixtures);
        IReadOnlyList<PlanePoint> steps = [.. processes.SelectMany(p => Steps(p, all))];
        return new ReachableRegion(mixtures, ConvexHull.Of(mixtures.Concat(mixtures.SelectMany(m => steps.Select(s => new PlanePoint(m.X + s.X, m.Y + s.Y))))));
    }

    /// <summary>The share of samples outside a region, among those with both values.</summary>
    /// <param name="region"><see cref="Mixtures"/> or <see cref="WithProcesses"/>.</param>
    /// <param name="x">Length n; NaN is missing.</param>
    /// <param name="y">Length n.</param>
    /// <returns>0 to 1; NaN where no sample has both values.</returns>
    public static double ShareOutside(IReadOnlyList<PlanePoint> region, IReadOnlyList<double> x, IReadOnlyList<double> y)
    {
        ArgumentNullException.ThrowIfNull(region);
        ArgumentNullException.ThrowIfNull(x);
        ArgumentNullException.ThrowIfNull(y);
        if (x.Count != y.Count)
        {
            throw new ArgumentException($"x and y hold one value per sample, but their lengths are {x.Count} and {y.Count}.");
        }

        long present = 0;
        long outside = 0;
        for (int i = 0; i < x.Count; i++)
        {
            if (double.IsFinite(x[i]) && double.IsFinite(y[i]))
            {
                present++;
                outside += ConvexHull.Contains(region, new PlanePoint(x[i], y[i])) ? 0 : 1;
            }
        }

        return present == 0 ? double.NaN : (double)outside / present;
    }

    /// <summary>Steps along a process, many times as long as the plot: within the plot the hull of so long steps is the cone they span.</summary>
    private static IEnumerable<PlanePoint> Steps(ProcessDirection process, PlaneExtent extent)
    {
        double length = Math.Sqrt(Square(process.Dx / extent.X.Width) + Square(process.Dy / extent.Y.Width));
        if (!(length > 0))
        {
            yield break;
        }

        const double PlotLengths = 1000;
        var step = new PlanePoint(process.Dx / length * PlotLengths, process.Dy / length * PlotLengths);
        if (process.Sign != ProcessSign.NonPositive)
        {
            yield return step;
        }

        if (process.Sign != ProcessSign.NonNegative)
        {
            yield return new PlanePoint(-step.X, -step.Y);
        }
    }

    private static double Square(double value) => value * value;
}
