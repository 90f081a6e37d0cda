using WaterMix.Core.EndMembers;

namespace WaterMix.Core.Mixing;

public static partial class ModelCheck
{
    private static void OfProcesses(MixingModel model, CheckFindings findings)
    {
        IReadOnlyList<string> parents = Parents(model);
        var ids = model.EndMembers.EndMembers.Select(e => e.Id).ToHashSet(StringComparer.OrdinalIgnoreCase);
        for (int i = 0; i < model.Processes.Count; i++)
        {
            Process process = model.Processes[i];
            string at = JsonPointer.Append("/processes", i);
            EndMemberSetCheck.Id(process.Id, JsonPointer.Append(at, "id"), ids, findings);
            EndMemberSetCheck.IsKnown(process.Per, model.EndMembers, JsonPointer.Append(at, "per"), findings);
            Ratios(model, process, parents, JsonPointer.Append(at, "ratios"), findings);
            Conditions(model, process.Where, at, findings);
        }
    }

    private static void Ratios(MixingModel model, Process process, IReadOnlyList<string> parents, string at, CheckFindings findings)
    {
        string own = JsonPointer.Append(at, process.Per);
        if (!process.Ratios.TryGetValue(process.Per, out double perOwn))
        {
            findings.Error(own, $"the ratio 1 of {process.Per}, which the amount counts", "none", $"Add \"{process.Per}\": 1 to the ratios.");
        }
        else if (perOwn != 1)
        {
            findings.Error(own, $"the ratio 1 of {process.Per}, which the amount counts", Text(perOwn), "Divide all ratios by this one, or choose another \"per\".");
        }

        bool sound = true;
        foreach ((string quantity, double ratio) in process.Ratios)
        {
            string place = JsonPointer.Append(at, quantity);
            if (!double.IsFinite(ratio))
            {
                findings.Error(place, "a finite number", Text(ratio), "Give the change in the sample per 1 of the \"per\" quantity.");
                sound = false;
            }
            else if (!EndMemberSetCheck.IsKnown(quantity, model.EndMembers, place, findings))
            {
                sound = false;
            }
            else if (!parents.Contains(quantity) && quantity != process.Per)
            {
                findings.Note(place, "a ratio of something that is fitted", $"a ratio of {quantity}, which is not", "It has no effect.");
            }
        }

        if (sound && parents.Count > 0 && !Acts(model, process))
        {
            findings.Warning(
                at,
                "a ratio other than 0 for a fitted tracer",
                "none",
                $"\"{process.Id}\" changes nothing that is fitted and is off for every sample; take it out, or give its ratios.");
        }
    }

    // True where the process changes a fitted tracer. Ratios of derived tracers follow from those of their parents, without the offset.
    private static bool Acts(MixingModel model, Process process) =>
        Rows(model).Any(row => model.Fit.Factors.ChangeOf(row.Tracer, process.Ratios) != 0);
}
