using WaterMix.Core.EndMembers;
using WaterMix.Core.Mixing;
using WaterMix.Core.Samples;
using WaterMix.Web.State.Figures;

namespace WaterMix.Web.State.Mixing;

/// <summary>A mixing model in sentences that one could read aloud.</summary>
public static class ModelSentences
{
    /// <summary>The sources.</summary>
    /// <param name="set">The set.</param>
    public static string Sources(EndMemberSet set)
    {
        ArgumentNullException.ThrowIfNull(set);
        return set.EndMembers.Count == 0
            ? "No sources yet."
            : $"{FigureText.Sentence(Number(set.EndMembers.Count))} {(set.EndMembers.Count == 1 ? "source" : "sources")}: {TracerText.List([.. set.EndMembers.Select(e => e.Id)])}; from the set \u201c{set.Name}\u201d, version {set.Version}.";
    }

    /// <summary>The tracers.</summary>
    /// <param name="model">The model.</param>
    public static string Tracers(MixingModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        return model.Tracers.Count switch
        {
            0 => "No tracer is fitted yet.",
            1 => $"One tracer is fitted: {TracerText.Name(model.Tracers[0])}.",
            _ => $"{FigureText.Sentence(Number(model.Tracers.Count))} tracers are fitted: {TracerText.List([.. model.Tracers.Select(TracerText.Name)])}.",
        };
    }

    /// <summary>The fit.</summary>
    /// <param name="fit">The fit.</param>
    public static string Fit(Fit fit) => fit switch
    {
        GeneralisedLeastSquares { Spread: EndMemberSpread.None } =>
            "Generalised least squares: residuals count against the errors of measurement alone; sources are taken as exact.",
        GeneralisedLeastSquares { Spread: EndMemberSpread.Fixed } =>
            "Generalised least squares: residuals count against the errors of measurement and the spread within the sources, the same for every sample of a layer.",
        GeneralisedLeastSquares =>
            "Generalised least squares: residuals count against the errors of measurement and the spread within the sources, in the proportions of the sample itself.",
        WeightedRows rows => $"Weighted rows: {Standardised(rows)}; then {(rows.WeightsAre == WeightMeaning.Squared ? "the square root of its weight" : "its weight")} multiplies the row.",
        _ => "",
    };

    /// <summary>The errors of measurement.</summary>
    /// <param name="model">The model.</param>
    public static string Errors(MixingModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        string[] parts = [.. ModelEdits.Parents(model).Where(model.Fit.MeasurementSd.ContainsKey).Select(p => $"{TracerText.Name(p)} {Error(model.Fit.MeasurementSd[p], TracerText.Unit(p, model.EndMembers))}")];
        return parts.Length == 0 ? "No error of measurement is given." : $"One standard deviation of a measurement: {string.Join("; ", parts)}.";
    }

    /// <summary>An error of measurement: <c>0.4 µmol/kg and 0.3 %</c>.</summary>
    /// <param name="error">The error.</param>
    /// <param name="unit">The unit as people write it.</param>
    public static string Error(MeasurementError error, string unit)
    {
        ArgumentNullException.ThrowIfNull(error);
        string absolute = $"{TypedNumber.Text(error.Absolute)}{(unit.Length > 0 ? " " + unit : "")}";
        return error.Relative > 0 ? $"{absolute} and {TypedNumber.Text(TypedNumber.PerCent(error.Relative))} %" : absolute;
    }

    /// <summary>The conservation of mass.</summary>
    /// <param name="mass">How mass is conserved.</param>
    public static string Mass(MassConservation mass)
    {
        ArgumentNullException.ThrowIfNull(mass);
        return mass.Weight is { } weight
            ? $"Mass is conserved by a row of weight {TypedNumber.Text(weight)}; fractions are reported as solved, and their sum shows the quality of the fit."
            : "Mass is conserved exactly: the fractions of a sample sum to one.";
    }

    /// <summary>A process.</summary>
    /// <param name="process">The process.</param>
    /// <param name="set">The set, which knows the units of further tracers.</param>
    public static string Process(Process process, EndMemberSet set)
    {
        ArgumentNullException.ThrowIfNull(process);
        string[] changes = [.. process.Ratios.Where(r => r.Key != process.Per && r.Value != 0).Select(r => $"{TracerText.Name(r.Key)} {(r.Value > 0 ? "+" : "")}{TypedNumber.Text(r.Value)}")];
        string unit = TracerText.Unit(process.Per, set);
        string what = $"for each {(unit.Length > 0 ? "1 " + unit : "1")} of {TracerText.Name(process.Per)}{(changes.Length > 0 ? ": " + string.Join(", ", changes) : " alone")}";
        string sign = process.Sign switch
        {
            ProcessSign.NonNegative => "its amount is never negative",
            ProcessSign.NonPositive => "its amount is never positive",
            _ => "its amount may have either sign",
        };
        return $"{FigureText.Sentence(process.Id)}, {what}; {sign}; {(process.Where.Count == 0 ? "everywhere" : "where " + Conditions(process.Where, set))}.";
    }

