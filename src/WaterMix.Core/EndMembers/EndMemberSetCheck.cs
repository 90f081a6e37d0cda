using System.Globalization;
using System.Text.RegularExpressions;
using WaterMix.Core.Quantities;

namespace WaterMix.Core.EndMembers;

/// <summary>Whether an end-member set makes sense: ids, tracers and units, ranges, matrices.</summary>
public static partial class EndMemberSetCheck
{
    /// <summary>Everything that is wrong or worth saying; a set without an error can be used and written.</summary>
    /// <param name="set">The set.</param>
    /// <param name="at">The set's place in its document as an RFC 6901 pointer; empty where it is the document.</param>
    /// <returns>The findings, with paths into the document.</returns>
    public static IReadOnlyList<Finding> Findings(EndMemberSet set, string at = "")
    {
        ArgumentNullException.ThrowIfNull(set);
        var findings = new CheckFindings();
        if (set.Version < 1)
        {
            findings.Error(JsonPointer.Append(at, "version"), "a version of 1 or more", Text(set.Version), "Count versions from 1.");
        }

        Units(set, JsonPointer.Append(at, "units"), findings);
        string list = JsonPointer.Append(at, "endMembers");
        if (set.EndMembers.Count == 0)
        {
            findings.Error(list, "at least one end-member", "none", "Add the source waters to the set.");
        }

        var seen = new HashSet<string>(StringComparer.OrdinalIgnoreCase);
        for (int i = 0; i < set.EndMembers.Count; i++)
        {
            EndMember endMember = set.EndMembers[i];
            string place = JsonPointer.Append(list, i);
            Id(endMember.Id, JsonPointer.Append(place, "id"), seen, findings);
            OfOne(endMember, set, place, findings);
        }

        return findings.Items;
    }

    /// <summary>An error where an id has another form than the contract's, or stands a second time, upper and lower case alike.</summary>
    internal static void Id(string id, string at, HashSet<string> seen, CheckFindings findings)
    {
        if (!IdPattern().IsMatch(id))
        {
            findings.Error(
                at,
                "an id of 1 to 32 characters: letters A to Z, digits, '.', '_' and '-', beginning with a letter or digit",
                $"\"{id}\"",
                "Shorten or respell the id; the name may be any text.");
        }
        else if (id.Equals("sum", StringComparison.OrdinalIgnoreCase))
        {
            findings.Error(at, "an id other than sum, which names the column of the fractions' sum", $"\"{id}\"", "Give it another id.");
        }
        else if (!seen.Add(id))
        {
            findings.Error(at, "an id that no other end-member or process has (upper and lower case count as the same)", $"\"{id}\" a second time", "Give one of them another id.");
        }
    }

    /// <summary>True where a name is a quantity of the contract, or a tracer of the user's with a unit.</summary>
    internal static bool IsKnown(string tracer, EndMemberSet set) => Quantity.Find(tracer) is not null || set.Units.ContainsKey(tracer);

    /// <summary>An error, and false, where a name is neither a quantity of the contract nor a tracer of the user's with a unit.</summary>
    internal static bool IsKnown(string tracer, EndMemberSet set, string at, CheckFindings findings)
    {
        if (IsKnown(tracer, set))
        {
            return true;
        }

        findings.Error(
            at,
            "a quantity's id, or a tracer that \"units\" of the end-member set names",
            $"\"{tracer}\"",
            NearestName.Suggestion(tracer, Quantity.All.Select(q => q.Id).Concat(set.Units.Keys)) + "Correct the name, or give its unit under \"units\" in the set.");
        return false;
    }

    private static void Units(EndMemberSet set, string at, CheckFindings findings)
    {
        foreach ((string tracer, string unit) in set.Units)
        {
            string place = JsonPointer.Append(at, tracer);
            if (Quantity.Find(tracer) is { } quantity && unit != quantity.Unit)
            {
                findings.Error(place, $"{quantity.Unit}, the unit that {tracer} always has", $"\"{unit}\"", "Convert the values to that unit and take this entry out.");
            }
            else if (tracer.Equals("mass", StringComparison.OrdinalIgnoreCase))
            {
                findings.Error(place, "a tracer's name other than mass, which names the column of the mass residual", $"\"{tracer}\"", "Give the tracer another name.");
            }
            else if (string.IsNullOrWhiteSpace(tracer) || string.IsNullOrWhiteSpace(unit))
            {
                findings.Error(place, "a tracer's name and its unit", $"\"{tracer}\": \"{unit}\"", "Give both; a tracer without a unit has the unit \"1\".");
            }
        }
    }

