using System.Globalization;
using System.Text.RegularExpressions;
using WaterMix.Core;
using WaterMix.Core.Mixing;
using WaterMix.Core.Quantities;

namespace WaterMix.Web.State.Mixing;

/// <summary>A finding about a model, for a person at the pages: in words, with the place where it is mended.</summary>
/// <param name="Severity">How much it weighs.</param>
/// <param name="Place">The part of the model.</param>
/// <param name="About">What it is about, such as <c>NDW, oxygen</c>; empty where the place says all.</param>
/// <param name="Text">What is needed, what is there, what to do.</param>
public sealed partial record FindingSentence(Severity Severity, ModelPlace Place, string About, string Text)
{
    /// <summary>What a model's findings say, errors first.</summary>
    /// <param name="model">The model.</param>
    public static IReadOnlyList<FindingSentence> Of(MixingModel model) =>
        [.. ModelCheck.Findings(model).Select(f => Of(f, model)).OrderByDescending(f => f.Severity)];

    /// <summary>A finding in words.</summary>
    /// <param name="finding">A finding with a path into the model.</param>
    /// <param name="model">The model.</param>
    public static FindingSentence Of(Finding finding, MixingModel model)
    {
        ArgumentNullException.ThrowIfNull(finding);
        ArgumentNullException.ThrowIfNull(model);
        string[] path = [.. (finding.Path ?? "").Split('/').Skip(1).Select(t => t.Replace("~1", "/", StringComparison.Ordinal).Replace("~0", "~", StringComparison.Ordinal))];
        ModelPlace place = PlaceOf(path);
        string remedy = finding.Remedy.StartsWith("Add \"", StringComparison.Ordinal) && place is ModelPlace.Errors or ModelPlace.Fit
            ? $"Give it under {Heading(place)}."
            : finding.Remedy;
        string found = finding.Found is "none" ? "there is none" : $"found: {finding.Found}";
        return new FindingSentence(finding.Severity, place, AboutOf(path, model), Readable($"Needed: {finding.Expected}; {found}. {remedy}"));
    }

    /// <summary>The heading of a part of the model.</summary>
    /// <param name="place">The part.</param>
    public static string Heading(ModelPlace place) => place switch
    {
        ModelPlace.Sources => "End-members",
        ModelPlace.Tracers => "Tracers",
        ModelPlace.Fit => "Fit",
        ModelPlace.Errors => "Errors of measurement",
        ModelPlace.Mass => "Mass",
        ModelPlace.Processes => "Processes",
        ModelPlace.Layers => "Layers",
        _ => "Samples used",
    };

    /// <summary>Text with quantities by their names instead of their ids.</summary>
    /// <param name="text">Text of a finding.</param>
    public static string Readable(string text) => LongId().Replace(text, match => Quantity.Find(match.Value)?.Name ?? match.Value);

    private static ModelPlace PlaceOf(string[] path) => path switch
    {
        ["tracers", ..] or ["fit", "factors", ..] => ModelPlace.Tracers,
        ["fit", "measurementSd" or "measurementCovariance", ..] => ModelPlace.Errors,
        ["fit", ..] => ModelPlace.Fit,
        ["massConservation", ..] => ModelPlace.Mass,
        ["processes", ..] => ModelPlace.Processes,
        ["layers", ..] => ModelPlace.Layers,
        ["acceptFlags" or "acceptCtdFlags" or "samples", ..] => ModelPlace.Samples,
        _ => ModelPlace.Sources,
    };

    private static string AboutOf(string[] path, MixingModel model) => path switch
    {
        ["endMembers", "endMembers", var i, "values" or "sd" or "meanSd", var tracer, ..] => $"{EndMember(model, i)}, {TracerText.Name(tracer)}",
        ["endMembers", "endMembers", var i, ..] => EndMember(model, i),
        ["tracers", var i, ..] => Index(i, model.Tracers.Count) is { } t ? TracerText.Name(model.Tracers[t]) : "",
        ["fit", "measurementSd" or "weights", var quantity, ..] => TracerText.Name(quantity),
        ["processes", var i, ..] => Index(i, model.Processes.Count) is { } p ? model.Processes[p].Id : "",
        ["layers", var i, ..] => Index(i, model.Layers.Count) is { } l ? model.Layers[l].Id : "",
        _ => "",
    };

    private static string EndMember(MixingModel model, string index) =>
        Index(index, model.EndMembers.EndMembers.Count) is { } i ? model.EndMembers.EndMembers[i].Id : "";

    private static int? Index(string token, int count) => int.TryParse(token, CultureInfo.InvariantCulture, out int index) && index < count ? index : null;

    [GeneratedRegex("[a-z]+(_[a-z0-9]+)+", RegexOptions.CultureInvariant)]
    private static partial Regex LongId();
}
