using WaterMix.Core.Quantities;
using WaterMix.Core.Seawater;

namespace WaterMix.Core.EndMembers;

/// <summary>Converts end-members between potential temperature with Practical Salinity and Conservative Temperature with Absolute Salinity.</summary>
public static class TemperatureSalinityConversion
{
    // Central differences over this step, degC or salinity: the curvature that is left out and the rounding are both near 1e-11 of the slope.
    private const double Step = 1e-3;

    /// <summary>Converts every end-member that has the other pair; one that has this pair, or no temperature and salinity at all, stays as it is.</summary>
    /// <remarks>
    /// <para>Values by TEOS-10, <c>IOC2010</c>, at the end-member's position. Spreads to first order: with J the derivatives of the new
    /// pair by the old one at the values, and C the covariance of the old pair, J C J'; correlations with other tracers likewise. So
    /// spreads that were independent become slightly correlated, and the set then says so.</para>
    /// <para>Where <c>meanSd</c> is given for one of the pair, both are converted in the same way with the correlation of the spread (the
    /// one that is not given counts as sd/sqrt(observations)). The version stays: the caller decides whether this is a new one.</para>
    /// </remarks>
    /// <param name="set">The set.</param>
    /// <param name="to">The pair wanted.</param>
    /// <returns>The set, or an error for each end-member that lacks a position or one of the pair, or lies outside the atlas of salinity anomaly.</returns>
    public static ConvertedSet Convert(EndMemberSet set, TemperatureSalinityPair to)
    {
        ArgumentNullException.ThrowIfNull(set);
        var findings = new CheckFindings();
        EndMember[] converted = [.. set.EndMembers.Select((endMember, i) => OfOne(endMember, to, JsonPointer.Append("/endMembers", i), findings))];
        return new ConvertedSet(findings.Items.Count == 0 ? set with { EndMembers = converted } : null, findings.Items);
    }

    private static (string Temperature, string Salinity) Ids(TemperatureSalinityPair pair) => pair == TemperatureSalinityPair.ConservativeAndAbsolute
        ? (Quantity.ConservativeTemperature.Id, Quantity.AbsoluteSalinity.Id)
        : (Quantity.PotentialTemperature.Id, Quantity.PracticalSalinity.Id);

    private static EndMember OfOne(EndMember endMember, TemperatureSalinityPair to, string at, CheckFindings findings)
    {
        TemperatureSalinityPair other = to == TemperatureSalinityPair.ConservativeAndAbsolute ? TemperatureSalinityPair.PotentialAndPractical : TemperatureSalinityPair.ConservativeAndAbsolute;
        (string newTemperature, string newSalinity) = Ids(to);
        (string oldTemperature, string oldSalinity) = Ids(other);
        bool hasBothNew = endMember.Values.ContainsKey(newTemperature) && endMember.Values.ContainsKey(newSalinity);
        bool hasOneNew = endMember.Values.ContainsKey(newTemperature) || endMember.Values.ContainsKey(newSalinity);
        bool hasOneOld = endMember.Values.ContainsKey(oldTemperature) || endMember.Values.ContainsKey(oldSalinity);
        if (hasBothNew || (!hasOneNew && !hasOneOld))
        {
            return endMember;
        }

        if (hasOneNew || !endMember.Values.TryGetValue(oldTemperature, out double t) || !endMember.Values.TryGetValue(oldSalinity, out double s))
        {
            string present = string.Join(", ", new[] { oldTemperature, oldSalinity, newTemperature, newSalinity }.Where(endMember.Values.ContainsKey));
            findings.Error(JsonPointer.Append(at, "values"), $"{oldTemperature} and {oldSalinity}, both and no other", $"{present} in {endMember.Id}", "Give the pair; one cannot be converted without the other.");
            return endMember;
        }

        if (endMember.Position is not { } position)
        {
            findings.Error(JsonPointer.Append(at, "position"), "a typical position and pressure, which Absolute Salinity depends on", $"none for {endMember.Id}", "Add \"position\" with latitude, longitude and pressure.");
            return endMember;
        }

        var jacobian = PairJacobian.At((x, y) => Values(x, y, position, to), t, s, Step);
        if (!jacobian.IsFinite)
        {
            findings.Error(
                JsonPointer.Append(at, "position"),
                "a position in the atlas of salinity anomaly (latitude -86 to 90), and a salinity that is not negative",
                FormattableString.Invariant($"{position.Latitude:R} N, {position.Longitude:R} E, {position.Pressure:R} dbar with salinity {s:R} for {endMember.Id}"),
                "Correct the position or the values.");
            return endMember;
        }

        return new PairSpread(endMember, oldTemperature, oldSalinity, newTemperature, newSalinity).Converted(jacobian);
    }

    private static (double Temperature, double Salinity) Values(double temperature, double salinity, EndMemberPosition at, TemperatureSalinityPair to)
    {
        if (to == TemperatureSalinityPair.ConservativeAndAbsolute)
        {
            double absolute = AbsoluteSalinity.FromPractical(salinity, at.Pressure, at.Longitude, at.Latitude);
            return (ConservativeTemperature.FromPotential(absolute, temperature), absolute);
        }

        double practical = PracticalSalinity.FromAbsolute(salinity, at.Pressure, at.Longitude, at.Latitude);
        return (PotentialTemperature.FromConservative(salinity, temperature), practical);
    }
}