    /// <summary>A layer.</summary>
    /// <param name="layer">The layer.</param>
    /// <param name="set">The set.</param>
    public static string Layer(Layer layer, EndMemberSet set)
    {
        ArgumentNullException.ThrowIfNull(layer);
        string which = layer.Where.Count == 0 ? "Every sample left" : $"A sample with {Conditions(layer.Where, set)}";
        string sources = layer.EndMembers.Count == 0 ? "no source yet" : TracerText.List(layer.EndMembers);
        return $"{which} may hold {sources}.";
    }

    /// <summary>Conditions: <c>pressure at least 150 dbar and sigma-2 below 36.6 kg/m³</c>.</summary>
    /// <param name="conditions">The conditions.</param>
    /// <param name="set">The set.</param>
    public static string Conditions(IReadOnlyList<Condition> conditions, EndMemberSet set)
    {
        ArgumentNullException.ThrowIfNull(conditions);
        return TracerText.List([.. conditions.Select(c => Condition(c, set))]);
    }

    /// <summary>The mask of the winter mixed layer.</summary>
    /// <param name="model">The model.</param>
    public static string Mask(MixingModel model) => WinterMask.Of(model) is { } dbar
        ? $"Samples above {TypedNumber.Text(dbar)} dbar are left out. {WinterMask.Reason}"
        : $"Samples near the surface are fitted too. {WinterMask.Reason}";

    /// <summary>Which values count.</summary>
    /// <param name="model">The model.</param>
    public static string Samples(MixingModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        string prefer = model.Prefer == ValueOrigin.Ctd ? "the CTD\u2019s is preferred" : "the bottle\u2019s is preferred";
        return $"A value of a water sample counts with flag {Flags(model.AcceptFlags)}, one of the CTD with flag {Flags(model.AcceptCtdFlags)}, and a value without a flag always; where both exist, {prefer}.";
    }

    /// <summary>How many unknowns a layer has against its tracers.</summary>
    /// <param name="count">The layer in numbers.</param>
    public static string Determinacy(LayerCount count)
    {
        ArgumentNullException.ThrowIfNull(count);
        int processes = count.ProcessesAlways + count.ProcessesInPlaces;
        string with = processes == 0 ? "" : $" and {Number(processes)} {(processes == 1 ? "process" : "processes")}";
        string unknowns = $"{FigureText.Sentence(Number(count.EndMembers))} {(count.EndMembers == 1 ? "source" : "sources")}{with} make {Number(Math.Max(count.UnknownsAtMost, 0))} {(count.UnknownsAtMost == 1 ? "unknown" : "unknowns")}";
        string tracers = $"{Number(count.Tracers)} {(count.Tracers == 1 ? "tracer" : "tracers")}";
        return Math.Max(count.Unknowns, 1) > count.Tracers ? $"{unknowns}, more than {tracers} can tell: no sample can be solved. Add tracers, or permit fewer sources or processes."
            : count.UnknownsAtMost > count.Tracers ? $"{unknowns} where all processes act, more than {tracers} can tell: those samples cannot be solved."
            : count.UnknownsAtMost == count.Tracers ? $"{unknowns}; {tracers} just determine them, so that nothing is left to judge the fit by."
            : $"{unknowns}; {tracers} determine them.";
    }

    private static string Condition(Condition condition, EndMemberSet set)
    {
        string unit = TracerText.Unit(condition.Quantity, set);
        string end = (unit.Length > 0 ? " " + unit : "") + (condition.Scale == DensityScale.Eos80 ? " (EOS-80)" : "");
        string name = TracerText.Name(condition.Quantity);
        return (condition.AtLeast, condition.LessThan) switch
        {
            ({ } low, { } high) => $"{name} from {TypedNumber.Text(low)} to below {TypedNumber.Text(high)}{end}",
            ({ } low, null) => $"{name} at least {TypedNumber.Text(low)}{end}",
            (null, { } high) => $"{name} below {TypedNumber.Text(high)}{end}",
            _ => $"{name} without a bound yet",
        };
    }

    private static string Standardised(WeightedRows rows)
    {
        string over = rows.Over == StandardiseOver.Set ? "all end-members" : "the layer\u2019s end-members";
        string divisor = rows.SdOver == SdDivisor.N ? "" : ", with n \u2212 1";
        return rows.Standardise switch
        {
            Standardisation.MeanAndSd => $"each tracer less the mean of {over}, divided by their standard deviation{divisor}",
            Standardisation.Sd => $"each tracer divided by the standard deviation of {over}{divisor}",
            _ => "tracers in their own units",
        };
    }

    private static string Flags(IReadOnlyList<int> flags) => flags.Count == 0
        ? "none"
        : string.Join(" or ", flags.Select(f => PlainText.Count(f)));

    private static string Number(int count) => count switch
    {
        0 => "no",
        1 => "one",
        2 => "two",
        3 => "three",
        4 => "four",
        5 => "five",
        6 => "six",
        7 => "seven",
        8 => "eight",
        9 => "nine",
        10 => "ten",
        _ => PlainText.Count(count),
    };
}
