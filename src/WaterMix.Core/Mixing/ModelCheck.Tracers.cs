using WaterMix.Core.EndMembers;
using WaterMix.Core.Quantities;

namespace WaterMix.Core.Mixing;

public static partial class ModelCheck
{
    private static readonly (string One, string Other)[] NeverTogether =
    [
        (Quantity.PotentialTemperature.Id, Quantity.ConservativeTemperature.Id),
        (Quantity.PracticalSalinity.Id, Quantity.AbsoluteSalinity.Id),
        (Quantity.ConservativeTemperature.Id, Quantity.PracticalSalinity.Id),
        (Quantity.PotentialTemperature.Id, Quantity.AbsoluteSalinity.Id),
    ];

    private static void OfTracers(MixingModel model, CheckFindings findings)
    {
        if (model.Tracers.Count == 0)
        {
            findings.Error("/tracers", "at least one tracer", "none", "Name the quantities that are the rows of the fit.");
        }

        var seen = new HashSet<string>(StringComparer.Ordinal);
        for (int i = 0; i < model.Tracers.Count; i++)
        {
            string tracer = model.Tracers[i];
            string at = JsonPointer.Append("/tracers", i);
            if (!seen.Add(tracer))
            {
                findings.Error(at, "each tracer once", $"\"{tracer}\" a second time", "Take one of them out; a weight or a measurement error says how much a tracer counts.");
            }
            else if (EndMemberSetCheck.IsKnown(tracer, model.EndMembers, at, findings) && Quantity.Find(tracer) is { Use: TracerUse.Never } quantity)
            {
                findings.Error(at, "a quantity that mixes linearly", $"\"{tracer}\": {WhyNever(quantity)}", InsteadOf(quantity));
            }
        }

        Pairs(model, findings);
        Dependence(model, findings);
        if (seen.Contains(Quantity.Silicate.Id) && !model.Processes.Any(p => p.Ratios.GetValueOrDefault(Quantity.Silicate.Id) != 0))
        {
            findings.Warning(
                JsonPointer.Append("/tracers", IndexOf(model.Tracers, Quantity.Silicate.Id)),
                "a process that adds silicate (dissolution of opal) where silicate is fitted",
                "none",
                "Add one, or leave silicate out: without it the fit is biased towards silicate-rich sources.");
        }
    }

    private static string WhyNever(Quantity quantity)
    {
        if (quantity == Quantity.InSituTemperature)
        {
            return "it changes with pressure, and water moved to another pressure keeps potential or Conservative Temperature instead";
        }

        if (quantity == Quantity.ApparentOxygenUtilisation)
        {
            return "the saturation in it is no linear function of temperature and salinity";
        }

        return quantity.Unit == Quantity.Sigma0.Unit ? "density does not mix linearly" : "it is a place, not a property of the water";
    }

    private static string InsteadOf(Quantity quantity)
    {
        if (quantity == Quantity.InSituTemperature)
        {
            return "Use potential_temperature or conservative_temperature; both are derived from the samples' in-situ temperature.";
        }

        if (quantity == Quantity.ApparentOxygenUtilisation)
        {
            return "Use oxygen, with a process for respiration.";
        }

        return quantity.Unit == Quantity.Sigma0.Unit
            ? "Use a temperature and a salinity as tracers, and density in a layer's \"where\"."
            : "Use it in a layer's \"where\" instead.";
    }

    private static void Pairs(MixingModel model, CheckFindings findings)
    {
        foreach ((string one, string other) in NeverTogether)
        {
            int later = Math.Max(IndexOf(model.Tracers, one), IndexOf(model.Tracers, other));
            if (model.Tracers.Contains(one) && model.Tracers.Contains(other))
            {
                findings.Error(
                    JsonPointer.Append("/tracers", later),
                    "potential_temperature with practical_salinity, or conservative_temperature with absolute_salinity",
                    $"{one} with {other}",
                    "Keep one pair; an end-member set can be converted from one pair to the other if its end-members have a position.");
            }
        }
    }

    // Tracers as linear forms of measured quantities: Gram-Schmidt finds the first that the ones before it already determine.
    private static void Dependence(MixingModel model, CheckFindings findings)
    {
        IReadOnlyList<string> parents = Parents(model);
        var basis = new List<double[]>();
        foreach ((int i, string tracer) in Rows(model))
        {
            double[] form = new double[parents.Count];
            foreach ((string parent, double factor) in model.Fit.Factors.FormOf(tracer).Terms)
            {
                form[IndexOf(parents, parent)] = factor;
            }

            double[] rest = Rest(Rest(form, basis), basis);
            double length = Length(rest);
            if (length <= 1e-10 * Length(form))
            {
                findings.Error(
                    JsonPointer.Append("/tracers", i),
                    "tracers none of which follows from the others",
                    $"\"{tracer}\", a combination of tracers named before it",
                    "Leave it or one of its parents out: it adds no information, and the fit would count the same measurement twice.");
            }
            else if (double.IsFinite(length))
            {
                basis.Add([.. rest.Select(x => x / length)]);
            }
        }
    }

    private static double[] Rest(double[] form, List<double[]> basis)
    {
        double[] rest = [.. form];
        foreach (double[] direction in basis)
        {
            double along = rest.Zip(direction, (x, y) => x * y).Sum();
            rest = [.. rest.Zip(direction, (x, y) => x - (along * y))];
        }

        return rest;
    }

    private static double Length(double[] v) => Math.Sqrt(v.Sum(x => x * x));

    private static int IndexOf(IReadOnlyList<string> items, string item)
    {
        for (int i = 0; i < items.Count; i++)
        {
            if (items[i] == item)
            {
                return i;
            }
        }

        return -1;
    }
}
