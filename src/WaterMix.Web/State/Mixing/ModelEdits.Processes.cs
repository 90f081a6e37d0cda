using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;

namespace WaterMix.Web.State.Mixing;

public static partial class ModelEdits
{
    /// <summary>Adds a process under an id that is free.</summary>
    /// <param name="model">The model.</param>
    /// <param name="process">The process.</param>
    public static MixingModel AddProcess(MixingModel model, Process process)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(process);
        return model with { Processes = [.. model.Processes, process with { Id = FreeId(model, process.Id) }] };
    }

    /// <summary>Takes a process out.</summary>
    /// <param name="model">The model.</param>
    /// <param name="index">Its place, from 0.</param>
    public static MixingModel RemoveProcess(MixingModel model, int index)
    {
        ArgumentNullException.ThrowIfNull(model);
        return model with { Processes = [.. model.Processes.Where((_, i) => i != index)] };
    }

    /// <summary>Changes a process.</summary>
    /// <param name="model">The model.</param>
    /// <param name="index">Its place, from 0.</param>
    /// <param name="change">The change.</param>
    public static MixingModel WithProcess(MixingModel model, int index, Func<Process, Process> change)
    {
        ArgumentNullException.ThrowIfNull(model);
        return model with { Processes = Replaced(model.Processes, index, change) };
    }

    /// <summary>Sets or takes out a ratio of a process.</summary>
    /// <param name="model">The model.</param>
    /// <param name="index">The process's place, from 0.</param>
    /// <param name="quantity">The quantity that changes.</param>
    /// <param name="ratio">Its change per 1 of the quantity that the amount counts; null takes it out.</param>
    public static MixingModel WithRatio(MixingModel model, int index, string quantity, double? ratio) => WithProcess(model, index, process => process with
    {
        Ratios = ratio is { } given ? Changed(process.Ratios, quantity, given) : Where(process.Ratios, id => id != quantity),
    });

    /// <summary>
    /// Lets the amount of a process count another quantity: its own ratio becomes 1, the others keep their proportions where it had one.
    /// </summary>
    /// <param name="process">The process.</param>
    /// <param name="quantity">The quantity that the amount counts.</param>
    public static Process CountedIn(Process process, string quantity)
    {
        ArgumentNullException.ThrowIfNull(process);
        double own = process.Ratios.GetValueOrDefault(quantity);
        var ratios = process.Ratios.ToDictionary(r => r.Key, r => own == 0 ? r.Value : r.Value / own, StringComparer.Ordinal);
        ratios[quantity] = 1;
        ProcessSign sign = (process.Sign, own < 0) switch
        {
            (ProcessSign.NonNegative, true) => ProcessSign.NonPositive,
            (ProcessSign.NonPositive, true) => ProcessSign.NonNegative,
            var (same, _) => same,
        };
        return process with { Per = quantity, Ratios = ratios, Sign = sign };
    }

    /// <summary>Why a process cannot have this id and what to do; null where it can.</summary>
    /// <param name="model">The model.</param>
    /// <param name="index">The process's place, from 0.</param>
    /// <param name="id">The id.</param>
    public static string? ProblemOfProcessId(MixingModel model, int index, string id)
    {
        ArgumentNullException.ThrowIfNull(model);
        bool isTaken = model.EndMembers.EndMembers.Select(e => e.Id)
            .Concat(model.Processes.Where((_, i) => i != index).Select(p => p.Id))
            .Contains(id, StringComparer.OrdinalIgnoreCase);
        if (isTaken)
        {
            return $"\u201c{id}\u201d is taken by another process or end-member (upper and lower case count as the same).";
        }

        EndMemberSet alone = new("", 1, [new EndMember(id, "", new Dictionary<string, double>(), new Provenance(ProvenanceKind.Manual))]);
        return EndMemberSetCheck.Findings(alone).FirstOrDefault(f => f.Path == "/endMembers/0/id") is { } finding
            ? $"\u201c{id}\u201d is no {finding.Expected.Replace("an id", "id", StringComparison.Ordinal)}."
            : null;
    }

    private static string FreeId(MixingModel model, string wanted)
    {
        var taken = model.EndMembers.EndMembers.Select(e => e.Id).Concat(model.Processes.Select(p => p.Id)).ToHashSet(StringComparer.OrdinalIgnoreCase);
        return !taken.Contains(wanted) ? wanted : Enumerable.Range(2, taken.Count + 1).Select(n => FormattableString.Invariant($"{wanted}-{n}")).First(id => !taken.Contains(id));
    }
}
