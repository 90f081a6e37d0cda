using System.CommandLine;
using System.CommandLine.Parsing;
using WaterMix.Core;

namespace WaterMix.Cli;

/// <summary>An option that no command has would be read as the name of a file.</summary>
internal static class UnknownOption
{
    /// <summary>Refuses values of an argument that look like options, unless a file has that name.</summary>
    /// <param name="argument">An argument that names files.</param>
    public static void Refuse(Argument argument) => argument.Validators.Add(result =>
    {
        foreach (string value in result.Tokens.Select(t => t.Value).Where(v => v.StartsWith('-') && !Path.Exists(v)))
        {
            string name = value.Split('=')[0];
            IEnumerable<string> known = result.Parent is CommandResult { Command: { } command } ? command.Options.Select(o => o.Name) : [];
            result.AddError($"unknown option '{name}'. {NearestName.Suggestion(name, known)}".TrimEnd());
        }
    });
}
