using WaterMix.Core.Mixing;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.EndMembers;

/// <summary>The share of samples that the sources cannot make, for every pair of tracers of a fit.</summary>
/// <param name="Planes">The pairs, the worst first.</param>
/// <param name="Samples">Number of samples with at least one pair.</param>
/// <param name="OutsideAny">Share of them outside in at least one plane; NaN without samples.</param>
public sealed record PlaneShares(IReadOnlyList<PlaneShare> Planes, long Samples, double OutsideAny)
{
    /// <summary>
    /// Counts. A sample outside in one plane is outside as a whole; one inside in every plane may still be outside, so that the shares are
    /// lower bounds.
    /// </summary>
    /// <param name="model">The model: its tracers, set, processes.</param>
    /// <param name="permitted">Ids of the permitted end-members; null for all.</param>
    /// <param name="values">The samples' values, an array for each tracer of the model in its order; NaN is missing.</param>
    /// <param name="counts">True for each row that counts.</param>
    public static PlaneShares Of(MixingModel model, IReadOnlyList<string>? permitted, IReadOnlyList<double[]> values, bool[] counts)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(values);
        ArgumentNullException.ThrowIfNull(counts);
        bool[] present = new bool[counts.Length];
        bool[] outside = new bool[counts.Length];
        var planes = new List<PlaneShare>();
        for (int i = 0; i < model.Tracers.Count; i++)
        {
            for (int j = i + 1; j < model.Tracers.Count; j++)
            {
                planes.Add(One(model, (model.Tracers[j], values[j]), (model.Tracers[i], values[i]), permitted, counts, present, outside));
            }
        }

        long samples = present.LongCount(p => p);
        return new PlaneShares(
            [.. planes.Where(p => p.Samples > 0).OrderByDescending(p => p.Outside).ThenByDescending(p => p.OutsideMixtures)],
            samples,
            samples == 0 ? double.NaN : (double)outside.LongCount(o => o) / samples);
    }

    private static PlaneShare One(
        MixingModel model, (string Id, double[] Values) along, (string Id, double[] Values) against, IReadOnlyList<string>? permitted, bool[] counts, bool[] present, bool[] outside)
    {
        (string xId, double[] x) = along;
        (string yId, double[] y) = against;
        IEnumerable<PlanePoint> sources = PropertySource.Of(model.EndMembers, xId, yId, model.Fit.Factors, permitted).Where(s => s.Permitted).Select(s => new PlanePoint(s.X, s.Y));
        var region = ReachableRegion.Of(sources, ProcessDirection.Of(model.Processes, xId, yId, model.Fit.Factors), PlaneExtent.Of(x, y));
        long samples = 0;
        long beyondMixtures = 0;
        long beyond = 0;
        for (int row = 0; row < x.Length; row++)
        {
            var point = new PlanePoint(x[row], y[row]);
            if (!counts[row] || !double.IsFinite(point.X) || !double.IsFinite(point.Y))
            {
                continue;
            }

            samples++;
            present[row] = true;
            if (ConvexHull.Contains(region.Mixtures, point))
            {
                continue;
            }

            beyondMixtures++;
            if (!ConvexHull.Contains(region.WithProcesses, point))
            {
                beyond++;
                outside[row] = true;
            }
        }

        return new PlaneShare(xId, yId, samples, samples == 0 ? double.NaN : (double)beyondMixtures / samples, samples == 0 ? double.NaN : (double)beyond / samples);
    }
}