    private static void OfOne(EndMember endMember, EndMemberSet set, string at, CheckFindings findings)
    {
        string values = JsonPointer.Append(at, "values");
        foreach ((string tracer, double value) in endMember.Values)
        {
            string place = JsonPointer.Append(values, tracer);
            if (IsKnown(tracer, set, place, findings))
            {
                Value(tracer, value, place, findings);
            }
        }

        Spread(endMember.Sd, endMember, set, JsonPointer.Append(at, "sd"), findings);
        Spread(endMember.MeanSd, endMember, set, JsonPointer.Append(at, "meanSd"), findings);
        if (endMember.Correlations is { } correlations)
        {
            string place = JsonPointer.Append(at, "correlations");
            for (int i = 0; i < correlations.Tracers.Count; i++)
            {
                IsKnown(correlations.Tracers[i], set, JsonPointer.Append(JsonPointer.Append(place, "tracers"), i), findings);
            }

            TracerMatrixCheck.Correlation(correlations, place, findings);
        }

        if (endMember.Observations < 1)
        {
            findings.Error(
                JsonPointer.Append(at, "observations"),
                "a count of independent determinations, 1 or more",
                Text(endMember.Observations.Value),
                "Give the number of cruises or years, or leave the key out.");
        }

        if (endMember.Position is { } position)
        {
            string place = JsonPointer.Append(at, "position");
            Range(position.Latitude, -90, 90, "degrees north", JsonPointer.Append(place, "latitude"), findings);
            Range(position.Longitude, -180, 360, "degrees east", JsonPointer.Append(place, "longitude"), findings);
            Range(position.Pressure, 0, 12_000, "dbar", JsonPointer.Append(place, "pressure"), findings);
        }
    }

    private static void Value(string tracer, double value, string at, CheckFindings findings)
    {
        Quantity quantity = Quantity.FindOrFurther(tracer);
        if (!double.IsFinite(value))
        {
            findings.Error(at, "a finite number", Text(value), "Leave a tracer out that has no value.");
        }
        else if (!quantity.IsPossible(value))
        {
            findings.Error(
                at,
                $"{quantity.Name} from {Text(quantity.Lowest)} to {Text(quantity.Highest)} {quantity.Unit}",
                Text(value),
                $"Check the number, its decimal point and its unit ({quantity.Unit}).");
        }
        else if (quantity.Use == TracerUse.DerivedRow)
        {
            findings.Warning(at, "values of measured quantities", $"a value for {quantity.Name}, which is computed from its parents", "Give the values of the parent quantities; this one is not used.");
        }
        else if (quantity.Use == TracerUse.Never)
        {
            findings.Warning(at, "values of tracers", $"a value for {quantity.Name}, which is never a row of a fit", "Take it out; this value is not used.");
        }
    }

    private static void Spread(IReadOnlyDictionary<string, double> spread, EndMember endMember, EndMemberSet set, string at, CheckFindings findings)
    {
        foreach ((string tracer, double sd) in spread)
        {
            string place = JsonPointer.Append(at, tracer);
            if (!IsKnown(tracer, set, place, findings))
            {
                continue;
            }

            if (!(sd >= 0 && double.IsFinite(sd)))
            {
                findings.Error(place, "a standard deviation, 0 or more", Text(sd), "Give a number that is not negative, or leave the tracer out.");
            }
            else if (!endMember.Values.ContainsKey(tracer))
            {
                findings.Warning(place, "a spread for a tracer that has a value", $"no value of {tracer} in {endMember.Id}", "Give the value too, or take the spread out; it is not used.");
            }
        }
    }

    private static void Range(double value, double lowest, double highest, string unit, string at, CheckFindings findings)
    {
        if (!(value >= lowest && value <= highest))
        {
            findings.Error(at, $"a number from {Text(lowest)} to {Text(highest)} {unit}", Text(value), "Correct the position.");
        }
    }

    private static string Text(double value) => value.ToString("R", CultureInfo.InvariantCulture);

    [GeneratedRegex(@"\A[A-Za-z0-9][A-Za-z0-9._-]{0,31}\z", RegexOptions.CultureInvariant)]
    private static partial Regex IdPattern();
}
