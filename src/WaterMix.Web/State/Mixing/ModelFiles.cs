using System.Text;
using WaterMix.Core;
using WaterMix.Core.Mixing;
using WaterMix.Formats.EndMemberSets;
using WaterMix.Formats.Json;
using WaterMix.Formats.MixingModels;

namespace WaterMix.Web.State.Mixing;

/// <summary>A file that a person opened or saves.</summary>
/// <param name="Name">Its name.</param>
/// <param name="Utf8">Its bytes.</param>
public sealed record NamedFile(string Name, byte[] Utf8);

/// <summary>Models and sets as files.</summary>
public static class ModelFiles
{
    /// <summary>The model with its set in it.</summary>
    /// <param name="model">The model.</param>
    public static NamedFile OfModel(MixingModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        return new NamedFile(FileName(model.Name, "model") + ".mixmodel.json", MixingModelFile.Write(model with { EndMembersFile = null }));
    }

    /// <summary>The end-member set of a model.</summary>
    /// <param name="model">The model.</param>
    public static NamedFile OfSet(MixingModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        return new NamedFile(
            string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{FileName(model.EndMembers.Name, "sources")}-v{model.EndMembers.Version}.endmembers.json"),
            EndMemberSetFile.Write(model.EndMembers));
    }

    /// <summary>Reads a model from the files that were chosen: the model, and where it names one, its set.</summary>
    /// <param name="files">The files, at least one.</param>
    /// <returns>The model with its set in it, or null where a finding is an error.</returns>
    public static Reading<MixingModel> Read(IReadOnlyList<NamedFile> files)
    {
        ArgumentNullException.ThrowIfNull(files);
        NamedFile chosen = files.FirstOrDefault(f => Encoding.UTF8.GetString(f.Utf8).Contains("watermix/mixing-model/", StringComparison.Ordinal)) ?? files[0];
        Reading<MixingModel> reading = MixingModelFile.Read(chosen.Utf8, chosen.Name, name => SetNamed(name, files));
        return reading with { Value = reading.Value is null ? null : reading.Value with { EndMembersFile = null } };
    }

    /// <summary>A finding about a file in words: line, what was expected and found, what to do.</summary>
    /// <param name="finding">The finding.</param>
    public static string Words(Finding finding)
    {
        ArgumentNullException.ThrowIfNull(finding);
        string line = finding.Line is { } n ? $"Line {PlainText.Count(n)}: " : "";
        string times = finding.Count > 1 ? $" ({PlainText.Count(finding.Count)} times)" : "";
        return $"{line}expected {finding.Expected}; found {finding.Found}{times}. {finding.Remedy}";
    }

    private static (byte[] Utf8, string FileName) SetNamed(string name, IReadOnlyList<NamedFile> files)
    {
        string own = name.Split('/', '\\')[^1];
        NamedFile file = files.FirstOrDefault(f => f.Name.Equals(own, StringComparison.OrdinalIgnoreCase))
            ?? throw new FileNotFoundException($"The model names the set {own}: choose both files together.", own);
        return (file.Utf8, file.Name);
    }

    private static string FileName(string name, string otherwise)
    {
        var text = new StringBuilder();
        foreach (char c in name.ToLowerInvariant())
        {
            if (char.IsAsciiLetterOrDigit(c))
            {
                text.Append(c);
            }
            else if (text.Length > 0 && text[^1] != '-')
            {
                text.Append('-');
            }
        }

        string made = text.ToString().Trim('-');
        return made.Length == 0 ? otherwise : made[..Math.Min(made.Length, 60)];
    }
}
