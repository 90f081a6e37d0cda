using System.Globalization;
using WaterMix.Core;
using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;
using WaterMix.Web.State.Mixing;

namespace WaterMix.Web.State.EndMembers;

/// <summary>Edits of the end-member set, each from a model to the changed model, so that layers follow when an end-member is renamed or taken out.</summary>
public static class SetEdits
{
    /// <summary>Adds an end-member without values; it is permitted in every layer.</summary>
    /// <param name="model">The model.</param>
    public static MixingModel Add(MixingModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        return Add(model, new EndMember(FreeId(model), "", new Dictionary<string, double>(), new Provenance(ProvenanceKind.Manual)));
    }

    /// <summary>Adds an end-member; it is permitted in every layer.</summary>
    /// <param name="model">The model.</param>
    /// <param name="endMember">The end-member.</param>
    public static MixingModel Add(MixingModel model, EndMember endMember)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(endMember);
        return OfSet(model, set => set with { EndMembers = [.. set.EndMembers, endMember] }) with
        {
            Layers = [.. model.Layers.Select(layer => layer with { EndMembers = [.. layer.EndMembers, endMember.Id] })],
        };
    }

    /// <summary>Takes an end-member out of the set and of every layer.</summary>
    /// <param name="model">The model.</param>
    /// <param name="index">Its place in the set, from 0.</param>
    public static MixingModel Remove(MixingModel model, int index)
    {
        ArgumentNullException.ThrowIfNull(model);
        string id = model.EndMembers.EndMembers[index].Id;
        return OfSet(model, set => set with { EndMembers = [.. set.EndMembers.Where((_, i) => i != index)] }) with
        {
            Layers = [.. model.Layers.Select(layer => layer with { EndMembers = [.. layer.EndMembers.Where(e => e != id)] })],
        };
    }

    /// <summary>Moves an end-member up or down the list, as far as there is room.</summary>
    /// <param name="model">The model.</param>
    /// <param name="index">Its place in the set, from 0.</param>
    /// <param name="by">Places: negative is up.</param>
    public static MixingModel Move(MixingModel model, int index, int by) => OfSet(model, set => set with { EndMembers = ModelEdits.Moved(set.EndMembers, index, by) });

    /// <summary>Gives an end-member another id, in the layers as well.</summary>
    /// <param name="model">The model.</param>
    /// <param name="index">Its place in the set, from 0.</param>
    /// <param name="id">The id; ask <see cref="ProblemOfId"/> first.</param>
    public static MixingModel WithId(MixingModel model, int index, string id)
    {
        ArgumentNullException.ThrowIfNull(model);
        string old = model.EndMembers.EndMembers[index].Id;
        return With(model, index, e => e with { Id = id }) with
        {
            Layers = [.. model.Layers.Select(layer => layer with { EndMembers = [.. layer.EndMembers.Select(e => e == old ? id : e)] })],
        };
    }

    /// <summary>Why an end-member cannot have this id and what to do; null where it can.</summary>
    /// <param name="model">The model.</param>
    /// <param name="index">Its place in the set, from 0.</param>
    /// <param name="id">The id.</param>
    public static string? ProblemOfId(MixingModel model, int index, string id)
    {
        ArgumentNullException.ThrowIfNull(model);
        if (model.Processes.Any(p => p.Id.Equals(id, StringComparison.OrdinalIgnoreCase))
            || model.EndMembers.EndMembers.Where((e, i) => i != index && e.Id.Equals(id, StringComparison.OrdinalIgnoreCase)).Any())
        {
            return $"\u201c{id}\u201d is taken by another end-member or process (upper and lower case count as the same).";
        }

        EndMemberSet alone = model.EndMembers with { EndMembers = [model.EndMembers.EndMembers[index] with { Id = id }] };
        Finding? finding = EndMemberSetCheck.Findings(alone).FirstOrDefault(f => f.Path == "/endMembers/0/id");
        return finding is null ? null : $"\u201c{id}\u201d is no {finding.Expected.Replace("an id", "id", StringComparison.Ordinal)}.";
    }

    /// <summary>Sets or takes out a value.</summary>
    /// <param name="model">The model.</param>
    /// <param name="index">The end-member's place in the set, from 0.</param>
    /// <param name="tracer">The quantity's id.</param>
    /// <param name="value">The value in the quantity's unit; null takes it out.</param>
    public static MixingModel WithValue(MixingModel model, int index, string tracer, double? value) => With(model, index, e => e with { Values = Changed(e.Values, tracer, value) });

    /// <summary>Sets or takes out a spread.</summary>
    /// <param name="model">The model.</param>
    /// <param name="index">The end-member's place in the set, from 0.</param>
    /// <param name="tracer">The quantity's id.</param>
    /// <param name="sd">One standard deviation, 0 or more; null takes it out.</param>
    public static MixingModel WithSd(MixingModel model, int index, string tracer, double? sd) => With(model, index, e => e with { Sd = Changed(e.Sd, tracer, sd) });

    /// <summary>Changes one end-member.</summary>
    /// <param name="model">The model.</param>
    /// <param name="index">The end-member's place in the set, from 0.</param>
    /// <param name="change">The change; not of its id.</param>
    public static MixingModel With(MixingModel model, int index, Func<EndMember, EndMember> change)
    {
        ArgumentNullException.ThrowIfNull(change);
        return OfSet(model, set => set with { EndMembers = [.. set.EndMembers.Select((e, i) => i == index ? change(e) : e)] });
    }

    /// <summary>Changes the set as a whole, not its ids.</summary>
    /// <param name="model">The model.</param>
    /// <param name="change">The change.</param>
    public static MixingModel OfSet(MixingModel model, Func<EndMemberSet, EndMemberSet> change)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(change);
        return model with { EndMembers = change(model.EndMembers), EndMembersFile = null };
    }

    /// <summary>Takes another set in: layers keep the end-members that it has; a layer left without any permits all.</summary>
    /// <param name="model">The model.</param>
    /// <param name="set">The set.</param>
    public static MixingModel Replace(MixingModel model, EndMemberSet set)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(set);
        string[] ids = [.. set.EndMembers.Select(e => e.Id)];
        return model with
        {
            EndMembers = set,
            EndMembersFile = null,
            Layers = [.. model.Layers.Select(layer => layer with { EndMembers = layer.EndMembers.Where(ids.Contains).ToArray() is { Length: > 0 } kept ? kept : ids })],
        };
    }

    private static string FreeId(MixingModel model)
    {
        var taken = model.EndMembers.EndMembers.Select(e => e.Id).Concat(model.Processes.Select(p => p.Id)).ToHashSet(StringComparer.OrdinalIgnoreCase);
        return Enumerable.Range(1, taken.Count + 1).Select(n => string.Create(CultureInfo.InvariantCulture, $"source-{n}")).First(id => !taken.Contains(id));
    }

    private static Dictionary<string, double> Changed(IReadOnlyDictionary<string, double> values, string tracer, double? value)
    {
        var changed = new Dictionary<string, double>(values, StringComparer.Ordinal);
        if (value is { } given)
        {
            changed[tracer] = given;
        }
        else
        {
            changed.Remove(tracer);
        }

        return changed;
    }
}
