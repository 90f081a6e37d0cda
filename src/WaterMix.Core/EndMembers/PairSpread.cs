namespace WaterMix.Core.EndMembers;

/// <summary>An end-member on the way from one temperature and salinity pair to the other: its spread, its mean's error, its correlations.</summary>
internal sealed class PairSpread(EndMember endMember, string oldTemperature, string oldSalinity, string newTemperature, string newSalinity)
{
    private readonly double _r = Correlation(endMember.Correlations, oldTemperature, oldSalinity);

    /// <summary>The end-member with the new pair.</summary>
    public EndMember Converted(PairJacobian jacobian)
    {
        double sdT = endMember.Sd.GetValueOrDefault(oldTemperature);
        double sdS = endMember.Sd.GetValueOrDefault(oldSalinity);
        (double tt, double ts, double ss) = jacobian.Covariance(sdT * sdT, _r * sdT * sdS, sdS * sdS);
        double newSdT = Math.Sqrt(tt);
        double newSdS = Math.Sqrt(ss);
        return endMember with
        {
            Values = Replaced(endMember.Values, jacobian.Temperature, jacobian.Salinity),
            Sd = Has(endMember.Sd) ? Replaced(endMember.Sd, newSdT, newSdS) : endMember.Sd,
            MeanSd = Has(endMember.MeanSd) ? MeanSd(jacobian) : endMember.MeanSd,
            Correlations = sdT > 0 || sdS > 0
                ? Correlations(jacobian, sdT, sdS, newSdT, newSdS, newSdT > 0 && newSdS > 0 ? ts / (newSdT * newSdS) : 0)
                : Renamed(endMember.Correlations),
        };
    }

    private static double Correlation(TracerMatrix? correlations, string a, string b)
    {
        int i = IndexOf(correlations, a);
        int j = IndexOf(correlations, b);
        return i < 0 || j < 0 ? 0 : correlations!.Matrix[i][j];
    }

    private static int IndexOf(TracerMatrix? correlations, string tracer) => correlations is null ? -1 : correlations.Tracers.ToList().IndexOf(tracer);

    private bool Has(IReadOnlyDictionary<string, double> spread) => spread.ContainsKey(oldTemperature) || spread.ContainsKey(oldSalinity);

    private Dictionary<string, double> Replaced(IReadOnlyDictionary<string, double> map, double temperature, double salinity)
    {
        var replaced = map.Where(p => p.Key != oldTemperature && p.Key != oldSalinity).ToDictionary();
        replaced[newTemperature] = temperature;
        replaced[newSalinity] = salinity;
        return replaced;
    }

    private Dictionary<string, double> MeanSd(PairJacobian jacobian)
    {
        double meanT = MeanSd(oldTemperature);
        double meanS = MeanSd(oldSalinity);
        (double tt, _, double ss) = jacobian.Covariance(meanT * meanT, _r * meanT * meanS, meanS * meanS);
        return Replaced(endMember.MeanSd, Math.Sqrt(tt), Math.Sqrt(ss));
    }

    private double MeanSd(string tracer) => endMember.MeanSd.TryGetValue(tracer, out double given)
        ? given
        : endMember.Sd.GetValueOrDefault(tracer) / Math.Sqrt(endMember.Observations ?? 1);

    private TracerMatrix? Renamed(TracerMatrix? correlations) =>
        correlations is null ? null : correlations with { Tracers = [.. correlations.Tracers.Select(NewName)] };

    private string NewName(string tracer) => tracer == oldTemperature ? newTemperature : tracer == oldSalinity ? newSalinity : tracer;

    // Old tracers in their order, the pair added where it was not among them; then each entry from the old ones.
    private TracerMatrix? Correlations(PairJacobian jacobian, double sdT, double sdS, double newSdT, double newSdS, double newR)
    {
        TracerMatrix? old = endMember.Correlations;
        if (old is null && newR == 0)
        {
            return null;
        }

        List<string> tracers = [.. old?.Tracers ?? []];
        tracers.AddRange(new[] { oldTemperature, oldSalinity }.Where(t => !tracers.Contains(t)).ToArray());
        double Entry(string a, string b)
        {
            if (a == b)
            {
                return 1;
            }

            bool isPairA = a == oldTemperature || a == oldSalinity;
            bool isPairB = b == oldTemperature || b == oldSalinity;
            if (isPairA && isPairB)
            {
                return Math.Clamp(newR, -1, 1);
            }

            return isPairA ? WithOther(a, b) : isPairB ? WithOther(b, a) : Correlation(old, a, b);
        }

        double WithOther(string ofPair, string tracer)
        {
            bool isTemperature = ofPair == oldTemperature;
            double byT = (isTemperature ? jacobian.TByT : jacobian.SByT) * sdT * Correlation(old, oldTemperature, tracer);
            double byS = (isTemperature ? jacobian.TByS : jacobian.SByS) * sdS * Correlation(old, oldSalinity, tracer);
            double sd = isTemperature ? newSdT : newSdS;
            return sd > 0 ? Math.Clamp((byT + byS) / sd, -1, 1) : 0;
        }

        return new TracerMatrix(
            [.. tracers.Select(NewName)],
            [.. tracers.Select(a => (IReadOnlyList<double>)[.. tracers.Select(b => Entry(a, b))])]);
    }
}
